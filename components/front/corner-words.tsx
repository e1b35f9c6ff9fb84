import { LengthText } from '@/components/ui/length-text';
import { PlusMinus } from '@/components/ui/plus-minus';
import { VerdictNote } from '@/components/ui/verdict-note';
import type { LengthUnit } from '@/lib/units/brands';
import type { CornerResult } from './check-corner';
import { readStepMm } from './check-tools';

/** What the corner is, and what it does to a cabinet that is square. */
export function CornerWords({ result, unit }: { result: CornerResult; unit: LengthUnit }) {
  const { theta, offset, mm, limitMm, share } = result;
  const size = { unit, stepMm: readStepMm(unit) };
  return (
    <div className="flex flex-col gap-3">
      <p className="text-reading font-bold tracking-tight">
        {theta.value.toFixed(1)}°{' '}
        <span className="text-lead font-normal text-graphite">± {theta.U.toFixed(1)}°</span>
      </p>
      {offset ? (
        <VerdictNote kind={share}>
          <OffsetWords offset={offset} depthMm={mm.depth} size={size} />
          <span className="block text-note text-graphite">
            Asked: no more than <LengthText mm={limitMm} {...size} /> over this depth. Common
            practice; your shop sets its own.
          </span>
        </VerdictNote>
      ) : (
        <p className="border-l-4 border-graphite bg-tint px-3 py-2">
          No square corner. Two pieces that meet here are each cut at {(theta.value / 2).toFixed(1)}
          °.
        </p>
      )}
    </div>
  );
}

type OffsetWordsProps = {
  offset: NonNullable<CornerResult['offset']>;
  depthMm: number;
  size: { unit: LengthUnit; stepMm: number };
};

function OffsetWords({ offset, depthMm, size }: OffsetWordsProps) {
  const depth = <LengthText mm={depthMm} {...size} />;
  const sure = <PlusMinus uMm={offset.U} {...size} />;
  if (Math.abs(offset.value) < offset.U) {
    return (
      <>
        Square within the reading: {sure} over a base {depth} deep.
      </>
    );
  }
  const amount = (
    <b>
      <LengthText mm={Math.abs(offset.value)} {...size} />
    </b>
  );
  return offset.value > 0 ? (
    <>
      Closed: over a base {depth} deep the left wall comes {amount} {sure} into the way at the
      front. A square cabinet stands that far off the back corner, or the filler is that much
      narrower at the front.
    </>
  ) : (
    <>
      Open: over a base {depth} deep the left wall falls {amount} {sure} away at the front. A square
      cabinet hard to the back corner leaves that gap to fill or to scribe.
    </>
  );
}
