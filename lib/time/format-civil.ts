/** Civil dates and times in words, with plain spaces only: a no-break space would turn an SMS into UCS-2. */
import { type LocalDate, type LocalTime, weekdayOf } from './civil';
import { clockOf, monthWords, type TextLocale, weekdayWords } from './text-locale';

/**
 * A day in full, without its year.
 * Example: "2026-05-12" is "Tuesday, May 12" (US), "Tuesday 12 May" (UK), "martes 12 de mayo".
 */
export function formatLocalDay(date: LocalDate, locale: TextLocale): string {
  return dayText(date, locale, 'full');
}

/**
 * A day with names cut to three letters, for tables and SMS.
 * Example: "2026-05-12" is "Tue, May 12" (US), "Tue 12 May" (UK), "mar 12 may".
 */
export function formatLocalDayShort(date: LocalDate, locale: TextLocale): string {
  return dayText(date, locale, 'short');
}

/** A day with its year, for papers. Example: "Tuesday, May 12, 2026" (US), "martes 12 de mayo de 2026". */
export function formatLocalDayWithYear(date: LocalDate, locale: TextLocale): string {
  const year = date.slice(0, 4);
  const between = locale.language === 'es' ? ' de ' : locale.region === 'US' ? ', ' : ' ';
  return `${formatLocalDay(date, locale)}${between}${year}`;
}

/**
 * A time of day. Example: "07:30" is "7:30 AM" (US), "7:30 am" (Australia), "07:30" (UK, Europe),
 * "7:30 a.m." in Spanish in the US.
 */
export function formatLocalTime(time: LocalTime, locale: TextLocale): string {
  if (clockOf[locale.region] === '24h') return time;
  return `${clockDigits(time)} ${halfOfDay(time, locale)}`;
}

/**
 * An arrival window in words that stand after a verb ("we arrive …").
 * Example: 08:00–10:00 is "between 8:00 and 10:00 AM"; 11:00–13:00 is "between 11:00 AM and 1:00 PM";
 * in Spanish "entre las 8:00 y las 10:00 a.m.".
 */
export function formatLocalWindow(from: LocalTime, until: LocalTime, locale: TextLocale): string {
  const [first, last] = windowEnds(from, until, locale);
  if (locale.language === 'en') return `between ${first} and ${last}`;
  return `entre ${articleFor(from, locale)} ${first} y ${articleFor(until, locale)} ${last}`;
}

/** A window for tables, with a plain hyphen. Example: "8:00-10:00 AM" (US), "08:00-10:00" (UK). */
export function formatLocalWindowShort(
  from: LocalTime,
  until: LocalTime,
  locale: TextLocale,
): string {
  return windowEnds(from, until, locale).join('-');
}

/** "at 8:00 AM", "a las 8:00 a.m.", "a la 1:00 p.m.". */
export function formatAtLocalTime(time: LocalTime, locale: TextLocale): string {
  const text = formatLocalTime(time, locale);
  return locale.language === 'en' ? `at ${text}` : `a ${articleFor(time, locale)} ${text}`;
}

function dayText(
  date: LocalDate,
  { language, region }: TextLocale,
  form: 'full' | 'short',
): string {
  const letters = form === 'short' ? 3 : undefined;
  const weekday = weekdayWords[language][weekdayOf(date) - 1]?.slice(0, letters);
  const month = monthWords[language][Number(date.slice(5, 7)) - 1]?.slice(0, letters);
  const day = Number(date.slice(8));
  if (language === 'es') return `${weekday} ${day} ${form === 'full' ? 'de ' : ''}${month}`;
  return region === 'US' ? `${weekday}, ${month} ${day}` : `${weekday} ${day} ${month}`;
}

/** The half of the day is said once where both ends are in it. */
function windowEnds(from: LocalTime, until: LocalTime, locale: TextLocale): [string, string] {
  const last = formatLocalTime(until, locale);
  const saysHalf = clockOf[locale.region] === '12h';
  const isSameHalf = halfOfDay(from, locale) === halfOfDay(until, locale) && from < until;
  return [saysHalf && isSameHalf ? clockDigits(from) : formatLocalTime(from, locale), last];
}

function clockDigits(time: LocalTime): string {
  return `${Number(time.slice(0, 2)) % 12 || 12}:${time.slice(3)}`;
}

function halfOfDay(time: LocalTime, { language, region }: TextLocale): string {
  const isMorning = time < '12:00';
  if (language === 'es') return isMorning ? 'a.m.' : 'p.m.';
  if (region === 'US') return isMorning ? 'AM' : 'PM';
  return isMorning ? 'am' : 'pm';
}

/** Spanish: "la" for one o'clock and its minutes, "las" for all others. */
function articleFor(time: LocalTime, { region }: TextLocale): string {
  const hour = Number(time.slice(0, 2));
  const shown = clockOf[region] === '12h' ? hour % 12 : hour;
  return shown === 1 ? 'la' : 'las';
}
