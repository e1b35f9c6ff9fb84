/** The days and hours on which one crew can be sent out: its pattern, less closed days, holidays and days off. */
import { addDays, type LocalDate } from '@/lib/time/civil';
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

/**
 * A crew goes out whole or not at all: a day off of one of its people is the crew's day off.
 * Example: Monday to Friday with Tuesday 2026-05-12 closed and one fitter away from 13 to 14: worked are
 * Monday 11 and Friday 15.
 */
export function crewCalendar(crew: {
  pattern: CrewPattern;
  /** Shop's closed days and the holidays that it keeps. */
  closedDays: Iterable<LocalDate>;
  daysAway?: readonly DaysAway[];
}): WorkCalendar {
  const { pattern, daysAway = [] } = crew;
  const closed = new Set(crew.closedDays);
  const first = pattern.weeks.flat()[0];
  return {
    usualHours: first ? { start: first.start, end: first.end } : null,
    hoursOn(date) {
      if (closed.has(date)) return null;
      if (daysAway.some(({ from, until }) => from <= date && date <= until)) return null;
      return hoursOn(pattern, date);
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
