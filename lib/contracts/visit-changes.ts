/** Changes of visits that meet: what somebody else did in the meantime, and taking one's own back. */
import { z } from 'zod';
import { visitView } from './visits';

/** Why a stale change was refused: the visit as it is now, and who made it so. */
export const staleVisit = visitView.extend({
  lastChange: z
    .object({
      by: z.string(),
      /** "today at 10:42 AM", in the shop's zone. */
      atWords: z.string(),
      /** As the job's story tells it. */
      summary: z.string(),
    })
    .nullable(),
});
export type StaleVisit = z.infer<typeof staleVisit>;

/** Takes the newest change of a visit back: the one that made this version. */
export const undoVisitChangeInput = z.object({
  visitId: z.uuid(),
  version: z.number().int(),
});
export type UndoVisitChangeInput = z.infer<typeof undoVisitChangeInput>;

/** The visit as it stands again. */
export const takenBackVisit = visitView.extend({
  /** The time that it had been given is held for the customer once more. */
  isHeldAgain: z.boolean(),
});
export type TakenBackVisit = z.infer<typeof takenBackVisit>;
