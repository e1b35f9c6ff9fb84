import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { figure } from '@/lib/measure/figure';
import { fillRun } from '@/lib/measure/fill-run';
import {
  changesOf,
  type SuggestWidthsInput,
  suggestWidths,
  type UnitChoice,
} from '@/lib/measure/suggest-widths';
import { planeEnd, runFrame } from './run-frames';

const filler = { leastMm: 25, mostMm: 75, isOpen: false, gableClearanceMm: 3 };

function input(over: Partial<SuggestWidthsInput> & { lengthMm?: number } = {}): SuggestWidthsInput {
  const { lengthMm = 2_400, ...rest } = over;
  return {
    frame: runFrame({ length: figure(lengthMm, 0, ['length']) }),
    carcassDepthMm: 560,
    fillerPlaneMm: 581,
    z0Mm: 100,
    z1Mm: 870,
    left: filler,
    right: filler,
    units: [],
    jointGrowthMm: 0,
    unitBuildToleranceMm: 0,
    share: { how: 'equal' },
    ...rest,
  };
}

function fixed(id: string, widthMm: number): UnitChoice {
  return { id, widthMm, alterable: null };
}

function stepped(
  id: string,
  widthMm: number,
  minMm: number,
  maxMm: number,
  stepMm: number,
): UnitChoice {
  return { id, widthMm, alterable: { minMm, maxMm, stepMm } };
}

describe('worked examples', () => {
  test('the last unit of 900 + 900 + 650 in 2400 becomes 550', () => {
    const units = [fixed('a', 900), fixed('b', 900), stepped('c', 650, 300, 650, 50)];
    expect(suggestWidths(input({ units })).value).toEqual({
      possible: true,
      changes: [{ unitId: 'c', fromMm: 650, toMm: 550 }],
      leftFillerMm: 25,
      rightFillerMm: 25,
    });
  });

  test('a run that fits is left as it is', () => {
    const units = [stepped('a', 900, 300, 900, 50), fixed('b', 1_400)];
    expect(suggestWidths(input({ units })).value).toMatchObject({ possible: true, changes: [] });
  });

  test('one larger change is better than two smaller ones', () => {
    const units = [
      stepped('a', 900, 880, 900, 10),
      stepped('b', 900, 880, 900, 10),
      stepped('c', 600, 300, 600, 50),
    ];
    expect(suggestWidths(input({ units, lengthMm: 2_410 })).value?.changes).toEqual([
      { unitId: 'c', fromMm: 600, toMm: 550 },
    ]);
  });

  test('says so when no change of these units can do it', () => {
    const units = [fixed('a', 900), fixed('b', 1_500)];
    expect(suggestWidths(input({ units })).value).toMatchObject({ possible: false, changes: [] });
  });

  test('a stock width is taken even where it is not a step away', () => {
    const stock: UnitChoice = {
      id: 'a',
      widthMm: 914.4,
      alterable: { minMm: 300, maxMm: 914.4, stepMm: 76.2, stockMm: [762, 838.2, 914.4] },
    };
    expect(suggestWidths(input({ units: [stock, fixed('b', 1_500)] })).value?.changes).toEqual([
      { unitId: 'a', fromMm: 914.4, toMm: 838.2 },
    ]);
  });

  test('on a tie the left unit changes', () => {
    const units = [
      stepped('a', 800, 700, 800, 50),
      stepped('b', 800, 700, 800, 50),
      fixed('c', 800),
    ];
    expect(suggestWidths(input({ units })).value?.changes).toEqual([
      { unitId: 'a', fromMm: 800, toMm: 750 },
    ]);
  });

  test('an open end needs room only', () => {
    const units = [stepped('a', 900, 700, 900, 50), fixed('b', 1_500)];
    const run = input({ units, right: { ...filler, isOpen: true } });
    const open = { ...run, frame: runFrame({ right: planeEnd(2_400) }) };
    expect(suggestWidths(open).value).toMatchObject({
      changes: [{ unitId: 'a', toMm: 850 }],
      rightFillerMm: null,
    });
  });
});

/** Every choice of widths, judged by `fillRun` itself. */
function exhaustive(
  run: SuggestWidthsInput,
): { count: number; totalMm: number; unevenMm: number; key: number[] } | null {
  let found: { count: number; totalMm: number; unevenMm: number; key: number[] } | null = null;
  const options = run.units.map((unit) => [0, ...changesOf(unit)]);
  const walk = (at: number, chosen: number[]) => {
    if (at < options.length) {
      for (const by of options[at] ?? []) walk(at + 1, [...chosen, by]);
      return;
    }
    const units = run.units.map((unit, i) => ({
      id: unit.id,
      widthMm: unit.widthMm + (chosen[i] ?? 0),
    }));
    const filledRun = fillRun({ ...run, units }).value;
    if (filledRun?.verdict !== 'fits') return;
    const count = chosen.filter((by) => by !== 0).length;
    const totalMm = chosen.reduce((sum, by) => sum + Math.abs(by), 0);
    const isOpen = filledRun.left.isOpen || filledRun.right.isOpen;
    const unevenMm = isOpen ? 0 : Math.abs(filledRun.left.face.value - filledRun.right.face.value);
    const key = chosen.flatMap((by, i) => (by === 0 ? [] : [i, -Math.abs(by), by]));
    const candidate = { count, totalMm, unevenMm, key };
    if (!found || isBetter(candidate, found)) found = candidate;
  };
  walk(0, []);
  return found;
}

