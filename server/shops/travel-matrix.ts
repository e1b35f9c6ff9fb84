import { and, eq, gt, inArray, sql } from 'drizzle-orm';
import { driveTimes } from '@/db/schema';
import { estimateDriveMinutes } from '@/lib/travel/estimate-drive';
import { type LatLon, placeKey, roundedPlace } from '@/lib/travel/place';
import type { Context } from '@/server/base/context';
import { getPorts } from '@/server/ports/choose-ports';

export type TravelMatrix = {
  /** [from][to] in minutes, not rounded; 0 on the diagonal. */
  minutes: number[][];
  /** Some of them are no more than geodesic × 1.3 at the shop's speed: screens say so. */
  isEstimated: boolean;
};

/** Roads change slowly; a new bridge is known half a year later at the latest. */
const keptDays = 180;
const rowsAtOnce = 2_000;

/**
 * Drive times between points, each way, from what is kept, else from the road service, else estimated.
 * It may wait for the network for some seconds: never call it inside a transaction.
 */
export async function travelMatrix(ctx: Context, points: LatLon[]): Promise<TravelMatrix> {
  const places = new Map(points.map((point) => [placeKey(point), roundedPlace(point)]));
  const known = await readKnown(ctx, [...places.keys()]);
  const missing = whatIsMissing(known, places);
  if (missing) await askService(ctx, known, missing);

  const kmPerHour = ctx.shop.rules.booking.driveKmPerHour;
  let isEstimated = false;
  const minutes = points.map((from) =>
    points.map((to) => {
      if (placeKey(from) === placeKey(to)) return 0;
      const kept = known.get(pairKey(placeKey(from), placeKey(to)));
      if (typeof kept === 'number') return kept;
      isEstimated = true;
      return estimateDriveMinutes(from, to, kmPerHour);
    }),
  );
  return { minutes, isEstimated };
}

/** By pair; null where the service knows of no road. */
type Known = Map<string, number | null>;
type Missing = { from: [string, LatLon][]; to: [string, LatLon][] };

const pairKey = (from: string, to: string) => `${from}>${to}`;

async function readKnown(ctx: Context, keys: string[]): Promise<Known> {
  if (keys.length < 2) return new Map();
  const rows = await ctx.db
    .select({
      fromPlace: driveTimes.fromPlace,
      toPlace: driveTimes.toPlace,
      minutes: driveTimes.minutes,
    })
    .from(driveTimes)
    .where(
      and(
        eq(driveTimes.shopId, ctx.shop.id),
        inArray(driveTimes.fromPlace, keys),
        inArray(driveTimes.toPlace, keys),
        gt(driveTimes.askedAt, new Date(ctx.now.getTime() - keptDays * 86_400_000)),
      ),
    );
  return new Map(rows.map((row) => [pairKey(row.fromPlace, row.toPlace), row.minutes]));
}

/** The smallest table that holds every pair not known; null when all are. */
function whatIsMissing(known: Known, places: Map<string, LatLon>): Missing | null {
  const from = new Map<string, LatLon>();
  const to = new Map<string, LatLon>();
  for (const [start, startPlace] of places) {
    for (const [end, endPlace] of places) {
      if (start === end || known.has(pairKey(start, end))) continue;
      from.set(start, startPlace);
      to.set(end, endPlace);
    }
  }
  return from.size > 0 ? { from: [...from], to: [...to] } : null;
}

async function askService(ctx: Context, known: Known, missing: Missing): Promise<void> {
  const { travel } = await getPorts();
  const answer = await travel.table({
    from: missing.from.map(([, place]) => place),
    to: missing.to.map(([, place]) => place),
  });
  if (!answer.ok) {
    ctx.log('drive times estimated', { ...answer.refusal });
    return;
  }
  const rows = missing.from.flatMap(([fromPlace], row) =>
    missing.to.flatMap(([toPlace], column) => {
      if (fromPlace === toPlace) return [];
      const minutes = answer.value[row]?.[column] ?? null;
      known.set(pairKey(fromPlace, toPlace), minutes);
      return [{ shopId: ctx.shop.id, fromPlace, toPlace, minutes, askedAt: ctx.now }];
    }),
  );
  for (let start = 0; start < rows.length; start += rowsAtOnce) {
    await ctx.db
      .insert(driveTimes)
      .values(rows.slice(start, start + rowsAtOnce))
      .onConflictDoUpdate({
        target: [driveTimes.shopId, driveTimes.fromPlace, driveTimes.toPlace],
        set: { minutes: sql`excluded.minutes`, askedAt: sql`excluded.asked_at` },
      });
  }
}
