/** The kinds of visit: a booked time on site. */
import { z } from 'zod';

export const visitKind = z.enum([
  'site-measure',
  'check-measure',
  'delivery',
  'install',
  'worktop-template',
  'return',
]);
export type VisitKind = z.infer<typeof visitKind>;

export const visitKinds = visitKind.options;