function isBetter(
  a: { count: number; totalMm: number; unevenMm: number; key: number[] },
  b: { count: number; totalMm: number; unevenMm: number; key: number[] },
): boolean {
  for (const difference of [a.count - b.count, a.totalMm - b.totalMm, a.unevenMm - b.unevenMm]) {
    if (Math.abs(difference) > 1e-6) return difference < 0;
  }
  for (let i = 0; i < a.key.length; i++) {
    const difference = (a.key[i] ?? 0) - (b.key[i] ?? 0);
    if (Math.abs(difference) > 1e-6) return difference < 0;
  }
  return false;
}

const anyUnit = fc
  .record({
    width: fc.integer({ min: 12, max: 20 }).map((n) => n * 50),
    kind: fc.constantFrom('fixed', 'stepped', 'stock'),
    down: fc.integer({ min: 0, max: 3 }),
    up: fc.integer({ min: 0, max: 2 }),
    step: fc.constantFrom(10, 12.7, 25, 50),
  })
  .map(({ width, kind, down, up, step }, i = 0): UnitChoice => {
    const id = `unit-${i}`;
    if (kind === 'fixed') return fixed(id, width);
    const limits = { minMm: width - down * step, maxMm: width + up * step, stepMm: step };
    if (kind === 'stepped') return { id, widthMm: width, alterable: limits };
    const stockMm = [width - 62.5, width - 30, width, width + 45];
    return {
      id,
      widthMm: width,
      alterable: { minMm: width - 70, maxMm: width + 50, stepMm: 1, stockMm },
    };
  });

const anyRun = fc
  .record({
    units: fc.array(anyUnit, { minLength: 1, maxLength: 4 }),
    slack: fc.integer({ min: -160, max: 260 }),
    u: fc.constantFrom(0, 0.8),
    how: fc.constantFrom('equal' as const, 'left' as const, 'right' as const, 'centred' as const),
    centre: fc.nat({ max: 4 }),
    off: fc.integer({ min: -40, max: 40 }),
    openRight: fc.boolean(),
  })
  .map(({ units, slack, u, how, centre, off, openRight }): SuggestWidthsInput => {
    const named = units.map((unit, i) => ({ ...unit, id: `unit-${i}` }));
    const total = named.reduce((sum, unit) => sum + unit.widthMm, 0);
    const length = total + slack;
    const index = Math.min(centre, named.length - 1);
    const before = named.slice(0, index).reduce((sum, unit) => sum + unit.widthMm, 0);
    const markMm = slack / 2 + before + (named[index]?.widthMm ?? 0) / 2 + off;
    return input({
      frame: runFrame({
        length: figure(length, u, ['length']),
        ...(openRight ? { right: planeEnd(length) } : {}),
      }),
      right: openRight ? { ...filler, isOpen: true } : filler,
      units: named,
      share: how === 'centred' ? { how, unitId: `unit-${index}`, markMm } : { how },
    });
  });

describe('exactness', () => {
  test('equals the search over every choice, on small runs', () => {
    let possible = 0;
    fc.assert(
      fc.property(anyRun, (run) => {
        const best = exhaustive(run);
        const found = suggestWidths(run).value;
        expect(found?.possible).toBe(best !== null);
        if (!best || !found) return;
        possible++;
        const key = found.changes.flatMap(({ unitId, fromMm, toMm }) => {
          const by = toMm - fromMm;
          return [run.units.findIndex(({ id }) => id === unitId), -Math.abs(by), by];
        });
        expect(key.length).toBe(best.key.length);
        for (const [i, value] of key.entries())
          expect(value).toBeCloseTo(best.key[i] ?? Number.NaN, 5);
      }),
      { seed: 5, numRuns: 250, endOnFailure: true },
    );
    expect(possible).toBeGreaterThan(60);
  }, 20_000);

  test('weighs many units with many widths quickly when three must change', () => {
    const units = Array.from({ length: 12 }, (_, i) => stepped(`unit-${i}`, 600, 590, 600, 1));
    const started = performance.now();
    const found = suggestWidths(input({ units, lengthMm: 12 * 600 + 22 })).value;
    expect(found?.changes.map(({ fromMm, toMm }) => fromMm - toMm)).toEqual([10, 10, 8]);
    expect(performance.now() - started).toBeLessThan(500);
  });
});
