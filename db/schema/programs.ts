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
import type { ProgramEvent } from '@/lib/contracts/programs';
import type { Permission } from '@/lib/permissions';
import { createdAt, instant, shopColumns } from './columns';
import { people } from './shops';

/** A key by which another program asks in the name of the person who made it; only its hash is kept. */
export const apiTokens = pgTable(
  'api_tokens',
  {
    ...shopColumns(),
    name: text('name').notNull(),
    tokenHash: text('token_hash').notNull(),
    /** What it may, within what its maker may. */
    scopes: jsonb('scopes').$type<Permission[]>().notNull(),
    madeBy: uuid('made_by').notNull(),
    createdAt: createdAt(),
    lastUsedAt: instant('last_used_at'),
    revokedAt: instant('revoked_at'),
  },
  (table) => [
    unique('api_tokens_token').on(table.tokenHash),
    foreignKey({
      name: 'api_tokens_made_by',
      columns: [table.shopId, table.madeBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('api_tokens_by_shop').on(table.shopId),
  ],
);

/** Where a shop wants to be told, and of what. Its secret is made from its id and our signing secret. */
export const webhooks = pgTable(
  'webhooks',
  {
    ...shopColumns(),
    url: text('url').notNull(),
    events: jsonb('events').$type<ProgramEvent[]>().notNull(),
    madeBy: uuid('made_by').notNull(),
    createdAt: createdAt(),
    stoppedAt: instant('stopped_at'),
  },
  (table) => [
    unique('webhooks_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'webhooks_made_by',
      columns: [table.shopId, table.madeBy],
      foreignColumns: [people.shopId, people.id],
    }),
  ],
);

/** What is to be told, written by triggers in the transaction of its cause (see drizzle/, `tell_programs`). */
export const webhookDeliveries = pgTable(
  'webhook_deliveries',
  {
    ...shopColumns(),
    webhookId: uuid('webhook_id').notNull(),
    event: text('event').$type<ProgramEvent>().notNull(),
    /** Ids and times; who it is about is asked for by the interface. */
    subject: jsonb('subject').$type<Record<string, string | number>>().notNull(),
    state: text('state', { enum: ['waiting', 'taken', 'given-up'] })
      .notNull()
      .default('waiting'),
    attempts: integer('attempts').notNull().default(0),
    dueAt: instant('due_at').notNull().defaultNow(),
    /** What their server said last, or why it could not be reached. */
    lastAnswer: text('last_answer').notNull().default(''),
    takenAt: instant('taken_at'),
    createdAt: createdAt(),
  },
  (table) => [
    foreignKey({
      name: 'webhook_deliveries_webhook',
      columns: [table.shopId, table.webhookId],
      foreignColumns: [webhooks.shopId, webhooks.id],
    }).onDelete('cascade'),
    index('webhook_deliveries_due').on(table.state, table.dueAt),
    index('webhook_deliveries_by_webhook').on(table.shopId, table.webhookId, table.createdAt),
  ],
);
