import { and, eq, inArray } from 'drizzle-orm';
import { crews, jobs, sites, visits } from '@/db/schema';
import type { TodayVisit } from '@/lib/contracts/visits';
import type { LatLon } from '@/lib/travel/place';
import type { PersonContext } from '@/server/base/context';
import { travelMatrix } from '@/server/shops/travel-matrix';

type Undriven = Omit<TodayVisit, 'drive'>;

/** A day's visits in order, each with the drive from the stop before it, or from the crew's base. */
export async function withDrives(ctx: PersonContext, day: Undriven[]): Promise<TodayVisit[]> {
  if (day.length === 0) return [];
  const rows = await ctx.db
    .select({
      visitId: visits.id,
      latitude: sites.latitude,
      longitude: sites.longitude,
      baseLatitude: crews.baseLatitude,
      baseLongitude: crews.baseLongitude,
    })
    .from(visits)
    .innerJoin(crews, eq(crews.id, visits.crewId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        inArray(
          visits.id,
          day.map(({ id }) => id),
        ),
      ),
    );
  const places = new Map(rows.map((row) => [row.visitId, row]));
  const legs = day.map((visit, at) => {
    const place = places.get(visit.id);
    const before = day.slice(0, at).findLast(({ crewId }) => crewId === visit.crewId);
    const from = before ? places.get(before.id) : null;
    return {
      from: from
        ? placeOf(from.latitude, from.longitude)
        : placeOf(place?.baseLatitude, place?.baseLongitude),
      to: placeOf(place?.latitude, place?.longitude),
    };
  });
  const points = legs.flatMap(({ from, to }) => [from, to].filter((point) => point !== null));
  const { minutes, isEstimated } = await travelMatrix(ctx, points);
  const indexOf = (point: LatLon) => points.indexOf(point);
  return day.map((visit, at) => {
    const { from, to } = legs[at] ?? { from: null, to: null };
    const leg = from && to ? minutes[indexOf(from)]?.[indexOf(to)] : undefined;
    return {
      ...visit,
      drive: leg === undefined ? null : { minutes: Math.ceil(leg), isEstimated },
    };
  });
}

function placeOf(lat?: number | null, lon?: number | null): LatLon | null {
  return typeof lat === 'number' && typeof lon === 'number' ? { lat, lon } : null;
}
