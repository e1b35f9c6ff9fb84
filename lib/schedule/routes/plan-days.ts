/** The stops of a day given to several crews, each in a good order: a search with a budget and a seed. */
import type { Outcome } from '@/lib/problem';
import { problem } from '@/lib/problem';
import type { CrewRoute, DayCrew, DayStop, DriveMatrix } from './day-stops';
import { missedBy, mostStopsExact, planDay } from './plan-day';
import { putBack } from './put-back';
import {
  emptyRoutes,
  type Fleet,
  makeFleet,
  type Routes,
  settleRoute,
  totalDriven,
} from './routes-state';
import { seededRandom } from './seeded-random';
import { takeOut } from './take-out';

export type DaysPlan = {
  routes: CrewRoute[];
  driveMinutes: number;
  /** Stops for which no place was found. */
  unplaced: string[];
};

export type PlanDaysInput = {
  stops: readonly DayStop[];
  crews: readonly DayCrew[];
  driveMinutes: DriveMatrix;
  /** The same seed, the same plan. */
  seed: number;
  /** Tries to take out and put back. */
  iterations: number;
  /** The plan as it is, stop ids by crew; the result is never worse. Left out: from nothing. */
  now?: readonly (readonly string[])[];
  /** Asked now and then whether the time is over; a plan cut short by it does not depend on the seed alone. */
  isTimeOver?: () => boolean;
};

/** A stop left out weighs more than any drive. */
const UNPLACED_MINUTES = 1e6;
const ASK_TIME_EACH = 64;
/** Warmth of the search against the mean drive between stops, at its start and at its end. */
const START_WARMTH = 0.3;
const END_WARMTH = 0.003;

/**
 * Gives stops to crews and orders them with little driving; promised windows, homecoming, loads and skills are
 * never broken. Stops are put in where they add least, then strings of neighbours are taken out and put back over
 * and over; a worse plan is taken with a chance that falls as the search cools (simulated annealing). At the end each
 * route of up to twelve stops is ordered exactly, with its wishes.
 * Units: minutes. Source: as `takeOut`; against published best-known plans see tests/bench/solomon.ts.
 * Problems: stops-left-out (warning): the plan holds for the rest.
 */
export function planDays(input: PlanDaysInput): Outcome<DaysPlan> {
  const { stops, crews, driveMinutes, seed, iterations } = input;
  const fleet = makeFleet(stops, crews, driveMinutes);
  const random = seededRandom(seed);
  const routes = firstRoutes(fleet, input);
  putBack(fleet, routes, { random, onChange: () => {} });
  let best = copyOf(routes);
  let bestCost = costOf(routes);
  let cost = bestCost;

  const near = nearest(fleet);
  const meanDrive = meanOf(fleet);
  const cooling = (END_WARMTH / START_WARMTH) ** (1 / Math.max(1, iterations));
  let warmth = START_WARMTH * meanDrive;
  for (let round = 0; round < iterations && stops.length > 0; round++) {
    if (input.isTimeOver && round % ASK_TIME_EACH === 0 && input.isTimeOver()) break;
    const before = new Map<number, number[]>();
    const unplacedBefore = [...routes.unplaced];
    const onChange = (crew: number) => {
      if (!before.has(crew)) before.set(crew, [...(routes.order[crew] as number[])]);
    };
    takeOut(fleet, routes, { random, near, onChange });
    putBack(fleet, routes, { random, onChange });
    const next = costOf(routes);
    if (next < cost - warmth * Math.log(random())) {
      cost = next;
      if (cost < bestCost - 1e-9) {
        best = copyOf(routes);
        bestCost = cost;
      }
    } else {
      restore(fleet, routes, before, unplacedBefore);
    }
    warmth *= cooling;
  }
  return planOf(input, fleet, best);
}

