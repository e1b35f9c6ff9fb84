/** The best order of one crew's day, exactly, up to twelve stops. */
import type { Outcome } from '@/lib/problem';
import { problem, refused } from '@/lib/problem';
import type { CrewRoute, DayCrew, DayStop, DriveMatrix } from './day-stops';

/** 2¹² sets of stops; thirteen would double the time, and no crew has so many. */
export const mostStopsExact = 12;

/** A way to have visited a set of stops, ending at the last of them. */
type Way = {
  cost: number;
  /** When the crew can leave the last stop. */
  leavesAt: number;
  arrivesAt: number;
  last: number;
  before: Way | null;
};

/**
 * The order with the least driving and missed wishes that keeps every promised window; among equals the one that
 * is done first. Each set of stops and its last stop keep the ways of which none is both dearer and later
 * (dynamic programming over subsets, M. Held and R. M. Karp 1962, with the time as second label).
 * Units: minutes. Example: two stops on one road, 10 and 20 minutes out, windows wide: nearest first, 40 driven. No stops: nothing driven.
 * Problems: too-many-stops, no-order-keeps-the-windows (errors).
 */
export function planDay(day: {
  stops: readonly DayStop[];
  crew: DayCrew;
  driveMinutes: DriveMatrix;
}): Outcome<CrewRoute> {
  const { stops, crew, driveMinutes } = day;
  const count = stops.length;
  if (count > mostStopsExact) {
    const message = `${count} stops are too many for one crew's day. Give some to another crew.`;
    return refused(problem('too-many-stops', message));
  }
  if (count === 0) return { value: routeOf(day, null, 0), problems: [] };
  const ways: Way[][][] = Array.from({ length: 1 << count }, () => []);
  for (const [index, stop] of stops.entries()) {
    const cost = drive(driveMinutes, crew.startPlace, stop.place);
    extend(ways, 1 << index, { stop, index, before: null, cost, readyAt: crew.leavesAt + cost });
  }
  for (let set = 1; set < 1 << count; set++) {
    for (const way of (ways[set] ?? []).flat()) {
      for (const [index, stop] of stops.entries()) {
        if (set & (1 << index)) continue;
        const minutes = drive(driveMinutes, stops[way.last]?.place ?? 0, stop.place);
        extend(ways, set | (1 << index), {
          stop,
          index,
          before: way,
          cost: way.cost + minutes,
          readyAt: way.leavesAt + minutes,
        });
      }
    }
  }
  const best = bestHome(day, (ways[(1 << count) - 1] ?? []).flat());
  if (!best) {
    const message = 'No order keeps all promised windows. Move a stop, or agree another window.';
    return refused(problem('no-order-keeps-the-windows', message));
  }
  return { value: best, problems: [] };
}

function extend(
  ways: Way[][][],
  set: number,
  step: { stop: DayStop; index: number; before: Way | null; cost: number; readyAt: number },
): void {
  const { stop, index, before, readyAt } = step;
  const arrival = Math.max(readyAt, stop.earliest);
  if (arrival > stop.latest) return;
  const { wish } = stop;
  const arrivals =
    wish && arrival < wish.from && wish.from <= stop.latest ? [arrival, wish.from] : [arrival];
  for (const arrivesAt of arrivals) {
    const isMissed = wish !== undefined && (arrivesAt < wish.from || arrivesAt > wish.until);
    keep(ways, set, {
      cost: step.cost + (isMissed ? wish.missedMinutes : 0),
      leavesAt: arrivesAt + stop.workMinutes,
      arrivesAt,
      last: index,
      before,
    });
  }
}

/** Kept unless another way to the same is neither dearer nor later. */
function keep(ways: Way[][][], set: number, way: Way): void {
  const ofSet = ways[set];
  if (!ofSet) return;
  const rivals = ofSet[way.last] ?? [];
  if (rivals.some(({ cost, leavesAt }) => cost <= way.cost && leavesAt <= way.leavesAt)) return;
  const left = rivals.filter(({ cost, leavesAt }) => cost < way.cost || leavesAt < way.leavesAt);
  left.push(way);
  ofSet[way.last] = left;
}

function bestHome(
  day: { stops: readonly DayStop[]; crew: DayCrew; driveMinutes: DriveMatrix },
  ways: Way[],
): CrewRoute | null {
  let best: { way: Way; cost: number; homeAt: number } | null = null;
  for (const way of ways) {
    const home = drive(day.driveMinutes, day.stops[way.last]?.place ?? 0, day.crew.endPlace);
    const [cost, homeAt] = [way.cost + home, way.leavesAt + home];
    if (homeAt > day.crew.homeBy) continue;
    if (!best || cost < best.cost || (cost === best.cost && homeAt < best.homeAt)) {
      best = { way, cost, homeAt };
    }
  }
  return best && routeOf(day, best.way, best.cost);
}

function routeOf(
  { stops, crew }: { stops: readonly DayStop[]; crew: DayCrew },
  last: Way | null,
  cost: number,
): CrewRoute {
  const planned: CrewRoute['stops'] = [];
  let missedMinutes = 0;
  for (let way = last; way; way = way.before) {
    const stop = stops[way.last];
    if (!stop) continue;
    planned.unshift({ id: stop.id, arrivesAt: way.arrivesAt });
    missedMinutes += missedBy(stop, way.arrivesAt);
  }
  return { crewId: crew.id, stops: planned, driveMinutes: cost - missedMinutes, missedMinutes };
}

/** Minutes by which an arrival misses the stop's wish. */
export function missedBy({ wish }: DayStop, arrivesAt: number): number {
  return wish && (arrivesAt < wish.from || arrivesAt > wish.until) ? wish.missedMinutes : 0;
}

function drive(matrix: DriveMatrix, from: number, to: number): number {
  return matrix[from]?.[to] ?? Number.POSITIVE_INFINITY;
}
