/** Calendar feeds on the wire. */
import { z } from 'zod';

const id = z.uuid();

/** Of a crew or of a person: one of the two. */
export const makeFeedInput = z
  .object({ crewId: id.optional(), personId: id.optional() })
  .refine(({ crewId, personId }) => (crewId === undefined) !== (personId === undefined), {
    message: 'Name a crew or a person.',
  });
export type MakeFeedInput = z.infer<typeof makeFeedInput>;

export const revokeFeedInput = z.object({ feedId: id });
export type RevokeFeedInput = z.infer<typeof revokeFeedInput>;

export const feedView = z.object({
  id,
  crewId: id.nullable(),
  personId: id.nullable(),
  /** Whoever has it reads the calendar. */
  address: z.string(),
  madeWords: z.string(),
  /** When a calendar last asked for it; empty when none did yet. */
  readWords: z.string(),
});
export type FeedView = z.infer<typeof feedView>;
