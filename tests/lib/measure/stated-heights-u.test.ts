import { describe, expect, it } from 'vitest';
import { chordAngle } from '@/lib/measure/chord-angle';
import { type Figure, figure } from '@/lib/measure/figure';
import type { LevelPoint } from '@/lib/measure/floor-surface';
import { counterSteps, sillOverCounter, upperGap } from '@/lib/measure/over-counter';
import { type TopGapInput, topGap } from '@/lib/measure/top-gap';
import { type UnderCounterInput, underCounterHeight } from '@/lib/measure/under-counter';
import { monteCarlo, seeded } from './seeded';

const RUNS = 4_000;
/** The spread of so many draws is itself sure to some two parts in a hundred (1/√(2n)). */
function expectSpread(stated: Figure | undefined, draw: () => number | undefined): void {
  const { mean, sd } = monteCarlo(RUNS, () => draw() ?? Number.NaN);
  expect(Math.abs((stated?.u ?? Number.NaN) / sd - 1)).toBeLessThan(0.06);
  expect(Math.abs((stated?.value ?? Number.NaN) - mean)).toBeLessThan((5 * sd) / Math.sqrt(RUNS));
}

/** A level line off by a tilt along and across, read with an error of each reading's own. */
function draws(seed: number) {
  const random = seeded(seed);
  const read = (points: LevelPoint[], up: 1 | -1, tilt: { x: number; y: number }): LevelPoint[] =>
    points.map((point) => ({
      ...point,
      u: 0,
      valueMm:
        point.valueMm + up * (tilt.x * point.xMm + tilt.y * point.yMm) + point.u * random.normal(),
    }));
  const tilt = () => ({ x: U_LEVEL * random.normal(), y: U_LEVEL * random.normal() });
  return { random, read, tilt };
}
const U_LEVEL = 0.0006;

const level = (xMm: number, yMm: number, valueMm: number): LevelPoint => ({
  id: `${xMm}/${yMm}`,
  xMm,
  yMm,
  valueMm,
  u: 0.4,
  setUpId: 'line',
});

describe('the u that is stated of heights is the u that is seen', () => {
  it('for the gap over boxes, the level line’s tilt and the datum in it', () => {
    const { random, read, tilt } = draws(51);
    const rises = [level(0, 300, 1_440), level(900, 300, 1_428), level(1_800, 300, 1_447)];
    const input: TopGapInput = {
      runId: 'uppers',
      rises,
      x0Mm: 300,
      x1Mm: 1_700,
      yMm: 300,
      topMm: 2_400,
      datumDrop: figure(1_000, 0.5, ['high']),
      datumSetUpId: 'line',
      uLevel: U_LEVEL,
      scribe: { marginMm: 3, leastMm: 6, stepMm: 1 },
    };
    const stated = topGap(input).value;
    const drawn = () =>
      topGap({
        ...input,
        rises: read(rises, 1, tilt()),
        datumDrop: figure(1_000 + 0.5 * random.normal(), 0, []),
        uLevel: 0,
      }).value;
    expectSpread(stated?.left, () => drawn()?.left.value);
    expectSpread(stated?.least, () => drawn()?.least.value);
  });

  it('for the height under a counter, floor to come with it', () => {
    const { random, read, tilt } = draws(52);
    const drops = [level(0, 30, 1_002), level(600, 30, 1_012), level(0, 560, 1_003)];
    const input: UnderCounterInput = {
      unitId: 'dishwasher',
      drops,
      footprint: { x0Mm: 0, x1Mm: 600, y0Mm: 30, y1Mm: 560 },
      undersideMm: 870,
      datumDrop: figure(1_000, 0.3, ['high']),
      datumSetUpId: 'line',
      floorToCome: { valueMm: 12, u: 0.6 },
      needMm: 860,
      uLevel: U_LEVEL,
    };
    // The least of several places is drawn too low where they lie near each other: one place, then.
    const one = { ...input, footprint: { x0Mm: 200, x1Mm: 200, y0Mm: 30, y1Mm: 30 } };
    const stated = underCounterHeight(one).value?.height;
    const drawn = () =>
      underCounterHeight({
        ...one,
        drops: read(drops, 1, tilt()),
        datumDrop: figure(1_000 + 0.3 * random.normal(), 0, []),
        floorToCome: { valueMm: 12 + 0.6 * random.normal(), u: 0 },
        uLevel: 0,
      }).value?.height.value;
    expectSpread(stated, drawn);
  });

  it('for what hangs over an old counter, a sill and a step', () => {
    const { random } = draws(53);
    const counter = (err: () => number, u: number) => [
      { id: 'left', topMm: figure(914 + 0.7 * err(), 0.7 * u, ['a']) },
      { id: 'right', topMm: figure(922 + 0.7 * err(), 0.7 * u, ['b']) },
    ];
    const none = () => 0;
    expectSpread(
      upperGap(counter(none, 1), 1_372, 457).value?.height,
      () => upperGap(counter(random.normal, 0), 1_372, 457).value?.height.value,
    );
    const sill = (err: () => number, u: number) =>
      sillOverCounter(counter(err, u), 100, figure(1_030 + 1.2 * err(), 1.2 * u, ['sill'])).value;
    expectSpread(sill(none, 1)?.margin, () => sill(random.normal, 0)?.margin.value);
    const step = (err: () => number, u: number) =>
      counterSteps(figure(914 + 0.5 * err(), 0.5 * u, ['new']), counter(err, u), 2).value?.[1];
    expectSpread(step(none, 1)?.step, () => step(random.normal, 0)?.step.value);
  });

  it('for a corner carried to the straight walls, read face and unread bow alike', () => {
    const { random } = draws(54);
    const unread = { armMm: 900, proud: null, wallLengthMm: 3_000, usualBowMm: 3 };
    const row = (value: number, u: number) => ({ ...unread, proud: { id: 'row', value, u } });
    expectSpread(
      chordAngle(figure(89.8, 0.05, ['r']), { left: row(2, 0.8), right: row(-1, 0.8) }),
      () =>
        chordAngle(figure(89.8 + 0.05 * random.normal(), 0, []), {
          left: row(2 + 0.8 * random.normal(), 0),
          right: row(-1 + 0.8 * random.normal(), 0),
        }).value,
    );
    // Where nobody read the faces: walls that bow within ±3 with equal chance of any, as a parabola.
    const share = (4 * 900) / 3_000;
    const markProud = () => random.between(-3, 3) * share * (1 - 900 / 3_000);
    expectSpread(
      chordAngle(figure(89.8, 0.05, ['r']), { left: unread, right: unread }),
      () =>
        chordAngle(figure(89.8 + 0.05 * random.normal(), 0, []), {
          left: row(markProud(), 0),
          right: row(markProud(), 0),
        }).value,
    );
  });
});
