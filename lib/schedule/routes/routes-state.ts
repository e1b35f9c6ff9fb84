/** Routes while they are searched: flat arrays, so that trying a place for a stop costs a few additions. */
import type { DayCrew, DayStop, DriveMatrix } from './day-stops';

export type Fleet = {
  stopCount: number;
  crewCount: number;
  /** By stop. */
  place: Int32Array;
  work: Float64Array;
  earliest: Float64Array;
  latest: Float64Array;
  load: Float64Array;
  /** By stop, by crew: 1 where the crew may do it. */
  mayDo: Uint8Array;
  /** By crew. */
  startPlace: Int32Array;
  endPlace: Int32Array;
  leavesAt: Float64Array;
  homeBy: Float64Array;
  capacity: Float64Array;
  /** Crews that are alike in everything: of their empty routes one is tried. */
  alike: Int32Array;
  placeCount: number;
  /** placeCount × placeCount. */
  drive: Float64Array;
};

export type Routes = {
  /** Stops by crew, in order. */
  order: number[][];
  /** Crew of each stop; -1 for none. */
  crewOf: Int32Array;
  arrivesAt: Float64Array;
  /** The latest arrival that keeps all promises from there on. */
  mustArriveBy: Float64Array;
  loads: Float64Array;
  driven: Float64Array;
  unplaced: number[];
};

export function makeFleet(
  stops: readonly DayStop[],
  crews: readonly DayCrew[],
  matrix: DriveMatrix,
): Fleet {
  const [stopCount, crewCount, placeCount] = [stops.length, crews.length, matrix.length];
  const drive = new Float64Array(placeCount * placeCount);
  for (const [from, row] of matrix.entries()) {
    for (const [to, minutes] of row.entries()) drive[from * placeCount + to] = minutes;
  }
  const mayDo = new Uint8Array(stopCount * crewCount);
  for (const [index, { crews: allowed }] of stops.entries()) {
    for (let crew = 0; crew < crewCount; crew++) {
      mayDo[index * crewCount + crew] = !allowed || allowed.includes(crew) ? 1 : 0;
    }
  }
  const keys = crews.map(
    ({ startPlace, endPlace, leavesAt, homeBy, capacity }, crew) =>
      `${startPlace} ${endPlace} ${leavesAt} ${homeBy} ${capacity} ${stops
        .map((_, stop) => mayDo[stop * crewCount + crew])
        .join('')}`,
  );
  return {
    stopCount,
    crewCount,
    placeCount,
    drive,
    mayDo,
    place: Int32Array.from(stops, ({ place }) => place),
    work: Float64Array.from(stops, ({ workMinutes }) => workMinutes),
    earliest: Float64Array.from(stops, ({ earliest }) => earliest),
    latest: Float64Array.from(stops, ({ latest }) => latest),
    load: Float64Array.from(stops, ({ load = 0 }) => load),
    startPlace: Int32Array.from(crews, ({ startPlace }) => startPlace),
    endPlace: Int32Array.from(crews, ({ endPlace }) => endPlace),
    leavesAt: Float64Array.from(crews, ({ leavesAt }) => leavesAt),
    homeBy: Float64Array.from(crews, ({ homeBy }) => homeBy),
    capacity: Float64Array.from(crews, ({ capacity = Number.POSITIVE_INFINITY }) => capacity),
    alike: Int32Array.from(keys, (key) => keys.indexOf(key)),
  };
}

export function emptyRoutes({ stopCount, crewCount }: Fleet): Routes {
  return {
    order: Array.from({ length: crewCount }, () => []),
    crewOf: new Int32Array(stopCount).fill(-1),
    arrivesAt: new Float64Array(stopCount),
    mustArriveBy: new Float64Array(stopCount),
    loads: new Float64Array(crewCount),
    driven: new Float64Array(crewCount),
    unplaced: Array.from({ length: stopCount }, (_, stop) => stop),
  };
}

/** Works a route's times, load and driving out anew; false where it breaks a promise or comes home late. */
export function settleRoute(fleet: Fleet, routes: Routes, crew: number): boolean {
  const { place, work, earliest, latest, load, drive, placeCount } = fleet;
  const order = routes.order[crew] as number[];
  let at = fleet.startPlace[crew] as number;
  let time = fleet.leavesAt[crew] as number;
  let driven = 0;
  let carried = 0;
  let isKept = true;
  for (const stop of order) {
    const to = place[stop] as number;
    const minutes = drive[at * placeCount + to] as number;
    const arrival = Math.max(time + minutes, earliest[stop] as number);
    if (arrival > (latest[stop] as number)) isKept = false;
    routes.arrivesAt[stop] = arrival;
    routes.crewOf[stop] = crew;
    time = arrival + (work[stop] as number);
    driven += minutes;
    carried += load[stop] as number;
    at = to;
  }
  const home = fleet.endPlace[crew] as number;
  const last = drive[at * placeCount + home] as number;
  // A crew with no stop stays at home.
  routes.driven[crew] = order.length === 0 ? 0 : driven + last;
  routes.loads[crew] = carried;
  if (order.length > 0 && time + last > (fleet.homeBy[crew] as number)) isKept = false;

  let bound = fleet.homeBy[crew] as number;
  let next = home;
  for (let index = order.length - 1; index >= 0; index--) {
    const stop = order[index] as number;
    const from = place[stop] as number;
    const mustLeave = bound - (drive[from * placeCount + next] as number);
    bound = Math.min(latest[stop] as number, mustLeave - (work[stop] as number));
    routes.mustArriveBy[stop] = bound;
    next = from;
  }
  return isKept && carried <= (fleet.capacity[crew] as number);
}

export function totalDriven(routes: Routes): number {
  let sum = 0;
  for (const minutes of routes.driven) sum += minutes;
  return sum;
}
