import type { CrewHours, ListCrewHoursInput } from '@/lib/contracts/crew-hours';
import { addDays, daysBetween } from '@/lib/time/civil';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readCrewPlans } from '@/server/shops/crew-plans';

/** When each crew works over some days; the diary shows by it what is free. */
export async function listCrewHours(
  ctx: PersonContext,
  { from, to }: ListCrewHoursInput,
): Promise<CrewHours[]> {
  mustBeAllowed(ctx, 'visits:read');
  const dates = Array.from({ length: daysBetween(from, to) }, (_, index) => addDays(from, index));
  const plans = await readCrewPlans(ctx.db, ctx);
  return plans.map(({ id, calendar }) => ({
    crewId: id,
    days: dates.flatMap((date) => {
      const hours = calendar.hoursOn(date);
      return hours ? [{ date, start: hours.start, end: hours.end }] : [];
    }),
  }));
}
