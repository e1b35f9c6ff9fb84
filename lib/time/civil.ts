/** Civil dates and times: what is written on a calendar or a clock, with no zone and no instant. */

/** "2026-05-12". Sorts as text. */
export type LocalDate = string & { readonly __kind?: 'local-date' };
/** "07:30", 24 hours. Sorts as text. */
export type LocalTime = string & { readonly __kind?: 'local-time' };
/** ISO weekday: 1 Monday … 7 Sunday. */
export type Weekday = 1 | 2 | 3 | 4 | 5 | 6 | 7;

const DAY_MS = 86_400_000;

/**
 * Whether a text is a date that exists, as "YYYY-MM-DD".
 * Example: "2028-02-29" is, "2026-02-29" and "2026-2-9" are not.
 */
export function isLocalDate(text: string): text is LocalDate {
  if (!/^\d{4}-\d\d-\d\d$/.test(text)) return false;
  const instant = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(instant.getTime()) && instant.toISOString().startsWith(text);
}

/** Whether a text is a time of day, "00:00" to "23:59". Example: "24:00" is not. */
export function isLocalTime(text: string): text is LocalTime {
  return /^([01]\d|2[0-3]):[0-5]\d$/.test(text);
}

/**
 * The date some days later, or earlier when negative.
 * Example: `addDays('2026-02-27', 3)` is "2026-03-02". Throws on a date that does not exist.
 */
export function addDays(date: LocalDate, days: number): LocalDate {
  return new Date(dayStartUtcMs(date) + days * DAY_MS).toISOString().slice(0, 10);
}

/** Days from one date to another. Example: from "2026-05-12" to "2026-05-19" is 7. */
export function daysBetween(from: LocalDate, to: LocalDate): number {
  return (dayStartUtcMs(to) - dayStartUtcMs(from)) / DAY_MS;
}

/** The ISO weekday (ISO 8601). Example: "2026-05-12" is 2, a Tuesday. */
export function weekdayOf(date: LocalDate): Weekday {
  return (((new Date(dayStartUtcMs(date)).getUTCDay() + 6) % 7) + 1) as Weekday;
}

/** Civil midnight as if it were in UTC: for arithmetic on civil dates only. */
export function dayStartUtcMs(date: LocalDate): number {
  if (!isLocalDate(date)) throw new RangeError(`Not a civil date: ${JSON.stringify(date)}`);
  return Date.parse(`${date}T00:00:00Z`);
}
