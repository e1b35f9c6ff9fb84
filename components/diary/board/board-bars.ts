import type { VisitView } from '@/lib/contracts/visits';
import type { LocalDate } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';
import type { BoardDay } from './board-days';

/** A visit as one bar on its crew's row, from its first day's column to its last. */
export type BoardBar = {
  visit: VisitView;
  firstColumn: number;
  lastColumn: number;
  /** 0 is the upper one. */
  lane: number;
  /** It began before, or goes on after, what is shown. */
  isCutBefore: boolean;
  isCutAfter: boolean;
  /** Columns between its ends on which nobody works on it: a closed day, a day off. */
  restColumns: number[];
};

/** The bars of one crew, each in the uppermost lane that is free; the order is that of time. */
export function boardBars(
  visits: readonly VisitView[],
  days: readonly BoardDay[],
  zone: Zone,
): BoardBar[] {
  const columnOf = new Map(days.map(({ date }, column) => [date, column]));
  const laneEnds: number[] = [];
  return [...visits]
    .sort((a, b) => a.startsAt.localeCompare(b.startsAt) || a.id.localeCompare(b.id))
    .flatMap((visit) => {
      const dates = pieceDates(visit, zone);
      const columns = dates.flatMap((date) => columnOf.get(date) ?? []);
      const firstColumn = columns[0];
      const lastColumn = columns.at(-1);
      if (firstColumn === undefined || lastColumn === undefined) return [];
      const free = laneEnds.findIndex((end) => end < firstColumn);
      const lane = free === -1 ? laneEnds.length : free;
      laneEnds[lane] = lastColumn;
      const worked = new Set(columns);
      const firstDay = days[0]?.date ?? '';
      const lastDay = days.at(-1)?.date ?? '';
      return [
        {
          visit,
          firstColumn,
          lastColumn,
          lane,
          isCutBefore: (dates[0] ?? '') < firstDay,
          isCutAfter: (dates.at(-1) ?? '') > lastDay,
          restColumns: between(firstColumn, lastColumn).filter((column) => !worked.has(column)),
        },
      ];
    });
}

/** The days on which a visit is worked on, in the shop's zone. */
export function pieceDates(visit: VisitView, zone: Zone): LocalDate[] {
  return visit.pieces.map(({ startsAt }) => localDate(new Date(startsAt), zone));
}

const between = (first: number, last: number): number[] =>
  Array.from({ length: last - first + 1 }, (_, index) => first + index);
