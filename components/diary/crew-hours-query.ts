'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { askServer } from '@/components/shell/ask-server';
import type { CrewHours } from '@/lib/contracts/crew-hours';
import { apiPaths } from '@/lib/paths';
import type { WorkedHours } from '@/lib/schedule/working-pattern';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { isWorkday, type WorkingPattern } from '@/lib/time/workdays';

export type HoursOf = (crewId: string, date: LocalDate) => WorkedHours | null;
export type Elsewhere = CrewHours['elsewhere'][number];
export type ElsewhereOf = (crewId: string) => readonly Elsewhere[];

const nowhereElse: readonly Elsewhere[] = [];

/** When each crew works, by the shop's own hours until it is known, and when its people are out with others. */
export function useCrewHours({
  from,
  weeks,
  pattern,
}: {
  from: LocalDate;
  weeks: number;
  pattern: WorkingPattern;
}): { hoursOf: HoursOf; elsewhereOf: ElsewhereOf; workedDates: LocalDate[] } {
  const to = addDays(from, weeks * 7);
  const { data, isPlaceholderData } = useQuery({
    // Of what is asked for again when a visit or a crew has changed.
    queryKey: ['days', 'crew-hours', from, to],
    queryFn: ({ signal }) => askServer<CrewHours[]>(apiPaths.crewHours(from, to), { signal }),
    placeholderData: keepPreviousData,
    staleTime: 60_000,
  });
  return useMemo(() => {
    const known = new Map(
      data?.map(({ crewId, days }) => [
        crewId,
        new Map(days.map(({ date, ...hours }) => [date, hours])),
      ]),
    );
    const shopHours = { start: pattern.dayStart, end: pattern.dayEnd };
    return {
      hoursOf: (crewId, date) => {
        const crew = known.get(crewId);
        // Of the days before, while these are fetched, nothing follows for days that they do not name.
        if (crew && (crew.has(date) || !isPlaceholderData)) return crew.get(date) ?? null;
        return isWorkday(date, pattern) ? shopHours : null;
      },
      elsewhereOf: (crewId) =>
        data?.find((crew) => crew.crewId === crewId)?.elsewhere ?? nowhereElse,
      workedDates: [...new Set([...known.values()].flatMap((days) => [...days.keys()]))],
    };
  }, [data, isPlaceholderData, pattern]);
}
