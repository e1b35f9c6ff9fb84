import type { BookingRules } from '@/lib/contracts/shop-rules';
import { type Holiday, publicHolidays } from '@/lib/schedule/holidays';
import { localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';

/** Years ahead for which the holidays are worked out: nobody books beyond. */
const yearsAhead = 2;

/** By place and year; a calendar costs some milliseconds to work out, and never changes. */
const known = new Map<string, Holiday[]>();

export function holidaysOf(place: { country: string; part: string }, year: number): Holiday[] {
  const key = `${place.country}-${place.part}-${year}`;
  const kept = known.get(key) ?? publicHolidays({ country: place.country, part: place.part }, year);
  known.set(key, kept);
  return kept;
}

/** The shop's booking rules, with the public holidays that it keeps among its closed days. */
export function bookingDays({ shop, now }: Pick<Context, 'shop' | 'now'>): BookingRules {
  const { booking } = shop.rules;
  // A shop of before there were holidays in the rules has none.
  const holidays = booking.holidays ?? null;
  if (!holidays) return booking;
  const thisYear = Number(localDate(now, shop.zone).slice(0, 4));
  const worked = new Set(holidays.worked);
  const kept = Array.from({ length: yearsAhead + 2 }, (_, index) => thisYear - 1 + index)
    .flatMap((year) => holidaysOf(holidays, year))
    .map(({ date }) => date)
    .filter((date) => !worked.has(date));
  return { ...booking, closedDays: [...new Set([...booking.closedDays, ...kept])].sort() };
}
