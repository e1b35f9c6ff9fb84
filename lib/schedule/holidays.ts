/**
 * Public holidays by country and part of it. The only file that knows the library that carries them; it is
 * heavy and for the server, so the index of this folder leaves it out.
 */
import Holidays from 'date-holidays';
import type { LocalDate } from '@/lib/time/civil';

export type HolidayRegion = {
  /** ISO 3166-1, two letters. */
  country: string;
  /** State, province or land (ISO 3166-2 without the country), where it has days of its own. */
  part?: string;
};
export type Holiday = { date: LocalDate; name: string };

/**
 * The public holidays of a year, in order, each day once; none for an unknown country. A day moved off a weekend
 * is on both days, as the law has it: a shop that works on neither loses nothing.
 * Example: US 2026 has Friday 2026-07-03 and Saturday 2026-07-04.
 */
export function publicHolidays(region: HolidayRegion, year: number): Holiday[] {
  if (!new Holidays().getCountries()[region.country]) return [];
  const calendar = region.part
    ? new Holidays(region.country, region.part)
    : new Holidays(region.country);
  const days = new Map<LocalDate, string>();
  for (const { date, name, type } of calendar.getHolidays(year, 'en')) {
    const day = date.slice(0, 10);
    if (type === 'public' && !days.has(day)) days.set(day, name);
  }
  return [...days]
    .map(([date, name]) => ({ date, name }))
    .sort((a, b) => (a.date < b.date ? -1 : 1));
}

export type HolidayPlace = {
  country: string;
  name: string;
  parts: { part: string; name: string }[];
};

/**
 * The named countries of which holidays are known, with their parts, by English name.
 * Example: "GB" is United Kingdom with England, Scotland and others.
 */
export function holidayPlaces(countries: readonly string[]): HolidayPlace[] {
  const library = new Holidays();
  const names = library.getCountries('en');
  return countries
    .flatMap((country) => {
      const name = names[country];
      if (!name) return [];
      const parts = Object.entries(library.getStates(country, 'en') ?? {})
        .map(([part, partName]) => ({ part, name: partName }))
        .sort((a, b) => (a.name < b.name ? -1 : 1));
      return [{ country, name, parts }];
    })
    .sort((a, b) => (a.name < b.name ? -1 : 1));
}
