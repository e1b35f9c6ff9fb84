import { LengthText } from '@/components/ui/length-text';
import { PlusMinus } from '@/components/ui/plus-minus';
import type { Figure } from '@/lib/measure/figure';
import type { LengthUnit } from '@/lib/units/brands';
import { roundBlankUp } from '@/lib/units/round';
import type { CornerResult } from './check-corner';

export type Size = { unit: LengthUnit; stepMm: number };

/** What the tape would have read in a square corner: the check that everybody knows by 3-4-5. */
export function SquareWords({ result, size }: { result: CornerResult; size: Size }) {
  const { squareMm, offSquareMm } = result;
  const square = (
    <>
      Square would be <LengthText mm={squareMm} {...size} className="font-bold" /> from mark to mark
    </>
  );
  if (Math.abs(offSquareMm) < size.stepMm / 2) return <p>{square}, as yours is.</p>;
  return (
    <p>
      {square}; yours is <LengthText mm={Math.abs(offSquareMm)} {...size} className="font-bold" />{' '}
      {offSquareMm < 0 ? 'short' : 'long'}.
    </p>
  );
}

type OverDepth = { offset: Figure; size: Size };

/** Where the left wall stands at the front of a cabinet, beside where a square one would. */
export function OffsetWords({ offset, depthMm, size }: OverDepth & { depthMm: number }) {
  const depth = <LengthText mm={depthMm} {...size} />;
  const sure = <PlusMinus uMm={offset.U} {...size} />;
  if (isWithinReading(offset)) {
    return (
      <>
        Square within the reading: {sure} over a base {depth} deep.
      </>
    );
  }
  const amount = <LengthText mm={Math.abs(offset.value)} {...size} className="font-bold" />;
  return offset.value > 0 ? (
    <>
      Closed: over a base {depth} deep the left wall comes {amount} {sure} into the way at the
      front.
    </>
  ) : (
    <>
      Open: over a base {depth} deep the left wall falls {amount} {sure} away at the front.
    </>
  );
}

/** What to leave, so that the filler is wide enough at its narrowest; its ± counts against it. */
export function FillerAdvice({ offset, leastMm, size }: OverDepth & { leastMm: number }) {
  if (isWithinReading(offset)) return null;
  const least = <LengthText mm={leastMm} {...size} />;
  const wider = roundBlankUp(leastMm + Math.abs(offset.value) + offset.U, size.stepMm);
  const most = <LengthText mm={wider} {...size} />;
  return offset.value > 0 ? (
    <>
      To be sure of {least} of filler at the front, leave {most} at the back.
    </>
  ) : (
    <>
      With {least} of filler at the back, cut it up to {most} wide for the front.
    </>
  );
}

const isWithinReading = ({ value, U }: Figure) => Math.abs(value) < U;
