import type { DayCrew, DayStop, DriveMatrix } from './day-stops';

export type TimedStop = {
  id: string;
  arrivesAt: number;
  /** From the stop before, or from where the crew starts. */
  driveMinutes: number;
  /** How much later the crew could be here and keep this and all later promises; below zero where one is broken. */
  slackMinutes: number;
  /** Minutes that the drive before it is longer than the time for it; 0 where it fits. */
  shortMinutes: number;
};

/**
 * The times of a route whose order is settled: each stop stays at the time that it has where the drives and the
 * later promises allow, so that a better order changes no more than it must. Units: minutes.
 * Example: stops planned at 60 and 120 that can be reached at 10 and 100 stay at 60 and 120.
 */
export function keepTimes(route: {
  stops: readonly (DayStop & { now: number })[];
  crew: DayCrew;
  driveMinutes: DriveMatrix;
}): TimedStop[] {
  const { stops, crew } = route;
  const mustArriveBy = latestArrivals(route);
  let at = crew.startPlace;
  let time = crew.leavesAt;
  return stops.map((stop, index) => {
    const drive = route.driveMinutes[at]?.[stop.place] ?? 0;
    const bound = mustArriveBy[index] ?? stop.latest;
    const soonest = Math.max(time + drive, stop.earliest);
    const arrivesAt = Math.max(soonest, Math.min(stop.now, bound));
    time = arrivesAt + stop.workMinutes;
    at = stop.place;
    return { ...timed(stop, drive, bound), arrivesAt, slackMinutes: bound - arrivesAt };
  });
}

/**
 * A route just as it stands in the diary, with what is wrong with it: no time is changed.
 * Example: a stop at 100 that ends 20 minutes' drive before one at 110, work 0: short by 10.
 */
export function timesAsTheyStand(route: {
  stops: readonly (DayStop & { now: number })[];
  crew: DayCrew;
  driveMinutes: DriveMatrix;
}): TimedStop[] {
  const mustArriveBy = latestArrivals(route);
  let at = route.crew.startPlace;
  let time = route.crew.leavesAt;
  return route.stops.map((stop, index) => {
    const drive = route.driveMinutes[at]?.[stop.place] ?? 0;
    const shortMinutes = Math.max(0, time + drive - stop.now);
    time = stop.now + stop.workMinutes;
    at = stop.place;
    const bound = mustArriveBy[index] ?? stop.latest;
    return {
      ...timed(stop, drive, bound),
      arrivesAt: stop.now,
      slackMinutes: bound - stop.now,
      shortMinutes,
    };
  });
}

function timed(stop: DayStop, driveMinutes: number, bound: number): TimedStop {
  return { id: stop.id, arrivesAt: bound, driveMinutes, slackMinutes: 0, shortMinutes: 0 };
}

/** From the end of the day backwards: the latest arrival at each stop that keeps all promises. */
function latestArrivals(route: {
  stops: readonly DayStop[];
  crew: DayCrew;
  driveMinutes: DriveMatrix;
}): number[] {
  const { stops, crew, driveMinutes } = route;
  let bound = crew.homeBy;
  let next = crew.endPlace;
  return stops
    .toReversed()
    .map((stop) => {
      const mustLeave = bound - (driveMinutes[stop.place]?.[next] ?? 0);
      bound = Math.min(stop.latest, mustLeave - stop.workMinutes);
      next = stop.place;
      return bound;
    })
    .reverse();
}
