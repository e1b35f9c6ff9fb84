import { doublePrecision, index, jsonb, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import type { FoundPlace } from '@/lib/contracts/travel';
import { instant } from './columns';
import { shops } from './shop';

const shopId = () =>
  text('shop_id')
    .notNull()
    .references(() => shops.id, { onDelete: 'cascade' });

/** What the road service said, between places rounded to eleven metres ("41.2843,-58.312"). */
export const driveTimes = pgTable(
  'drive_times',
  {
    shopId: shopId(),
    fromPlace: text('from_place').notNull(),
    toPlace: text('to_place').notNull(),
    /** Null: no road leads there. */
    minutes: doublePrecision('minutes'),
    askedAt: instant('asked_at').notNull(),
  },
  (table) => [
    primaryKey({
      name: 'drive_times_once',
      columns: [table.shopId, table.fromPlace, table.toPlace],
    }),
    index('drive_times_by_age').on(table.askedAt),
  ],
);

/** What the address service said to a question, in small letters; an empty list is an answer too. */
export const addressAnswers = pgTable(
  'address_answers',
  {
    shopId: shopId(),
    question: text('question').notNull(),
    places: jsonb('places').$type<FoundPlace[]>().notNull(),
    askedAt: instant('asked_at').notNull(),
  },
  (table) => [
    primaryKey({ name: 'address_answers_once', columns: [table.shopId, table.question] }),
    index('address_answers_by_age').on(table.askedAt),
  ],
);
