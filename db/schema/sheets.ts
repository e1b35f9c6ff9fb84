import { foreignKey, index, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import { instant, shopColumns } from './columns';
import { people } from './shops';
import { rooms } from './walls';

/** A frozen fit. The database refuses to change one (see drizzle/, `releases_frozen`). */
export const releases = pgTable(
  'releases',
  {
    ...shopColumns(),
    roomId: uuid('room_id').notNull(),
    /** A, B, … Z, AA … */
    revision: text('revision').notNull(),
    engineVersion: text('engine_version').notNull(),
    readingIds: uuid('reading_ids').array().notNull(),
    /** What went in, so that the sheet can be drawn and checked again years later. */
    wallBook: jsonb('wall_book').$type<WallBook>().notNull(),
    runs: jsonb('runs').$type<Run[]>().notNull(),
    rules: jsonb('rules').$type<FitRules>().notNull(),
    fit: jsonb('fit').$type<Fit>().notNull(),
    /** What differs from the revision before, in words. */
    changes: jsonb('changes').$type<string[]>().notNull(),
    /** Why it was released over an open verdict; empty when none was open. */
    overrideReason: text('override_reason').notNull().default(''),
    releasedAt: instant('released_at').notNull().defaultNow(),
    releasedBy: uuid('released_by').notNull(),
  },
  (table) => [
    unique('releases_shop_id').on(table.shopId, table.id),
    unique('releases_revision').on(table.roomId, table.revision),
    foreignKey({
      name: 'releases_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }),
    foreignKey({
      name: 'releases_person',
      columns: [table.shopId, table.releasedBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('releases_by_room').on(table.shopId, table.roomId),
  ],
);

/** The bench took the sheet up; beside the release because a release never changes. */
export const releaseReceipts = pgTable(
  'release_receipts',
  {
    ...shopColumns(),
    releaseId: uuid('release_id').notNull(),
    takenUpAt: instant('taken_up_at').notNull().defaultNow(),
    takenUpBy: uuid('taken_up_by').notNull(),
  },
  (table) => [
    unique('release_receipts_once').on(table.releaseId),
    foreignKey({
      name: 'release_receipts_release',
      columns: [table.shopId, table.releaseId],
      foreignColumns: [releases.shopId, releases.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'release_receipts_person',
      columns: [table.shopId, table.takenUpBy],
      foreignColumns: [people.shopId, people.id],
    }),
  ],
);
