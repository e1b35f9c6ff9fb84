import { customType, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { shops } from './shop';

/** The columns that every table of a shop begins with. */
export const shopColumns = () => ({
  shopId: text('shop_id')
    .notNull()
    .references(() => shops.id, { onDelete: 'cascade' }),
  id: uuid('id').primaryKey().defaultRandom(),
});

export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

export const createdAt = () => instant('created_at').notNull().defaultNow();

/** `[start, end)`; generated from two columns, so that it is read and never written. */
export const instantRange = customType<{ data: string; driverData: string }>({
  dataType: () => 'tstzrange',
});
