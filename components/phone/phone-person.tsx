'use client';

import { createContext, type ReactNode, useContext, useEffect, useMemo } from 'react';
import type { Holder } from '@/lib/sync/holder';
import { startFetchingAhead } from './fetch-ahead';
import { keepHolder } from './kept-store';
import { startSending } from './send-queue';
import { startWorker } from './worker';

const HolderContext = createContext<Holder | null>(null);

/**
 * Who holds the phone. While a phone page is open, what that person kept is sent, and what the day needs
 * without a signal is fetched.
 */
export function PhonePerson({ holder, children }: { holder: Holder; children: ReactNode }) {
  // A page that is drawn again brings the same person as a new object.
  const words = JSON.stringify(holder);
  const held = useMemo(() => JSON.parse(words) as Holder, [words]);

  useEffect(() => {
    // Asks the browser not to clear the store when space runs short; a refusal changes nothing else.
    navigator.storage?.persist?.().catch(() => false);
    return startWorker();
  }, []);

  useEffect(() => {
    const stopSending = startSending(held.personId);
    let stopFetching = () => {};
    let isGone = false;
    keepHolder(held)
      .then(() => {
        if (!isGone) stopFetching = startFetchingAhead(held);
      })
      .catch((cause) => console.warn('setwell: nothing is kept for later', cause));
    return () => {
      isGone = true;
      stopSending();
      stopFetching();
    };
  }, [held]);

  return <HolderContext value={held}>{children}</HolderContext>;
}

export function useHolder(): Holder {
  const holder = useContext(HolderContext);
  if (holder === null) throw new Error('useHolder outside PhonePerson');
  return holder;
}

export function usePersonId(): string {
  return useHolder().personId;
}
