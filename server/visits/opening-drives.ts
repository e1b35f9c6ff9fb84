/** Drive times for the search: of a great many places, only those near the best times are asked of the roads. */
import { estimateDriveMinutes } from '@/lib/travel/estimate-drive';
import { type LatLon, placeKey } from '@/lib/travel/place';
import type { Context } from '@/server/base/context';
import { travelMatrix } from '@/server/shops/travel-matrix';

/** Places by number, each once. */
export class PlaceList {
  readonly places: LatLon[] = [];
  private readonly byKey = new Map<string, number>();

  indexOf(place: LatLon | null): number | null {
    if (!place) return null;
    const key = placeKey(place);
    const known = this.byKey.get(key);
    if (known !== undefined) return known;
    this.places.push(place);
    this.byKey.set(key, this.places.length - 1);
    return this.places.length - 1;
  }
}

export type Drives = {
  minutes: (from: number, to: number) => number;
  /** Whether the road service said nothing of drives to or from a place. */
  isEstimated: (place: number) => boolean;
};

/** The line over the ground, for all places at once; nothing is asked of anybody. */
export function estimatedDrives(ctx: Context, places: readonly LatLon[]): Drives {
  const known = new Map<number, number>();
  const kmPerHour = ctx.shop.rules.booking.driveKmPerHour;
  return {
    isEstimated: () => true,
    minutes(from, to) {
      const key = from * places.length + to;
      const kept = known.get(key);
      if (kept !== undefined) return kept;
      const [start, end] = [places[from], places[to]];
      const minutes = start && end ? estimateDriveMinutes(start, end, kmPerHour) : 0;
      known.set(key, minutes);
      return minutes;
    },
  };
}

/** By the roads between the places that matter, estimated between others. It may wait for the network. */
export async function roadDrives(
  ctx: Context,
  places: readonly LatLon[],
  wanted: readonly number[],
): Promise<Drives> {
  const points = wanted.flatMap((index) => places[index] ?? []);
  const matrix = await travelMatrix(ctx, points);
  const rowOf = new Map(wanted.map((index, row) => [index, row]));
  const estimated = estimatedDrives(ctx, places);
  return {
    isEstimated: (place) => matrix.isEstimated || !rowOf.has(place),
    minutes(from, to) {
      const [row, column] = [rowOf.get(from), rowOf.get(to)];
      const known =
        row === undefined || column === undefined ? undefined : matrix.minutes[row]?.[column];
      return known ?? estimated.minutes(from, to);
    },
  };
}
