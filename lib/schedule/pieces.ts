/** A visit of several days as its daily pieces, within the hours that the crew works. */
import type { Outcome, Problem } from '@/lib/problem';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { fromLocal, toLocal } from '@/lib/time/local-moment';
import type { WorkingPattern } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import { shopCalendar, type WorkCalendar, workedDayFrom } from './work-calendar';
import type { WorkedHours } from './working-pattern';

/** [startsAt, endsAt), both on one civil day. */
export type Piece = { startsAt: Date; endsAt: Date };

type Work = {
  /** Working time on site, by the clock: already divided by the people who share it. */
  workMinutes: number;
  startsAt: Date;
  zone: Zone;
};
export type PiecesInput = Work & { pattern: WorkingPattern };
export type CalendarPiecesInput = Work & { calendar: WorkCalendar };

const MINUTE_MS = 60_000;
/** A visit longer than a working year is a slip of the keyboard. */
const MOST_WORK_MINUTES = 260 * 24 * 60;

/** The same as `splitOverCalendar`, for a crew that works the shop's own days and hours. */
export function splitIntoPieces({ pattern, ...work }: PiecesInput): Outcome<Piece[]> {
  return splitOverCalendar({ ...work, calendar: shopCalendar(pattern) });
}

/**
 * Splits work into one piece a worked day: the first from the asked start to the day's end, the next from
 * day start, until the work is used up. Hours are civil, minutes are real, so 16 hours of work stay 16
 * hours over a clock change. A start before the day's hours or on a day off is kept as asked, with a
 * warning (the scheduler may mean it); at or after the day's end, or on a day off after hours, it is an error.
 * Example: 960 minutes from Friday 08:00, Monday to Friday 08:00–16:00: Friday 8–16 and Monday 8–16.
 * Problems: work-minutes-out-of-range, no-working-hours, starts-after-day-end (errors);
 * starts-before-day-start, starts-on-day-off (warnings).
 */
export function splitOverCalendar(input: CalendarPiecesInput): Outcome<Piece[]> {
  const { workMinutes, startsAt, calendar, zone } = input;
  const { date, time } = toLocal(startsAt, zone);
  const firstHours = calendar.hoursOn(date) ?? calendar.usualHours;
  const problem = whatForbids(workMinutes, time, firstHours);
  if (problem || !firstHours) return { value: null, problems: [problem ?? noWorkingHours] };

  const pieces: Piece[] = [];
  let leftMs = Math.round(workMinutes * MINUTE_MS);
  let day: { date: LocalDate; hours: WorkedHours } | null = { date, hours: firstHours };
  let pieceStart = startsAt;
  while (day !== null) {
    const dayEnd = fromLocal(day.date, day.hours.end, zone);
    const usedMs = Math.min(leftMs, dayEnd.getTime() - pieceStart.getTime());
    if (usedMs > 0)
      pieces.push({ startsAt: pieceStart, endsAt: new Date(pieceStart.getTime() + usedMs) });
    leftMs -= Math.max(0, usedMs);
    if (leftMs <= 0) {
      return { value: pieces, problems: unusualStart({ date, time }, firstHours, calendar) };
    }
    day = workedDayFrom(calendar, addDays(day.date, 1));
    if (day !== null) pieceStart = fromLocal(day.date, day.hours.start, zone);
  }
  return { value: null, problems: [noWorkingHours] };
}

const noWorkingHours: Problem = {
  code: 'no-working-hours',
  message: 'No day is worked in this pattern. Check the hours, the weekdays and the closed days.',
  about: [],
  severity: 'error',
};

function whatForbids(
  workMinutes: number,
  startTime: string,
  hours: WorkedHours | null,
): Problem | null {
  if (!(workMinutes > 0 && workMinutes <= MOST_WORK_MINUTES)) {
    return {
      code: 'work-minutes-out-of-range',
      message: 'The visit needs a length: more than nothing and less than a working year.',
      about: [],
      severity: 'error',
    };
  }
  if (!hours || hours.start >= hours.end) return noWorkingHours;
  if (startTime >= hours.end) {
    return {
      code: 'starts-after-day-end',
      message: `The crew's day ends at ${hours.end}. Start earlier, or on the next working day.`,
      about: [],
      severity: 'error',
    };
  }
  return null;
}

function unusualStart(
  start: { date: LocalDate; time: string },
  hours: WorkedHours,
  calendar: WorkCalendar,
): Problem[] {
  const { date, time } = start;
  const problems: Problem[] = [];
  if (time < hours.start) {
    problems.push({
      code: 'starts-before-day-start',
      message: `The crew's day starts at ${hours.start}; this starts at ${time}.`,
      about: [],
      severity: 'warning',
    });
  }
  if (!calendar.hoursOn(date)) {
    problems.push({
      code: 'starts-on-day-off',
      message: `${date} is not a working day of this crew.`,
      about: [],
      severity: 'warning',
    });
  }
  return problems;
}
