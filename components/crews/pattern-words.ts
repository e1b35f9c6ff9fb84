import type { CrewPattern, WorkedWeekday } from '@/lib/schedule/working-pattern';

export const dayNames = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'] as const;

/**
 * A pattern in one line. Example: "Mon–Fri 07:30–16:00", "Mon–Thu 07:00–15:30, Sat 08:00–12:00"; two weeks
 * that follow each other are joined by "then".
 */
export function patternWords({ weeks }: CrewPattern): string {
  return weeks.map((week) => weekWords(week) || 'off').join(', then ');
}

/** Days as people say them: "Mon–Thu and Sat". */
export function weekdayWords(weekdays: readonly number[]): string {
  return runsOf(
    [...weekdays].sort((a, b) => a - b),
    () => '',
  )
    .map(({ first, last }) => runWords(first, last))
    .join(', ');
}

function weekWords(week: readonly WorkedWeekday[]): string {
  const hours = new Map(week.map(({ weekday, start, end }) => [weekday, `${start}–${end}`]));
  const days = [...hours.keys()].sort((a, b) => a - b);
  return runsOf(days, (day) => hours.get(day) ?? '')
    .map(({ first, last, value }) => `${runWords(first, last)} ${value}`)
    .join(', ');
}

type DayRun = { first: number; last: number; value: string };

/** Neighbouring days of one value together. */
function runsOf(days: readonly number[], hoursOf: (day: number) => string): DayRun[] {
  const runs: DayRun[] = [];
  for (const day of days) {
    const value = hoursOf(day);
    const open = runs.at(-1);
    if (open && open.last === day - 1 && open.value === value) open.last = day;
    else runs.push({ first: day, last: day, value });
  }
  return runs;
}

function runWords(first: number, last: number): string {
  const name = (day: number) => dayNames[day - 1] ?? '';
  if (first === last) return name(first);
  return `${name(first)}${last === first + 1 ? ' and ' : '–'}${name(last)}`;
}
