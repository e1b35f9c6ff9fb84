/** When a text may be sent: by day, at the site. */
import { addDays, type LocalTime } from '@/lib/time/civil';
import { fromLocal, toLocal } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';

export type QuietHoursInput = {
  dueAt: Date;
  /** Of the site. */
  zone: Zone;
  /** As in the shop's rules: quiet from 21:00 until 08:00. Both the same: never quiet. */
  quietFrom: LocalTime;
  quietUntil: LocalTime;
  /** Past this instant the text is of no use; null: it always is. */
  notAfter: Date | null;
};

/**
 * When a text that is due may go: at once outside the quiet hours, else when they end; null when that is
 * past `notAfter`, so that e-mail alone is left. Quiet from 21:00 means that 20:59 may and 21:00 may not;
 * quiet until 08:00 means that 08:00 may. Hours are civil: a clock change moves them with everybody's clock.
 * Example: due 22:30, quiet 21:00 to 08:00: next day 08:00; with `notAfter` 07:30 that day: null.
 * The hours are those of 47 CFR 64.1200(c)(1), kept for all texts.
 */
export function nextAllowedTime(input: QuietHoursInput): Date | null {
  const { dueAt, notAfter } = input;
  const allowedAt = isQuiet(input) ? endOfQuiet(input) : dueAt;
  return notAfter !== null && allowedAt > notAfter ? null : allowedAt;
}

function isQuiet({ dueAt, zone, quietFrom, quietUntil }: QuietHoursInput): boolean {
  const { time } = toLocal(dueAt, zone);
  if (quietFrom === quietUntil) return false;
  return quietFrom < quietUntil
    ? time >= quietFrom && time < quietUntil
    : time >= quietFrom || time < quietUntil;
}

function endOfQuiet({ dueAt, zone, quietUntil }: QuietHoursInput): Date {
  const { date, time } = toLocal(dueAt, zone);
  return fromLocal(time < quietUntil ? date : addDays(date, 1), quietUntil, zone);
}
