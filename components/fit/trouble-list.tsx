import { VerdictNote } from '@/components/ui/verdict-note';
import type { Fit } from '@/lib/measure/fit';
import type { RunFit } from '@/lib/measure/run-fit';
import { InFractions } from './in-fractions';

/** What stands in the way of a wall's runs: collisions numbered as drawn, studs missed, units that will not stand up. */
export function TroubleList({ fit, runs }: { fit: Fit; runs: readonly RunFit[] }) {
  const runIds = new Set(runs.map(({ runId }) => runId));
  const collisions = fit.collisions.flatMap((collision, index) =>
    runIds.has(collision.runId) ? [{ ...collision, number: index + 1 }] : [],
  );
  const units = runs.flatMap((run) =>
    run.units.map((unit, index) => ({ ...unit, place: `${run.name}, unit ${index + 1}` })),
  );
  const loose = units.flatMap(({ unitId, place, studs }) =>
    studs && !studs.enough ? [{ unitId, place, words: studs.words }] : [],
  );
  const stuck = units.flatMap(({ unitId, place, tilt }) =>
    tilt && !tilt.standsUp ? [{ unitId, place, words: tilt.words }] : [],
  );
  const blocked = fit.wayIn.filter(({ runId, passes }) => runIds.has(runId) && !passes);
  if (collisions.length + loose.length + stuck.length + blocked.length === 0) return null;
  return (
    <div className="flex flex-col gap-2 py-2 print:gap-1 print:py-1">
      {collisions.map(({ number, words, readingId, unitId }) => (
        <VerdictNote
          key={`${readingId} ${unitId} ${words}`}
          kind="over"
          word={`${number}, in the way`}
        >
          <InFractions words={words} />
        </VerdictNote>
      ))}
      {loose.map(({ unitId, place, words }) => (
        <VerdictNote key={unitId} kind="over" word="studs">
          {place}: <InFractions words={words} /> Wall units are fixed to studs or backing, never to
          board alone.
        </VerdictNote>
      ))}
      {stuck.map(({ unitId, place, words }) => (
        <VerdictNote key={unitId} kind="over" word="does not stand up">
          {place}: <InFractions words={words} />
        </VerdictNote>
      ))}
      {blocked.map(({ readingId, unitId, words }) => (
        <VerdictNote key={`${readingId} ${unitId}`} kind="over" word="way in">
          <InFractions words={words} />
        </VerdictNote>
      ))}
    </div>
  );
}
