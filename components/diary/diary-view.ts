'use client';

import { useCallback, useEffect, useState } from 'react';

export const diaryViews = ['crews', 'month', 'week', 'day', 'list'] as const;
export type DiaryView = (typeof diaryViews)[number];
export type ShownView = {
  view: DiaryView;
  weeks: 1 | 2 | 3 | 4;
  /** The waiting list is folded away, for the width. */
  isListFolded: boolean;
};

const storageKey = 'setwell-diary-view';
const opened: ShownView = { view: 'week', weeks: 1, isListFolded: false };

/**
 * How the diary was left on this device. It always opens on today, and on a phone on the day: there is no
 * room for more.
 */
export function useDiaryView(): [ShownView, (change: Partial<ShownView>) => void] {
  const [shown, setShown] = useState<ShownView>(opened);

  useEffect(() => {
    if (window.innerWidth < 768) return setShown({ ...opened, view: 'day' });
    const kept = readView(localStorage.getItem(storageKey));
    if (kept) setShown(kept);
  }, []);

  const show = useCallback((change: Partial<ShownView>) => {
    setShown((now) => {
      const next = { ...now, ...change };
      localStorage.setItem(storageKey, viewText(next));
      return next;
    });
  }, []);
  return [shown, show];
}

const viewText = ({ view, weeks, isListFolded }: ShownView): string =>
  `${view} ${weeks}${isListFolded ? ' folded' : ''}`;

function readView(text: string | null): ShownView | null {
  const [word, number, folded] = (text ?? '').split(' ');
  const view = diaryViews.find((known) => known === word);
  const weeks = ([1, 2, 3, 4] as const).find((known) => known === Number(number));
  return view && weeks ? { view, weeks, isListFolded: folded === 'folded' } : null;
}
