/** One crew's days as numbers: hours, what is taken, and the gaps between. Instants are milliseconds. */
import type { WorkCalendar } from '@/lib/schedule/work-calendar';
import { addDays, type LocalDate, type LocalTime } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';
import type { BusyPiece } from './opening-input';

export type Stop = { startMs: number; endMs: number; piece: BusyPiece };

/** [startMs, endMs) in which nothing is taken, with the stops at its ends; null is the crew's base. */
export type Gap = { startMs: number; endMs: number; after: Stop | null; before: Stop | null };

export type CrewDay = {
  date: LocalDate;
  startMs: number;
  endMs: number;
  startMinuteOfDay: number;
  stops: Stop[];
  gaps: Gap[];
};

export type CrewDays = {
  /** Null on a day off. */
  on(date: LocalDate): CrewDay | null;
};

/** Local times of one horizon as instants; most crews share their hours, so each is worked out once. */
export function instantCache(zone: Zone): (date: LocalDate, time: LocalTime) => number {
  const known = new Map<string, number>();
  return (date, time) => {
    const key = date + time;
    const found = known.get(key);
    if (found !== undefined) return found;
    const instantMs = fromLocal(date, time, zone).getTime();
    known.set(key, instantMs);
    return instantMs;
  };
}

/** Days are made when asked for, each once. */
export function crewDays(crew: {
  calendar: WorkCalendar;
  busy: readonly BusyPiece[];
  zone: Zone;
  instantMs: (date: LocalDate, time: LocalTime) => number;
}): CrewDays {
  const { calendar, zone, instantMs } = crew;
  const stopsOf = byDate(crew.busy, zone);
  const made = new Map<LocalDate, CrewDay | null>();

  function make(date: LocalDate): CrewDay | null {
    const hours = calendar.hoursOn(date);
    if (!hours || hours.start >= hours.end) return null;
    const startMs = instantMs(date, hours.start);
    const endMs = instantMs(date, hours.end);
    const stops = (stopsOf.get(date) ?? []).toSorted((a, b) => a.startMs - b.startMs);
    const startMinuteOfDay = Number(hours.start.slice(0, 2)) * 60 + Number(hours.start.slice(3));
    return { date, startMs, endMs, startMinuteOfDay, stops, gaps: gapsOf(startMs, endMs, stops) };
  }

  return {
    on(date) {
      const known = made.get(date);
      if (known !== undefined) return known;
      const day = make(date);
      made.set(date, day);
      return day;
    },
  };
}

/** Where stops overlap, the one that ends last is the one driven from. */
function gapsOf(startMs: number, endMs: number, stops: Stop[]): Gap[] {
  const gaps: Gap[] = [];
  let cursorMs = startMs;
  let after: Stop | null = null;
  for (const stop of stops) {
    if (stop.startMs > cursorMs) {
      gaps.push({ startMs: cursorMs, endMs: Math.min(stop.startMs, endMs), after, before: stop });
    }
    if (stop.endMs > cursorMs || after === null) {
      cursorMs = Math.max(cursorMs, stop.endMs);
      after = stop;
    }
  }
  if (cursorMs < endMs) gaps.push({ startMs: cursorMs, endMs, after, before: null });
  return gaps.filter((gap) => gap.endMs > gap.startMs);
}

function byDate(busy: readonly BusyPiece[], zone: Zone): Map<LocalDate, Stop[]> {
  const days = new Map<LocalDate, Stop[]>();
  for (const piece of busy) {
    const stop = { startMs: piece.startsAt.getTime(), endMs: piece.endsAt.getTime(), piece };
    const first = localDate(piece.startsAt, zone);
    const last = localDate(new Date(stop.endMs - 1), zone);
    for (let day = first; day <= last; day = addDays(day, 1)) {
      const stops = days.get(day);
      if (stops) stops.push(stop);
      else days.set(day, [stop]);
    }
  }
  return days;
}
