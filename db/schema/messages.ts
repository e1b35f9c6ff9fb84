import {
  doublePrecision,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import { type MessageCause, messageStates, schedulerItemKinds } from '@/lib/contracts/messages';
import { createdAt, instant, shopColumns } from './columns';
import { customers, jobs } from './jobs';
import { people } from './shops';
import { visits } from './visits';

/** The outbox: written only in the transaction of its cause, rendered from the visit as it is when sent. */
export const messages = pgTable(
  'messages',
  {
    ...shopColumns(),
    customerId: uuid('customer_id').notNull(),
    jobId: uuid('job_id'),
    visitId: uuid('visit_id'),
    occasion: text('occasion').notNull(),
    channel: text('channel', { enum: ['sms', 'email'] }).notNull(),
    /** visit, version, occasion, channel: a second row of the same cause is refused. */
    key: text('key').notNull(),
    state: text('state', { enum: messageStates }).notNull().default('waiting'),
    dueAt: instant('due_at').notNull(),
    /** Past this it is of no use and is withdrawn. */
    notAfter: instant('not_after'),
    /** What the visit no longer says when the message is sent: the time before a move, why it is called off. */
    cause: jsonb('cause').$type<MessageCause>().notNull().default({}),
    attempts: integer('attempts').notNull().default(0),
    claimedAt: instant('claimed_at'),
    /** Of the first try: since then the provider may have it. */
    firstTriedAt: instant('first_tried_at'),
    /** Told in one message with this one of the same customer, whose fate it shares from then on. */
    toldWith: uuid('told_with'),
    providerId: text('provider_id'),
    sentAt: instant('sent_at'),
    deliveredAt: instant('delivered_at'),
    /** When the provider is asked for a report that has not come; null once there is nothing to ask. */
    askAt: instant('ask_at'),
    /** What a text cost, in messages of the carrier. */
    segments: integer('segments').notNull().default(0),
    /** Who of the shop wrote it by hand. */
    writtenBy: uuid('written_by'),
    /** Why it was withdrawn or refused, in words for the scheduler. */
    reason: text('reason').notNull().default(''),
    /** As sent or as received, for the record. */
    toAddress: text('to_address').notNull().default(''),
    body: text('body').notNull().default(''),
    createdAt: createdAt(),
  },
  (table) => [
    unique('messages_shop_id').on(table.shopId, table.id),
    unique('messages_once').on(table.shopId, table.key),
    foreignKey({
      name: 'messages_customer',
      columns: [table.shopId, table.customerId],
      foreignColumns: [customers.shopId, customers.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'messages_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }),
    foreignKey({
      name: 'messages_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }),
    foreignKey({
      name: 'messages_person',
      columns: [table.shopId, table.writtenBy],
      foreignColumns: [people.shopId, people.id],
    }),
    foreignKey({
      name: 'messages_told_with',
      columns: [table.shopId, table.toldWith],
      foreignColumns: [table.shopId, table.id],
    }),
    index('messages_due').on(table.state, table.dueAt),
    index('messages_to_ask').on(table.askAt),
    index('messages_by_customer').on(table.shopId, table.customerId),
    index('messages_by_address').on(table.toAddress, table.sentAt),
    index('messages_by_job').on(table.shopId, table.jobId),
    index('messages_by_visit').on(table.shopId, table.visitId),
    index('messages_by_provider').on(table.providerId),
    index('messages_by_lead').on(table.toldWith),
  ],
);

/** A shop's own words for one occasion in one language; an empty part is said in ours. */
export const messageWordings = pgTable(
  'message_wordings',
  {
    ...shopColumns(),
    occasion: text('occasion').notNull(),
    language: text('language', { enum: ['en', 'es'] }).notNull(),
    sms: text('sms').notNull().default(''),
    subject: text('subject').notNull().default(''),
    email: text('email').notNull().default(''),
    changedAt: instant('changed_at').notNull().defaultNow(),
  },
  (table) => [unique('message_wordings_one').on(table.shopId, table.occasion, table.language)],
);

/** One row a shop; none is all occasions on and no price known. */
export const messageSettings = pgTable(
  'message_settings',
  {
    ...shopColumns(),
    /** Occasions on which this shop tells nothing. */
    silentOn: jsonb('silent_on').$type<string[]>().notNull().default([]),
    /** What the provider asks for one message of a text; null: not known. */
    segmentPrice: doublePrecision('segment_price'),
    /** ISO 4217 */
    currency: text('currency').notNull().default('USD'),
  },
  (table) => [unique('message_settings_one').on(table.shopId)],
);

/** The scheduler's list: what a person of the office has to look at, until it is ticked off. */
export const schedulerItems = pgTable(
  'scheduler_items',
  {
    ...shopColumns(),
    customerId: uuid('customer_id').notNull(),
    jobId: uuid('job_id'),
    visitId: uuid('visit_id'),
    kind: text('kind', { enum: schedulerItemKinds }).notNull(),
    /** One cause is one item. */
    key: text('key').notNull(),
    words: text('words').notNull(),
    at: instant('at').notNull(),
    doneAt: instant('done_at'),
    /** Who ticked it off, or what settled it. */
    doneBy: text('done_by').notNull().default(''),
  },
  (table) => [
    unique('scheduler_items_once').on(table.shopId, table.key),
    foreignKey({
      name: 'scheduler_items_customer',
      columns: [table.shopId, table.customerId],
      foreignColumns: [customers.shopId, customers.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'scheduler_items_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }),
    foreignKey({
      name: 'scheduler_items_visit',
      columns: [table.shopId, table.visitId],
      foreignColumns: [visits.shopId, visits.id],
    }),
    index('scheduler_items_open').on(table.shopId, table.doneAt, table.at),
  ],
);
