import { LengthText } from '@/components/ui/length-text';
import { VerdictNote } from '@/components/ui/verdict-note';
import type { Figure } from '@/lib/measure/figure';
import type { LengthUnit } from '@/lib/units/brands';
import type { CornerResult } from './check-corner';
import { readStepMm } from './check-tools';
import { FillerAdvice, OffsetWords, type Size, SquareWords } from './square-corner-words';

/** What the corner is, and what it does to a cabinet that is square. */
export function CornerWords({ result, unit }: { result: CornerResult; unit: LengthUnit }) {
  const { theta, offset } = result;
  const size = { unit, stepMm: readStepMm(unit) };
  return (
    <div className="flex flex-col gap-3">
      <p className="text-reading font-bold tracking-tight">
        {theta.value.toFixed(1)}°{' '}
        <span className="text-lead font-normal text-graphite">± {inTenthsUp(theta.U)}°</span>
      </p>
      {offset ? (
        <SquareCorner result={result} offset={offset} size={size} />
      ) : (
        <p className="border-l-4 border-graphite bg-tint px-3 py-2">
          No square corner. Two pieces that meet here are each cut at {(theta.value / 2).toFixed(1)}
          °.
        </p>
      )}
    </div>
  );
}

function SquareCorner({
  result,
  offset,
  size,
}: {
  result: CornerResult;
  offset: Figure;
  size: Size;
}) {
  const { mm, limitMm, leastFillerMm, share } = result;
  return (
    <>
      <SquareWords result={result} size={size} />
      <VerdictNote kind={share}>
        <OffsetWords offset={offset} depthMm={mm.depth} size={size} />{' '}
        <FillerAdvice offset={offset} leastMm={leastFillerMm} size={size} />
        <span className="block text-note text-graphite">
          Asked: no more than <LengthText mm={limitMm} {...size} /> over this depth. Common
          practice; your shop sets its own.
        </span>
      </VerdictNote>
      <p className="text-note text-graphite">
        ± is what a class II tape read to <LengthText mm={size.stepMm} {...size} /> leaves open.
        Marks twice as far out leave about half of it.
      </p>
    </>
  );
}

/** How unsure is never said as less than it is. */
const inTenthsUp = (degrees: number) => (Math.ceil(degrees * 10 - 1e-9) / 10).toFixed(1);
