/** Customers, sites and jobs on the wire. */
import { z } from 'zod';
import { stages } from '@/lib/schedule/stages';

const id = z.uuid();
/** Names and addresses stand in headers, calendars and sheets: no line ends, no control characters. */
const oneLine = (most: number) =>
  z
    .string()
    .trim()
    .max(most)
    .regex(/^\P{Cc}*$/u, 'Write it in one line.');

export const customerInput = z.object({
  name: oneLine(120).min(1, 'Give the customer a name.'),
  /** As typed; kept as E.164. Empty: none. */
  phone: z.string().trim().max(40).default(''),
  email: z.union([z.literal(''), z.email('That is no e-mail address.').max(200)]).default(''),
  language: z.enum(['en', 'es']).default('en'),
  /** The customer agreed to be told by this channel; asked, not assumed. */
  mayText: z.boolean().default(false),
  mayEmail: z.boolean().default(false),
});

export const siteInput = z.object({
  street: oneLine(160).min(1, 'Give the street and number.'),
  town: oneLine(80).default(''),
  postcode: oneLine(20).default(''),
  latitude: z.number().min(-90).max(90).nullable().default(null),
  longitude: z.number().min(-180).max(180).nullable().default(null),
  /** How to get in; no codes here. */
  wayIn: z.string().trim().max(400).default(''),
  floorsUp: z.number().int().min(-2).max(80).default(0),
  hasLift: z.boolean().default(false),
  yearBuilt: z.number().int().min(1500).max(2200).nullable().default(null),
});

/** Customer, site and job in one go: the call that starts it all. */
export const startJobInput = z.object({
  customer: customerInput,
  site: siteInput,
  title: oneLine(120).min(1, 'Say what it is: "Kitchen, L, 11 units".'),
  roomCount: z.number().int().min(1).max(30).default(1),
  unitCount: z.number().int().min(0).max(300).default(0),
  wallsReady: z.enum(['not-yet', 'bare-studs', 'closed']).default('not-yet'),
  siteReadyOn: z.iso.date().nullable().default(null),
  notes: z.string().trim().max(4000).default(''),
});
export type StartJobInput = z.infer<typeof startJobInput>;

/** What the office learns about a job later; only what is given is changed. */
export const changeJobInput = z.object({
  jobId: id,
  title: oneLine(120).min(1).optional(),
  wallsReady: z.enum(['not-yet', 'bare-studs', 'closed']).optional(),
  siteReadyOn: z.iso.date().nullable().optional(),
  floorAgreed: z.boolean().optional(),
  notReady: z.string().trim().max(400).optional(),
  wayIn: z.string().trim().max(400).optional(),
  roomCount: z.number().int().min(1).max(30).optional(),
  unitCount: z.number().int().min(0).max(300).optional(),
  notes: z.string().trim().max(4000).optional(),
  onHold: z.boolean().optional(),
});
export type ChangeJobInput = z.infer<typeof changeJobInput>;

/** The bench: cabinets ready now or on a day. */
export const sayReadyInput = z.object({
  jobId: id,
  readyOn: z.iso.date().nullable(),
  /** Where they stand, once they do. */
  where: z.string().trim().max(120).optional(),
  /** Why they are late or short, until they do. */
  why: z.string().trim().max(400).optional(),
});
export type SayReadyInput = z.infer<typeof sayReadyInput>;

export const jobIdInput = z.object({ jobId: id });

export const listJobsInput = z.object({
  /** Name, street, phone, job number or title; empty: all. */
  search: z.string().trim().max(120).default(''),
  stage: z.enum(stages).optional(),
});
export type ListJobsInput = z.infer<typeof listJobsInput>;

export const jobRow = z.object({
  id,
  number: z.number().int(),
  title: z.string(),
  stage: z.enum(stages),
  customerName: z.string(),
  phone: z.string(),
  street: z.string(),
  town: z.string(),
  /** Its site has a pin, by which drives are reckoned. */
  isOnMap: z.boolean(),
  unitCount: z.number().int(),
  readyOn: z.string().nullable(),
  /** Local date and time of the next visit in words, or null. */
  nextVisit: z.string().nullable(),
  createdAt: z.iso.datetime(),
});
export type JobRow = z.infer<typeof jobRow>;

/** One line of a job's story, newest first. */
export const storyLine = z.object({
  id,
  at: z.iso.datetime(),
  /** In the shop's zone, ready to be read. */
  atWords: z.string(),
  who: z.string(),
  summary: z.string(),
});

export const roomRow = z.object({
  id,
  name: z.string(),
  wallCount: z.number().int(),
  readingCount: z.number().int(),
  runCount: z.number().int(),
  submittedAt: z.iso.datetime().nullable(),
  /** Newest released revision, and whether readings or runs changed since. */
  revision: z.string().nullable(),
  isSuperseded: z.boolean(),
});
export type RoomRow = z.infer<typeof roomRow>;

export const jobView = jobRow.extend({
  customerId: id,
  /** Who it was is gone; sizes and times stayed. */
  isErased: z.boolean(),
  email: z.string(),
  language: z.enum(['en', 'es']),
  mayText: z.boolean(),
  mayEmail: z.boolean(),
  siteId: id,
  postcode: z.string(),
  latitude: z.number().nullable(),
  longitude: z.number().nullable(),
  wayIn: z.string(),
  floorsUp: z.number().int(),
  hasLift: z.boolean(),
  yearBuilt: z.number().int().nullable(),
  wallsReady: z.enum(['not-yet', 'bare-studs', 'closed']),
  siteReadyOn: z.string().nullable(),
  floorAgreed: z.boolean(),
  notReady: z.string(),
  roomCount: z.number().int(),
  notes: z.string(),
  story: z.array(storyLine),
});
export type JobView = z.infer<typeof jobView>;
