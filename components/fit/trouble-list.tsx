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
    run.units.map((unit, index) => ({ ...unit, run: run.name, number: index + 1 })),
  );
  const loose = alike(
    units.flatMap(({ run, number, studs }) =>
      studs && !studs.enough ? [{ run, number, words: studs.words }] : [],
    ),
  );
  const stuck = alike(
    units.flatMap(({ run, number, tilt }) =>
      tilt && !tilt.standsUp ? [{ run, number, words: tilt.words }] : [],
    ),
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
      {loose.map(({ place, words }) => (
        <VerdictNote key={place} kind="over" word="studs">
          {place}: <InFractions words={words} /> Wall units are fixed to studs or backing, never to
          board alone.
        </VerdictNote>
      ))}
      {stuck.map(({ place, words }) => (
        <VerdictNote key={place} kind="over" word="does not stand up">
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

type OfUnit = { run: string; number: number; words: string };

/** Units of one run of which the same is to be said are named together: "Uppers, units 2, 3 and 5". */
function alike(list: readonly OfUnit[]): { place: string; words: string }[] {
  const groups = new Map<string, OfUnit[]>();
  for (const one of list) {
    const key = `${one.run}\n${one.words}`;
    groups.set(key, [...(groups.get(key) ?? []), one]);
  }
  return [...groups.values()].map((group) => {
    const [first] = group;
    const numbers = group.map(({ number }) => String(number));
    const named = [numbers.slice(0, -1).join(', '), numbers.at(-1)].filter(Boolean).join(' and ');
    return {
      place: `${first?.run}, unit${numbers.length === 1 ? '' : 's'} ${named}`,
      words: first?.words ?? '',
    };
  });
}
