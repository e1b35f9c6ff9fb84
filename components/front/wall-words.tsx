import { LengthText } from '@/components/ui/length-text';
import { PlusMinus } from '@/components/ui/plus-minus';
import { VerdictNote } from '@/components/ui/verdict-note';
import type { Figure } from '@/lib/measure/figure';
import type { FaceShape } from '@/lib/measure/straightness';
import type { LengthUnit } from '@/lib/units/brands';
import { gapStepMm } from './check-tools';
import type { WallResult } from './check-wall';

/** What each shape does to a straight cabinet back. */
const shapes: Record<FaceShape, [string, string]> = {
  straight: ['Straight within the reading', ''],
  hollow: ['Hollow', 'A straight back touches at the ends and leaves that behind the middle.'],
  bulge: ['A bulge', 'A straight back rocks on the middle: shim the ends before it is fixed.'],
  wavy: ['Wavy', 'It turns more than once: set the line on its proudest places.'],
};

const leans = {
  plumb: ['Plumb within the reading', ''],
  in: ['Leans in', 'A plumb cabinet touches at the top and stands off by that at the foot.'],
  out: ['Leans out', 'A plumb cabinet touches at the foot and stands off by that at the top.'],
} as const;

export function WallWords({ result, unit }: { result: WallResult; unit: LengthUnit }) {
  const { straight, plumb, straightShare, plumbShare, limitMm, lengthMm } = result;
  const size = { unit, stepMm: gapStepMm(unit) };
  const [shape, shapeMeans] = shapes[straight.shape];
  const says = (figure: Figure) => (
    <>
      <b>
        <LengthText mm={Math.abs(figure.value)} {...size} />
      </b>{' '}
      <PlusMinus uMm={figure.U} {...size} /> over <LengthText mm={lengthMm} {...size} />.
    </>
  );
  return (
    <div className="flex flex-col gap-3">
      {plumb ? (
        <VerdictNote kind={plumbShare}>
          {leans[plumb.leans][0]}: {says(plumb.over)} {leans[plumb.leans][1]}
        </VerdictNote>
      ) : null}
      <VerdictNote kind={straightShare}>
        {shape}: {says(straight.minimumZone)} {shapeMeans}
      </VerdictNote>
      <p className="text-note text-graphite">
        Flagged from <LengthText mm={limitMm} {...size} />. Common practice; your shop sets its own.
      </p>
    </div>
  );
}
