import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type { ListVisitsInput, VisitView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';

export const visitsKey = ['visits'] as const;

/** The visits of a stretch of local days; kept while the next stretch is fetched, so that nothing flickers. */
export const visitsQuery = ({ from, to }: ListVisitsInput) =>
  queryOptions({
    queryKey: [...visitsKey, from, to],
    queryFn: ({ signal }) =>
      askServer<VisitView[]>(`${apiPaths.visits()}?from=${from}&to=${to}`, { signal }),
    placeholderData: keepPreviousData,
    refetchInterval: 20_000,
  });

export const useVisits = (range: ListVisitsInput) => useQuery(visitsQuery(range));
