import { foreignKey, index, integer, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, instant, shopColumns } from './columns';
import { jobs } from './jobs';
import { people } from './shops';
import { rooms } from './walls';

/** What is kept with a job. The bytes lie with the files port; the row is what makes them a file of the shop. */
export const files = pgTable(
  'files',
  {
    ...shopColumns(),
    jobId: uuid('job_id').notNull(),
    roomId: uuid('room_id'),
    /** No foreign key: a wall may be drawn away, and its photo stays with the room. */
    wallId: uuid('wall_id'),
    name: text('name').notNull(),
    caption: text('caption').notNull().default(''),
    mediaType: text('media_type').notNull(),
    bytes: integer('bytes').notNull(),
    widthPx: integer('width_px'),
    heightPx: integer('height_px'),
    /** Of the bytes as they are kept; tells a repeat from another file under the same id. */
    sha256: text('sha256').notNull(),
    /** Where the files port keeps it. */
    storageKey: text('storage_key').notNull(),
    takenAt: instant('taken_at').notNull(),
    addedBy: uuid('added_by').notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('files_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'files_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'files_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'files_person',
      columns: [table.shopId, table.addedBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('files_by_job').on(table.shopId, table.jobId),
    index('files_by_room').on(table.shopId, table.roomId, table.takenAt),
  ],
);
