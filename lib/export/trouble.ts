import type { Fit } from '@/lib/measure/fit';

/**
 * What stands in the way of some runs, in words: collisions numbered as they are drawn, studs missed,
 * units that will not stand up or not come in.
 *
 * Edge: units that lack the same are told together; an empty list where nothing is in the way.
 * Example: `Uppers left, unit 2; Uppers right, unit 1: Catches 1 of 2 studs: needs backing or a rail …`.
 */
export function troubleOf(fit: Fit, runIds: readonly string[]): string[] {
  const runs = fit.runs.filter(({ runId }) => runIds.includes(runId));
  const units = runs.flatMap(({ name, units: ofRun }) =>
    ofRun.map((unit, index) => ({ ...unit, place: `${name}, unit ${index + 1}` })),
  );
  return [
    ...fit.collisions.flatMap(({ runId, words }, index) =>
      runIds.includes(runId) ? [`${index + 1}: ${words}`] : [],
    ),
    ...together(
      units.flatMap(({ place, studs }) =>
        studs && !studs.enough ? [{ place, words: studs.words }] : [],
      ),
    ),
    ...together(
      units.flatMap(({ place, tilt }) =>
        tilt && !tilt.standsUp ? [{ place, words: tilt.words }] : [],
      ),
    ),
    ...together(
      fit.wayIn.flatMap(({ runId, passes, name, words }) =>
        runIds.includes(runId) && !passes ? [{ place: name, words }] : [],
      ),
    ),
  ];
}

function together(list: { place: string; words: string }[]): string[] {
  const places = new Map<string, Set<string>>();
  for (const { place, words } of list) {
    places.set(words, (places.get(words) ?? new Set()).add(place));
  }
  return [...places].map(([words, at]) => `${[...at].join('; ')}: ${words}`);
}
