/** Times that work, on the wire: what is asked, what is offered with why, and holds of fifteen minutes. */
import { z } from 'zod';
import { visitKind } from '@/lib/schedule/visit-kind';
import { bookedVisit } from './visits';

const id = z.uuid();
const localDate = z.iso.date();
const localTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Write the time as 07:30.');
const workMinutes = z.number().int().min(10).max(60_000);

/** What the customer would like; a time that misses one is still offered, and says so. Local to the shop. */
export const openingWishes = z.object({
  /** ISO weekdays, 1 Monday … 7 Sunday; none: any day. */
  weekdays: z.array(z.number().int().min(1).max(7)).max(7).default([]),
  /** The crew arrives at this time or later, on the first day. */
  notBefore: localTime.optional(),
  /** The crew arrives at this time or earlier, on the first day. */
  notAfter: localTime.optional(),
  /** The crew is gone by then, on each day. */
  doneBy: localTime.optional(),
  /** Nobody can open the door then (the school run): the arrival window keeps clear of it. */
  away: z
    .array(z.object({ from: localTime, until: localTime }))
    .max(4)
    .default([]),
});
export type OpeningWishes = z.infer<typeof openingWishes>;

export const noWishes: OpeningWishes = { weekdays: [], away: [] };

export const findOpeningsInput = z
  .object({
    jobId: id,
    kind: visitKind,
    /** Another time for this visit: its own time counts as free, its length is kept. */
    visitId: id.optional(),
    /** Only these crews; left out: all that do this kind. */
    crewIds: z.array(id).min(1).max(50).optional(),
    /** First and last local day; left out: from the day that the gates allow, over ninety days. */
    from: localDate.optional(),
    until: localDate.optional(),
    /** Left out: the estimate for each crew's size. */
    workMinutes: workMinutes.optional(),
    /** Two for a measure that one person cannot do. Left out: one, or as many as go on the measure that moves. */
    peopleNeeded: z.number().int().min(1).max(12).optional(),
    /** The scheduler will write why: days before the gates allow it are offered too. */
    isGateOverridden: z.boolean().default(false),
    wishes: openingWishes.default(noWishes),
    limit: z.number().int().min(1).max(60).default(9),
  })
  .refine(({ from, until }) => !from || !until || from <= until, {
    path: ['until'],
    message: 'The last day is before the first.',
  });
export type FindOpeningsInput = z.infer<typeof findOpeningsInput>;

export const opening = z.object({
  crewId: id,
  crewName: z.string(),
  /** The start as booking takes it: local day and time in the shop's zone. */
  date: localDate,
  time: localTime,
  startsAt: z.iso.datetime(),
  endsAt: z.iso.datetime(),
  windowStartsAt: z.iso.datetime(),
  windowEndsAt: z.iso.datetime(),
  workMinutes,
  /** Busy time, one piece a day. */
  pieces: z.array(z.object({ startsAt: z.iso.datetime(), endsAt: z.iso.datetime() })),
  /** Ready to be read, in the shop's zone: "Thu, Dec 10", "8:00-10:00 AM". */
  dayWords: z.string(),
  windowWords: z.string(),
  /** What the visit adds to the crew's driving over its days. */
  driveAddedMinutes: z.number(),
  /** No road service answered, or a place is not on the map. */
  isDriveEstimated: z.boolean(),
  /** Working time of those days that another visit could still use. */
  leavesFreeMinutes: z.number(),
  /** In words: "not a Tuesday", "before 9:30 AM". */
  missedWishes: z.array(z.string()),
  /** Minutes of trouble, by the shop's weights: the least is the best. */
  score: z.number(),
  /** One sentence. */
  why: z.string(),
});
export type Opening = z.infer<typeof opening>;

export const openingsView = z.object({
  /** Best first. */
  openings: z.array(opening),
  /** How many there are in all, with those past the limit. */
  found: z.number().int(),
  /** What the gates say: now, from a day, or not yet (then nothing is offered unless overridden). */
  state: z.enum(['now', 'from', 'blocked']),
  from: localDate.nullable(),
  gateWords: z.string(),
  /** Where nothing is offered: what stands in the way, and what to do. */
  whyNone: z.string(),
});
export type OpeningsView = z.infer<typeof openingsView>;

export const holdMinutes = 15;

/** Keeps a time for somebody who is choosing; nobody is told. */
export const holdOpeningInput = z.object({
  idempotencyKey: z.uuid(),
  jobId: id,
  kind: visitKind,
  /** The booked visit that may move there; left out: a visit not booked yet. */
  forVisitId: id.optional(),
  crewId: id,
  date: localDate,
  time: localTime,
  workMinutes: workMinutes.optional(),
  overrideReason: z.string().trim().max(400).default(''),
});
export type HoldOpeningInput = z.infer<typeof holdOpeningInput>;

export const heldVisit = bookedVisit.extend({ holdEndsAt: z.iso.datetime() });
export type HeldVisit = z.infer<typeof heldVisit>;

/** A held time becomes the booking (or the booked visit moves there), or is let go. */
export const heldVisitInput = z.object({ visitId: id });
export type HeldVisitInput = z.infer<typeof heldVisitInput>;

/**
 * What the customer's page offers in place of the booked time; words in their language, in the site's zone.
 * The crew stays on the server: the customer chooses a time.
 */
export const offeredTime = z.object({
  crewId: id,
  date: localDate,
  time: localTime,
  dayWords: z.string(),
  windowWords: z.string(),
});
export type OfferedTime = z.infer<typeof offeredTime>;

/** The time that is kept for the customer just now. */
export const customerHold = z.object({
  heldVisitId: id,
  startsAt: z.iso.datetime(),
  holdEndsAt: z.iso.datetime(),
  dayWords: z.string(),
  windowWords: z.string(),
});
export type CustomerHold = z.infer<typeof customerHold>;

export const offeredTimes = z.object({
  times: z.array(offeredTime),
  hold: customerHold.nullable(),
});
export type OfferedTimes = z.infer<typeof offeredTimes>;

export const holdForCustomerInput = z.object({ date: localDate, time: localTime });
export type HoldForCustomerInput = z.infer<typeof holdForCustomerInput>;
