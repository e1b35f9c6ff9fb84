import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { JobRow } from '@/lib/contracts/jobs';
import { apiPaths } from '@/lib/paths';
import { askServer } from './ask-server';

/** Jobs by name, street, phone, number or title; asked from the second letter on. */
export function useJobSearch(search: string) {
  const typed = search.trim();
  return useQuery({
    queryKey: ['job-search', typed],
    queryFn: ({ signal }) => askServer<JobRow[]>(apiPaths.jobSearch(typed), { signal }),
    enabled: typed.length >= 2,
    placeholderData: keepPreviousData,
  });
}
