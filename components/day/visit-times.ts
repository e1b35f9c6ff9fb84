import type { TodayVisit } from '@/lib/contracts/visits';
import {
  formatLocalDayShort,
  formatLocalTime,
  formatLocalWindowShort,
} from '@/lib/time/format-civil';
import type { Crew } from './crew-language';

type Speech = Pick<Crew, 'language' | 'region'>;

/** The promised window in the crew's language: "8:00-10:00 AM", "8:00-10:00 a.m.". */
export function windowIn(visit: TodayVisit, crew: Speech, zone: string): string {
  const { windowWords, windowStartsAt, windowEndsAt } = visit;
  if (crew.language === 'en') return windowWords;
  return formatLocalWindowShort(timeAt(windowStartsAt, zone), timeAt(windowEndsAt, zone), crew);
}

/** "Tue, Dec 1", "mar 1 dic". */
export function dayIn(visit: TodayVisit, crew: Speech, zone: string): string {
  if (crew.language === 'en') return visit.dayWords;
  return formatLocalDayShort(dateAt(visit.windowStartsAt, zone), crew);
}

/** Who, and when: the office's own words in English. */
export function foundIn(
  { foundBy, foundAt, foundWords }: { foundBy: string; foundAt: string; foundWords: string },
  crew: Speech,
  zone: string,
): string {
  if (crew.language === 'en') return foundWords;
  const day = formatLocalDayShort(dateAt(foundAt, zone), crew);
  return `${foundBy}, ${day}, ${formatLocalTime(timeAt(foundAt, zone), crew)}`;
}

/** As British and Swedish clocks and calendars write it: "07:30", "2026-12-01". */
const timeAt = (instant: string, zone: string) =>
  new Date(instant).toLocaleTimeString('en-GB', {
    timeZone: zone,
    hour: '2-digit',
    minute: '2-digit',
  });
const dateAt = (instant: string, zone: string) =>
  new Date(instant).toLocaleDateString('sv-SE', { timeZone: zone });
