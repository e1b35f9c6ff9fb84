import { and, asc, eq, gte, inArray, isNull } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { crewPeople, crews, daysOff, people } from '@/db/schema';
import type { CrewView } from '@/lib/contracts/visits';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import {
  crewCalendar,
  type DaysAway,
  goesOn,
  type WorkCalendar,
} from '@/lib/schedule/work-calendar';
import { type CrewPattern, patternOfShop } from '@/lib/schedule/working-pattern';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import type { LatLon } from '@/lib/travel/place';
import type { Context } from '@/server/base/context';
import { bookingDays } from './booking-days';

export type CrewPlanPerson = {
  id: string;
  name: string;
  /** ISO weekdays on which they go with this crew; null: every day. */
  weekdays: number[] | null;
  daysAway: DaysAway[];
};

/** A crew as booking sees it: what it goes out for, from where, who goes, and on which days and hours. */
export type CrewPlan = {
  id: string;
  name: string;
  does: CrewView['does'];
  colour: CrewView['colour'];
  kinds: VisitKind[];
  pattern: CrewPattern;
  hasOwnPattern: boolean;
  baseAddress: string;
  base: LatLon | null;
  people: CrewPlanPerson[];
  /** Its days and hours, less closed days, holidays and days off. */
  calendar: WorkCalendar;
};

/** Days off longer past than this say nothing about any visit that can still be booked or moved. */
const daysBack = 60;

/** All crews of the shop, or those named; in order of what they do and of name. */
export async function readCrewPlans(
  db: Database,
  ctx: Context,
  crewIds?: string[],
): Promise<CrewPlan[]> {
  const rows = await db
    .select()
    .from(crews)
    .where(and(eq(crews.shopId, ctx.shop.id), crewIds ? inArray(crews.id, crewIds) : undefined))
    .orderBy(asc(crews.does), asc(crews.name), asc(crews.id));
  const members = await readMembers(db, ctx, crewIds);
  const rules = bookingDays(ctx);
  return rows.map((row) => {
    const { baseLatitude: lat, baseLongitude: lon } = row;
    const pattern = row.pattern ?? patternOfShop(rules);
    const goers = members.get(row.id) ?? [];
    return {
      id: row.id,
      name: row.name,
      does: row.does,
      colour: row.colour,
      kinds: row.kinds,
      pattern,
      hasOwnPattern: row.pattern !== null,
      baseAddress: row.baseAddress,
      base: lat === null || lon === null ? null : { lat, lon },
      people: goers,
      calendar: crewCalendar({ pattern, closedDays: rules.closedDays, members: goers }),
    };
  });
}

/** Who of the crew goes out on a day: those whose day with it that is, and who are not off. */
export function whoGoes(crew: Pick<CrewPlan, 'people'>, date: LocalDate): CrewPlanPerson[] {
  return crew.people.filter((person) => goesOn(person, date) && !isAway(person, date));
}

/** Who of the crew would go out on a day, and is off. */
export function whoIsOff(crew: Pick<CrewPlan, 'people'>, date: LocalDate): CrewPlanPerson[] {
  return crew.people.filter((person) => goesOn(person, date) && isAway(person, date));
}

export function isAway(person: Pick<CrewPlanPerson, 'daysAway'>, date: LocalDate): boolean {
  return person.daysAway.some(({ from, until }) => from <= date && date <= until);
}

async function readMembers(db: Database, ctx: Context, crewIds: string[] | undefined) {
  const rows = await db
    .select({
      crewId: crewPeople.crewId,
      weekdays: crewPeople.weekdays,
      id: people.id,
      name: people.name,
    })
    .from(crewPeople)
    .innerJoin(people, and(eq(people.id, crewPeople.personId), isNull(people.leftAt)))
    .where(
      and(
        eq(crewPeople.shopId, ctx.shop.id),
        crewIds ? inArray(crewPeople.crewId, crewIds) : undefined,
      ),
    )
    .orderBy(asc(people.name), asc(people.id));
  const away = await readDaysAway(db, ctx, [...new Set(rows.map(({ id }) => id))]);
  const byCrew = new Map<string, CrewPlanPerson[]>();
  for (const { crewId, ...person } of rows) {
    const members = byCrew.get(crewId) ?? [];
    byCrew.set(crewId, [...members, { ...person, daysAway: away.get(person.id) ?? [] }]);
  }
  return byCrew;
}

async function readDaysAway(db: Database, ctx: Context, personIds: string[]) {
  const byPerson = new Map<string, DaysAway[]>();
  if (personIds.length === 0) return byPerson;
  const earliest = addDays(localDate(ctx.now, ctx.shop.zone), -daysBack);
  const rows = await db
    .select({ personId: daysOff.personId, from: daysOff.firstDay, until: daysOff.lastDay })
    .from(daysOff)
    .where(
      and(
        eq(daysOff.shopId, ctx.shop.id),
        inArray(daysOff.personId, personIds),
        gte(daysOff.lastDay, earliest),
      ),
    );
  for (const { personId, ...days } of rows) {
    byPerson.set(personId, [...(byPerson.get(personId) ?? []), days]);
  }
  return byPerson;
}
