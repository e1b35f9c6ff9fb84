import { describe, expect, it } from 'vitest';
import { adjustRoom } from '@/lib/measure/adjust-room';
import type { Figure } from '@/lib/measure/figure';
import { findBlunder } from '@/lib/measure/find-blunder';
import { type IslandInput, islandPlacement } from '@/lib/measure/island';
import { sheetCorrection } from '@/lib/measure/sheet-correction';
import { studCatch } from '@/lib/measure/studs';
import { tiltUp } from '@/lib/measure/tilt-up';
import { passesDoor } from '@/lib/measure/way-in';
import { oneTape, readLegs, readLength } from './random-readings';
import { CROOKED, drawnShape, randomPlan } from './random-room';
import { monteCarlo, seeded } from './seeded';

const RUNS = 3_000;
/** The spread of so many draws is itself sure to some two parts in a hundred. */
function expectSpread(stated: Figure | undefined, draw: () => number | undefined): void {
  const { sd } = monteCarlo(RUNS, () => draw() ?? Number.NaN);
  expect(Math.abs((stated?.u ?? Number.NaN) / sd - 1)).toBeLessThan(0.06);
}

describe('the u that is stated is the u that is seen', () => {
  it('for stacked sheets', () => {
    const random = seeded(31);
    const of = (value: number, u: number) =>
      sheetCorrection({ nominalMm: 19.05, actual: { value, u, from: [] }, thicknesses: 3 }).value;
    expectSpread(
      of(18.3, 0.1)?.correction,
      () => of(18.3 + 0.1 * random.normal(), 0)?.correction.value,
    );
  });

  it('for a tall unit stood up', () => {
    const random = seeded(32);
    const of = (clear: number, u: number) =>
      tiltUp({
        unit: { heightMm: 2_150, widthMm: 600, depthMm: 580, kickMm: 100, kickComesOff: true },
        clearWhereTilted: { value: clear, u, from: [] },
        clearWhereItStands: { value: 2_400, u: 0, from: [] },
        marginMm: 12,
        liftMm: 10,
      }).value?.tiltMargin;
    expectSpread(of(2_400, 2), () => of(2_400 + 2 * random.normal(), 0)?.value);
  });

  it('for a doorway', () => {
    const random = seeded(33);
    const of = (width: number, u: number) =>
      passesDoor(
        { widthMm: 600, depthMm: 580, heightMm: 2_150 },
        {
          clearWidth: { value: width, u, from: [] },
          clearHeight: { value: 1_981, u: 0, from: [] },
        },
      ).value?.margin;
    expectSpread(of(762, 1.5), () => of(762 + 1.5 * random.normal(), 0)?.value);
  });

  it('for an aisle, a kick and a sink of an island', () => {
    const random = seeded(34);
    const of = (err: () => number, on: 0 | 1) => {
      const input: IslandInput = {
        setLine: { origin: { xMm: 0, yMm: 0 }, headingDeg: 0 },
        offset: { value: 1_700 + 2 * err(), u: 2 * on, from: [] },
        along: { value: 600 + 3 * err(), u: 3 * on, from: [] },
        lengthMm: 1_800,
        depthMm: 900,
        opensMm: { back: 0, right: 0, front: 0, left: 0 },
        joined: null,
        faces: [
          {
            id: 'run',
            name: 'run',
            line: { from: { xMm: 0, yMm: 600 }, to: { xMm: 3_000, yMm: 600 } },
            u: 0,
            opensMm: 0,
          },
        ],
        floor: [0, 1, 2, 3].map((i) => ({
          id: `${i}`,
          xMm: i % 2 === 0 ? 0 : 4_000,
          yMm: i < 2 ? 1_000 : 4_000,
          valueMm: 1_000 + 4 * i + err(),
          u: on,
          setUpId: 'line',
        })),
        nominalKickMm: 100,
        datumDrop: { value: 1_000, u: 0, from: [] },
        legs: { minMm: 0, maxMm: 500 },
        uLevel: 0,
        builtAngleDeg: 90,
        sink: { alongMm: 900, depthMm: 450 },
        services: [{ id: 'w', kind: 'water', xMm: 1_480 + 4 * err(), yMm: 2_100, u: 4 * on }],
      };
      return islandPlacement(input).value;
    };
    const stated = of(() => 0, 1);
    const drawn = () => of(random.normal, 0);
    expectSpread(stated?.leastAisle?.clear, () => drawn()?.leastAisle?.clear.value);
    expectSpread(stated?.services[0]?.alongMm, () => drawn()?.services[0]?.alongMm.value);
    expectSpread(stated?.kicks[0]?.height, () => drawn()?.kicks[0]?.height.value);
  });

  it('for the size of a slip', { timeout: 20_000 }, () => {
    let squares = 0;
    const trials = 60;
    for (let seed = 0; seed < trials; seed++) {
      const random = seeded(700 + seed);
      const plan = { ...randomPlan(random, 5, CROOKED), zRefMm: 910 };
      const tape = oneTape(random);
      const readings = plan.corners.flatMap((_, i) =>
        [100, 910, 1_450].flatMap((zMm) => [
          readLength(plan, tape, i, zMm),
          readLegs(plan, random, tape, i, zMm),
        ]),
      );
      const wrong = readings.map((o) =>
        o.kind === 'length' && o.readingIds[0] === 'length-2-910'
          ? { ...o, valueMm: o.valueMm + 60 }
          : o,
      );
      const { value } = adjustRoom(drawnShape(plan), wrong, { usualBowMm: 3, zRefMm: 910 });
      const suspect = value && findBlunder(value)?.suspects[0];
      if (suspect?.readingIds[0] !== 'length-2-910') continue;
      squares += ((suspect.slip - 60) / suspect.uSlip) ** 2 / trials;
    }
    expect(Math.sqrt(squares)).toBeGreaterThan(0.75);
    expect(Math.sqrt(squares)).toBeLessThan(1.25);
  });

  it('for a stud that is predicted, no less than how far a true stud stands off the row', () => {
    const random = seeded(35);
    let squares = 0;
    let count = 0;
    for (let trial = 0; trial < 600; trial++) {
      const phase = random.between(0, 400);
      const off = () => 2 * random.normal();
      const found = [0, 1, 2, 4, 5].map((k) => ({
        id: `${k}`,
        xMm: phase + 400 * k + off(),
        u: 2,
        at: 'centre' as const,
      }));
      const { value } = studCatch({
        studs: found,
        units: [],
        openings: [],
        wallLengthMm: phase + 2_050,
        spacingsMm: [400],
        studWidthMm: 38,
        screwEdgeMm: 19,
        studsNeeded: [{ toWidthMm: 900, studs: 2 }],
      });
      const near = (x: number) => Math.abs(x - phase - 1_200) < 100;
      const predicted = value?.studs.find((stud) => stud.predicted && near(stud.xMm));
      if (!predicted) continue;
      squares += ((predicted.xMm - (phase + 1_200 + off())) / predicted.u) ** 2;
      count++;
    }
    expect(count).toBeGreaterThan(400);
    expect(Math.sqrt(squares / count)).toBeGreaterThan(0.85);
    expect(Math.sqrt(squares / count)).toBeLessThan(1.1);
  });
});
