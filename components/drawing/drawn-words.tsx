import { Fragment } from 'react';

const fraction = /(\d+ )?(\d+)\/(\d+)/g;

/** Words of a drawing with their fractions set as fractions: "blank 2 1/2" has a true half. */
export function DrawnWords({ words }: { words: string }) {
  const parts = [];
  let done = 0;
  for (const found of words.matchAll(fraction)) {
    const [all, whole = '', numerator, denominator] = found;
    parts.push(
      <Fragment key={found.index}>
        {words.slice(done, found.index)}
        {whole.trim()}
        <tspan dx={whole ? '0.15em' : undefined} className="diagonal-fractions">
          {numerator}⁄{denominator}
        </tspan>
      </Fragment>,
    );
    done = found.index + all.length;
  }
  return (
    <>
      {parts}
      {words.slice(done)}
    </>
  );
}
