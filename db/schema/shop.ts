import { sql } from 'drizzle-orm';
import { boolean, check, integer, pgTable, text, timestamp } from 'drizzle-orm/pg-core';
import { rulesColumn } from './rules-column';

/** A cabinet shop: where, in what units, by which rules. Every other table hangs from it. */
export const shops = pgTable(
  'shops',
  {
    id: text('id').primaryKey(),
    name: text('name').notNull(),
    phone: text('phone').notNull().default(''),
    email: text('email').notNull().default(''),
    region: text('region', { enum: ['US', 'UK', 'AU', 'EU'] }).notNull(),
    /** IANA zone; everything a person types or reads is in it. */
    zone: text('zone').notNull(),
    rules: rulesColumn('rules').notNull(),
    /** To play with: nobody is told anything from it, and it can be removed whole. */
    isSample: boolean('is_sample').notNull().default(false),
    nextJobNumber: integer('next_job_number').notNull().default(1),
    createdAt: timestamp('created_at', { withTimezone: true, mode: 'date' }).notNull().defaultNow(),
  },
  (table) => [check('shops_region', sql`${table.region} in ('US', 'UK', 'AU', 'EU')`)],
);
