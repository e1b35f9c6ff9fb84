import { describe, expect, it } from 'vitest';
import { troubleOf } from '@/lib/export/trouble';
import type { Fit } from '@/lib/measure/fit';
import type { PlacedUnit } from '@/lib/measure/run-fit';
import { releasedSheet } from '../../help/released-sheet';

const { fit, runs } = releasedSheet();
const all = runs.map(({ id }) => id);
const [first] = fit.runs;
if (!first) throw new Error('the kitchen has no run');

function withUnits(change: (unit: PlacedUnit, index: number) => Partial<PlacedUnit>): Fit {
  const units = first?.units.map((unit, index) => ({ ...unit, ...change(unit, index) })) ?? [];
  return { ...fit, runs: fit.runs.map((run) => (run === first ? { ...run, units } : run)) };
}

describe('troubleOf', () => {
  it('names the boxes that miss their studs, by run and number', () => {
    const missed = fit.runs.flatMap(({ units }) =>
      units.filter(({ studs }) => studs && !studs.enough),
    );
    expect(missed.length).toBeGreaterThan(0);
    const words = troubleOf(fit, all);
    expect(words).toContain(
      'Uppers left, unit 2: Catches 1 of 2 studs: needs backing or a rail; ask the shop.',
    );
  });

  it('tells boxes of a run that lack the same together', () => {
    const tilt = { standsUp: false, margin: first.units[0]?.backGapLeft, words: 'Lacks 1".' };
    const fallen = withUnits((_, index) => (index < 3 ? ({ tilt } as Partial<PlacedUnit>) : {}));
    expect(troubleOf(fallen, [first.runId])).toEqual(['Sink wall, units 1, 2, 3: Lacks 1".']);
  });

  it('numbers collisions as they are drawn, and leaves out those of other runs', () => {
    const collision = { unitId: null, readingId: 'r', what: '', overlapMm: 5, xMm: 0, zMm: 0 };
    const hit: Fit = {
      ...fit,
      collisions: [
        { ...collision, runId: 'elsewhere', words: 'not here' },
        { ...collision, runId: first.runId, words: 'outlet inside a gable' },
      ],
    };
    expect(troubleOf(hit, [first.runId])[0]).toBe('2: outlet inside a gable');
  });

  it('is silent where nothing is in the way', () => {
    expect(
      troubleOf(
        withUnits(() => ({ studs: null, tilt: null })),
        [first.runId],
      ),
    ).toEqual([]);
  });
});
