'use client';

import { queryOptions, useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { askServer } from '@/components/shell/ask-server';
import type { WaitingItem } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';

export const waitingKey = ['waiting'] as const;

export const waitingQuery = queryOptions({
  queryKey: waitingKey,
  queryFn: ({ signal }) => askServer<WaitingItem[]>(apiPaths.waiting(), { signal }),
  refetchInterval: 30_000,
});

export type Waiting = ReturnType<typeof useWaiting>;

/** The waiting list, and the part of it that fits what is typed above it. */
export function useWaiting() {
  const { data, error, isPending } = useQuery(waitingQuery);
  const [typed, setTyped] = useState('');
  const shown = useMemo(() => (data ?? []).filter((item) => fits(item, typed)), [data, typed]);
  return { all: data, shown, typed, setTyped, error, isPending };
}

/** Every word typed must be somewhere: "ruiz meas" finds the measure for Tomas Ruiz. */
function fits(item: WaitingItem, typed: string): boolean {
  const { customerName, street, town, jobTitle, jobNumber, kind } = item;
  const text = plain(
    `${visitKindWords[kind]} ${customerName} ${street} ${town} ${jobTitle} ${jobNumber}`,
  );
  return plain(typed)
    .split(/\s+/)
    .every((word) => text.includes(word));
}

/** Small letters without accents: "marin" finds Marín. */
const plain = (text: string) => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();
