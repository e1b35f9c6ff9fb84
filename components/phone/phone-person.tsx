'use client';

import { createContext, type ReactNode, useContext, useEffect } from 'react';
import { startSending } from './send-queue';

const PersonContext = createContext<string | null>(null);

/** Who holds the phone. While a phone page is open, what that person kept is sent. */
export function PhonePerson({ personId, children }: { personId: string; children: ReactNode }) {
  useEffect(() => {
    // Asks the browser not to clear the store when space runs short; a refusal changes nothing else.
    navigator.storage?.persist?.().catch(() => false);
    return startSending(personId);
  }, [personId]);
  return <PersonContext value={personId}>{children}</PersonContext>;
}

export function usePersonId(): string {
  const personId = useContext(PersonContext);
  if (personId === null) throw new Error('usePersonId outside PhonePerson');
  return personId;
}
