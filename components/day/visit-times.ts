import type { TodayVisit } from '@/lib/contracts/visits';
import type { CrewLanguage } from '@/lib/words/crew';

/** The promised window in the crew's language: the office's own words in English, the phone's in Spanish. */
export function windowIn(visit: TodayVisit, language: CrewLanguage, zone: string): string {
  if (language === 'en') return visit.windowWords;
  const time = (at: string) =>
    new Date(at).toLocaleTimeString('es-US', {
      timeZone: zone,
      hour: 'numeric',
      minute: '2-digit',
    });
  return `${time(visit.windowStartsAt)}–${time(visit.windowEndsAt)}`;
}

/** "Tue, Dec 1", "mar, 1 dic". */
export function dayIn(visit: TodayVisit, language: CrewLanguage, zone: string): string {
  if (language === 'en') return visit.dayWords;
  return spanishDay(new Date(visit.windowStartsAt), zone, 'short');
}

export function spanishDay(day: Date, zone: string, length: 'short' | 'long'): string {
  return day.toLocaleDateString('es-US', {
    timeZone: zone,
    weekday: length,
    day: 'numeric',
    month: length,
  });
}
