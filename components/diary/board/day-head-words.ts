import { type LocalDate, weekdayOf } from '@/lib/time/civil';
import { weekdayWords } from '@/lib/time/text-locale';

/** Example: "2026-12-07" is "Mon". */
export const weekdayShort = (date: LocalDate): string =>
  (weekdayWords.en[weekdayOf(date) - 1] ?? '').slice(0, 3);

/** Example: "2026-12-07" is "Mon 7". */
export const dayHeadWords = (date: LocalDate): string =>
  `${weekdayShort(date)} ${Number(date.slice(8))}`;
