import { z } from 'zod';
import { benchSheet } from '@/lib/contracts/bench';
import {
  importedList,
  importListInput,
  listPreview,
  previewListInput,
} from '@/lib/contracts/job-lists';
import {
  changeJobInput,
  jobIdInput,
  jobRow,
  jobView,
  listJobsInput,
  roomRow,
  sayReadyInput,
  startJobInput,
} from '@/lib/contracts/jobs';
import { listMessagesInput, messageView } from '@/lib/contracts/messages';
import { numbersInput, numbersView } from '@/lib/contracts/numbers';
import { findOpeningsInput, openingsView } from '@/lib/contracts/openings';
import type { keyScopes } from '@/lib/contracts/programs';
import {
  bookedVisit,
  bookVisitInput,
  callOffVisitInput,
  listVisitsInput,
  moveVisitInput,
  visitIdInput,
  visitView,
  waitingItem,
} from '@/lib/contracts/visits';

export type Operation = {
  id: string;
  method: 'get' | 'post' | 'patch';
  path: string;
  scope: (typeof keyScopes)[number];
  summary: string;
  /** Everything that is asked, wherever it stands: in the address, the query or the body. */
  input: z.ZodObject | z.ZodType;
  inPath: string[];
  answer: z.ZodType;
  /** A list as CSV: sent as the body, with the input in the query, or given as the answer. */
  csv?: 'sent' | 'given';
  /** One that works on a shop with these rows. */
  example: Record<string, unknown>;
};

/** Stand for a shop's own rows in the examples. */
export const exampleIds = {
  jobId: '0b6f1a52-6f0e-4b53-9d3a-5d1f3a7c2e10',
  visitId: '5f8de0c4-93a7-4f1e-8a6b-2c94d1b7e620',
  crewId: 'c1d3a8f7-2b4e-4c69-b0d5-7e8f9a1b2c30',
  key: '7a9c2e4d-1f3b-4d5e-9c8b-0a1b2c3d4e50',
} as const;

/** A list as it may be sent, for the examples. */
export const exampleList =
  'Customer,Street,Phone,Job\r\nAda Quill,4 Kiln Yard,212-555-0188,Pantry\r\n';

