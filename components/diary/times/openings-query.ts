import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type { FindOpeningsInput, OpeningsView } from '@/lib/contracts/openings';
import { apiPaths } from '@/lib/paths';

export const openingsKey = ['openings'] as const;

type Asked = Pick<FindOpeningsInput, 'jobId' | 'kind' | 'wishes'> & Partial<FindOpeningsInput>;

/** The old list stands until the new one is there: a toggle must not make the panel jump. */
export const openingsQuery = (asked: Asked) =>
  queryOptions({
    queryKey: [...openingsKey, asked],
    queryFn: ({ signal }) =>
      askServer<OpeningsView>(apiPaths.openings(), { method: 'POST', body: asked, signal }),
    placeholderData: (previous: OpeningsView | undefined, query) =>
      (query?.queryKey[1] as Asked | undefined)?.jobId === asked.jobId
        ? keepPreviousData(previous)
        : undefined,
    staleTime: 5_000,
  });

export const useOpenings = (asked: Asked) => useQuery(openingsQuery(asked));
