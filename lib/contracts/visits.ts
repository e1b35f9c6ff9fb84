/** The diary on the wire: visits, the waiting list, bookings and what is told from site. */
import { z } from 'zod';
import { missingThings } from '@/lib/messages/missing-words';
import { visitKind } from '@/lib/schedule/visit-kind';
import type { CrewSnag } from './snags';

const id = z.uuid();
/** A local day and time in the shop's zone; the server makes the instant of it. */
const localDate = z.iso.date();
const localTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Write the time as 07:30.');

export const visitStatuses = [
  'held',
  'booked',
  'confirmed',
  'on-the-way',
  'on-site',
  'done',
  'missed',
  'called-off',
] as const;
export const visitStatus = z.enum(visitStatuses);
export type VisitStatus = z.infer<typeof visitStatus>;

export const crewView = z.object({
  id,
  name: z.string(),
  does: z.enum(['measure', 'fit']),
  colour: z.enum(['1', '2', '3', '4', '5', '6']),
  people: z.array(z.object({ id, name: z.string() })),
});
export type CrewView = z.infer<typeof crewView>;

/** One crew's busy time on one day, as the diary draws it. */
export const pieceView = z.object({
  id,
  startsAt: z.iso.datetime(),
  endsAt: z.iso.datetime(),
});

export const visitView = z.object({
  id,
  version: z.number().int(),
  kind: visitKind,
  status: visitStatus,
  jobId: id,
  jobNumber: z.number().int(),
  jobTitle: z.string(),
  customerName: z.string(),
  /** As people of the shop's country write it. */
  phone: z.string(),
  street: z.string(),
  town: z.string(),
  wayIn: z.string(),
  crewId: id,
  crewName: z.string(),
  startsAt: z.iso.datetime(),
  endsAt: z.iso.datetime(),
  windowStartsAt: z.iso.datetime(),
  windowEndsAt: z.iso.datetime(),
  /** Ready to be read, in the shop's zone: "Thu 10 Dec", "07:30–08:30". */
  dayWords: z.string(),
  windowWords: z.string(),
  workMinutes: z.number().int(),
  customerSays: z.string(),
  confirmedAt: z.iso.datetime().nullable(),
  /** When a crew that runs late now expects to be there. */
  expectedAt: z.iso.datetime().nullable(),
  arrivedAt: z.iso.datetime().nullable(),
  leftAt: z.iso.datetime().nullable(),
  pieces: z.array(pieceView),
});
export type VisitView = z.infer<typeof visitView>;

/** What booking and moving answer: the visit, and what is unusual about it, done as asked. */
export const bookedVisit = visitView.extend({ warnings: z.array(z.string()) });
export type BookedVisit = z.infer<typeof bookedVisit>;

export const visitIdInput = z.object({ visitId: id });

export const listVisitsInput = z.object({
  /** [from, to) as local dates in the shop's zone. */
  from: localDate,
  to: localDate,
});
export type ListVisitsInput = z.infer<typeof listVisitsInput>;

export const findVisitsInput = z.object({ search: z.string().trim().min(2).max(120) });
export type FindVisitsInput = z.infer<typeof findVisitsInput>;

/** A job and a kind of visit that it needs next: from when, or why not yet. */
export const waitingItem = z.object({
  jobId: id,
  jobNumber: z.number().int(),
  kind: visitKind,
  customerName: z.string(),
  street: z.string(),
  town: z.string(),
  jobTitle: z.string(),
  workMinutes: z.number().int(),
  /** now: can be booked today; from: on or after `from`; blocked: not yet. */
  state: z.enum(['now', 'from', 'blocked']),
  from: localDate.nullable(),
  /** "cabinets ready Mon 14 Dec, floor down" or "not yet: no revision released". */
  why: z.string(),
  /** Gates that are not passed; booking before `from` needs a reason for each. */
  openGates: z.array(z.object({ gate: z.string(), words: z.string() })),
  /** What the customer wished for or said. */
  wish: z.string(),
});
export type WaitingItem = z.infer<typeof waitingItem>;

export const bookVisitInput = z.object({
  /** Made in the browser: sent twice, it books once and gets the same answer. */
  idempotencyKey: z.uuid(),
  jobId: id,
  kind: visitKind,
  crewId: id,
  date: localDate,
  time: localTime,
  /** Work on site; over a day it is split into daily pieces. Left out: the estimate. */
  workMinutes: z.number().int().min(10).max(60_000).optional(),
  /** Why a gate that is not passed is overridden; without it such a booking is refused. */
  overrideReason: z.string().trim().max(400).default(''),
});
export type BookVisitInput = z.infer<typeof bookVisitInput>;

export const moveVisitInput = z.object({
  visitId: id,
  /** The version that the mover saw. */
  version: z.number().int(),
  crewId: id,
  date: localDate,
  time: localTime,
  workMinutes: z.number().int().min(10).max(60_000).optional(),
  overrideReason: z.string().trim().max(400).default(''),
});
export type MoveVisitInput = z.infer<typeof moveVisitInput>;

