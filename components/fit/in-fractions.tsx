import { Fragment } from 'react';

const fraction = /(\d+ )?(\d+)\/(\d+)/g;

/** A sentence with its fractions set as fractions; a screen reader hears it as it is written. */
export function InFractions({ words }: { words: string }) {
  const parts = [];
  let done = 0;
  for (const found of words.matchAll(fraction)) {
    const [all, whole = '', numerator, denominator] = found;
    parts.push(
      <Fragment key={found.index}>
        {words.slice(done, found.index)}
        <span className="sr-only">{all}</span>
        <span aria-hidden="true" className="whitespace-nowrap">
          {whole.trim()}
          <span className={`diagonal-fractions ${whole ? 'ml-[0.18em]' : ''}`}>
            {numerator}⁄{denominator}
          </span>
        </span>
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
