import { and, asc, eq, gt, inArray, lt, ne, notInArray, or } from 'drizzle-orm';
import { customers, jobs, sites, visitPieces, visits } from '@/db/schema';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { startOfLocalDay } from '@/lib/time/local-moment';
import type { LatLon } from '@/lib/travel/place';
import type { Context } from '@/server/base/context';
import { type CrewPlan, readCrewPlans } from '@/server/shops/crew-plans';

export type DayVisit = Awaited<ReturnType<typeof readDayVisits>>[number];
export type CrewAndVisits = { crew: CrewPlan; visits: DayVisit[] };

/** Each crew with its stops of a day in order of time. */
export async function readCrewDays(
  ctx: Context,
  date: LocalDate,
  crewIds?: string[],
): Promise<CrewAndVisits[]> {
  const crews = await readCrewPlans(ctx.db, ctx, crewIds);
  const found = await readDayVisits(
    ctx,
    date,
    crews.map(({ id }) => id),
  );
  return crews.map((crew) => ({
    crew,
    visits: found.filter(({ crewId }) => crewId === crew.id),
  }));
}

async function readDayVisits(ctx: Context, date: LocalDate, crewIds: string[]) {
  if (crewIds.length === 0) return [];
  const { id: shopId, zone } = ctx.shop;
  const [from, until] = [startOfLocalDay(date, zone), startOfLocalDay(addDays(date, 1), zone)];
  const ofVisit = and(eq(visitPieces.shopId, shopId), eq(visitPieces.visitId, visits.id));
  const pieceCount = ctx.db.$count(visitPieces, ofVisit);
  const rows = await ctx.db
    .select({
      id: visits.id,
      version: visits.version,
      kind: visits.kind,
      status: visits.status,
      crewId: visits.crewId,
      jobId: visits.jobId,
      jobNumber: jobs.number,
      customerName: customers.name,
      street: sites.street,
      town: sites.town,
      lat: sites.latitude,
      lon: sites.longitude,
      windowStartsAt: visits.windowStartsAt,
      windowEndsAt: visits.windowEndsAt,
      workMinutes: visits.workMinutes,
      pieceCount,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
    })
    .from(visits)
    .innerJoin(visitPieces, ofVisit)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(visits.shopId, shopId),
        inArray(visits.crewId, crewIds),
        notInArray(visits.status, ['called-off', 'missed']),
        or(ne(visits.status, 'held'), gt(visits.holdEndsAt, ctx.now)),
        lt(visitPieces.startsAt, until),
        gt(visitPieces.endsAt, from),
      ),
    )
    .orderBy(asc(visitPieces.startsAt), asc(visits.id));
  return rows.map(({ lat, lon, pieceCount: pieces, ...visit }) => ({
    ...visit,
    place: placeOf(lat, lon),
    isFixed: !isMovable(ctx, { ...visit, pieceCount: pieces }),
  }));
}

/** Of one day, booked, and not begun: what may change its hour within its promised window. */
export function isMovable(
  ctx: Context,
  visit: { status: string; startsAt: Date; pieceCount: number },
): boolean {
  const isBooked = visit.status === 'booked' || visit.status === 'confirmed';
  return isBooked && visit.pieceCount === 1 && visit.startsAt > ctx.now;
}

function placeOf(lat: number | null, lon: number | null): LatLon | null {
  return lat === null || lon === null ? null : { lat, lon };
}
