import type { CrewDay } from '@/lib/contracts/day-plans';
import { keepTimes, timesAsTheyStand } from '@/lib/schedule/routes/keep-times';
import { formatWindowShort } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';
import type { DayToPlan } from './day-to-plan';
import type { DayVisit } from './read-crew-days';

/** One crew's day in an order of visit ids, or as it stands. */
export function crewDayView(
  ctx: Context,
  day: DayToPlan,
  crewId: string,
  order: string[] | null,
): CrewDay {
  const index = day.crews.findIndex(({ id }) => id === crewId);
  const [driver, own] = [day.crews[index], day.days[index]];
  if (!driver || !own) throw new Error(`no crew ${crewId} in this day`);
  const stops = (order ?? day.now[index] ?? []).flatMap(
    (id) => day.stops.find((stop) => stop.id === id) ?? [],
  );
  const route = { stops, crew: driver, driveMinutes: day.driveMinutes };
  const timed = order ? keepTimes(route) : timesAsTheyStand(route);
  const byId = new Map(day.days.flatMap(({ visits }) => visits.map((visit) => [visit.id, visit])));
  const lastPlace = stops.at(-1)?.place;
  const home = lastPlace === undefined ? 0 : (day.driveMinutes[lastPlace]?.[driver.endPlace] ?? 0);
  const planned = timed.flatMap((stop) => {
    const visit = byId.get(stop.id);
    return visit ? [stopView(ctx, visit, stop)] : [];
  });
  const { crew } = own;
  return {
    crewId,
    crewName: crew.name,
    colour: crew.colour,
    base: crew.base,
    stops: planned,
    driveHomeMinutes: home,
    driveMinutes: planned.reduce((sum, { driveMinutes }) => sum + driveMinutes, home),
    troubles: timed.flatMap((stop) => {
      const visit = byId.get(stop.id);
      if (!visit || stop.shortMinutes === 0) return [];
      return [
        `The drive to ${visit.customerName} takes ${stop.driveMinutes} min: ${stop.shortMinutes} more than there are.`,
      ];
    }),
  };
}

export function dayTroubles(days: CrewDay[]): string[] {
  return days.flatMap(({ troubles }) => troubles);
}

function stopView(
  ctx: Context,
  visit: DayVisit,
  stop: { arrivesAt: number; driveMinutes: number; slackMinutes: number },
): CrewDay['stops'][number] {
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const startsAt = new Date(stop.arrivesAt * 60_000);
  const endsAt = new Date(startsAt.getTime() + (visit.endsAt.getTime() - visit.startsAt.getTime()));
  const words = (from: Date, until: Date) => formatWindowShort({ from, until }, zone, locale);
  return {
    visitId: visit.id,
    version: visit.version,
    jobId: visit.jobId,
    jobNumber: visit.jobNumber,
    kind: visit.kind,
    status: visit.status,
    customerName: visit.customerName,
    street: visit.street,
    town: visit.town,
    place: visit.place,
    startsAt: startsAt.toISOString(),
    endsAt: endsAt.toISOString(),
    windowStartsAt: visit.windowStartsAt.toISOString(),
    windowEndsAt: visit.windowEndsAt.toISOString(),
    timeWords: words(startsAt, endsAt),
    windowWords: words(visit.windowStartsAt, visit.windowEndsAt),
    driveMinutes: stop.driveMinutes,
    slackMinutes: stop.slackMinutes,
    isFixed: visit.isFixed,
  };
}