/** What other programs may ask, and how; the document is made from this and from the contracts alone. */
export const operations: Operation[] = [
  {
    id: 'listJobs',
    method: 'get',
    path: '/api/jobs',
    scope: 'jobs:read',
    summary: 'Jobs, newest first, by any part of name, street, title or phone, or by number.',
    input: listJobsInput,
    inPath: [],
    answer: z.array(jobRow),
    example: { search: 'alder' },
  },
  {
    id: 'startJob',
    method: 'post',
    path: '/api/jobs',
    scope: 'jobs:change',
    summary: 'Customer, site and job in one go. Not repeatable: sent twice, it makes two.',
    input: startJobInput,
    inPath: [],
    answer: z.object({ id: z.uuid(), number: z.number().int() }),
    example: {
      customer: { name: 'Robin Alder', phone: '212-555-0163', mayText: true, mayEmail: false },
      site: { street: '4 Quarry Lane', town: 'Stonebeck' },
      title: 'Kitchen, L, 11 units',
      unitCount: 11,
    },
  },
  {
    id: 'getJob',
    method: 'get',
    path: '/api/jobs/{jobId}',
    scope: 'jobs:read',
    summary: 'One job with its customer, its site and its story.',
    input: jobIdInput,
    inPath: ['jobId'],
    answer: jobView,
    example: { jobId: exampleIds.jobId },
  },
  {
    id: 'changeJob',
    method: 'patch',
    path: '/api/jobs/{jobId}',
    scope: 'jobs:change',
    summary: 'What the office learns later; only what is given is changed.',
    input: changeJobInput,
    inPath: ['jobId'],
    answer: z.unknown(),
    example: { jobId: exampleIds.jobId, floorAgreed: true, wallsReady: 'closed' },
  },
  {
    id: 'sayReady',
    method: 'post',
    path: '/api/jobs/{jobId}/ready',
    scope: 'sheets:say-ready',
    summary: 'The cabinets are ready, or on which day they will be; null takes it back.',
    input: sayReadyInput,
    inPath: ['jobId'],
    answer: z.unknown(),
    example: { jobId: exampleIds.jobId, readyOn: '2027-01-11' },
  },
  {
    id: 'listWaiting',
    method: 'get',
    path: '/api/waiting',
    scope: 'visits:book',
    summary: 'Jobs that need a visit booked: which, from when, or why not yet.',
    input: z.object({}),
    inPath: [],
    answer: z.array(waitingItem),
    example: {},
  },
  {
    id: 'findOpenings',
    method: 'post',
    path: '/api/openings',
    scope: 'visits:book',
    summary: 'Times that work for a visit, best first, each with why.',
    input: findOpeningsInput,
    inPath: [],
    answer: openingsView,
    example: { jobId: exampleIds.jobId, kind: 'site-measure', limit: 3 },
  },
  {
    id: 'listVisits',
    method: 'get',
    path: '/api/visits',
    scope: 'visits:read',
    summary: 'Visits from a local day up to, and without, another.',
    input: listVisitsInput,
    inPath: [],
    answer: z.array(visitView),
    example: { from: '2026-12-01', to: '2027-01-01' },
  },
  {
    id: 'getVisit',
    method: 'get',
    path: '/api/visits/{visitId}',
    scope: 'visits:read',
    summary: 'One visit as it stands.',
    input: visitIdInput,
    inPath: ['visitId'],
    answer: visitView,
    example: { visitId: exampleIds.visitId },
  },
  {
    id: 'moveVisit',
    method: 'patch',
    path: '/api/visits/{visitId}',
    scope: 'visits:book',
    summary:
      'Another time or crew; refused when the visit changed since the version that was seen.',
    input: moveVisitInput,
    inPath: ['visitId'],
    answer: bookedVisit,
    example: {
      visitId: exampleIds.visitId,
      version: 1,
      crewId: exampleIds.crewId,
      date: '2027-01-12',
      time: '09:00',
    },
  },
  {
    id: 'callOffVisit',
    method: 'post',
    path: '/api/visits/{visitId}/call-off',
    scope: 'visits:book',
    summary: 'Calls a visit off and tells the customer why.',
    input: callOffVisitInput,
    inPath: ['visitId'],
    answer: z.unknown(),
    example: { visitId: exampleIds.visitId, version: 2, reason: 'The joiner is ill' },
  },
  {
    id: 'bookVisit',
    method: 'post',
    path: '/api/visits',
    scope: 'visits:book',
    summary: 'Books a visit. With the same idempotencyKey it books once and answers the same.',
    input: bookVisitInput,
    inPath: [],
    answer: bookedVisit,
    example: {
      idempotencyKey: exampleIds.key,
      jobId: exampleIds.jobId,
      kind: 'site-measure',
      crewId: exampleIds.crewId,
      date: '2027-01-14',
      time: '13:00',
    },
  },
  {
    id: 'exportJobs',
    method: 'get',
    path: '/api/exports/jobs',
    scope: 'jobs:change',
    summary:
      'Every job with its customer and site, as CSV; what goes out in these columns comes in by them.',
    input: z.object({}),
    inPath: [],
    answer: z.string(),
    csv: 'given',
    example: {},
  },
  {
    id: 'previewList',
    method: 'post',
    path: '/api/imports/preview',
    scope: 'jobs:change',
    summary: 'What would become of each row of a list of customers and jobs; nothing is written.',
    input: previewListInput,
    inPath: [],
    answer: listPreview,
    csv: 'sent',
    example: {},
  },
  {
    id: 'importList',
    method: 'post',
    path: '/api/imports',
    scope: 'jobs:change',
    summary:
      'Brings a list in, all of it or nothing, once under its idempotencyKey. `columns` names what each column is, in order, as the preview gives it.',
    input: importListInput,
    inPath: [],
    answer: importedList,
    csv: 'sent',
    example: { idempotencyKey: exampleIds.key, columns: 'customer,street,phone,title' },
  },
  {
    id: 'listRooms',
    method: 'get',
    path: '/api/rooms',
    scope: 'walls:read',
    summary: 'The rooms of a job: how far each is read, and the revision that the bench has.',
    input: jobIdInput,
    inPath: [],
    answer: z.array(roomRow),
    example: { jobId: exampleIds.jobId },
  },
  {
    id: 'listBench',
    method: 'get',
    path: '/api/bench',
    scope: 'sheets:read',
    summary: 'The newest released sheet of each room that is to be built, first need first.',
    input: z.object({}),
    inPath: [],
    answer: z.array(benchSheet),
    example: {},
  },
  {
    id: 'listMessages',
    method: 'get',
    path: '/api/messages',
    scope: 'messages:read',
    summary:
      'What customers were told and what they said, newest first; of one job where it is named.',
    input: listMessagesInput,
    inPath: [],
    answer: z.array(messageView),
    example: { jobId: exampleIds.jobId },
  },
  {
    id: 'getNumbers',
    method: 'get',
    path: '/api/numbers',
    scope: 'numbers:read',
    summary: 'The owner’s figures of the last so many days, each with the jobs behind it.',
    input: numbersInput,
    inPath: [],
    answer: numbersView,
    example: { days: '90' },
  },
];
