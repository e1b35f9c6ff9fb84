/** What real times say about the shop's minutes, on the wire: an offer, which the owner takes in Shop rules. */
import { z } from 'zod';

export const durationCorrection = z.object({
  /** The rule that it would change. */
  rule: z.enum(['measureMinutesPerRoom', 'installMinutesPerUnit']),
  nowMinutes: z.number(),
  offeredMinutes: z.number(),
  lowQuartileMinutes: z.number(),
  highQuartileMinutes: z.number(),
  visitCount: z.number().int(),
  setAsideCount: z.number().int(),
  /** "A unit takes 75 min by 12 installs; the rule says 60." */
  words: z.string(),
  /** Visits that wait to be booked and would be booked for longer or shorter. */
  waiting: z.array(
    z.object({
      jobId: z.uuid(),
      jobNumber: z.number().int(),
      customerName: z.string(),
      fromMinutes: z.number(),
      toMinutes: z.number(),
    }),
  ),
});
export type DurationCorrection = z.infer<typeof durationCorrection>;

export const durationCorrectionsView = z.object({
  corrections: z.array(durationCorrection),
  /** Rules of which too few visits were timed, in words. */
  tooFew: z.array(z.string()),
});
export type DurationCorrectionsView = z.infer<typeof durationCorrectionsView>;
