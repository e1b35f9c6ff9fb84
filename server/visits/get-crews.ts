import { and, asc, eq, gte } from 'drizzle-orm';
import { daysOff } from '@/db/schema';
import type { CrewsView, DayOff } from '@/lib/contracts/crews';
import { may } from '@/lib/permissions';
import { holidayPlaces } from '@/lib/schedule/holidays';
import { formatLocalDayWithYear } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { listPeople } from '@/server/people/list-people';
import { holidaysOf } from '@/server/shops/booking-days';
import { readCrewPlans } from '@/server/shops/crew-plans';
import { daysWords } from './change-days-off';
import { visitsOutside } from './visits-outside';

/** Whose holidays a shop may keep: those of its region, and of the neighbours it may lie beside. */
const countriesOf: Record<PersonContext['shop']['region'], readonly string[]> = {
  US: ['US', 'CA', 'MX'],
  UK: ['GB', 'IE', 'GG', 'JE', 'IM'],
  AU: ['AU', 'NZ'],
  EU: [
    ...['AT', 'BE', 'BG', 'CH', 'CY', 'CZ', 'DE', 'DK', 'EE', 'ES', 'FI', 'FR', 'GR', 'HR', 'HU'],
    ...[
      'IE',
      'IS',
      'IT',
      'LI',
      'LT',
      'LU',
      'LV',
      'MT',
      'NL',
      'NO',
      'PL',
      'PT',
      'RO',
      'SE',
      'SI',
      'SK',
    ],
  ],
};

/** Crews, people, days off and closed days, and which visits stand outside them. */
export async function getCrews(ctx: PersonContext): Promise<CrewsView> {
  mustBeAllowed(ctx, 'people:read');
  const { region, zone, rules } = ctx.shop;
  const today = localDate(ctx.now, zone);
  const off = await daysOffFrom(ctx, today);
  const people = await listPeople(ctx);
  const plans = await readCrewPlans(ctx.db, ctx);
  const holidays = rules.booking.holidays ?? null;
  const year = Number(today.slice(0, 4));
  return {
    crews: plans.map(({ id, name, does, colour, kinds, pattern, hasOwnPattern, ...plan }) => ({
      id,
      name,
      does,
      colour,
      kinds,
      pattern: { firstWeekOf: pattern.firstWeekOf, weeks: pattern.weeks.map((week) => [...week]) },
      hasOwnPattern,
      base: { address: plan.baseAddress, place: plan.base },
      members: plan.people.map((person) => ({
        personId: person.id,
        name: person.name,
        weekdays: person.weekdays,
      })),
    })),
    people: people.map((person) => ({ ...person, daysOff: off.get(person.id) ?? [] })),
    closedDays: rules.booking.closedDays,
    holidays,
    publicHolidays: holidays
      ? [year, year + 1]
          .flatMap((of) => holidaysOf(holidays, of))
          .filter(({ date }) => date >= today)
          .map(({ date, name }) => ({
            date,
            name,
            words: formatLocalDayWithYear(date, { language: 'en', region }),
            isWorked: holidays.worked.includes(date),
          }))
      : [],
    holidayPlaces: holidayPlaces(countriesOf[region]),
    outside: await visitsOutside(ctx.db, ctx),
    today,
  };
}

async function daysOffFrom(ctx: PersonContext, today: string): Promise<Map<string, DayOff[]>> {
  const rows = await ctx.db
    .select({
      id: daysOff.id,
      personId: daysOff.personId,
      firstDay: daysOff.firstDay,
      lastDay: daysOff.lastDay,
      reason: daysOff.reason,
    })
    .from(daysOff)
    .where(and(eq(daysOff.shopId, ctx.shop.id), gte(daysOff.lastDay, today)))
    .orderBy(asc(daysOff.firstDay));
  // Why somebody is off is their own affair and the office's.
  const maySeeWhy = may(ctx.actor.role, 'crews:change');
  const byPerson = new Map<string, DayOff[]>();
  for (const { personId, reason, ...days } of rows) {
    const view = { ...days, words: daysWords(ctx.shop, days), reason: maySeeWhy ? reason : '' };
    byPerson.set(personId, [...(byPerson.get(personId) ?? []), view]);
  }
  return byPerson;
}
