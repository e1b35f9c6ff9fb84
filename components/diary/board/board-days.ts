import { addDays, daysBetween, type LocalDate, weekdayOf } from '@/lib/time/civil';
import { isWorkday, type WorkingDays } from '@/lib/time/workdays';

export type BoardDay = {
  date: LocalDate;
  /** Not a weekend and not a closed day of the shop. */
  isWorked: boolean;
  /** The first column of its week: a stronger rule stands before it. */
  isWeekStart: boolean;
};

/**
 * The columns of the board: whole weeks from a Monday. Weekdays that the shop never works are folded away,
 * unless a visit lies on them or a crew works them; a closed day keeps its column, so that everybody sees why
 * it is empty.
 */
export function boardDays(
  range: { from: LocalDate; weeks: number },
  shopDays: WorkingDays,
  busyDates: ReadonlySet<LocalDate>,
): BoardDay[] {
  const days = Array.from({ length: range.weeks * 7 }, (_, index) => addDays(range.from, index))
    .filter((date) => shopDays.workdays.includes(weekdayOf(date)) || busyDates.has(date))
    .map((date) => ({ date, isWorked: isWorkday(date, shopDays), isWeekStart: false }));
  return days.map((day, index) => ({
    ...day,
    isWeekStart: index === 0 || !isSameWeek(days[index - 1]?.date ?? day.date, day.date),
  }));
}

/** The Monday on or before a date. */
export function mondayOf(date: LocalDate): LocalDate {
  return addDays(date, 1 - weekdayOf(date));
}

function isSameWeek(a: LocalDate, b: LocalDate): boolean {
  return daysBetween(mondayOf(a), mondayOf(b)) === 0;
}
