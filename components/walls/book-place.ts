'use client';

import { useSyncExternalStore } from 'react';

/** Where in the wall book: kept in the address, so that the phone's own back key and a reload know it. */
export type BookPlace =
  | { at: 'next' }
  | { at: 'ask'; slot: string }
  | { at: 'wall'; wallId: string }
  | { at: 'reading'; readingId: string }
  | { at: 'correct'; readingId: string }
  | { at: 'again'; readingId: string }
  | { at: 'add'; kind: string; wallId: string }
  | { at: 'feature'; wallId: string; readingId?: string }
  | { at: 'list' }
  | { at: 'photo'; photoId: string; wallId: string }
  | { at: 'sketch'; wallId?: string }
  | { at: 'leave' };

export function placeHref(place: BookPlace): string {
  const [at, ...parts] = Object.values(place) as string[];
  return `#${[at, ...parts.map(encodeURIComponent)].join('/')}`;
}

/**
 * The place that an address names; anything unknown is the next question.
 * Example: `#wall/1b4e…` is the wall's list.
 */
export function placeOf(hash: string): BookPlace {
  const [at = '', first = '', second = ''] = hash.replace(/^#/, '').split('/').map(decode);
  if (at === 'ask' && first) return { at, slot: first };
  if (at === 'wall' && first) return { at, wallId: first };
  if (at === 'feature' && first)
    return { at, wallId: first, ...(second ? { readingId: second } : {}) };
  if ((at === 'reading' || at === 'correct' || at === 'again') && first) {
    return { at, readingId: first };
  }
  if (at === 'add' && first) return { at, kind: first, wallId: second };
  if (at === 'photo' && first) return { at, photoId: first, wallId: second };
  if (at === 'sketch') return { at, ...(first ? { wallId: first } : {}) };
  if (at === 'list' || at === 'leave') return { at };
  return { at: 'next' };
}

export function useBookPlace(): BookPlace {
  return placeOf(
    useSyncExternalStore(
      subscribe,
      () => window.location.hash,
      () => '',
    ),
  );
}

export function goTo(place: BookPlace): void {
  window.location.hash = placeHref(place);
}

function subscribe(listener: () => void): () => void {
  window.addEventListener('hashchange', listener);
  return () => window.removeEventListener('hashchange', listener);
}

function decode(part: string): string {
  try {
    return decodeURIComponent(part);
  } catch {
    return '';
  }
}
