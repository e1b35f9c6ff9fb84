import { and, asc, count, eq, notInArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { jobs, readings, rooms, runs, walls } from '@/db/schema';
import type { RoomRow } from '@/lib/contracts/jobs';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { newestReleases } from './newest-releases';

/** The rooms of a job, in the order in which they were drawn. */
export async function listRooms(
  ctx: PersonContext,
  { jobId }: { jobId: string },
): Promise<RoomRow[]> {
  mustBeAllowed(ctx, 'walls:read');
  const [job] = await ctx.db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
  const rows = await ctx.db
    .select({ id: rooms.id, name: rooms.name, submittedAt: rooms.submittedAt })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.jobId, jobId)))
    .orderBy(asc(rooms.position), asc(rooms.createdAt), asc(rooms.id));
  const released = await newestReleases(
    ctx.db,
    ctx,
    rows.map(({ id }) => id),
  );
  const wallCounts = await countOfRoom(ctx.db, ctx, jobId, walls);
  const runCounts = await countOfRoom(ctx.db, ctx, jobId, runs);
  const readingCounts = await countOfRoom(ctx.db, ctx, jobId, readings);
  return rows.map(({ id, name, submittedAt }) => ({
    id,
    name,
    wallCount: wallCounts.get(id) ?? 0,
    readingCount: readingCounts.get(id) ?? 0,
    runCount: runCounts.get(id) ?? 0,
    submittedAt: submittedAt?.toISOString() ?? null,
    revision: released.get(id)?.revision ?? null,
    isSuperseded: released.get(id)?.isSuperseded ?? false,
  }));
}

async function countOfRoom(
  db: Database,
  ctx: PersonContext,
  jobId: string,
  table: typeof walls | typeof runs | typeof readings,
): Promise<Map<string, number>> {
  const isReading =
    table === readings ? notInArray(readings.kind, ['withdrawal', 'skip']) : undefined;
  const rows = await db
    .select({ roomId: table.roomId, count: count() })
    .from(table)
    .innerJoin(rooms, eq(rooms.id, table.roomId))
    .where(and(eq(table.shopId, ctx.shop.id), eq(rooms.jobId, jobId), isReading))
    .groupBy(table.roomId);
  return new Map(rows.map(({ roomId, count: found }) => [roomId, found]));
}
