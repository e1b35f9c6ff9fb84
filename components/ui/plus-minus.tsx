import type { LengthUnit } from '@/lib/units/brands';
import { roundBlankUp } from '@/lib/units/round';
import { LengthText } from './length-text';

/** How sure a length is, rounded up to the step: "± ¹⁄₁₆". */
export function PlusMinus({
  uMm,
  unit,
  stepMm,
}: {
  uMm: number;
  unit: LengthUnit;
  stepMm: number;
}) {
  return (
    <span className="whitespace-nowrap text-graphite">
      <span className="sr-only">give or take </span>
      <span aria-hidden="true">± </span>
      <LengthText mm={roundBlankUp(uMm, stepMm)} unit={unit} stepMm={stepMm} showsUnit={false} />
    </span>
  );
}
