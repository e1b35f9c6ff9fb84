import { bigint, index, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, instant, shopColumns } from './columns';

/** Who changed what. The actor is a person, a customer's link or the system, in words that outlive them. */
export const audit = pgTable(
  'audit',
  {
    ...shopColumns(),
    at: instant('at').notNull().defaultNow(),
    actorKind: text('actor_kind', { enum: ['person', 'customer', 'system'] }).notNull(),
    actorName: text('actor_name').notNull(),
    verb: text('verb').notNull(),
    subjectKind: text('subject_kind').notNull(),
    subjectId: uuid('subject_id').notNull(),
    /** The job whose story it belongs to. */
    jobId: uuid('job_id'),
    /** One sentence for the job's story. */
    summary: text('summary').notNull(),
    detail: jsonb('detail').$type<Record<string, unknown>>().notNull().default({}),
    sequence: bigint('sequence', { mode: 'number' }).generatedAlwaysAsIdentity(),
  },
  (table) => [index('audit_by_job').on(table.shopId, table.jobId, table.sequence)],
);

/** The first answer to a write that may be repeated, given again to the second. */
export const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    ...shopColumns(),
    key: text('key').notNull(),
    verb: text('verb').notNull(),
    answer: jsonb('answer').$type<unknown>().notNull(),
    createdAt: createdAt(),
  },
  (table) => [unique('idempotency_keys_once').on(table.shopId, table.verb, table.key)],
);
