import { describe, expect, it } from 'vitest';
import type { Run } from '@/lib/contracts/runs';
import { fitRules } from '@/lib/contracts/shop-rules';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { wayOutOf } from '@/lib/sheet/with-widths';
import { sampleRun, sampleUnit } from '../measure/sample-runs';
import { bookOf, squareRoom } from '../measure/true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const wallBook = bookOf(squareRoom);
const alterable = { minMm: 300, maxMm: 900, stepMm: 50 };
const runOf = (...widths: number[]): Run =>
  sampleRun(1, 0, {
    units: widths.map((widthMm, i) => sampleUnit(10 + i, { widthMm, alterable })),
  });
const wayOut = (run: Run) => {
  const [runFit] = fitRoom(wallBook, [run], rules).runs;
  if (!runFit) throw new Error('the run was not fitted');
  return { runFit, way: wayOutOf({ wallBook, runs: [run], rules }, runFit) };
};

describe('the way out of a run that is too long', () => {
  it('is its widths as suggested, with what the room then says of it', () => {
    const run = runOf(900, 900, 600, 600);
    const { runFit, way } = wayOut(run);
    expect(runFit.fill?.verdict).toBe('short');
    expect(way?.after.fill?.verdict).toBe('fits');
    expect(way?.after.fill?.suggestion).toBeNull();
    const changed = way?.run.units.filter(({ widthMm }, i) => widthMm !== run.units[i]?.widthMm);
    expect(changed).toHaveLength(runFit.fill?.suggestion?.changes.length ?? -1);
    const { leftFillerMm } = runFit.fill?.suggestion ?? {};
    expect(way?.after.left.filler?.least.value).toBeCloseTo(leftFillerMm ?? Number.NaN, 0);
  });

  it('is none where the run comes out, nor where no change can help', () => {
    expect(wayOut(runOf(900, 900, 600, 500)).way).toBeNull();
    const fixed = runOf(900, 900, 600, 600);
    const little = { minMm: 590, maxMm: 610, stepMm: 10 };
    const units = fixed.units.map((unit, i) => ({ ...unit, alterable: i === 3 ? little : null }));
    const { runFit, way } = wayOut({ ...fixed, units });
    expect(runFit.fill?.suggestion?.possible).toBe(false);
    expect(way).toBeNull();
  });
});
