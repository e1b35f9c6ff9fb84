import { Fragment } from 'react';
import { FractionText } from '@/components/ui/fraction-text';

const lengthShape = /(\d+ )?(\d+)\/(\d+)(?=")/g;

/** A sentence with lengths in it, its fractions set as fractions; a screen reader hears the plain text. */
export function FractionWords({ children }: { children: string }) {
  const parts: {
    at: number;
    before: string;
    whole: number;
    numerator: number;
    denominator: number;
  }[] = [];
  let end = 0;
  for (const found of children.matchAll(lengthShape)) {
    const [text, whole, numerator, denominator] = found;
    parts.push({
      at: found.index,
      before: children.slice(end, found.index),
      whole: Number(whole ?? 0),
      numerator: Number(numerator),
      denominator: Number(denominator),
    });
    end = found.index + text.length;
  }
  if (parts.length === 0) return children;
  return (
    <>
      <span className="sr-only">{children}</span>
      <span aria-hidden="true">
        {parts.map(({ at, before, ...fraction }) => (
          <Fragment key={at}>
            {before}
            <FractionText negative={false} {...fraction} />
          </Fragment>
        ))}
        {children.slice(end)}
      </span>
    </>
  );
}
