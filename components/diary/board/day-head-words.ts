import { type LocalDate, weekdayOf } from '@/lib/time/civil';
import { weekdayWords } from '@/lib/time/text-locale';

/** Example: "2026-12-07" is "Mon 7". */
export function dayHeadWords(date: LocalDate): string {
  return `${weekdayWords.en[weekdayOf(date) - 1]?.slice(0, 3)} ${Number(date.slice(8))}`;
}
