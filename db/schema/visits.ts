import { sql } from 'drizzle-orm';
import {
  check,
  foreignKey,
  index,
  integer,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { visitStatuses } from '@/lib/contracts/visits';
import { visitKinds } from '@/lib/schedule/visit-kind';
import { createdAt, instant, instantRange, shopColumns } from './columns';
import { jobs } from './jobs';
import { crews, people } from './shops';

export const visits = pgTable(
  'visits',
  {
    ...shopColumns(),
    jobId: uuid('job_id').notNull(),
    kind: text('kind', { enum: visitKinds }).notNull(),
    crewId: uuid('crew_id').notNull(),
    status: text('status', { enum: visitStatuses }).notNull().default('booked'),
    /** First piece's start and last piece's end; the pieces are what is busy. */
    startsAt: instant('starts_at').notNull(),
    endsAt: instant('ends_at').notNull(),
    /** Promised arrival. */
    windowStartsAt: instant('window_starts_at').notNull(),
    windowEndsAt: instant('window_ends_at').notNull(),
    workMinutes: integer('work_minutes').notNull(),
    /** What the customer asked for, or what they say is not ready. */
    customerSays: text('customer_says').notNull().default(''),
    holdEndsAt: instant('hold_ends_at'),
    /** The booked visit that may move to this held time. */
    heldForVisitId: uuid('held_for_visit_id'),
    confirmedAt: instant('confirmed_at'),
    /** When the crew running late now expects to be there. */
    expectedAt: instant('expected_at'),
    arrivedAt: instant('arrived_at'),
    leftAt: instant('left_at'),
    /** Rises with every change; a stale one is refused. */
    version: integer('version').notNull().default(1),
    /** Set by the database with each change (see drizzle/, `visits_changed_at`). */
    changedAt: instant('changed_at').notNull().defaultNow(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('visits_shop_id').on(table.shopId, table.id),
    check('visits_ends_after_start', sql`${table.endsAt} > ${table.startsAt}`),
    check('visits_window', sql`${table.windowEndsAt} >= ${table.windowStartsAt}`),
    foreignKey({
      name: 'visits_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }),
    foreignKey({
      name: 'visits_crew',
      columns: [table.shopId, table.crewId],
      foreignColumns: [crews.shopId, crews.id],
    }),
    foreignKey({
      name: 'visits_held_for',
      columns: [table.shopId, table.heldForVisitId],
      foreignColumns: [table.shopId, table.id],
    }).onDelete('cascade'),
    check('visits_hold_ends', sql`(${table.status} = 'held') = (${table.holdEndsAt} is not null)`),
    index('visits_by_time').on(table.shopId, table.startsAt),
    index('visits_held').on(table.holdEndsAt).where(sql`${table.status} = 'held'`),
    index('visits_by_job').on(table.shopId, table.jobId),
  ],
);

/** One crew's busy time on one day. `visit_pieces_one_crew_one_place` refuses overlaps (see drizzle/). */
export const visitPieces = pgTable(
  'visit_pieces',
  {
    ...shopColumns(),
    visitId: uuid('visit_id').notNull(),
    crewId: uuid('crew_id').notNull(),
    startsAt: instant('starts_at').notNull(),
    endsAt: instant('ends_at').notNull(),
    during: instantRange('during').generatedAlwaysAs(sql`tstzrange(starts_at, ends_at, '[)')`),
  },
  (table) => [
    unique('visit_pieces_shop_id').on(table.shopId, table.id),
    check('visit_pieces_ends_after_start', sql`${table.endsAt} > ${table.startsAt}`),
    foreignKey({
      name: 'visit_pieces_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'visit_pieces_crew',
      columns: [table.shopId, table.crewId],
      foreignColumns: [crews.shopId, crews.id],
    }),
    index('visit_pieces_by_time').on(table.shopId, table.startsAt),
    index('visit_pieces_by_visit').on(table.shopId, table.visitId),
  ],
);

/** The same for each person of the crew. `visit_piece_people_one_place` refuses overlaps (see drizzle/). */
export const visitPiecePeople = pgTable(
  'visit_piece_people',
  {
    ...shopColumns(),
    pieceId: uuid('piece_id').notNull(),
    personId: uuid('person_id').notNull(),
    startsAt: instant('starts_at').notNull(),
    endsAt: instant('ends_at').notNull(),
    during: instantRange('during').generatedAlwaysAs(sql`tstzrange(starts_at, ends_at, '[)')`),
  },
  (table) => [
    foreignKey({
      name: 'visit_piece_people_piece',
      columns: [table.shopId, table.pieceId],
      foreignColumns: [visitPieces.shopId, visitPieces.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'visit_piece_people_person',
      columns: [table.shopId, table.personId],
      foreignColumns: [people.shopId, people.id],
    }),
    index('visit_piece_people_by_piece').on(table.shopId, table.pieceId),
  ],
);

/** A gate of the order of work that a scheduler overrode, with why. */
export const gateOverrides = pgTable(
  'gate_overrides',
  {
    ...shopColumns(),
    visitId: uuid('visit_id').notNull(),
    gate: text('gate').notNull(),
    reason: text('reason').notNull(),
    byPersonId: uuid('by_person_id').notNull(),
    at: instant('at').notNull().defaultNow(),
  },
  (table) => [
    check('gate_overrides_reason', sql`length(trim(${table.reason})) > 0`),
    foreignKey({
      name: 'gate_overrides_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'gate_overrides_person',
      columns: [table.shopId, table.byPersonId],
      foreignColumns: [people.shopId, people.id],
    }),
  ],
);

/** The customer's link to one visit: only the token's hash is kept. */
export const visitLinks = pgTable(
  'visit_links',
  {
    ...shopColumns(),
    visitId: uuid('visit_id').notNull(),
    tokenHash: text('token_hash').notNull(),
    endsAt: instant('ends_at').notNull(),
    revokedAt: instant('revoked_at'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('visit_links_token').on(table.tokenHash),
    foreignKey({
      name: 'visit_links_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }).onDelete('cascade'),
    index('visit_links_by_visit').on(table.shopId, table.visitId),
  ],
);
