import { and, asc, count, eq, gt, inArray, ne, notInArray, or, type SQL } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, rooms, runs, sites, units, visits } from '@/db/schema';
import type { Context } from '@/server/base/context';
import { newestReleases } from '@/server/walls/newest-releases';

/** Jobs whose next visit the office may have to book. */
export const openJobs = notInArray(jobs.stage, ['signed-off', 'called-off', 'on-hold']);

/** All that the order of work asks of some jobs, in one set of queries however many they are. */
export async function readJobRecords(db: Database, ctx: Context, which: SQL) {
  const ofShop = eq(jobs.shopId, ctx.shop.id);
  const found = await db
    .select({
      id: jobs.id,
      number: jobs.number,
      title: jobs.title,
      stage: jobs.stage,
      wallsReady: jobs.wallsReady,
      siteReadyOn: jobs.siteReadyOn,
      floorAgreed: jobs.floorAgreed,
      readyOn: jobs.readyOn,
      notReady: jobs.notReady,
      roomCount: jobs.roomCount,
      unitCount: jobs.unitCount,
      customerId: customers.id,
      customerName: customers.name,
      phone: customers.phone,
      email: customers.email,
      street: sites.street,
      town: sites.town,
      zone: sites.zone,
      latitude: sites.latitude,
      longitude: sites.longitude,
      wayIn: sites.wayIn,
      floorsUp: sites.floorsUp,
      hasLift: sites.hasLift,
    })
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(ofShop, which))
    .orderBy(asc(jobs.number));
  const ids = found.map(({ id }) => id);
  if (ids.length === 0) return [];
  const visitsOf = await readVisitRecords(db, ctx, ids);
  const roomsOf = await readRoomRecords(db, ctx, ids);
  const unitsOf = await countUnits(db, ctx, ids);
  return found.map((job) => ({
    ...job,
    visits: visitsOf.get(job.id) ?? [],
    rooms: roomsOf.get(job.id) ?? [],
    units: unitsOf.get(job.id) ?? [],
  }));
}
export type JobRecord = Awaited<ReturnType<typeof readJobRecords>>[number];

async function readVisitRecords(db: Database, ctx: Context, jobIds: string[]) {
  const rows = await db
    .select({
      jobId: visits.jobId,
      id: visits.id,
      kind: visits.kind,
      status: visits.status,
      endsAt: visits.endsAt,
      customerSays: visits.customerSays,
    })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        inArray(visits.jobId, jobIds),
        or(ne(visits.status, 'held'), gt(visits.holdEndsAt, ctx.now)),
      ),
    )
    .orderBy(asc(visits.endsAt), asc(visits.id));
  return groupByJob(rows);
}

async function readRoomRecords(db: Database, ctx: Context, jobIds: string[]) {
  const ofJobs = and(eq(rooms.shopId, ctx.shop.id), inArray(rooms.jobId, jobIds));
  const all = await db
    .select({ jobId: rooms.jobId, id: rooms.id, submittedAt: rooms.submittedAt })
    .from(rooms)
    .where(ofJobs);
  const withRuns = await db
    .selectDistinct({ roomId: runs.roomId })
    .from(runs)
    .innerJoin(rooms, eq(rooms.id, runs.roomId))
    .where(ofJobs);
  const newest = await newestReleases(
    db,
    ctx,
    all.map(({ id }) => id),
  );
  const hasRuns = new Set(withRuns.map(({ roomId }) => roomId));
  return groupByJob(
    all.map((room) => ({
      ...room,
      hasRuns: hasRuns.has(room.id),
      release: newest.get(room.id) ?? null,
    })),
  );
}

async function countUnits(db: Database, ctx: Context, jobIds: string[]) {
  const rows = await db
    .select({ jobId: rooms.jobId, kind: units.kind, count: count() })
    .from(units)
    .innerJoin(runs, eq(runs.id, units.runId))
    .innerJoin(rooms, eq(rooms.id, runs.roomId))
    .where(and(eq(units.shopId, ctx.shop.id), inArray(rooms.jobId, jobIds)))
    .groupBy(rooms.jobId, units.kind);
  return groupByJob(rows);
}

function groupByJob<T extends { jobId: string }>(rows: T[]): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const row of rows) groups.set(row.jobId, [...(groups.get(row.jobId) ?? []), row]);
  return groups;
}
