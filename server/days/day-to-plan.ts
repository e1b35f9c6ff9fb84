import { driveWhenUnknownMinutes } from '@/lib/schedule';
import { goesOutFor } from '@/lib/schedule/crew-kinds';
import type { DayCrew, DayStop, DriveMatrix } from '@/lib/schedule/routes/day-stops';
import type { LocalDate } from '@/lib/time/civil';
import { fromLocal } from '@/lib/time/local-moment';
import type { LatLon } from '@/lib/travel/place';
import type { Context } from '@/server/base/context';
import { whoGoes } from '@/server/shops/crew-plans';
import { travelMatrix } from '@/server/shops/travel-matrix';
import type { CrewAndVisits, DayVisit } from './read-crew-days';

/** A day's visits as the planner takes them; minutes of the Unix epoch. */
export type DayToPlan = {
  stops: (DayStop & { now: number })[];
  crews: DayCrew[];
  driveMinutes: DriveMatrix;
  /** Visit ids by crew, in order of time. */
  now: string[][];
  isDriveEstimated: boolean;
  days: CrewAndVisits[];
};

/** Drives are reckoned in steps of this, so that times come out as people say them. */
const stepMinutes = 5;
/** The drive out and home lie outside the hours: neither binds the order. */
const unboundMinutes = 1_440;

export async function dayToPlan(
  ctx: Context,
  date: LocalDate,
  days: CrewAndVisits[],
): Promise<DayToPlan> {
  const { zone } = ctx.shop;
  const places = days.flatMap(({ crew, visits }) => [
    crew.base,
    ...visits.map(({ place }) => place),
  ]);
  const { driveMinutes, isDriveEstimated } = await drives(ctx, places);
  const midnight = minutesOf(fromLocal(date, '00:00', zone));
  const ends = days.flatMap(({ crew }) => {
    const hours = crew.calendar.hoursOn(date);
    return hours ? [minutesOf(fromLocal(date, hours.end, zone))] : [];
  });
  const dayEnd = ends.length > 0 ? Math.min(...ends) : midnight + unboundMinutes;

  let row = -1;
  const stops: DayToPlan['stops'] = [];
  const crews = days.map(({ crew, visits }): DayCrew => {
    row += 1;
    const base = row;
    for (const visit of visits) {
      row += 1;
      const allowed = days.flatMap((other, index) =>
        mayTake(other, { crew, visit, date }) ? [index] : [],
      );
      stops.push({ ...stopOf(visit, dayEnd), place: row, crews: allowed });
    }
    return {
      id: crew.id,
      startPlace: base,
      endPlace: base,
      leavesAt: midnight - unboundMinutes,
      homeBy: midnight + 2 * unboundMinutes,
    };
  });
  const now = days.map(({ visits }) => visits.map(({ id }) => id));
  return { stops, crews, driveMinutes, now, isDriveEstimated, days };
}

/** Arrival within the promise and work done within the day; what stands outside already may stay there. */
function stopOf(visit: DayVisit, dayEnd: number): Omit<DayStop, 'place'> & { now: number } {
  const now = minutesOf(visit.startsAt);
  const workMinutes = minutesOf(visit.endsAt) - now;
  const bounds = visit.isFixed
    ? { earliest: now, latest: now }
    : {
        earliest: Math.min(now, minutesOf(visit.windowStartsAt)),
        latest: Math.max(now, Math.min(minutesOf(visit.windowEndsAt), dayEnd - workMinutes)),
      };
  return { id: visit.id, workMinutes, now, ...bounds };
}

/** Another crew takes a stop when it does the kind, works that day, and is as many. */
function mayTake(
  { crew: other }: CrewAndVisits,
  { crew, visit, date }: { crew: CrewAndVisits['crew']; visit: DayVisit; date: LocalDate },
): boolean {
  if (other.id === crew.id) return true;
  return (
    !visit.isFixed &&
    goesOutFor(other, visit.kind) &&
    other.calendar.hoursOn(date) !== null &&
    whoGoes(other, date).length >= whoGoes(crew, date).length
  );
}

async function drives(ctx: Context, places: (LatLon | null)[]) {
  const known = places.flatMap((place) => place ?? []);
  const matrix = await travelMatrix(ctx, known);
  let next = 0;
  const rowOf = places.map((place) => (place ? next++ : null));
  const minutes = (from: number, to: number) => {
    if (from === to) return 0;
    const [row, column] = [rowOf[from] ?? null, rowOf[to] ?? null];
    if (row === null || column === null) return driveWhenUnknownMinutes;
    return Math.ceil((matrix.minutes[row]?.[column] ?? 0) / stepMinutes - 1e-6) * stepMinutes;
  };
  return {
    driveMinutes: places.map((_, from) => places.map((__, to) => minutes(from, to))),
    isDriveEstimated: matrix.isEstimated || known.length < places.length,
  };
}

function minutesOf(instant: Date): number {
  return instant.getTime() / 60_000;
}
