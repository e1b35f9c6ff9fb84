import { Fragment, type ReactNode } from 'react';

const fraction = /(\d+ )?(\d+)\/(\d+)/g;

export type Fraction = { all: string; whole: string; numerator: string; denominator: string };

/** Words in which each fraction is drawn by `draw`, the rest as it stands: "blank 2 1/2" holds one. */
export function withFractions(words: string, draw: (found: Fraction) => ReactNode): ReactNode {
  const parts: ReactNode[] = [];
  let done = 0;
  for (const found of words.matchAll(fraction)) {
    const [all, whole = '', numerator = '', denominator = ''] = found;
    parts.push(
      <Fragment key={found.index}>
        {words.slice(done, found.index)}
        {draw({ all, whole: whole.trim(), numerator, denominator })}
      </Fragment>,
    );
    done = found.index + all.length;
  }
  return [...parts, words.slice(done)];
}
