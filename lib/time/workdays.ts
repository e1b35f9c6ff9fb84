/** Days and hours that are worked, in civil terms: a pattern does not change when the clocks do. */
import { addDays, type LocalDate, type LocalTime, weekdayOf } from './civil';

/** When a crew or a shop works. A shop's booking rules have this shape. */
export type WorkingPattern = {
  dayStart: LocalTime;
  dayEnd: LocalTime;
  /** ISO weekdays worked, 1 Monday … 7 Sunday. */
  workdays: readonly number[];
  /** Holidays and the shop's own closed days. */
  closedDays: readonly LocalDate[];
};
export type WorkingDays = Pick<WorkingPattern, 'workdays' | 'closedDays'>;

/** A pattern with no worked day within this span is taken as having none at all. */
const SEARCH_DAYS = 400;

/** Whether a day is worked. Example: Sunday 2026-05-10 is not, with Monday to Friday. */
export function isWorkday(date: LocalDate, days: WorkingDays): boolean {
  return days.workdays.includes(weekdayOf(date)) && !days.closedDays.includes(date);
}

/**
 * The first worked day on or after a date; null where none is worked within 400 days.
 * Example: from Saturday 2026-05-09 with Monday to Friday it is Monday 2026-05-11.
 */
export function workdayOnOrAfter(date: LocalDate, days: WorkingDays): LocalDate | null {
  for (let ahead = 0, day = date; ahead <= SEARCH_DAYS; ahead++, day = addDays(day, 1)) {
    if (isWorkday(day, days)) return day;
  }
  return null;
}

/**
 * The date a number of working days (0 or more) later; the day itself is not counted, and 0 gives the first worked
 * day on or after it. Null where the pattern has no worked days.
 * Example: 5 working days after Tuesday 2026-05-12 is Tuesday 2026-05-19, or Wednesday 20 if Monday 18 is closed.
 */
export function addWorkdays(date: LocalDate, count: number, days: WorkingDays): LocalDate | null {
  if (count === 0) return workdayOnOrAfter(date, days);
  let day: LocalDate | null = date;
  for (let left = count; left > 0 && day !== null; left--) {
    day = workdayOnOrAfter(addDays(day, 1), days);
  }
  return day;
}
