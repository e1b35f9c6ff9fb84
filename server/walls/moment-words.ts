import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';

/** An instant as the shop's clock shows it: "Tue, Dec 1, 2:05 PM". */
export function momentWords(ctx: Context, instant: Date): string {
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return `${formatDayShort(instant, zone, locale)}, ${formatTime(instant, zone, locale)}`;
}
