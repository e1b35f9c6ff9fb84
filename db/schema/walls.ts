import {
  bigint,
  boolean,
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
import type { Reading } from '@/lib/contracts/readings';
import type { Run, Unit } from '@/lib/contracts/runs';
import { createdAt, instant, shopColumns } from './columns';
import { jobs } from './jobs';
import { people } from './shops';

export const rooms = pgTable(
  'rooms',
  {
    ...shopColumns(),
    jobId: uuid('job_id').notNull(),
    name: text('name').notNull(),
    position: integer('position').notNull().default(0),
    wallThicknessToComeMm: doublePrecision('wall_thickness_to_come_mm').notNull().default(0),
    floorToComeMm: doublePrecision('floor_to_come_mm').notNull().default(0),
    cabinetsStandOn: text('cabinets_stand_on', { enum: ['finished-floor', 'rough-floor'] }),
    /** The measurer says that the book is full. */
    submittedAt: instant('submitted_at'),
    createdAt: createdAt(),
  },
  (table) => [
    unique('rooms_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'rooms_job',
      columns: [table.shopId, table.jobId],
      foreignColumns: [jobs.shopId, jobs.id],
    }).onDelete('cascade'),
    index('rooms_by_job').on(table.shopId, table.jobId),
  ],
);

export const walls = pgTable(
  'walls',
  {
    ...shopColumns(),
    roomId: uuid('room_id').notNull(),
    /** Which chain of the room, and the place in it, clockwise. */
    chain: integer('chain').notNull(),
    chainClosed: boolean('chain_closed').notNull(),
    position: integer('position').notNull(),
    name: text('name').notNull(),
    nominalLengthMm: doublePrecision('nominal_length_mm').notNull(),
    leftCornerDeg: doublePrecision('left_corner_deg'),
  },
  (table) => [
    unique('walls_shop_id').on(table.shopId, table.id),
    unique('walls_place').on(table.roomId, table.chain, table.position),
    foreignKey({
      name: 'walls_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }).onDelete('cascade'),
  ],
);

/** Append-only: the database refuses to change or remove one (see drizzle/, `readings_append_only`). */
export const readings = pgTable(
  'readings',
  {
    ...shopColumns(),
    roomId: uuid('room_id').notNull(),
    kind: text('kind').notNull(),
    body: jsonb('body').$type<Reading>().notNull(),
    takenAt: instant('taken_at').notNull(),
    takenBy: uuid('taken_by').notNull(),
    receivedAt: instant('received_at').notNull().defaultNow(),
    /** Order of arrival; the office's list follows it. */
    sequence: bigint('sequence', { mode: 'number' }).generatedAlwaysAsIdentity(),
  },
  (table) => [
    unique('readings_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'readings_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'readings_person',
      columns: [table.shopId, table.takenBy],
      foreignColumns: [people.shopId, people.id],
    }),
    index('readings_by_room').on(table.shopId, table.roomId, table.sequence),
  ],
);

export const runs = pgTable(
  'runs',
  {
    ...shopColumns(),
    roomId: uuid('room_id').notNull(),
    wallId: uuid('wall_id').notNull(),
    position: integer('position').notNull().default(0),
    name: text('name').notNull(),
    /** Everything of the run but its units. */
    body: jsonb('body').$type<Omit<Run, 'id' | 'wallId' | 'name' | 'units'>>().notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('runs_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'runs_room',
      columns: [table.shopId, table.roomId],
      foreignColumns: [rooms.shopId, rooms.id],
    }).onDelete('cascade'),
    foreignKey({
      name: 'runs_wall',
      columns: [table.shopId, table.wallId],
      foreignColumns: [walls.shopId, walls.id],
    }).onDelete('cascade'),
    index('runs_by_room').on(table.shopId, table.roomId),
  ],
);

export const units = pgTable(
  'units',
  {
    ...shopColumns(),
    runId: uuid('run_id').notNull(),
    position: integer('position').notNull(),
    name: text('name').notNull().default(''),
    kind: text('kind').$type<Unit['kind']>().notNull(),
    widthMm: doublePrecision('width_mm').notNull(),
    alterable: jsonb('alterable').$type<Unit['alterable']>(),
    armMm: doublePrecision('arm_mm'),
    needHeightMm: doublePrecision('need_height_mm'),
  },
  (table) => [
    unique('units_shop_id').on(table.shopId, table.id),
    foreignKey({
      name: 'units_run',
      columns: [table.shopId, table.runId],
      foreignColumns: [runs.shopId, runs.id],
    }).onDelete('cascade'),
    index('units_by_run').on(table.shopId, table.runId),
  ],
);
