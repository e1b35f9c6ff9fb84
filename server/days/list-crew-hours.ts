import type { CrewHours, ListCrewHoursInput } from '@/lib/contracts/crew-hours';
import { addDays, daysBetween } from '@/lib/time/civil';
import { startOfLocalDay } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readCrewPlans } from '@/server/shops/crew-plans';
import { busyOf, readBusy } from '@/server/visits/read-busy';

/** When each crew works over some days, and when its people are out with others; the diary shows what is free by it. */
export async function listCrewHours(
  ctx: PersonContext,
  { from, to }: ListCrewHoursInput,
): Promise<CrewHours[]> {
  mustBeAllowed(ctx, 'visits:read');
  const { zone } = ctx.shop;
  const dates = Array.from({ length: daysBetween(from, to) }, (_, index) => addDays(from, index));
  const plans = await readCrewPlans(ctx.db, ctx);
  const nameOf = new Map(plans.map(({ id, name }) => [id, name]));
  const busy = await readBusy(ctx.db, ctx, {
    from: startOfLocalDay(from, zone),
    until: startOfLocalDay(to, zone),
  });
  return plans.map((crew) => ({
    crewId: crew.id,
    days: dates.flatMap((date) => {
      const hours = crew.calendar.hoursOn(date);
      return hours ? [{ date, start: hours.start, end: hours.end }] : [];
    }),
    elsewhere: busyOf(busy, crew, zone)
      .filter(({ crewId }) => crewId !== crew.id)
      .map(({ crewId, startsAt, endsAt }) => ({
        startsAt: startsAt.toISOString(),
        endsAt: endsAt.toISOString(),
        crewName: nameOf.get(crewId) ?? '',
      })),
  }));
}
