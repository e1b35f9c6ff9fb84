/** The kinds of visit: a booked time on site. */
import { z } from 'zod';

export const visitKinds = [
  'site-measure',
  'check-measure',
  'delivery',
  'install',
  'worktop-template',
  'return',
] as const;
export const visitKind = z.enum(visitKinds);
export type VisitKind = z.infer<typeof visitKind>;
