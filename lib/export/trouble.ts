import type { Fit } from '@/lib/measure/fit';
import type { PlacedUnit, RunFit } from '@/lib/measure/run-fit';

/**
 * What stands in the way of some runs, in words: collisions numbered as they are drawn, studs missed,
 * units that will not stand up or not come in.
 *
 * Edge: units of a run that lack the same are told together; an empty list where nothing is in the way.
 * Example: `Uppers, units 2, 3: Catches 1 of 2 studs: needs backing or a rail; ask the shop.`
 */
export function troubleOf(fit: Fit, runIds: readonly string[]): string[] {
  const runs = fit.runs.filter(({ runId }) => runIds.includes(runId));
  const blocked = fit.wayIn.filter(({ runId, passes }) => runIds.includes(runId) && !passes);
  return [
    ...fit.collisions.flatMap(({ runId, words }, index) =>
      runIds.includes(runId) ? [`${index + 1}: ${words}`] : [],
    ),
    ...runs.flatMap((run) =>
      together(run, ({ studs }) => (studs && !studs.enough ? studs.words : null)),
    ),
    ...runs.flatMap((run) =>
      together(run, ({ tilt }) => (tilt && !tilt.standsUp ? tilt.words : null)),
    ),
    ...new Set(blocked.map(({ name, words }) => `${name}: ${words}`)),
  ];
}

/** The units of a run by what is said of them. */
function together(run: RunFit, wordsOf: (unit: PlacedUnit) => string | null): string[] {
  const places = new Map<string, number[]>();
  run.units.forEach((unit, index) => {
    const words = wordsOf(unit);
    if (words !== null) places.set(words, [...(places.get(words) ?? []), index + 1]);
  });
  return [...places].map(([words, numbers]) => {
    const units = numbers.length === 1 ? 'unit' : 'units';
    return `${run.name}, ${units} ${numbers.join(', ')}: ${words}`;
  });
}
