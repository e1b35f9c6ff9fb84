import type { OpeningWishes } from '@/lib/contracts/openings';
import type { CrewDay } from './crew-days';
import type { MissedWish } from './opening-input';

const MINUTE_MS = 60_000;
const wishOrder: readonly MissedWish[] = ['weekday', 'not-before', 'not-after', 'done-by', 'away'];

export type MissedWishes = {
  /** How many wishes a time misses. */
  count(first: CrewDay, startMs: number, pieces: readonly Placed[]): number;
  /** Which. */
  list(first: CrewDay, startMs: number, pieces: readonly Placed[]): MissedWish[];
};
/** A piece after the first, or the first itself: only its end matters here. */
type Placed = { endMs: number; day: CrewDay };

/**
 * Wishes made ready to be asked many times. Weekday and arrival speak of the first day; "gone by" of each.
 * Example: a start at 08:00 with "not before 09:30" misses 'not-before'; with somebody away from 08:00 to 09:00
 * and a window of two hours it misses 'away'.
 */
export function readyWishes(wishes: OpeningWishes, windowMinutes: number): MissedWishes {
  const weekdays = new Set(wishes.weekdays);
  const notBefore = minutesOf(wishes.notBefore) ?? Number.NEGATIVE_INFINITY;
  const notAfter = minutesOf(wishes.notAfter) ?? Number.POSITIVE_INFINITY;
  const doneBy = minutesOf(wishes.doneBy) ?? Number.POSITIVE_INFINITY;
  const away = wishes.away.map(({ from, until }) => ({
    from: minutesOf(from) ?? 0,
    until: minutesOf(until) ?? 0,
  }));

  function missed(first: CrewDay, startMs: number, pieces: readonly Placed[]): boolean[] {
    const arrival = minuteOfDay(startMs, first);
    return [
      weekdays.size > 0 && !weekdays.has(first.weekday),
      arrival < notBefore,
      arrival > notAfter,
      pieces.some(({ endMs, day }) => minuteOfDay(endMs, day) > doneBy),
      away.some(({ from, until }) => arrival < until && from < arrival + windowMinutes),
    ];
  }
  const hasWishes =
    weekdays.size + away.length > 0 || !!wishes.notBefore || !!wishes.notAfter || !!wishes.doneBy;
  return {
    count: (first, startMs, pieces) =>
      hasWishes ? missed(first, startMs, pieces).filter(Boolean).length : 0,
    list: (first, startMs, pieces) => {
      const flags = missed(first, startMs, pieces);
      return wishOrder.filter((_, index) => flags[index]);
    },
  };
}

/** By the clock, counted from the day's start: no clock changes while a crew works. */
function minuteOfDay(instantMs: number, day: CrewDay): number {
  return day.startMinuteOfDay + (instantMs - day.startMs) / MINUTE_MS;
}

function minutesOf(time: string | undefined): number | undefined {
  return time === undefined ? undefined : Number(time.slice(0, 2)) * 60 + Number(time.slice(3));
}
