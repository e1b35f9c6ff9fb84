/** "The shop is three days late on these", on the wire: what it moves, where to, and all of it accepted at once. */
import { z } from 'zod';
import { visitKind } from '@/lib/schedule/visit-kind';

const id = z.uuid();
const localDate = z.iso.date();
const localTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Write the time as 07:30.');

export const slipInput = z.object({
  jobIds: z.array(id).min(1, 'Choose the jobs that are late.').max(100),
  /** Working days of the shop. */
  days: z.number().int().min(1).max(260),
});
export type SlipInput = z.infer<typeof slipInput>;

export const slipMove = z.object({
  visitId: id,
  version: z.number().int(),
  jobId: id,
  jobNumber: z.number().int(),
  customerName: z.string(),
  kind: visitKind,
  /** Where it is now. */
  crewName: z.string(),
  dayWords: z.string(),
  windowWords: z.string(),
  /** The gates that it would break where it is, in words. */
  brokenGates: z.array(z.string()),
  /** Where it could go; null where no time was found. */
  proposal: z
    .object({
      crewId: id,
      crewName: z.string(),
      date: localDate,
      time: localTime,
      dayWords: z.string(),
      windowWords: z.string(),
      /** "same crew, same weekday, one week later". */
      why: z.string(),
    })
    .nullable(),
  whyNone: z.string(),
});
export type SlipMove = z.infer<typeof slipMove>;

export const slipPreview = z.object({
  /** The new day on which each job's cabinets are ready. */
  jobs: z.array(
    z.object({
      jobId: id,
      jobNumber: z.number().int(),
      customerName: z.string(),
      readyOn: localDate,
      readyWords: z.string(),
      wasReadyWords: z.string(),
    }),
  ),
  moves: z.array(slipMove),
  /** Visits of these jobs that stay, because nothing stands against them. */
  staying: z.number().int(),
  customersToTell: z.number().int(),
});
export type SlipPreview = z.infer<typeof slipPreview>;

export const acceptSlipInput = z.object({
  idempotencyKey: z.uuid(),
  /** Kept with each job and in the story. */
  reason: z.string().trim().min(1, 'Say why the shop is late.').max(400),
  jobs: z
    .array(z.object({ jobId: id, readyOn: localDate }))
    .min(1)
    .max(100),
  moves: z
    .array(
      z.object({
        visitId: id,
        version: z.number().int(),
        crewId: id,
        date: localDate,
        time: localTime,
      }),
    )
    .max(200),
});
export type AcceptSlipInput = z.infer<typeof acceptSlipInput>;

export const acceptedSlip = z.object({
  moved: z.number().int(),
  customersTold: z.number().int(),
});
export type AcceptedSlip = z.infer<typeof acceptedSlip>;
