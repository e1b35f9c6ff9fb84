import {
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { MessageCause } from '@/lib/contracts/messages';
import { createdAt, instant, shopColumns } from './columns';
import { customers, jobs } from './jobs';
import { visits } from './visits';

export const messageStates = [
  'waiting',
  'sending',
  'sent',
  'delivered',
  'refused',
  'withdrawn',
  'received',
] as const;

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
    providerId: text('provider_id'),
    sentAt: instant('sent_at'),
    deliveredAt: instant('delivered_at'),
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
    index('messages_due').on(table.state, table.dueAt),
    index('messages_by_job').on(table.shopId, table.jobId),
    index('messages_by_visit').on(table.shopId, table.visitId),
    index('messages_by_provider').on(table.providerId),
  ],
);
