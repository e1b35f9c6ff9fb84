import { sql } from 'drizzle-orm';
import {
  boolean,
  check,
  date,
  foreignKey,
  index,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { PenStrokes, SignedSnag } from '@/lib/contracts/sign-offs';
import { snagKinds, snagMenders } from '@/lib/contracts/snags';
import { createdAt, instant, shopColumns } from './columns';
import { jobs } from './jobs';
import { people } from './shops';
import { visits } from './visits';
import { rooms } from './walls';

/** What is not right yet. Photos are named by their ids: one may reach us after the snag that it shows. */
export const snags = pgTable(
  'snags',
  {
    ...shopColumns(),
    jobId: uuid('job_id').notNull(),
    /** Where it was found; null from the office. */
    visitId: uuid('visit_id'),
    roomId: uuid('room_id'),
    /** No foreign key: runs are laid out anew, and the snag stays. */
    unitId: uuid('unit_id'),
    place: text('place').notNull().default(''),
    kind: text('kind', { enum: snagKinds }).notNull(),
    words: text('words').notNull(),
    mender: text('mender', { enum: snagMenders }).notNull(),
    dueOn: date('due_on', { mode: 'string' }),
    photoIds: uuid('photo_ids').array().notNull().default(sql`'{}'::uuid[]`),
    foundAt: instant('found_at').notNull(),
    foundBy: uuid('found_by').notNull(),
    /** Later than the customer's signature: it stands apart from what was signed. */
    isAfterSignOff: boolean('is_after_sign_off').notNull().default(false),
    /** What the bench does about it. */
    benchSays: text('bench_says').notNull().default(''),
    benchReadyOn: date('bench_ready_on', { mode: 'string' }),
    benchSaidAt: instant('bench_said_at'),
    closedAt: instant('closed_at'),
    closedBy: uuid('closed_by'),
    closedWords: text('closed_words').notNull().default(''),
    closedPhotoIds: uuid('closed_photo_ids').array().notNull().default(sql`'{}'::uuid[]`),
    createdAt: createdAt(),
  },
  (table) => [
    unique('snags_shop_id').on(table.shopId, table.id),
    check(
      'snags_closed_shows_how',
      sql`${table.closedAt} is null or ${table.closedWords} <> '' or cardinality(${table.closedPhotoIds}) > 0`,
    ),
    check('snags_closed_by', sql`(${table.closedAt} is null) = (${table.closedBy} is null)`),
    foreignKey({
      name: 'snags_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'snags_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }),
    foreignKey({
      name: 'snags_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }),
    foreignKey({
      name: 'snags_found_by',
      columns: [table.shopId, table.foundBy],
      foreignColumns: [people.shopId, people.id],
    }),
    foreignKey({
      name: 'snags_closed_by_person',
      columns: [table.shopId, table.closedBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('snags_by_job').on(table.shopId, table.jobId),
    index('snags_open').on(table.shopId, table.closedAt, table.dueOn),
  ],
);

/** What the customer signed, as it stood then. The database refuses to change one (see drizzle/). */
export const signOffs = pgTable(
  'sign_offs',
  {
    ...shopColumns(),
    jobId: uuid('job_id').notNull(),
    visitId: uuid('visit_id').notNull(),
    name: text('name').notNull(),
    language: text('language', { enum: ['en', 'es'] }).notNull(),
    statement: text('statement').notNull(),
    strokes: jsonb('strokes').$type<PenStrokes>().notNull(),
    snags: jsonb('snags').$type<SignedSnag[]>().notNull(),
    signedAt: instant('signed_at').notNull(),
    takenBy: uuid('taken_by').notNull(),
    receivedAt: instant('received_at').notNull(),
    /** Over all of the above, with a key that the database does not hold. */
    seal: text('seal').notNull(),
  },
  (table) => [
    unique('sign_offs_shop_id').on(table.shopId, table.id),
    unique('sign_offs_one_per_visit').on(table.shopId, table.visitId),
    foreignKey({
      name: 'sign_offs_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }),
    foreignKey({
      name: 'sign_offs_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }),
    foreignKey({
      name: 'sign_offs_taken_by',
      columns: [table.shopId, table.takenBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('sign_offs_by_job').on(table.shopId, table.jobId),
  ],
);
