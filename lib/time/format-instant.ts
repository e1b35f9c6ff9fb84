/** Instants in words, as calendar and clock show them in a zone. */
import {
  formatAtLocalTime,
  formatLocalDay,
  formatLocalDayShort,
  formatLocalTime,
  formatLocalWindow,
  formatLocalWindowShort,
} from './format-civil';
import { toLocal } from './local-moment';
import type { TextLocale } from './text-locale';
import type { Zone } from './zones';

/** [from, until) */
export type InstantRange = { from: Date; until: Date };

/** Example: 2026-05-12T14:00Z in America/Denver is "Tuesday, May 12" (US). */
export function formatDay(instant: Date, zone: Zone, locale: TextLocale): string {
  return formatLocalDay(toLocal(instant, zone).date, locale);
}

/** Example: 2026-05-12T14:00Z in America/Denver is "Tue, May 12" (US). */
export function formatDayShort(instant: Date, zone: Zone, locale: TextLocale): string {
  return formatLocalDayShort(toLocal(instant, zone).date, locale);
}

/** Example: 2026-05-12T14:00Z in America/Denver is "8:00 AM" (US). */
export function formatTime(instant: Date, zone: Zone, locale: TextLocale): string {
  return formatLocalTime(toLocal(instant, zone).time, locale);
}

/** Example: 2026-05-12T14:00Z in America/Denver is "Tuesday, May 12 at 8:00 AM" (US). */
export function formatDayAndTime(instant: Date, zone: Zone, locale: TextLocale): string {
  const { date, time } = toLocal(instant, zone);
  return `${formatLocalDay(date, locale)} ${formatAtLocalTime(time, locale)}`;
}

/** Example: 14:00Z to 16:00Z in America/Denver in May is "between 8:00 and 10:00 AM" (US). */
export function formatWindow(range: InstantRange, zone: Zone, locale: TextLocale): string {
  return formatLocalWindow(timeOf(range.from, zone), timeOf(range.until, zone), locale);
}

/** Example: 14:00Z to 16:00Z in America/Denver in May is "8:00-10:00 AM" (US). */
export function formatWindowShort(range: InstantRange, zone: Zone, locale: TextLocale): string {
  return formatLocalWindowShort(timeOf(range.from, zone), timeOf(range.until, zone), locale);
}

function timeOf(instant: Date, zone: Zone): string {
  return toLocal(instant, zone).time;
}
