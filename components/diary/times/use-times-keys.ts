'use client';

import { usePageKeys } from '@/components/shell/page-keys';

type TimesKeys = {
  count: number;
  chosen: number;
  choose: (index: number) => void;
  book: () => void;
  hold: () => void;
  byHand: () => void;
  close: () => void;
  halfDay: (half: 'morning' | 'afternoon') => void;
  /** Null where nothing is booked yet that another time could be sooner than. */
  sooner: (() => void) | null;
};

/** The panel's keys; while it is open they stand before those of the diary. */
export function useTimesKeys({
  count,
  chosen,
  choose,
  book,
  hold,
  byHand,
  close,
  halfDay,
  sooner,
}: TimesKeys): void {
  const last = Math.max(0, count - 1);
  usePageKeys('Times that work', [
    ...[1, 2, 3, 4, 5, 6, 7, 8, 9].map((digit) => ({
      keys: String(digit),
      words: `Look at time ${digit}`,
      run: () => {
        if (digit <= count) choose(digit - 1);
      },
    })),
    { keys: 'ArrowDown', words: 'The next time', run: () => choose(Math.min(last, chosen + 1)) },
    { keys: 'ArrowUp', words: 'The time before', run: () => choose(Math.max(0, chosen - 1)) },
    { keys: 'Enter', words: 'Book the time that is looked at', run: () => pressOr(book) },
    { keys: 'a', words: 'Mornings', run: () => halfDay('morning') },
    { keys: 'p', words: 'Afternoons', run: () => halfDay('afternoon') },
    ...(sooner ? [{ keys: 's', words: 'Sooner than it is booked', run: sooner }] : []),
    { keys: 'h', words: 'Keep it a quarter of an hour for the customer', run: hold },
    { keys: 'b', words: 'Book by hand, at any time', run: byHand },
    { keys: 'Escape', words: 'Close', run: close },
  ]);
}

/** Enter on a button presses that button; on an opening, and anywhere else, it books. */
function pressOr(book: () => void) {
  const focused = document.activeElement;
  const isOther = focused instanceof HTMLElement && focused.matches('button, a, summary');
  if (isOther && !focused.closest('[data-openings]')) focused.click();
  else book();
}
