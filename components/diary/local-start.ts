import { toLocal } from '@/lib/time/local-moment';

/** Day and time of an instant in the shop's zone, for the date and time fields. */
export function localStart(instant: string, zone: string): { date: string; time: string } {
  const { date, time } = toLocal(new Date(instant), zone);
  return { date, time };
}
