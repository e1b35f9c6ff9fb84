import type { LengthUnit } from '@/lib/units/brands';
import { formatLength } from '@/lib/units/format-length';
import { fractionParts } from '@/lib/units/fraction-parts';

type LengthTspanProps = { mm: number; unit: LengthUnit; stepMm: number };

/** A length inside a drawing's text, set like LengthText and without its unit: the drawing names it once. */
export function LengthTspan({ mm, unit, stepMm }: LengthTspanProps) {
  if (unit === 'mm') return formatLength(mm, { unit, stepMm }).replace(' mm', '').replace('-', '−');
  const { negative, whole, numerator, denominator } = fractionParts(mm, stepMm);
  const showsWhole = whole !== 0 || numerator === 0;
  return (
    <>
      {negative ? '−' : ''}
      {showsWhole ? whole : ''}
      {numerator === 0 ? null : (
        <tspan dx={showsWhole ? '0.15em' : undefined} className="diagonal-fractions">
          {numerator}⁄{denominator}
        </tspan>
      )}
    </>
  );
}
