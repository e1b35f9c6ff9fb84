import { LengthText } from '@/components/ui/length-text';
import { PlusMinus } from '@/components/ui/plus-minus';
import { VerdictNote } from '@/components/ui/verdict-note';
import type { LengthUnit } from '@/lib/units/brands';
import type { FillerResult } from './check-filler';
import { readStepMm } from './check-tools';

export function FillerWords({ result, unit }: { result: FillerResult; unit: LengthUnit }) {
  const { blankMm, scribe, taper, share, words, leastMm } = result;
  const size = { unit, stepMm: readStepMm(unit) };
  const isTapered = Math.abs(taper.value) > taper.U;
  return (
    <div className="flex flex-col gap-3">
      <p>
        <span className="block text-note text-graphite">cut the blank</span>
        <LengthText mm={blankMm} {...size} className="text-reading font-bold tracking-tight" />
      </p>
      <VerdictNote kind={share}>
        {words} Least asked at a wall: <LengthText mm={leastMm} {...size} />.
      </VerdictNote>
      <p>
        {isTapered ? (
          <>
            Tapers <LengthText mm={Math.abs(taper.value)} {...size} />{' '}
            <PlusMinus uMm={taper.U} {...size} />, wider at the {taper.value > 0 ? 'top' : 'bottom'}
            .
          </>
        ) : (
          <>Parallel within the reading.</>
        )}{' '}
        Left on for the scribe: <LengthText mm={scribe.roundedUpMm} {...size} />
        {scribe.governedBy === 'least-scribe' ? ', the least that is usual' : ''}.
      </p>
    </div>
  );
}
