'use client';

import { useSyncExternalStore } from 'react';

/** Which of the office's two lists lies over the page: a key or any button may ask for one. */
export type OfficeList = 'commands' | 'keys';

let open: OfficeList | null = null;
const listeners = new Set<() => void>();

export function openList(list: OfficeList | null): void {
  open = list;
  for (const listener of listeners) listener();
}

export function useOpenList(): OfficeList | null {
  return useSyncExternalStore(
    subscribe,
    () => open,
    () => null,
  );
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
