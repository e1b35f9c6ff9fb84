import { type Fleet, type Routes, settleRoute } from './routes-state';
import type { Random } from './seeded-random';

/** How often a place is passed over, so that the search does not always fall into the same hole. */
const BLINK_SHARE = 0.01;

/**
 * Puts the stops that have no crew back, each where it adds least driving; what fits nowhere stays out.
 * The order in which they are put back is drawn: random, large loads, far, near, narrow, early or late windows.
 * Source: as `takeOut`.
 */
export function putBack(
  fleet: Fleet,
  routes: Routes,
  search: { random: Random; onChange: (crew: number) => void },
): void {
  const { random, onChange } = search;
  const waiting = routes.unplaced;
  routes.unplaced = [];
  sortForPutting(fleet, waiting, random);
  for (const stop of waiting) {
    const found = bestPlace(fleet, routes, stop, random);
    if (!found) {
      routes.unplaced.push(stop);
      continue;
    }
    onChange(found.crew);
    (routes.order[found.crew] as number[]).splice(found.index, 0, stop);
    settleRoute(fleet, routes, found.crew);
  }
}

function bestPlace(fleet: Fleet, routes: Routes, stop: number, random: Random) {
  const { place, work, earliest, latest, drive, placeCount, crewCount } = fleet;
  const { arrivesAt, mustArriveBy, loads } = routes;
  const here = place[stop] as number;
  const [opens, closes] = [earliest[stop] as number, latest[stop] as number];
  const workHere = work[stop] as number;
  const loadHere = fleet.load[stop] as number;
  let bestCost = Number.POSITIVE_INFINITY;
  let bestCrew = -1;
  let bestIndex = 0;
  const emptyTried = new Set<number>();
  for (let crew = 0; crew < crewCount; crew++) {
    if (fleet.mayDo[stop * crewCount + crew] === 0) continue;
    if ((loads[crew] as number) + loadHere > (fleet.capacity[crew] as number)) continue;
    const order = routes.order[crew] as number[];
    if (order.length === 0) {
      const kind = fleet.alike[crew] as number;
      if (emptyTried.has(kind)) continue;
      emptyTried.add(kind);
    }
    let at = fleet.startPlace[crew] as number;
    let time = fleet.leavesAt[crew] as number;
    const home = fleet.endPlace[crew] as number;
    for (let index = 0; index <= order.length; index++) {
      const there = drive[at * placeCount + here] as number;
      const arrival = Math.max(opens, time + there);
      if (arrival > closes) break;
      const isLast = index === order.length;
      const next = isLast ? -1 : (order[index] as number);
      const to = isLast ? home : (place[next] as number);
      const on = drive[here * placeCount + to] as number;
      const bound = isLast ? (fleet.homeBy[crew] as number) : (mustArriveBy[next] as number);
      if (arrival + workHere + on <= bound) {
        const without = order.length === 0 ? 0 : (drive[at * placeCount + to] as number);
        const cost = there + on - without;
        if (cost < bestCost && random() >= BLINK_SHARE) {
          bestCost = cost;
          bestCrew = crew;
          bestIndex = index;
        }
      }
      if (!isLast) {
        time = (arrivesAt[next] as number) + (work[next] as number);
        at = to;
      }
    }
  }
  return bestCrew < 0 ? null : { crew: bestCrew, index: bestIndex };
}

/** Shares of the ways to sort, of seventeen. */
const waysToSort = ['random', 'random', 'random', 'random', 'load', 'load', 'load', 'load'].concat([
  'far',
  'far',
  'near',
  'narrow',
  'narrow',
  'early',
  'early',
  'late',
  'late',
]);

function sortForPutting(fleet: Fleet, waiting: number[], random: Random): void {
  const way = waysToSort[Math.floor(random() * waysToSort.length)];
  const { load, earliest, latest, drive, place } = fleet;
  const base = fleet.startPlace[0] as number;
  const key = (stop: number): number => {
    const fromBase = drive[base * fleet.placeCount + (place[stop] as number)] as number;
    switch (way) {
      case 'load':
        return -(load[stop] as number);
      case 'far':
        return -fromBase;
      case 'near':
        return fromBase;
      case 'narrow':
        return (latest[stop] as number) - (earliest[stop] as number);
      case 'early':
        return earliest[stop] as number;
      case 'late':
        return -(latest[stop] as number);
      default:
        return random();
    }
  };
  const keys = new Map(waiting.map((stop) => [stop, key(stop)]));
  waiting.sort((a, b) => (keys.get(a) as number) - (keys.get(b) as number));
}
