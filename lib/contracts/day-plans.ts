/** The order of a day on the wire: what each crew drives now, what would be better, and what to accept. */
import { z } from 'zod';
import { visitKind } from '@/lib/schedule/visit-kind';
import { visitStatus } from './visits';

const id = z.uuid();
const localDate = z.iso.date();
const place = z.object({ lat: z.number(), lon: z.number() });

export const planDayInput = z.object({
  date: localDate,
  /** One crew: its own stops in a better order. Several, or left out: stops may change crews. */
  crewIds: z.array(id).min(1).max(50).optional(),
});
export type PlanDayInput = z.infer<typeof planDayInput>;

export const plannedStop = z.object({
  visitId: id,
  version: z.number().int(),
  jobId: id,
  jobNumber: z.number().int(),
  kind: visitKind,
  status: visitStatus,
  customerName: z.string(),
  street: z.string(),
  town: z.string(),
  /** Null where the site is not on the map. */
  place: place.nullable(),
  startsAt: z.iso.datetime(),
  endsAt: z.iso.datetime(),
  windowStartsAt: z.iso.datetime(),
  windowEndsAt: z.iso.datetime(),
  timeWords: z.string(),
  windowWords: z.string(),
  /** From the stop before, or from the crew's base. */
  driveMinutes: z.number(),
  /** How much later the crew could be here without breaking this or a later promise. */
  slackMinutes: z.number(),
  /** Under way, done, or part of a visit of several days: stays where it is. */
  isFixed: z.boolean(),
});
export type PlannedStop = z.infer<typeof plannedStop>;

export const crewDay = z.object({
  crewId: id,
  crewName: z.string(),
  colour: z.enum(['1', '2', '3', '4', '5', '6']),
  base: place.nullable(),
  stops: z.array(plannedStop),
  /** From the last stop home. */
  driveHomeMinutes: z.number(),
  driveMinutes: z.number(),
  /** Promises that the day breaks as it stands, in words. */
  troubles: z.array(z.string()),
});
export type CrewDay = z.infer<typeof crewDay>;

/** One visit's new place in the day; its promised window stays what the customer was told. */
export const dayChange = z.object({
  visitId: id,
  version: z.number().int(),
  crewId: id,
  startsAt: z.iso.datetime(),
});
export type DayChange = z.infer<typeof dayChange>;

export const dayPlanView = z.object({
  date: localDate,
  dayWords: z.string(),
  now: z.array(crewDay),
  /** The same where nothing is better. */
  better: z.array(crewDay),
  nowDriveMinutes: z.number(),
  betterDriveMinutes: z.number(),
  isDriveEstimated: z.boolean(),
  /** What to send to accept; empty where nothing is better. */
  changes: z.array(dayChange),
});
export type DayPlanView = z.infer<typeof dayPlanView>;

export const acceptDayPlanInput = z.object({
  idempotencyKey: z.uuid(),
  date: localDate,
  changes: z.array(dayChange).min(1).max(200),
});
export type AcceptDayPlanInput = z.infer<typeof acceptDayPlanInput>;

export const acceptedDayPlan = z.object({ changed: z.number().int() });
export type AcceptedDayPlan = z.infer<typeof acceptedDayPlan>;
