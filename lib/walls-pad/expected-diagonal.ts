import type { Room, WallBook } from '@/lib/contracts/wall-book';
import { type Figure, figure } from '@/lib/measure/figure';
import { type AsRead, asRead } from './as-read';
import { walk } from './walk';

/**
 * What walls and corners as read say a diagonal between two corners should be; null until they say.
 *
 * Edge: goes round the way that is read in full, the surer where both are; each u carried by a central
 * difference. Tools count as independent here; the adjustment of the room has them right.
 * Example: walls 4000 and 3000 with 90° between: 5000 mm.
 * Problems: none. Source: elementary geometry; JCGM 100:2008, 5.1.2.
 */
export function expectedDiagonal(
  book: WallBook,
  fromCornerWallId: string,
  toCornerWallId: string,
): Figure | null {
  const read = asRead(book);
  const ways = waysBetween(book.room, fromCornerWallId, toCornerWallId)
    .map((wallIds) => distanceAlong(wallIds, read))
    .filter((way) => way !== null);
  return ways.sort((one, other) => one.u - other.u)[0] ?? null;
}

/** Walls walked from one corner to the other, clockwise; in a closed chain also the other way about. */
function waysBetween(room: Room, from: string, to: string): string[][] {
  for (const { closed, walls } of room.chains) {
    const ids = walls.map(({ id }) => id);
    const [start, end] = [ids.indexOf(from), ids.indexOf(to)];
    if (start < 0 || end < 0 || start === end) continue;
    const [low, high] = [Math.min(start, end), Math.max(start, end)];
    const inside = ids.slice(low, high);
    return closed ? [inside, [...ids.slice(high), ...ids.slice(0, low)]] : [inside];
  }
  return [];
}

function distanceAlong(wallIds: string[], read: AsRead): Figure | null {
  const lengths = wallIds.map((id) => read.lengthMm.get(id));
  const corners = wallIds.map((id, at) => (at === 0 ? null : read.cornerDeg.get(id)));
  const inputs = [...lengths, ...corners.slice(1)];
  const known = inputs.filter((input): input is Figure => input != null);
  if (known.length < inputs.length || wallIds.length < 2) return null;
  const values = known.map(({ value }) => value);
  const count = wallIds.length;
  const distance = (all: number[]) => {
    const points = walk(
      wallIds.map((_, at) => ({ lengthMm: all[at] ?? 0, cornerDeg: all[count + at - 1] ?? 180 })),
    );
    const end = points.at(-1) ?? { xMm: 0, yMm: 0 };
    return Math.hypot(end.xMm, end.yMm);
  };
  const parts = known.map(({ u }, at) => {
    const moved = (by: number) =>
      distance(values.map((value, i) => (i === at ? value + by : value)));
    return u > 0 ? (moved(u) - moved(-u)) / 2 : 0;
  });
  return figure(
    distance(values),
    Math.hypot(...parts),
    known.flatMap(({ from }) => from),
  );
}
