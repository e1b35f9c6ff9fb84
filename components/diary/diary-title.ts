import { addDays, type LocalDate } from '@/lib/time/civil';
import { monthWords, type TextLocale } from '@/lib/time/text-locale';

/** Example: "Week of December 7" (US), "7 December – 1 January" (UK). */
export function boardTitle(from: LocalDate, weeks: number, locale: TextLocale): string {
  if (weeks === 1) return `Week of ${dayOfMonth(from, locale)}`;
  return `${dayOfMonth(from, locale)} – ${dayOfMonth(addDays(from, weeks * 7 - 1), locale)}`;
}

function dayOfMonth(date: LocalDate, { language, region }: TextLocale): string {
  const day = Number(date.slice(8));
  const month = monthWords[language][Number(date.slice(5, 7)) - 1];
  return region === 'US' ? `${month} ${day}` : `${day} ${month}`;
}
