import { formatDayShort } from '@/lib/time/format-instant';
import type { PersonContext } from '@/server/base/context';
import type { BookOnFile } from '@/server/walls/read-wall-book';

/** Who read what a sheet stands on, when and with what: "Ines Brand; Tue, Dec 1; Tape, class II". */
export function measuredWords(
  ctx: PersonContext,
  { wallBook, takenBy }: BookOnFile,
  readingIds: readonly string[],
): string {
  const stands = new Set(readingIds);
  const readings = wallBook.readings.filter(({ id }) => stands.has(id));
  const tools = new Map(wallBook.tools.map(({ id, name }) => [id, name]));
  return [
    distinct(readings.map(({ id }) => takenBy.get(id))).join(', '),
    daysWords(
      ctx,
      readings.map(({ takenAt }) => takenAt),
    ),
    distinct(readings.map(({ toolId }) => tools.get(toolId))).join(', '),
  ]
    .filter(Boolean)
    .join('; ');
}

function daysWords(ctx: PersonContext, instants: readonly string[]): string {
  const locale = { language: 'en', region: ctx.shop.region } as const;
  const inOrder = [...instants].sort();
  const [first, last] = [inOrder[0], inOrder.at(-1)].map((instant) =>
    instant ? formatDayShort(new Date(instant), ctx.shop.zone, locale) : '',
  );
  return first === last ? (first ?? '') : `${first} to ${last}`;
}

function distinct(words: readonly (string | undefined)[]): string[] {
  return [...new Set(words.filter((word) => word !== undefined))];
}