/** The plan as it is, as far as it keeps its promises. */
function firstRoutes(fleet: Fleet, { stops, now }: PlanDaysInput): Routes {
  const routes = emptyRoutes(fleet);
  const numberOf = new Map(stops.map(({ id }, index) => [id, index]));
  for (const [crew, ids] of (now ?? []).entries()) {
    const order = ids.flatMap((id) => numberOf.get(id) ?? []);
    const isAllowed = order.every((stop) => fleet.mayDo[stop * fleet.crewCount + crew] === 1);
    routes.order[crew] = order;
    if (!isAllowed || !settleRoute(fleet, routes, crew)) {
      for (const stop of order) routes.crewOf[stop] = -1;
      routes.order[crew] = [];
      settleRoute(fleet, routes, crew);
    }
  }
  const placed = new Set(routes.order.flat());
  routes.unplaced = routes.unplaced.filter((stop) => !placed.has(stop));
  return routes;
}

function costOf(routes: Routes): number {
  return totalDriven(routes) + routes.unplaced.length * UNPLACED_MINUTES;
}

function copyOf(routes: Routes): { order: number[][]; unplaced: number[] } {
  return { order: routes.order.map((order) => [...order]), unplaced: [...routes.unplaced] };
}

function restore(
  fleet: Fleet,
  routes: Routes,
  before: Map<number, number[]>,
  unplaced: number[],
): void {
  for (const stop of unplaced) routes.crewOf[stop] = -1;
  routes.unplaced = unplaced;
  for (const [crew, order] of before) {
    routes.order[crew] = order;
    settleRoute(fleet, routes, crew);
  }
}

/** For each stop all stops, the nearest first, itself at the head. */
function nearest({ stopCount, place, drive, placeCount }: Fleet): Int32Array[] {
  const minutes = (from: number, to: number) =>
    from === to
      ? -1
      : (drive[(place[from] as number) * placeCount + (place[to] as number)] as number);
  const all = Array.from({ length: stopCount }, (_, stop) => stop);
  return all.map((from) =>
    Int32Array.from(all.toSorted((a, b) => minutes(from, a) - minutes(from, b))),
  );
}

function meanOf({ stopCount, place, drive, placeCount }: Fleet): number {
  let sum = 0;
  for (let from = 0; from < stopCount; from++) {
    for (let to = 0; to < stopCount; to++) {
      sum += drive[(place[from] as number) * placeCount + (place[to] as number)] as number;
    }
  }
  return stopCount > 1 ? sum / (stopCount * (stopCount - 1)) : 1;
}

function planOf(
  { stops, crews, driveMinutes }: PlanDaysInput,
  fleet: Fleet,
  best: { order: number[][]; unplaced: number[] },
): Outcome<DaysPlan> {
  const settled = { ...emptyRoutes(fleet), order: best.order };
  const routes = crews.map((crew, index): CrewRoute => {
    settleRoute(fleet, settled, index);
    const order = best.order[index] ?? [];
    const own = order.flatMap((stop) => stops[stop] ?? []);
    const exact =
      own.length > 0 && own.length <= mostStopsExact
        ? planDay({ stops: own, crew, driveMinutes }).value
        : null;
    if (exact) return exact;
    const planned = order.map((stop) => ({
      id: stops[stop]?.id ?? '',
      arrivesAt: settled.arrivesAt[stop] ?? 0,
    }));
    const missed = own.map((stop, at) => missedBy(stop, planned[at]?.arrivesAt ?? 0));
    return {
      crewId: crew.id,
      stops: planned,
      driveMinutes: settled.driven[index] ?? 0,
      missedMinutes: missed.reduce((sum, minutes) => sum + minutes, 0),
    };
  });
  const unplaced = best.unplaced.flatMap((stop) => stops[stop]?.id ?? []);
  const value = {
    routes,
    driveMinutes: routes.reduce((sum, route) => sum + route.driveMinutes, 0),
    unplaced,
  };
  if (unplaced.length === 0) return { value, problems: [] };
  const message = `${unplaced.length} stops fit into no crew's day. Move them to another day.`;
  return {
    value,
    problems: [{ ...problem('stops-left-out', message, unplaced), severity: 'warning' }],
  };
}
