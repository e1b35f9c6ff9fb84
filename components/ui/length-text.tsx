import type { LengthUnit } from '@/lib/units/brands';
import { formatLength } from '@/lib/units/format-length';
import { fractionParts } from '@/lib/units/fraction-parts';
import { FractionText } from './fraction-text';

type LengthTextProps = {
  mm: number;
  unit: LengthUnit;
  stepMm: number;
  /** Off where a heading or the line says the unit already. */
  showsUnit?: boolean;
  className?: string;
};

/** A length set like a dimension, and said in words to a screen reader: "34 and a half inches". */
export function LengthText({ mm, unit, stepMm, showsUnit = true, className }: LengthTextProps) {
  return (
    <span className={className}>
      <span className="sr-only">{formatLength(mm, { unit, stepMm, spoken: true })}</span>
      {unit === 'in' ? (
        <FractionText {...fractionParts(mm, stepMm)} />
      ) : (
        <span aria-hidden="true">{millimetres(mm, stepMm)}</span>
      )}
      {showsUnit ? <span aria-hidden="true">{unit === 'in' ? ' in' : ' mm'}</span> : null}
    </span>
  );
}

function millimetres(mm: number, stepMm: number): string {
  return formatLength(mm, { unit: 'mm', stepMm }).replace(' mm', '').replace('-', '−');
}
