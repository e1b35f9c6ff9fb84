import type { CrewPattern, WorkedWeekday } from '@/lib/schedule/working-pattern';
import { hoursText, readHours } from './hours-text';
import type { WeekTexts } from './pattern-fields';

/** A pattern as the form's texts, Monday first. */
export function weekTexts({ weeks }: CrewPattern): WeekTexts[] {
  return weeks.map((week) =>
    [1, 2, 3, 4, 5, 6, 7].map((day) => hoursText(week.find(({ weekday }) => weekday === day))),
  );
}

/** The texts as a pattern; null while one of them cannot be read. */
export function readPattern(texts: readonly WeekTexts[], firstWeekOf: string): CrewPattern | null {
  const weeks: WorkedWeekday[][] = [];
  for (const week of texts) {
    const read = week.map(readHours);
    if (read.some(({ error }) => error !== null)) return null;
    weeks.push(
      read.flatMap(({ hours }, index) => (hours ? [{ weekday: index + 1, ...hours }] : [])),
    );
  }
  return { weeks, firstWeekOf };
}
