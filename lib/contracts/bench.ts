/** What the bench has to build, as its screen shows it. */
import { z } from 'zod';

/** The newest sheet of a room, with when it is needed and how it stands. */
export const benchSheet = z.object({
  releaseId: z.uuid(),
  jobId: z.uuid(),
  roomId: z.uuid(),
  jobNumber: z.number().int(),
  jobTitle: z.string(),
  customerName: z.string(),
  roomName: z.string(),
  revision: z.string(),
  releasedAtWords: z.string(),
  takenUpWords: z.string().nullable(),
  isSuperseded: z.boolean(),
  /** The first install that stands in the diary. */
  needOn: z.iso.date().nullable(),
  needWords: z.string().nullable(),
  /** The cabinets are to be ready so many days later than they are needed; 0 when they are not late. */
  lateDays: z.number().int(),
  readyOn: z.iso.date().nullable(),
  readyWords: z.string().nullable(),
  /** They stand ready now. */
  isReady: z.boolean(),
  readyWhere: z.string(),
  readyWhy: z.string(),
  finish: z.string(),
  /** The shop's day now. */
  today: z.iso.date(),
});
export type BenchSheet = z.infer<typeof benchSheet>;
