import { addDays, type LocalDate } from '@/lib/time/civil';
import { monthWords } from '@/lib/time/text-locale';

/** Example: "Week of 7 December", "7 December – 1 January". */
export function boardTitle(from: LocalDate, weeks: number): string {
  if (weeks === 1) return `Week of ${dayOfMonth(from)}`;
  return `${dayOfMonth(from)} – ${dayOfMonth(addDays(from, weeks * 7 - 1))}`;
}

function dayOfMonth(date: LocalDate): string {
  return `${Number(date.slice(8))} ${monthWords.en[Number(date.slice(5, 7)) - 1]}`;
}
