/** The days and hours on which one crew can be sent out: its pattern, less closed days, holidays and days off. */
import { addDays, type LocalDate, weekdayOf } from '@/lib/time/civil';
import type { WorkingPattern } from '@/lib/time/workdays';
import { type CrewPattern, hoursOn, patternOfShop, type WorkedHours } from './working-pattern';

export type WorkCalendar = {
  /** Null on a day off. */
  hoursOn(date: LocalDate): WorkedHours | null;
  /** Hours of a day off that is worked all the same, because somebody says so. */
  usualHours: WorkedHours | null;
};

/** [from, until] of local days, both away. */
export type DaysAway = { from: LocalDate; until: LocalDate };

/** A pattern with no worked day within this span is taken as having none at all. */
const SEARCH_DAYS = 400;

/** Who goes out in a crew. */
export type CrewMember = {
  /** ISO weekdays on which they go with this crew; null: every day. */
  weekdays: readonly number[] | null;
  daysAway: readonly DaysAway[];
};

/** Whether somebody goes with the crew on a date, away or not. */
export function goesOn(member: Pick<CrewMember, 'weekdays'>, date: LocalDate): boolean {
  return member.weekdays === null || member.weekdays.includes(weekdayOf(date));
}

/**
 * A crew goes out whole or not at all: a day off of one who goes that weekday is the crew's day off, and so is a
 * weekday on which nobody goes.
 * Example: Monday to Friday with Tuesday 2026-05-12 closed and one fitter away from 13 to 14: worked are
 * Monday 11 and Friday 15.
 */
export function crewCalendar(crew: {
  pattern: CrewPattern;
  /** Shop's closed days and the holidays that it keeps. */
  closedDays: Iterable<LocalDate>;
  /** Left out: nobody named yet, and so nobody away. */
  members?: readonly CrewMember[];
}): WorkCalendar {
  const { pattern, members = [] } = crew;
  const closed = new Set(crew.closedDays);
  const first = pattern.weeks.flat()[0];
  return {
    usualHours: first ? { start: first.start, end: first.end } : null,
    hoursOn(date) {
      if (closed.has(date)) return null;
      const going = members.filter((member) => goesOn(member, date));
      if (members.length > 0 && going.length === 0) return null;
      const isAway = ({ daysAway }: CrewMember) =>
        daysAway.some(({ from, until }) => from <= date && date <= until);
      return going.some(isAway) ? null : hoursOn(pattern, date);
    },
  };
}

/** The calendar of a crew that works the shop's own days and hours. */
export function shopCalendar(pattern: WorkingPattern): WorkCalendar {
  return {
    ...crewCalendar({ pattern: patternOfShop(pattern), closedDays: pattern.closedDays }),
    usualHours: { start: pattern.dayStart, end: pattern.dayEnd },
  };
}

/** The first worked day on or after a date, with its hours; null where none is worked within 400 days. */
export function workedDayFrom(
  calendar: WorkCalendar,
  date: LocalDate,
): { date: LocalDate; hours: WorkedHours } | null {
  for (let ahead = 0, day = date; ahead <= SEARCH_DAYS; ahead++, day = addDays(day, 1)) {
    const hours = calendar.hoursOn(day);
    if (hours) return { date: day, hours };
  }
  return null;
}
