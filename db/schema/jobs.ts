import { sql } from 'drizzle-orm';
import {
  bigint,
  boolean,
  date,
  doublePrecision,
  foreignKey,
  index,
  integer,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { stages } from '@/lib/schedule/stages';
import { createdAt, instant, shopColumns } from './columns';
import { people } from './shops';

export const customers = pgTable(
  'customers',
  {
    ...shopColumns(),
    name: text('name').notNull(),
    /** E.164, or empty. */
    phone: text('phone').notNull().default(''),
    email: text('email').notNull().default(''),
    language: text('language', { enum: ['en', 'es'] })
      .notNull()
      .default('en'),
    /** The number that the provider said takes no texts; another number may be tried again. */
    untextablePhone: text('untextable_phone').notNull().default(''),
    /** The row stays for the numbers; who it was is gone. */
    erasedAt: instant('erased_at'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('customers_shop_id').on(table.shopId, table.id),
    index('customers_phone').on(table.shopId, table.phone),
  ],
);

/** Consent per channel with when, how and by whom; the newest row holds. Never changed, only added to. */
export const consents = pgTable(
  'consents',
  {
    ...shopColumns(),
    customerId: uuid('customer_id').notNull(),
    channel: text('channel', { enum: ['sms', 'email'] }).notNull(),
    given: boolean('given').notNull(),
    /** "asked on the phone", "texted STOP", "provider says opted out" … */
    how: text('how').notNull(),
    /** Their words, or where it is written down. */
    proof: text('proof').notNull().default(''),
    byPersonId: uuid('by_person_id'),
    at: instant('at').notNull().defaultNow(),
    /** Two rows of one instant are told apart by this. */
    sequence: bigint('sequence', { mode: 'number' }).generatedAlwaysAsIdentity(),
  },
  (table) => [
    foreignKey({
      name: 'consents_customer',
      columns: [table.shopId, table.customerId],
      foreignColumns: [customers.shopId, customers.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'consents_person',
      columns: [table.shopId, table.byPersonId],
      foreignColumns: [people.shopId, people.id],
    }),
    index('consents_newest').on(table.customerId, table.channel, table.sequence),
  ],
);

/** A refusal that outlives its customer: the address is kept only as a keyed hash, to be known again. */
export const keptRefusals = pgTable(
  'kept_refusals',
  {
    ...shopColumns(),
    channel: text('channel', { enum: ['sms', 'email'] }).notNull(),
    addressHash: text('address_hash').notNull(),
    at: instant('at').notNull(),
  },
  (table) => [unique('kept_refusals_once').on(table.shopId, table.channel, table.addressHash)],
);

export const sites = pgTable(
  'sites',
  {
    ...shopColumns(),
    customerId: uuid('customer_id').notNull(),
    street: text('street').notNull(),
    town: text('town').notNull().default(''),
    postcode: text('postcode').notNull().default(''),
    latitude: doublePrecision('latitude'),
    longitude: doublePrecision('longitude'),
    /** When the address service is next asked for the pin; null: nobody waits for it. */
    placeDueAt: instant('place_due_at'),
    /** IANA zone of the site; messages keep to its hours. */
    zone: text('zone').notNull(),
    wayIn: text('way_in').notNull().default(''),
    parking: text('parking').notNull().default(''),
    /** AES-256-GCM under a key that the database does not hold; null where there is none. */
    accessCodeSealed: text('access_code_sealed'),
    accessCodeSetAt: instant('access_code_set_at'),
    floorsUp: integer('floors_up').notNull().default(0),
    hasLift: boolean('has_lift').notNull().default(false),
    yearBuilt: integer('year_built'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('sites_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'sites_customer',
      columns: [table.shopId, table.customerId],
      foreignColumns: [customers.shopId, customers.id],
    }).onDelete('cascade'),
    index('sites_by_customer').on(table.shopId, table.customerId),
    index('sites_place_due').on(table.placeDueAt).where(sql`${table.placeDueAt} is not null`),
  ],
);

export const jobs = pgTable(
  'jobs',
  {
    ...shopColumns(),
    number: integer('number').notNull(),
    title: text('title').notNull(),
    customerId: uuid('customer_id').notNull(),
    siteId: uuid('site_id').notNull(),
    stage: text('stage', { enum: stages }).notNull().default('enquiry'),
    /** Gates of the order of work. */
    wallsReady: text('walls_ready', { enum: ['not-yet', 'bare-studs', 'closed'] })
      .notNull()
      .default('not-yet'),
    siteReadyOn: date('site_ready_on', { mode: 'string' }),
    floorAgreed: boolean('floor_agreed').notNull().default(false),
    /** The bench says the cabinets are ready, or when they will be. */
    readyOn: date('ready_on', { mode: 'string' }),
    readySaidAt: instant('ready_said_at'),
    /** Where they stand, once they do; why they are late or short, until they do. */
    readyWhere: text('ready_where').notNull().default(''),
    readyWhy: text('ready_why').notNull().default(''),
    /** What the cabinets are made and finished in, for the crew's filler stock. */
    finish: text('finish').notNull().default(''),
    /** What the customer says is not ready; empty when nothing is. */
    notReady: text('not_ready').notNull().default(''),
    roomCount: integer('room_count').notNull().default(1),
    unitCount: integer('unit_count').notNull().default(0),
    notes: text('notes').notNull().default(''),
    createdAt: createdAt(),
  },
  (table) => [
    unique('jobs_shop_id').on(table.shopId, table.id),
    unique('jobs_number').on(table.shopId, table.number),
    foreignKey({
      name: 'jobs_customer',
      columns: [table.shopId, table.customerId],
      foreignColumns: [customers.shopId, customers.id],
    }),
    foreignKey({
      name: 'jobs_site',
      columns: [table.shopId, table.siteId],
      foreignColumns: [sites.shopId, sites.id],
    }),
    index('jobs_by_stage').on(table.shopId, table.stage),
  ],
);
