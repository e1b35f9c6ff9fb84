import { queryOptions, useQuery } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type { WaitingItem } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';

export const waitingKey = ['waiting'] as const;

export const waitingQuery = queryOptions({
  queryKey: waitingKey,
  queryFn: ({ signal }) => askServer<WaitingItem[]>(apiPaths.waiting(), { signal }),
  refetchInterval: 30_000,
});

export const useWaiting = () => useQuery(waitingQuery);
