/**
 * Instants and civil times, one into the other. An instant is a `Date`, in and out; on the wire it is an
 * ISO text in UTC. A civil date is "2026-05-12" and a civil time "07:30", everywhere.
 */
import {
  dayStartUtcMs,
  isLocalTime,
  type LocalDate,
  type LocalTime,
  type Weekday,
  weekdayOf,
} from './civil';
import { offsetMinutesAt, type Zone } from './zones';

export type LocalMoment = {
  date: LocalDate;
  time: LocalTime;
  weekday: Weekday;
  /** Minutes ahead of UTC at that instant: -360 in Denver in summer. */
  offsetMinutes: number;
};

const MINUTE_MS = 60_000;
const DAY_MS = 86_400_000;

/**
 * What calendar and clock show in a zone at an instant, seconds cut off.
 * Example: 2026-12-15T12:00Z in America/Vancouver is 2026-12-15 05:00, a Tuesday (tz database 2026b).
 * Throws on an unknown zone or an invalid date.
 */
export function toLocal(instant: Date, zone: Zone): LocalMoment {
  const instantMs = instant.getTime();
  if (Number.isNaN(instantMs)) throw new RangeError('Not an instant: invalid Date');
  const offsetMinutes = offsetMinutesAt(instantMs, zone);
  const shown = new Date(instantMs + offsetMinutes * MINUTE_MS).toISOString();
  const date = shown.slice(0, 10);
  return { date, time: shown.slice(11, 16), weekday: weekdayOf(date), offsetMinutes };
}

/**
 * The instant of a civil date and time. A time that comes twice (clocks go back) is its first occurrence;
 * one that is skipped (clocks go forward) is read with the offset before the gap, so that it falls as
 * much after the gap as it was written into it: RFC 5545, 3.3.5.
 * Example: 2026-03-08 02:30 in New York is 07:30Z, shown as 03:30; 2026-11-01 01:30 is 05:30Z.
 * Throws on a date, time or zone that does not exist: they are checked where they are typed.
 */
export function fromLocal(date: LocalDate, time: LocalTime, zone: Zone): Date {
  if (!isLocalTime(time)) throw new RangeError(`Not a time of day: ${JSON.stringify(time)}`);
  const minutes = Number(time.slice(0, 2)) * 60 + Number(time.slice(3));
  const wallMs = dayStartUtcMs(date) + minutes * MINUTE_MS;
  const before = offsetMinutesAt(wallMs - DAY_MS, zone);
  const after = offsetMinutesAt(wallMs + DAY_MS, zone);
  const firstMs = wallMs - before * MINUTE_MS;
  if (before === after || offsetMinutesAt(firstMs, zone) === before) return new Date(firstMs);
  const secondMs = wallMs - after * MINUTE_MS;
  return new Date(offsetMinutesAt(secondMs, zone) === after ? secondMs : firstMs);
}

/** The civil date at an instant. Example: 2026-05-13T03:00Z in America/Denver is "2026-05-12". */
export function localDate(instant: Date, zone: Zone): LocalDate {
  return toLocal(instant, zone).date;
}

/**
 * The first instant of a civil day: midnight, or the end of the gap where midnight is skipped.
 * Example: 2024-09-08 in America/Santiago begins at 04:00Z, which clocks there show as 01:00.
 */
export function startOfLocalDay(date: LocalDate, zone: Zone): Date {
  return fromLocal(date, '00:00', zone);
}
