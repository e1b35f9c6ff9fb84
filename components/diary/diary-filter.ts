'use client';

import { useCallback, useEffect, useMemo, useState } from 'react';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import { isOpen } from './place';

type Hidden = { crewIds: string[]; kinds: VisitKind[]; isFirm: boolean };
const nothingHidden: Hidden = { crewIds: [], kinds: [], isFirm: false };
const storageKey = 'setwell-diary-hidden';

export type DiaryFilter = ReturnType<typeof useDiaryFilter>;

/** What the diary shows. What is hidden is remembered, so that a new crew or kind is seen at once. */
export function useDiaryFilter(crews: readonly CrewView[]) {
  const [hidden, setHidden] = useState(nothingHidden);

  useEffect(() => {
    const kept = readHidden(localStorage.getItem(storageKey));
    if (kept) setHidden(kept);
  }, []);

  const change = useCallback((next: Hidden) => {
    localStorage.setItem(storageKey, JSON.stringify(next));
    setHidden(next);
  }, []);

  return useMemo(() => {
    const shownCrews = crews.filter(({ id }) => !hidden.crewIds.includes(id));
    const shownIds = new Set(shownCrews.map(({ id }) => id));
    return {
      shownCrews,
      onlyOpen: hidden.isFirm,
      isAnythingHidden:
        hidden.isFirm || hidden.kinds.length > 0 || shownCrews.length < crews.length,
      showsCrew: (crewId: string) => shownIds.has(crewId),
      showsKind: (kind: VisitKind) => !hidden.kinds.includes(kind),
      shows: (visit: VisitView) =>
        shownIds.has(visit.crewId) &&
        !hidden.kinds.includes(visit.kind) &&
        (!hidden.isFirm || isOpen(visit)),
      toggleCrew: (crewId: string) =>
        change({ ...hidden, crewIds: toggled(hidden.crewIds, crewId) }),
      toggleKind: (kind: VisitKind) => change({ ...hidden, kinds: toggled(hidden.kinds, kind) }),
      toggleOnlyOpen: () => change({ ...hidden, isFirm: !hidden.isFirm }),
      showAll: () => change(nothingHidden),
    };
  }, [crews, hidden, change]);
}

function toggled<Item>(items: Item[], item: Item): Item[] {
  return items.includes(item) ? items.filter((other) => other !== item) : [...items, item];
}

function readHidden(text: string | null): Hidden | null {
  try {
    const { crewIds, kinds, isFirm } = JSON.parse(text ?? 'null') as Hidden;
    return Array.isArray(crewIds) && Array.isArray(kinds) && typeof isFirm === 'boolean'
      ? { crewIds, kinds, isFirm }
      : null;
  } catch {
    return null;
  }
}
