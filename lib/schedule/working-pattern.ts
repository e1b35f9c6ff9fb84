/** When a crew works, in local hours: by weekday, the same each week or alternating over a few weeks. */
import type { Problem } from '@/lib/problem';
import { dayStartUtcMs, type LocalDate, type LocalTime } from '@/lib/time/civil';
import type { WorkingPattern } from '@/lib/time/workdays';

/** [start, end) of a local day. */
export type WorkedHours = { start: LocalTime; end: LocalTime };

/** ISO weekday, 1 Monday … 7 Sunday, with its hours. A weekday that is not named is off. */
export type WorkedWeekday = WorkedHours & { weekday: number };

/** A shop's closed days are not in it, nor holidays, nor anybody's days off: see `crewCalendar`. */
export type CrewPattern = {
  /** One week, or up to four that follow each other and begin again. */
  weeks: readonly (readonly WorkedWeekday[])[];
  /** Any day of a week that `weeks[0]` describes; of no matter with one week. */
  firstWeekOf: LocalDate;
};

export const mostWeeksOfPattern = 4;

/**
 * The hours worked on a date by the pattern alone; null on a day off.
 * Example: Monday to Friday 07:30–16:00 and each second Saturday 08:00–12:00, first week of 2026-05-04: Saturday
 * 2026-05-09 is worked, Saturday 2026-05-16 is off. Weeks begin on Monday (ISO 8601).
 */
export function hoursOn(pattern: CrewPattern, date: LocalDate): WorkedHours | null {
  const count = pattern.weeks.length;
  if (count === 0) return null;
  const dayNumber = dayStartUtcMs(date) / DAY_MS;
  const weeksOn = weekNumber(dayNumber) - weekNumber(dayStartUtcMs(pattern.firstWeekOf) / DAY_MS);
  const weekday = modulo(dayNumber + MONDAY_BEFORE_EPOCH, 7) + 1;
  const day = pattern.weeks[modulo(weeksOn, count)]?.find((worked) => worked.weekday === weekday);
  return day ? { start: day.start, end: day.end } : null;
}

/** The shop's own days and hours, for a crew that has none of its own. */
export function patternOfShop(
  shop: Pick<WorkingPattern, 'dayStart' | 'dayEnd' | 'workdays'>,
): CrewPattern {
  const { dayStart: start, dayEnd: end } = shop;
  return {
    weeks: [shop.workdays.map((weekday) => ({ weekday, start, end }))],
    firstWeekOf: '2024-01-01',
  };
}

/**
 * What keeps a pattern from being used: pattern-weeks-out-of-range, weekday-twice, hours-end-before-start,
 * no-working-hours.
 */
export function patternProblems({ weeks }: CrewPattern): Problem[] {
  const problem = (code: string, message: string): Problem[] => [
    { code, message, about: [], severity: 'error' },
  ];
  if (weeks.length < 1 || weeks.length > mostWeeksOfPattern) {
    return problem('pattern-weeks-out-of-range', 'A pattern has one to four weeks.');
  }
  const days = weeks.flat();
  if (days.length === 0) return problem('no-working-hours', 'Name a day that is worked.');
  if (days.some(({ start, end }) => start >= end)) {
    return problem('hours-end-before-start', 'A day ends before it starts.');
  }
  const isTwice = weeks.some(
    (week) => new Set(week.map(({ weekday }) => weekday)).size < week.length,
  );
  return isTwice ? problem('weekday-twice', 'One weekday stands twice in a week.') : [];
}

/** 1970-01-01 was a Thursday: the week that holds it began three days before. */
const MONDAY_BEFORE_EPOCH = 3;
const DAY_MS = 86_400_000;

const weekNumber = (dayNumber: number): number => Math.floor((dayNumber + MONDAY_BEFORE_EPOCH) / 7);
const modulo = (number: number, by: number): number => ((number % by) + by) % by;
