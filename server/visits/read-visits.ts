import { and, asc, eq, inArray, type SQL } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { crews, customers, jobs, sites, visitPieces, visits } from '@/db/schema';
import type { VisitView } from '@/lib/contracts/visits';
import { phoneWords } from '@/lib/messages/phone-number';
import { formatDayShort, formatWindowShort } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Visits as every screen shows them, in order of time. */
export async function readVisits(
  db: Database,
  ctx: Context,
  which: SQL | undefined,
): Promise<VisitView[]> {
  const rows = await db
    .select({
      id: visits.id,
      version: visits.version,
      kind: visits.kind,
      status: visits.status,
      jobId: visits.jobId,
      jobNumber: jobs.number,
      jobTitle: jobs.title,
      customerName: customers.name,
      phone: customers.phone,
      street: sites.street,
      town: sites.town,
      wayIn: sites.wayIn,
      crewId: visits.crewId,
      crewName: crews.name,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      windowStartsAt: visits.windowStartsAt,
      windowEndsAt: visits.windowEndsAt,
      workMinutes: visits.workMinutes,
      customerSays: visits.customerSays,
      confirmedAt: visits.confirmedAt,
      expectedAt: visits.expectedAt,
      arrivedAt: visits.arrivedAt,
      leftAt: visits.leftAt,
    })
    .from(visits)
    .innerJoin(crews, eq(crews.id, visits.crewId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(visits.shopId, ctx.shop.id), which))
    .orderBy(asc(visits.startsAt), asc(visits.id));
  const pieces = await readPieces(
    db,
    ctx,
    rows.map(({ id }) => id),
  );
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return rows.map((row) => ({
    ...row,
    phone: phoneWords(row.phone, region),
    startsAt: row.startsAt.toISOString(),
    endsAt: row.endsAt.toISOString(),
    windowStartsAt: row.windowStartsAt.toISOString(),
    windowEndsAt: row.windowEndsAt.toISOString(),
    confirmedAt: row.confirmedAt?.toISOString() ?? null,
    expectedAt: row.expectedAt?.toISOString() ?? null,
    arrivedAt: row.arrivedAt?.toISOString() ?? null,
    leftAt: row.leftAt?.toISOString() ?? null,
    dayWords: formatDayShort(row.windowStartsAt, zone, locale),
    windowWords: formatWindowShort(
      { from: row.windowStartsAt, until: row.windowEndsAt },
      zone,
      locale,
    ),
    pieces: pieces.get(row.id) ?? [],
  }));
}

export async function readVisit(db: Database, ctx: Context, visitId: string): Promise<VisitView> {
  const [visit] = await readVisits(db, ctx, eq(visits.id, visitId));
  if (!visit) throw notFound('visit');
  return visit;
}

async function readPieces(db: Database, ctx: Context, visitIds: string[]) {
  const pieces = new Map<string, VisitView['pieces']>();
  if (visitIds.length === 0) return pieces;
  const rows = await db
    .select({
      visitId: visitPieces.visitId,
      id: visitPieces.id,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
    })
    .from(visitPieces)
    .where(and(eq(visitPieces.shopId, ctx.shop.id), inArray(visitPieces.visitId, visitIds)))
    .orderBy(asc(visitPieces.startsAt));
  for (const { visitId, id, startsAt, endsAt } of rows) {
    const piece = { id, startsAt: startsAt.toISOString(), endsAt: endsAt.toISOString() };
    pieces.set(visitId, [...(pieces.get(visitId) ?? []), piece]);
  }
  return pieces;
}
