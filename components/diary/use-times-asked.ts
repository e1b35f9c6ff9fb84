'use client';

import { useSearchParams } from 'next/navigation';
import { useEffect, useRef } from 'react';
import type { WaitingItem } from '@/lib/contracts/visits';

/** The page of a job may ask by the address for its times; they open once, when the waiting list is here. */
export function useTimesAsked(
  waiting: readonly WaitingItem[] | undefined,
  open: (item: WaitingItem) => void,
): void {
  const asked = useRef(useSearchParams().get('times'));
  useEffect(() => {
    const item = waiting?.find(({ jobId }) => jobId === asked.current);
    if (!item) return;
    asked.current = null;
    open(item);
  }, [waiting, open]);
}
