import { foreignKey, index, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { checkAnswers, pauseReasons } from '@/lib/contracts/day-events';
import type { Reading } from '@/lib/contracts/readings';
import { createdAt, instant, shopColumns } from './columns';
import { releases } from './sheets';
import { people } from './shops';
import { visits } from './visits';
import { rooms } from './walls';

/** Work on site stopped and went on again; arriving and leaving are the visit's own. Only added to. */
export const visitPauses = pgTable(
  'visit_pauses',
  {
    ...shopColumns(),
    visitId: uuid('visit_id').notNull(),
    what: text('what', { enum: ['pause', 'go-on'] }).notNull(),
    /** Of a pause; null when work goes on. */
    why: text('why', { enum: pauseReasons }),
    at: instant('at').notNull(),
    byPersonId: uuid('by_person_id').notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    foreignKey({
      name: 'visit_pauses_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'visit_pauses_person',
      columns: [table.shopId, table.byPersonId],
      foreignColumns: [people.shopId, people.id],
    }),
    index('visit_pauses_by_visit').on(table.shopId, table.visitId, table.at),
  ],
);

/** Answers to the checklist of a visit; the newest of an item holds. Only added to. */
export const visitChecks = pgTable(
  'visit_checks',
  {
    ...shopColumns(),
    visitId: uuid('visit_id').notNull(),
    item: text('item').notNull(),
    answer: text('answer', { enum: checkAnswers }).notNull(),
    words: text('words').notNull().default(''),
    at: instant('at').notNull(),
    byPersonId: uuid('by_person_id').notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    foreignKey({
      name: 'visit_checks_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'visit_checks_person',
      columns: [table.shopId, table.byPersonId],
      foreignColumns: [people.shopId, people.id],
    }),
    index('visit_checks_by_visit').on(table.shopId, table.visitId, table.at),
  ],
);

/**
 * Readings taken again before setting, beside the release they were held against. They are no readings of
 * the wall book: a sheet that holds is not unmade by a crew that looked again.
 */
export const siteChecks = pgTable(
  'site_checks',
  {
    ...shopColumns(),
    visitId: uuid('visit_id').notNull(),
    roomId: uuid('room_id').notNull(),
    releaseId: uuid('release_id').notNull(),
    readings: jsonb('readings').$type<Reading[]>().notNull(),
    /** What does not agree with the release, and what it changes, in words; empty when all agrees. */
    disagreements: jsonb('disagreements').$type<string[]>().notNull(),
    changes: jsonb('changes').$type<string[]>().notNull(),
    at: instant('at').notNull(),
    byPersonId: uuid('by_person_id').notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('site_checks_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'site_checks_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'site_checks_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }),
    foreignKey({
      name: 'site_checks_release',
      columns: [table.shopId, table.releaseId],
      foreignColumns: [releases.shopId, releases.id],
    }),
    foreignKey({
      name: 'site_checks_person',
      columns: [table.shopId, table.byPersonId],
      foreignColumns: [people.shopId, people.id],
    }),
    index('site_checks_by_visit').on(table.shopId, table.visitId),
  ],
);
