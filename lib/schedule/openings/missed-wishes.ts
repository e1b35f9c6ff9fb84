import type { OpeningWishes } from '@/lib/contracts/openings';
import { weekdayOf } from '@/lib/time/civil';
import type { CrewDay } from './crew-days';
import type { MissedWish } from './opening-input';

const MINUTE_MS = 60_000;

/**
 * Which wishes a time misses. Weekday and arrival speak of the first day; "gone by" of each.
 * Example: a start at 08:00 with "not before 09:30" misses 'not-before'; with somebody away from 08:00 to 09:00
 * and a window of two hours it misses 'away'.
 */
export function missedWishes(
  pieces: readonly { startMs: number; endMs: number; day: CrewDay }[],
  asked: { wishes: OpeningWishes; windowMinutes: number },
): MissedWish[] {
  const { weekdays, notBefore, notAfter, doneBy, away } = asked.wishes;
  const first = pieces[0];
  if (!first) return [];
  const arrival = minuteOfDay(first.startMs, first.day);
  const arrivalEnd = arrival + asked.windowMinutes;
  const missed: MissedWish[] = [];
  if (weekdays.length > 0 && !weekdays.includes(weekdayOf(first.day.date))) missed.push('weekday');
  if (notBefore !== undefined && arrival < minutesOf(notBefore)) missed.push('not-before');
  if (notAfter !== undefined && arrival > minutesOf(notAfter)) missed.push('not-after');
  if (
    doneBy !== undefined &&
    pieces.some(({ endMs, day }) => minuteOfDay(endMs, day) > minutesOf(doneBy))
  ) {
    missed.push('done-by');
  }
  if (away.some(({ from, until }) => arrival < minutesOf(until) && minutesOf(from) < arrivalEnd)) {
    missed.push('away');
  }
  return missed;
}

/** By the clock, counted from the day's start: no clock changes while a crew works. */
function minuteOfDay(instantMs: number, day: CrewDay): number {
  return day.startMinuteOfDay + (instantMs - day.startMs) / MINUTE_MS;
}

function minutesOf(time: string): number {
  return Number(time.slice(0, 2)) * 60 + Number(time.slice(3));
}
