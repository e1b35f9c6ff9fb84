import { and, asc, eq, gte, inArray, lte } from 'drizzle-orm';
import { crews, jobs, sites, visitPieces, visits } from '@/db/schema';
import type { DriveFact } from '@/lib/numbers/facts';
import { localDate } from '@/lib/time/local-moment';
import { type LatLon, placeKey } from '@/lib/travel/place';
import type { PersonContext } from '@/server/base/context';
import { travelMatrix } from '@/server/shops/travel-matrix';

type Stop = {
  crewId: string;
  crewName: string;
  day: string;
  base: LatLon | null;
  site: LatLon;
  visit: DriveFact['visits'][number];
};

/** What each crew drove on each day that it worked: base, its stops in their order, base. */
export async function readDriveFacts(
  ctx: PersonContext,
  period: { from: Date; until: Date },
): Promise<{ days: DriveFact[]; isEstimated: boolean }> {
  const days = byCrewDay(await readStops(ctx, period));
  const routes = days.map((stops) => {
    const base = stops[0]?.base;
    const places = stops.map(({ site }) => site);
    return base ? [base, ...places, base] : places;
  });
  // The same few driveways come again and again: each is asked about once.
  const places = new Map(routes.flat().map((place) => [placeKey(place), place]));
  const { minutes, isEstimated } = await travelMatrix(ctx, [...places.values()]);
  const rowOf = new Map([...places.keys()].map((key, row) => [key, row]));
  const between = (from: LatLon, to: LatLon) =>
    minutes[rowOf.get(placeKey(from)) ?? 0]?.[rowOf.get(placeKey(to)) ?? 0] ?? 0;
  return { days: days.map((stops, at) => driveOf(stops, routes[at] ?? [], between)), isEstimated };
}

function driveOf(
  stops: Stop[],
  route: LatLon[],
  between: (from: LatLon, to: LatLon) => number,
): DriveFact {
  const legs = route.slice(1).map((to, at) => between(route[at] ?? to, to));
  return {
    crewName: stops[0]?.crewName ?? '',
    day: stops[0]?.day ?? '',
    minutes: legs.reduce((total, leg) => total + leg, 0),
    visits: stops.map(({ visit }) => visit),
  };
}

async function readStops(
  ctx: PersonContext,
  { from, until }: { from: Date; until: Date },
): Promise<Stop[]> {
  const rows = await ctx.db
    .select({
      crewId: crews.id,
      crewName: crews.name,
      baseLatitude: crews.baseLatitude,
      baseLongitude: crews.baseLongitude,
      latitude: sites.latitude,
      longitude: sites.longitude,
      startsAt: visitPieces.startsAt,
      jobId: jobs.id,
      jobNumber: jobs.number,
      kind: visits.kind,
    })
    .from(visitPieces)
    .innerJoin(visits, eq(visits.id, visitPieces.visitId))
    .innerJoin(crews, eq(crews.id, visitPieces.crewId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(visitPieces.shopId, ctx.shop.id),
        inArray(visits.status, ['on-site', 'done', 'missed']),
        gte(visitPieces.startsAt, from),
        lte(visitPieces.startsAt, until),
      ),
    )
    .orderBy(asc(visitPieces.startsAt));
  return rows.flatMap((row) => {
    const site = placeOf(row.latitude, row.longitude);
    if (!site) return [];
    const { crewId, crewName, jobId, jobNumber, kind } = row;
    return [
      {
        crewId,
        crewName,
        day: localDate(row.startsAt, ctx.shop.zone),
        base: placeOf(row.baseLatitude, row.baseLongitude),
        site,
        visit: { jobId, jobNumber, kind },
      },
    ];
  });
}

const placeOf = (lat: number | null, lon: number | null): LatLon | null =>
  lat === null || lon === null ? null : { lat, lon };

function byCrewDay(stops: Stop[]): Stop[][] {
  const days = new Map<string, Stop[]>();
  for (const stop of stops) {
    const key = `${stop.day} ${stop.crewId}`;
    days.set(key, [...(days.get(key) ?? []), stop]);
  }
  return [...days.values()];
}
