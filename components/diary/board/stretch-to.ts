import { addDays, type LocalDate, type LocalTime } from '@/lib/time/civil';
import { isWorkday, type WorkingPattern } from '@/lib/time/workdays';

type Moment = { date: LocalDate; time: LocalTime };

/** The half hour nearest to a part of the day worked. Example: 0.5 of 07:30–15:30 is "11:30". */
export function timeInDay(part: number, { dayStart, dayEnd }: WorkingPattern): LocalTime {
  const opens = minutesOf(dayStart);
  const closes = minutesOf(dayEnd);
  const minutes = Math.round((opens + part * (closes - opens)) / 30) * 30;
  return clock(Math.min(closes, Math.max(opens + 30, minutes)));
}

/**
 * Minutes of work from a start to an end within the hours worked: what a visit's length becomes when its
 * end is pulled there. 0 where the end is not after the start.
 * Example: Friday 08:00 to Monday 12:00, Monday to Friday 08:00–16:00: 480 + 240.
 */
export function workMinutesUntil(start: Moment, end: Moment, pattern: WorkingPattern): number {
  if (end.date < start.date) return 0;
  let minutes = 0;
  for (let date = start.date; date <= end.date; date = addDays(date, 1)) {
    const isFirst = date === start.date;
    if (!isFirst && !isWorkday(date, pattern)) continue;
    const from = minutesOf(isFirst ? start.time : pattern.dayStart);
    const until = minutesOf(date === end.date ? end.time : pattern.dayEnd);
    minutes += Math.max(0, until - from);
  }
  return minutes;
}

const minutesOf = (time: LocalTime) => Number(time.slice(0, 2)) * 60 + Number(time.slice(3));
const clock = (minutes: number): LocalTime =>
  `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;
