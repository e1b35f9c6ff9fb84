'use client';

import { useSyncExternalStore } from 'react';
import { snagKinds } from '@/lib/contracts/snag-kinds';
import type { SnagKind } from '@/lib/contracts/snags';

/** Where in a stop: kept in the address, so that the phone's own back key and a reload know it. */
export type StopPlace =
  | { at: 'stop' }
  | { at: 'bring' | 'checks' | 'snags' | 'sign' }
  | { at: 'setting' | 'as-found'; roomId: string }
  | { at: 'new-snag'; kind: SnagKind }
  | { at: 'snag'; snagId: string }
  | { at: 'photo'; photoId: string; kind: SnagKind | ''; snagId: string };

export function stopHref(place: StopPlace): string {
  const [at, ...parts] = Object.values(place) as string[];
  return `#${[at, ...parts.map(encodeURIComponent)].join('/')}`;
}

/** The place that an address names; anything unknown is the stop itself. Example: `#snag/1b4e…`. */
export function stopPlaceOf(hash: string): StopPlace {
  const [at = '', first = '', second = '', third = ''] = hash
    .replace(/^#/, '')
    .split('/')
    .map(decoded);
  const kind = snagKinds.find((known) => known === (at === 'photo' ? second : first));
  if (at === 'bring' || at === 'checks' || at === 'snags' || at === 'sign') return { at };
  if ((at === 'setting' || at === 'as-found') && first) return { at, roomId: first };
  if (at === 'new-snag' && kind) return { at, kind };
  if (at === 'snag' && first) return { at, snagId: first };
  if (at === 'photo' && first) return { at, photoId: first, kind: kind ?? '', snagId: third };
  return { at: 'stop' };
}

export function useStopPlace(): StopPlace {
  return stopPlaceOf(
    useSyncExternalStore(
      subscribe,
      () => window.location.hash,
      () => '',
    ),
  );
}

export function goToStop(place: StopPlace): void {
  window.location.hash = stopHref(place);
}

function subscribe(listener: () => void): () => void {
  window.addEventListener('hashchange', listener);
  return () => window.removeEventListener('hashchange', listener);
}

function decoded(part: string): string {
  try {
    return decodeURIComponent(part);
  } catch {
    return '';
  }
}
