'use client';

import { useEffect, useState } from 'react';
import { dropDraft, keepDraft, readDraft } from '@/components/phone/draft-store';
import { useTyping } from '@/components/phone/use-typing';

/**
 * A form that is half filled in: each change is on the phone's disk, so that a photo taken meanwhile, a
 * reload or a dead battery loses none of it. Null until it was read.
 */
export function useKeptDraft<Draft extends object>(key: string, empty: Draft) {
  const [draft, setDraft] = useState<Draft | null>(null);
  const [isTouched, setIsTouched] = useState(false);
  useTyping(isTouched);
  // biome-ignore lint/correctness/useExhaustiveDependencies: what is empty is empty whichever object says it
  useEffect(() => {
    let isShown = true;
    readDraft<Draft>(key)
      .catch(() => null)
      .then((kept) => isShown && setDraft({ ...empty, ...kept }));
    return () => {
      isShown = false;
    };
  }, [key]);
  const change = (part: Partial<Draft>) => {
    const next = { ...empty, ...draft, ...part };
    setDraft(next);
    setIsTouched(true);
    keepDraft(key, next);
  };
  const drop = () => {
    dropDraft(key);
    setIsTouched(false);
  };
  return { draft, change, drop };
}
