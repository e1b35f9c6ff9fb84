/** A visit of several days as its daily pieces, within the hours that the crew works. */
import type { Outcome, Problem } from '@/lib/problem';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { fromLocal, toLocal } from '@/lib/time/local-moment';
import { isWorkday, type WorkingPattern, workdayOnOrAfter } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';

/** [startsAt, endsAt), both on one civil day. */
export type Piece = { startsAt: Date; endsAt: Date };

export type PiecesInput = {
  /** Working time on site, by the clock: already divided by the people who share it. */
  workMinutes: number;
  startsAt: Date;
  pattern: WorkingPattern;
  zone: Zone;
};

const MINUTE_MS = 60_000;
/** A visit longer than a working year is a slip of the keyboard. */
const MOST_WORK_MINUTES = 260 * 24 * 60;

/**
 * Splits work into one piece a worked day: the first from the asked start to the day's end, the next from
 * day start, until the work is used up. Hours are civil, minutes are real, so 16 hours of work stay 16
 * hours over a clock change. A start before the day's hours or on a day off is kept as asked, with a
 * warning (the scheduler may mean it); at or after the day's end, or on a day off after hours, it is an error.
 * Example: 960 minutes from Friday 08:00, Monday to Friday 08:00–16:00: Friday 8–16 and Monday 8–16.
 * Problems: work-minutes-out-of-range, no-working-hours, starts-after-day-end (errors);
 * starts-before-day-start, starts-on-day-off (warnings).
 */
export function splitIntoPieces(input: PiecesInput): Outcome<Piece[]> {
  const { workMinutes, startsAt, pattern, zone } = input;
  const problem = whatForbids(input);
  if (problem) return { value: null, problems: [problem] };

  const pieces: Piece[] = [];
  let leftMs = Math.round(workMinutes * MINUTE_MS);
  let day: LocalDate | null = toLocal(startsAt, zone).date;
  let pieceStart = startsAt;
  while (day !== null) {
    const dayEnd = fromLocal(day, pattern.dayEnd, zone);
    const usedMs = Math.min(leftMs, dayEnd.getTime() - pieceStart.getTime());
    if (usedMs > 0)
      pieces.push({ startsAt: pieceStart, endsAt: new Date(pieceStart.getTime() + usedMs) });
    leftMs -= Math.max(0, usedMs);
    if (leftMs <= 0) return { value: pieces, problems: unusualStart(input) };
    day = workdayOnOrAfter(addDays(day, 1), pattern);
    if (day !== null) pieceStart = fromLocal(day, pattern.dayStart, zone);
  }
  return { value: null, problems: [noWorkingHours] };
}

const noWorkingHours: Problem = {
  code: 'no-working-hours',
  message: 'No day is worked in this pattern. Check the hours, the weekdays and the closed days.',
  about: [],
  severity: 'error',
};

function whatForbids({ workMinutes, startsAt, pattern, zone }: PiecesInput): Problem | null {
  if (!(workMinutes > 0 && workMinutes <= MOST_WORK_MINUTES)) {
    return {
      code: 'work-minutes-out-of-range',
      message: 'The visit needs a length: more than nothing and less than a working year.',
      about: [],
      severity: 'error',
    };
  }
  if (pattern.dayStart >= pattern.dayEnd) return noWorkingHours;
  if (toLocal(startsAt, zone).time >= pattern.dayEnd) {
    return {
      code: 'starts-after-day-end',
      message: `The crew's day ends at ${pattern.dayEnd}. Start earlier, or on the next working day.`,
      about: [],
      severity: 'error',
    };
  }
  return null;
}

function unusualStart({ startsAt, pattern, zone }: PiecesInput): Problem[] {
  const { date, time } = toLocal(startsAt, zone);
  const problems: Problem[] = [];
  if (time < pattern.dayStart) {
    problems.push({
      code: 'starts-before-day-start',
      message: `The crew's day starts at ${pattern.dayStart}; this starts at ${time}.`,
      about: [],
      severity: 'warning',
    });
  }
  if (!isWorkday(date, pattern)) {
    problems.push({
      code: 'starts-on-day-off',
      message: `${date} is not a working day of this crew.`,
      about: [],
      severity: 'warning',
    });
  }
  return problems;
}
