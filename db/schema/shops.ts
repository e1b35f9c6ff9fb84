import { sql } from 'drizzle-orm';
import {
  check,
  date,
  doublePrecision,
  foreignKey,
  index,
  jsonb,
  pgTable,
  primaryKey,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { SavedTableView } from '@/lib/contracts/saved-views';
import type { Tool } from '@/lib/contracts/wall-book';
import { roles } from '@/lib/permissions';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import type { CrewPattern } from '@/lib/schedule/working-pattern';
import { user } from './auth';
import { createdAt, instant, shopColumns } from './columns';

/** A person at work in the shop; signs in when `user_id` is set. */
export const people = pgTable(
  'people',
  {
    ...shopColumns(),
    userId: text('user_id').references(() => user.id, { onDelete: 'set null' }),
    name: text('name').notNull(),
    phone: text('phone').notNull().default(''),
    role: text('role', { enum: roles }).notNull(),
    /** Left the shop: may no longer sign in here; the name stays in the story. */
    leftAt: instant('left_at'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('people_shop_id').on(table.shopId, table.id),
    unique('people_one_per_user').on(table.shopId, table.userId),
  ],
);

/** An invitation by e-mail; only the token's hash is kept. */
export const invitations = pgTable(
  'invitations',
  {
    ...shopColumns(),
    email: text('email').notNull(),
    role: text('role', { enum: roles }).notNull(),
    tokenHash: text('token_hash').notNull(),
    endsAt: instant('ends_at').notNull(),
    invitedBy: uuid('invited_by').notNull(),
    acceptedAt: instant('accepted_at'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('invitations_token').on(table.tokenHash),
    foreignKey({
      name: 'invitations_person',
      columns: [table.shopId, table.invitedBy],
      foreignColumns: [people.shopId, people.id],
    }),
  ],
);

/** Who goes out together: a fitting crew, or one measurer. */
export const crews = pgTable(
  'crews',
  {
    ...shopColumns(),
    name: text('name').notNull(),
    does: text('does', { enum: ['measure', 'fit'] }).notNull(),
    /** One of the crew colours of the look, by number. */
    colour: text('colour', { enum: ['1', '2', '3', '4', '5', '6'] }).notNull(),
    /** Kinds of visit that it goes out for; empty: all that its `does` includes. */
    kinds: jsonb('kinds').$type<VisitKind[]>().notNull().default([]),
    /** Its own days and hours; null: the shop's. */
    pattern: jsonb('pattern').$type<CrewPattern>(),
    /** Where its day begins and ends. */
    baseAddress: text('base_address').notNull().default(''),
    baseLatitude: doublePrecision('base_latitude'),
    baseLongitude: doublePrecision('base_longitude'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('crews_shop_id').on(table.shopId, table.id),
    unique('crews_name').on(table.shopId, table.name),
  ],
);

export const crewPeople = pgTable(
  'crew_people',
  {
    shopId: text('shop_id').notNull(),
    crewId: uuid('crew_id').notNull(),
    personId: uuid('person_id').notNull(),
    /** ISO weekdays on which they go with this crew; null: every day. */
    weekdays: jsonb('weekdays').$type<number[]>(),
  },
  (table) => [
    primaryKey({ columns: [table.crewId, table.personId] }),
    foreignKey({
      name: 'crew_people_crew',
      columns: [table.shopId, table.crewId],
      foreignColumns: [crews.shopId, crews.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'crew_people_person',
      columns: [table.shopId, table.personId],
      foreignColumns: [people.shopId, people.id],
    }).onDelete('cascade'),
  ],
);

/** Days on which a person does not work: first and last, both off. */
export const daysOff = pgTable(
  'days_off',
  {
    ...shopColumns(),
    personId: uuid('person_id').notNull(),
    firstDay: date('first_day', { mode: 'string' }).notNull(),
    lastDay: date('last_day', { mode: 'string' }).notNull(),
    /** In the office's words; nobody outside it reads them. */
    reason: text('reason').notNull().default(''),
    createdAt: createdAt(),
  },
  (table) => [
    check('days_off_in_order', sql`${table.lastDay} >= ${table.firstDay}`),
    foreignKey({
      name: 'days_off_person',
      columns: [table.shopId, table.personId],
      foreignColumns: [people.shopId, people.id],
    }).onDelete('cascade'),
    index('days_off_by_person').on(table.shopId, table.personId, table.lastDay),
  ],
);

/** A calendar that others' programs fetch by its address: of a crew or of a person. Only the token's hash is kept. */
export const calendarFeeds = pgTable(
  'calendar_feeds',
  {
    ...shopColumns(),
    crewId: uuid('crew_id'),
    personId: uuid('person_id'),
    tokenHash: text('token_hash').notNull(),
    madeBy: uuid('made_by').notNull(),
    createdAt: createdAt(),
    revokedAt: instant('revoked_at'),
    lastReadAt: instant('last_read_at'),
  },
  (table) => [
    unique('calendar_feeds_token').on(table.tokenHash),
    check('calendar_feeds_of_one', sql`num_nonnulls(${table.crewId}, ${table.personId}) = 1`),
    foreignKey({
      name: 'calendar_feeds_crew',
      columns: [table.shopId, table.crewId],
      foreignColumns: [crews.shopId, crews.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'calendar_feeds_person',
      columns: [table.shopId, table.personId],
      foreignColumns: [people.shopId, people.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'calendar_feeds_made_by',
      columns: [table.shopId, table.madeBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('calendar_feeds_by_shop').on(table.shopId),
  ],
);

/** How a person likes to look at a table, by a name of theirs. */
export const savedViews = pgTable(
  'saved_views',
  {
    ...shopColumns(),
    personId: uuid('person_id').notNull(),
    tableName: text('table_name').notNull(),
    name: text('name').notNull(),
    view: jsonb('view').$type<SavedTableView>().notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('saved_views_name').on(table.shopId, table.personId, table.tableName, table.name),
    foreignKey({
      name: 'saved_views_person',
      columns: [table.shopId, table.personId],
      foreignColumns: [people.shopId, people.id],
    }).onDelete('cascade'),
  ],
);

/** Measuring tools and their accuracy. */
export const tools = pgTable(
  'tools',
  {
    ...shopColumns(),
    name: text('name').notNull(),
    spec: jsonb('spec').$type<Tool['spec']>().notNull(),
    createdAt: createdAt(),
  },
  (table) => [unique('tools_shop_id').on(table.shopId, table.id)],
);
