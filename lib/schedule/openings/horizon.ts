import { addDays, daysBetween, type LocalDate, type LocalTime } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';

/** Days by number from the first on, and local times as instants; each is worked out once for all crews. */
export type Horizon = {
  dateOf(day: number): LocalDate;
  /** The day in which an instant lies; below zero before the first. */
  dayOf(instantMs: number): number;
  instantMs(day: number, time: LocalTime): number;
};

export function makeHorizon(from: LocalDate, zone: Zone): Horizon {
  const dates: LocalDate[] = [from];
  const midnights: number[] = [];
  const known = new Map<LocalTime, number[]>();

  function dateOf(day: number): LocalDate {
    while (dates.length <= day) dates.push(addDays(dates.at(-1) ?? from, 1));
    return dates[day] ?? addDays(from, day);
  }
  function instantMs(day: number, time: LocalTime): number {
    const ofTime = known.get(time) ?? [];
    if (ofTime.length === 0) known.set(time, ofTime);
    const instant = ofTime[day] ?? fromLocal(dateOf(day), time, zone).getTime();
    ofTime[day] = instant;
    return instant;
  }
  function midnight(day: number): number {
    while (midnights.length <= day) midnights.push(instantMs(midnights.length, '00:00'));
    return midnights[day] ?? 0;
  }
  return {
    dateOf,
    instantMs,
    dayOf(instant) {
      const start = midnight(0);
      if (instant < start) return daysBetween(from, localDate(new Date(instant), zone));
      // A day has 23 to 25 hours: the guess is off by one at most for decades.
      let day = Math.floor((instant - start) / 86_400_000);
      while (midnight(day + 1) <= instant) day += 1;
      while (day > 0 && midnight(day) > instant) day -= 1;
      return day;
    },
  };
}
