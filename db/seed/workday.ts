import { addDays } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import { isWorkday, workdayOnOrAfter } from '@/lib/time/workdays';
import type { SeedShop } from './seed-demo';

/** A local time on the n-th working day from today: 0 is today, or the next one worked. */
export function workday(
  shop: Pick<SeedShop, 'now' | 'zone' | 'rules'>,
  days: number,
  time: string,
): Date {
  let date = localDate(shop.now, shop.zone);
  const works = (day: string) => isWorkday(day, shop.rules.booking);
  while (!works(date)) date = addDays(date, 1);
  for (let left = Math.abs(days); left > 0; ) {
    date = addDays(date, Math.sign(days));
    if (works(date)) left -= 1;
  }
  return fromLocal(date, time, shop.zone);
}

/** The morning of the next working day after an instant. */
export function workdayAfter(
  { zone, rules }: Pick<SeedShop, 'zone' | 'rules'>,
  instant: Date,
): Date {
  const next = workdayOnOrAfter(addDays(localDate(instant, zone), 1), rules.booking);
  if (!next) throw new Error('the shop works on no day');
  return fromLocal(next, '08:05', zone);
}
