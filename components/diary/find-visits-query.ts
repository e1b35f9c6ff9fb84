'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { visitsKey } from './visits-query';

const none: readonly VisitView[] = [];

/** Booked visits that fit what is typed, from the second letter on. */
export function useFoundVisits(typed: string): readonly VisitView[] {
  const search = typed.trim();
  const { data } = useQuery({
    queryKey: [...visitsKey, 'found', search],
    queryFn: ({ signal }) => askServer<VisitView[]>(apiPaths.findVisits(search), { signal }),
    enabled: search.length >= 2,
    placeholderData: keepPreviousData,
  });
  return search.length >= 2 ? (data ?? none) : none;
}
