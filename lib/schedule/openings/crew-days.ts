/** One crew's days as numbers: hours, what is taken, and the gaps between. Instants are milliseconds. */
import type { WorkCalendar } from '@/lib/schedule/work-calendar';
import { type Weekday, weekdayOf } from '@/lib/time/civil';
import type { Horizon } from './horizon';
import type { BusyPiece } from './opening-input';

export type Stop = { startMs: number; endMs: number; piece: BusyPiece };

/** [startMs, endMs) in which nothing is taken, with the stops at its ends; null is the crew's base. */
export type Gap = { startMs: number; endMs: number; after: Stop | null; before: Stop | null };

export type CrewDay = {
  /** Counted from the first of the horizon. */
  day: number;
  weekday: Weekday;
  startMs: number;
  endMs: number;
  startMinuteOfDay: number;
  gaps: Gap[];
};

export type CrewDays = {
  /** Null on a day off. */
  on(day: number): CrewDay | null;
};

/** Days are made when asked for, each once. */
export function crewDays(crew: {
  calendar: WorkCalendar;
  busy: readonly BusyPiece[];
  horizon: Horizon;
}): CrewDays {
  const { calendar, horizon } = crew;
  const stopsOf = byDay(crew.busy, horizon);
  const made: (CrewDay | null | undefined)[] = [];

  function make(day: number): CrewDay | null {
    const date = horizon.dateOf(day);
    const hours = calendar.hoursOn(date);
    if (!hours || hours.start >= hours.end) return null;
    const startMs = horizon.instantMs(day, hours.start);
    const endMs = horizon.instantMs(day, hours.end);
    const stops = (stopsOf.get(day) ?? []).sort((a, b) => a.startMs - b.startMs);
    const startMinuteOfDay = Number(hours.start.slice(0, 2)) * 60 + Number(hours.start.slice(3));
    const gaps = gapsOf(startMs, endMs, stops);
    return { day, weekday: weekdayOf(date), startMs, endMs, startMinuteOfDay, gaps };
  }

  return {
    on(day) {
      const known = made[day];
      if (known !== undefined) return known;
      const fresh = make(day);
      made[day] = fresh;
      return fresh;
    },
  };
}

/** Where stops overlap, the one that ends last is the one driven from. */
function gapsOf(startMs: number, endMs: number, stops: Stop[]): Gap[] {
  const gaps: Gap[] = [];
  let cursorMs = startMs;
  let after: Stop | null = null;
  for (const stop of stops) {
    const untilMs = Math.min(stop.startMs, endMs);
    if (untilMs > cursorMs) gaps.push({ startMs: cursorMs, endMs: untilMs, after, before: stop });
    if (stop.endMs > cursorMs || after === null) {
      cursorMs = Math.max(cursorMs, stop.endMs);
      after = stop;
    }
  }
  if (cursorMs < endMs) gaps.push({ startMs: cursorMs, endMs, after, before: null });
  return gaps;
}

function byDay(busy: readonly BusyPiece[], horizon: Horizon): Map<number, Stop[]> {
  const days = new Map<number, Stop[]>();
  for (const piece of busy) {
    const stop = { startMs: piece.startsAt.getTime(), endMs: piece.endsAt.getTime(), piece };
    const last = horizon.dayOf(stop.endMs - 1);
    for (let day = Math.max(0, horizon.dayOf(stop.startMs)); day <= last; day += 1) {
      const stops = days.get(day);
      if (stops) stops.push(stop);
      else days.set(day, [stop]);
    }
  }
  return days;
}
