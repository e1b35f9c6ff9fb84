import { useEffect, useMemo, useState } from 'react';
import type { CrewView } from '@/lib/contracts/visits';

const storageKey = 'setwell-diary-hidden-crews';

/** Which crews the diary shows; the hidden ones are remembered, so that a new crew is seen at once. */
export function useShownCrews(crews: readonly CrewView[]) {
  const [hidden, setHidden] = useState<ReadonlySet<string>>(new Set());

  useEffect(() => {
    const kept = localStorage.getItem(storageKey);
    if (kept) setHidden(new Set(kept.split(' ').filter(Boolean)));
  }, []);

  const shownCrewIds = useMemo(
    () => new Set(crews.map(({ id }) => id).filter((id) => !hidden.has(id))),
    [crews, hidden],
  );
  const toggle = (crewId: string) => {
    const next = new Set(hidden);
    if (!next.delete(crewId)) next.add(crewId);
    localStorage.setItem(storageKey, [...next].join(' '));
    setHidden(next);
  };
  return { shownCrewIds, toggle };
}
