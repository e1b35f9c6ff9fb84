'use client';

import type { KeyboardEvent } from 'react';
import { flushSync } from 'react-dom';
import { areSingleKeysOn } from '@/components/shell/key-listener';
import { usePageKeys } from '@/components/shell/page-keys';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import type { WorkingPattern } from '@/lib/time/workdays';
import type { ShownView } from './diary-view';
import { canChange, type Place } from './place';
import type { DiaryRange } from './use-diary-range';
import { visitBeside, visitKeyWords, visitStep } from './visit-keys';

type DiaryKeys = {
  today: string;
  range: DiaryRange;
  show: (change: Partial<ShownView>) => void;
  isListFolded: boolean;
  toggleOnlyOpen: () => void;
  shop: { pattern: WorkingPattern; crews: readonly CrewView[] };
  visitOf: (id: string) => VisitView | undefined;
  /** Null where the person may not move visits. */
  nudge: ((visit: VisitView, change: (place: Place) => Place) => void) | null;
  anotherTime: (visit: VisitView) => void;
  sayYes: (visit: VisitView) => Promise<void>;
  openWaiting: (index: number) => void;
};

/** The keys of the diary; gives what the days hear when a visit within them has the focus. */
export function useDiaryKeys(diary: DiaryKeys) {
  const { range, show } = diary;
  usePageKeys('Diary', [
    { keys: 'ArrowLeft', words: 'Earlier', run: () => range.step(-1) },
    { keys: 'ArrowRight', words: 'Later', run: () => range.step(1) },
    { keys: 't', words: 'Today', run: () => range.goTo(diary.today) },
    { keys: 'c', words: 'Crews by day', run: () => show({ view: 'crews' }) },
    { keys: 'm', words: 'Month', run: () => show({ view: 'month' }) },
    { keys: 'w', words: 'Week', run: () => show({ view: 'week' }) },
    { keys: 'd', words: 'Day', run: () => show({ view: 'day' }) },
    {
      keys: 'f',
      words: 'Find who waits or is booked; Enter looks for times, or opens the visit',
      run: () => {
        flushSync(() => show({ isListFolded: false }));
        focusSearch();
      },
    },
    { keys: 'l', words: 'List, day by day', run: () => show({ view: 'list' }) },
    { keys: 'n', words: 'Only visits with no answer yet, or all', run: diary.toggleOnlyOpen },
    {
      keys: 'r',
      words: 'More room: fold the waiting list away, or out again',
      run: () => show({ isListFolded: !diary.isListFolded }),
    },
    { keys: 'v', words: 'To the visits: arrows go from one to the next', run: focusFirstVisit },
    ...visitKeyWords.map(({ keys, words }) => ({ keys, words, run: focusFirstVisit })),
    ...[1, 2, 3, 4, 5, 6, 7, 8, 9].map((digit) => ({
      keys: String(digit),
      words: `Times that work for number ${digit} of the waiting list`,
      run: () => diary.openWaiting(digit - 1),
    })),
  ]);

  return (event: KeyboardEvent<HTMLElement>) => {
    const element = (event.target as HTMLElement).closest<HTMLElement>('[data-visit-id]');
    if (!element || event.ctrlKey || event.metaKey || event.altKey || !areSingleKeysOn()) return;
    const beside = event.shiftKey ? null : visitBeside(element, event.key, event.currentTarget);
    if (beside) {
      event.preventDefault();
      beside.focus();
      return;
    }
    const visit = diary.visitOf(element.dataset.visitId ?? '');
    if (!visit || !diary.nudge || !canChange(visit)) return;
    if (event.key.toLowerCase() === 'o') {
      event.preventDefault();
      diary.anotherTime(visit);
      return;
    }
    if (event.key.toLowerCase() === 'y' && visit.status === 'booked') {
      event.preventDefault();
      void diary.sayYes(visit);
      return;
    }
    const step = visitStep(event, diary.shop);
    if (!step) return;
    event.preventDefault();
    diary.nudge(visit, (place) => step(visit, place));
    keepFocusOn(visit.id);
  };
}

function focusSearch() {
  document.getElementById('waiting-search')?.focus();
}

function focusFirstVisit() {
  document.querySelector<HTMLElement>('[data-visit-id]')?.focus();
}

/** A visit that is drawn anew in another row or column keeps the focus. */
function keepFocusOn(visitId: string) {
  requestAnimationFrame(() =>
    requestAnimationFrame(() =>
      document.querySelector<HTMLElement>(`[data-visit-id="${visitId}"]`)?.focus(),
    ),
  );
}
