'use client';

import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { visitsKey } from './visits-query';

const none: readonly VisitView[] = [];

/** Booked visits that fit what is typed, from the second letter on; those of the letters before while it is asked. */
export function useFoundVisits(typed: string): {
  found: readonly VisitView[];
  isAsking: boolean;
} {
  const search = typed.trim();
  const { data, isPending, isPlaceholderData } = useQuery({
    queryKey: [...visitsKey, 'found', search],
    queryFn: ({ signal }) => askServer<VisitView[]>(apiPaths.findVisits(search), { signal }),
    enabled: search.length >= 2,
    placeholderData: keepPreviousData,
  });
  if (search.length < 2) return { found: none, isAsking: false };
  return { found: data ?? none, isAsking: isPending || isPlaceholderData };
}