export const callOffVisitInput = z.object({
  visitId: id,
  version: z.number().int(),
  reason: z.string().trim().min(1, 'Say why.').max(400),
});
export type CallOffVisitInput = z.infer<typeof callOffVisitInput>;

/** The customer's yes, as the office heard it. */
export const noteYesInput = z.object({ visitId: id, version: z.number().int() });
export type NoteYesInput = z.infer<typeof noteYesInput>;

/** One tap on site. */
export const reportVisitInput = z
  .object({
    visitId: id,
    what: z.enum(['on-the-way', 'running-late', 'arrived', 'done', 'nobody-home']),
    /** When it was tapped, by the phone's clock. */
    at: z.iso.datetime(),
    /** Running late: how long after the end of the promised window they will be there. */
    lateMinutes: z.number().int().min(5).max(600).optional(),
  })
  .refine(({ what, lateMinutes }) => what !== 'running-late' || lateMinutes !== undefined, {
    path: ['lateMinutes'],
    message: 'Say how many minutes late.',
  });
export type ReportVisitInput = z.infer<typeof reportVisitInput>;

/** Measurer's or crew's list for a local day. */
export const todayInput = z.object({ date: localDate.optional() });
export type TodayInput = z.infer<typeof todayInput>;

export const todayVisit = visitView.extend({
  rooms: z.array(z.object({ id, name: z.string() })),
  notes: z.string(),
  /** From the stop before, or from the crew's base; null where a place is not known. */
  drive: z.object({ minutes: z.number().int(), isEstimated: z.boolean() }).nullable(),
});
export type TodayVisit = z.infer<typeof todayVisit>;

export type TodayView = {
  date: string;
  dayWords: string;
  visits: TodayVisit[];
  /** What the crew has to mend, whichever day it goes there again. */
  snags: CrewSnag[];
};

/** What the customer's page shows; only this visit, nothing else of the shop. */
export const customerVisitView = z.object({
  language: z.enum(['en', 'es']),
  region: z.enum(['US', 'UK', 'AU', 'EU']),
  shopName: z.string(),
  shopPhone: z.string(),
  kind: visitKind,
  status: visitStatus,
  /** "Thursday" / "10 December", in the visit's language and the site's zone. */
  weekdayWords: z.string(),
  dateWords: z.string(),
  windowWords: z.string(),
  /** "until about 3:30, today and Friday" or ''. */
  untilWords: z.string(),
  whoComes: z.array(z.string()),
  street: z.string(),
  town: z.string(),
  customerSays: z.string(),
  /** They said that something is not ready, and not yet that it is. */
  saysNotReady: z.boolean(),
  /** The crew runs late: "about 11:30 AM"; else ''. */
  arrivalWords: z.string(),
  isOldHouse: z.boolean(),
});
export type CustomerVisitView = z.infer<typeof customerVisitView>;

/** What the page of other times shows. */
export type CustomerTimesView = {
  language: 'en' | 'es';
  shopName: string;
  shopPhone: string;
  mayChange: boolean;
  /** Of the visit as it stands. */
  dayWords: string;
  windowWords: string;
  times: { date: string; time: string; dayWords: string; windowWords: string }[];
  /** `untilWords`: "10:45 AM", of the site. */
  hold: {
    heldVisitId: string;
    holdEndsAt: string;
    dayWords: string;
    windowWords: string;
    untilWords: string;
  } | null;
};

const linkToken = z.string().min(10).max(60);
export const customerHoldInput = z.object({
  token: linkToken,
  date: localDate,
  time: localTime,
});
export const customerTakeInput = z.object({ token: linkToken, heldVisitId: id });

/** A box of a plain form: there as "yes", or not there. */
const ticked = z.preprocess((value) => value === 'yes', z.boolean());

export const customerAnswerInput = z
  .object({
    token: z.string().min(10).max(60),
    answer: z.enum(['confirm', 'another-time', 'call-me', 'not-ready', 'ready-now']),
    /** Another time, call me: when would suit. Not ready: what is missing, in their own words. */
    words: z.string().trim().max(400).default(''),
    floor: ticked,
    power: ticked,
    parking: ticked,
    away: ticked,
  })
  .transform(({ floor, power, parking, away, ...answer }) => {
    const boxes = { floor, power, parking, away };
    return { ...answer, missing: missingThings.filter((thing) => boxes[thing]) };
  });
export type CustomerAnswerInput = z.infer<typeof customerAnswerInput>;

export const createCrewInput = z.object({
  name: z.string().trim().min(1, 'Give the crew a name.').max(40),
  does: z.enum(['measure', 'fit']),
  colour: z.enum(['1', '2', '3', '4', '5', '6']),
  personIds: z.array(id).max(12),
});
export type CreateCrewInput = z.infer<typeof createCrewInput>;
