import type { FractionParts } from '@/lib/units/fraction-parts';

/** Inches as they are drawn: whole, then a true fraction. Hidden from screen readers; see LengthText. */
export function FractionText({ negative, whole, numerator, denominator }: FractionParts) {
  const showsWhole = whole !== 0 || numerator === 0;
  return (
    <span aria-hidden="true" className="whitespace-nowrap">
      {negative ? '−' : ''}
      {showsWhole ? whole : ''}
      {numerator === 0 ? null : (
        <span className={`diagonal-fractions ${showsWhole ? 'ml-[0.18em]' : ''}`}>
          {numerator}⁄{denominator}
        </span>
      )}
    </span>
  );
}
