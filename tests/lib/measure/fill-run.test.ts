import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { figure } from '@/lib/measure/figure';
import { type FillRunInput, fillRun } from '@/lib/measure/fill-run';
import { planeEnd, runFrame, wallEnd } from './run-frames';
import { monteCarlo, seeded } from './seeded';

const wallFiller = { leastMm: 25, mostMm: 75, isOpen: false, gableClearanceMm: 3 };
const openEnd = { leastMm: 0, mostMm: 0, isOpen: true, gableClearanceMm: 0 };

function units(...widths: number[]) {
  return widths.map((widthMm, i) => ({ id: `unit-${i}`, widthMm }));
}

function input(over: Partial<FillRunInput> = {}): FillRunInput {
  return {
    frame: runFrame(),
    carcassDepthMm: 560,
    fillerPlaneMm: 581,
    z0Mm: 100,
    z1Mm: 870,
    left: wallFiller,
    right: wallFiller,
    units: units(600, 900, 800),
    jointGrowthMm: 0,
    unitBuildToleranceMm: 0,
    share: { how: 'equal' },
    ...over,
  };
}

function filled(over: Partial<FillRunInput> = {}) {
  const result = fillRun(input(over));
  if (!result.value) throw new Error(JSON.stringify(result.problems));
  return result.value;
}

const faces = (run: ReturnType<typeof filled>) => [run.left.face.value, run.right.face.value];

describe('sharing', () => {
  test('2400 between true walls less 2300 of units leaves 50 at each end', () => {
    const run = filled();
    expect(run.room.value).toBeCloseTo(2_350, 9);
    expect(run.slack.value).toBeCloseTo(50, 9);
    expect(faces(run)).toEqual([50, 50]);
    expect(run.verdict).toBe('fits');
    expect(run.placed[0]).toMatchObject({ leftMm: 50, rightMm: 650 });
  });

  test('the published sum 89 1/2 less 21, 36, 24 1/4 and 3 gives 2 5/8 and 2 5/8', () => {
    const inch = 25.4;
    const run = filled({
      frame: runFrame({ length: figure(89.5 * inch, 0, ['length']) }),
      units: units(21 * inch, 36 * inch, 24.25 * inch, 3 * inch),
    });
    for (const face of faces(run)) expect(face / inch).toBeCloseTo(2.625, 9);
  });

  test('all left leaves the right at its least', () => {
    expect(faces(filled({ share: { how: 'left' } }))).toEqual([75, 25]);
  });

  test('all right leaves the left at its least', () => {
    expect(faces(filled({ share: { how: 'right' } }))).toEqual([25, 75]);
  });

  test('equal is as equal as a higher least at one end allows', () => {
    const run = filled({ left: { ...wallFiller, leastMm: 60, mostMm: 90 } });
    expect(faces(run)).toEqual([60, 40]);
  });

  test('a unit centred on a mark decides both ends', () => {
    const run = filled({ share: { how: 'centred', unitId: 'unit-1', markMm: 1_090 } });
    expect(faces(run)).toEqual([40, 60]);
  });

  test('an open end gets what the closed end at its least leaves', () => {
    const run = filled({ frame: runFrame({ right: planeEnd(2_400) }), right: openEnd });
    expect(faces(run)).toEqual([25, 75]);
    expect(run.right.isOpen).toBe(true);
    expect(run.verdict).toBe('fits');
  });

  test('joints grow the run', () => {
    const run = filled({ jointGrowthMm: 0.5 });
    expect(run.jointGrowthMm).toBe(1);
    expect(faces(run)).toEqual([49.5, 49.5]);
    expect(run.placed[1]?.leftMm).toBe(49.5 + 600.5);
  });
});

describe('two limits at each end, kept apart', () => {
  test('a belly behind the face pushes the gable, not the filler', () => {
    const points = [
      { yMm: 0, zMm: 400, proudMm: 0, uMm: 0, leanShareMm: 0, bowShare: 0, readingId: 'back' },
      { yMm: 300, zMm: 400, proudMm: 40, uMm: 0, leanShareMm: 0, bowShare: 0, readingId: 'belly' },
      { yMm: 581, zMm: 400, proudMm: 0, uMm: 0, leanShareMm: 0, bowShare: 0, readingId: 'front' },
    ];
    const run = filled({ frame: runFrame({ left: wallEnd({ points }) }) });
    // 40 + 3 at the gable is more than 0 + 25 in the filler's plane.
    expect(run.left.leastMm).toBeCloseTo(43, 9);
    expect(run.room.value).toBeCloseTo(2_400 - 43 - 25, 9);
    expect(run.room.from).toContain('belly');
  });
});

describe('verdicts, in order', () => {
  test('short says how much to lose', () => {
    const run = filled({ units: units(600, 900, 860) });
    expect(run.verdict).toBe('short');
    expect(run.toLoseMm).toBeCloseTo(10, 9);
  });

  test('short by a mark that is off says the smallest shift of it', () => {
    const run = filled({ share: { how: 'centred', unitId: 'unit-1', markMm: 1_060 } });
    expect(run.verdict).toBe('short');
    expect(run.shiftOfMarkMm).toBeCloseTo(15, 9);
  });

  test('loose when the fillers are wider than the shop allows', () => {
    expect(filled({ units: units(600, 900, 700) }).verdict).toBe('loose');
  });

  test('tight when U would break a least', () => {
    const frame = runFrame({ length: figure(2_400, 1, ['length']) });
    expect(filled({ frame, units: units(600, 900, 848.5) }).verdict).toBe('tight');
    expect(filled({ frame, units: units(600, 900, 847.5) }).verdict).toBe('fits');
  });

  test('U counts build tolerance and joint growth as rectangular', () => {
    const run = filled({ jointGrowthMm: 0.3, unitBuildToleranceMm: 0.5 });
    expect(run.slack.u).toBeCloseTo(Math.sqrt((3 * 0.25 + 2 * 0.09) / 3), 9);
  });
});

describe('taper of a filler', () => {
  test('a wall that leans in makes the filler narrower at the top', () => {
    const lean = figure(0.01, 0, ['plumb']);
    const run = filled({ frame: runFrame({ left: wallEnd({ lean }), zRefMm: 100 }) });
    const [top, bottom] = run.left.widths;
    expect(top?.zMm).toBe(870);
    expect((bottom?.width.value ?? 0) - (top?.width.value ?? 0)).toBeCloseTo(7.7, 6);
    expect(run.left.face.value).toBeCloseTo(top?.width.value ?? 0, 9);
  });

  test('the whole U of the length lands on the end that takes all the slack', () => {
    const frame = runFrame({ length: figure(2_400, 1, ['length']) });
    const run = filled({ frame, share: { how: 'left' } });
    expect(run.left.face.u).toBeCloseTo(1, 9);
    expect(run.right.face.u).toBeCloseTo(0, 9);
    expect(filled({ frame }).left.face.u).toBeCloseTo(0.5, 9);
  });
});

const anyInput = fc
  .record({
    length: fc.double({ min: 1_500, max: 3_500, noNaN: true }),
    angles: fc.tuple(
      fc.double({ min: 85, max: 95, noNaN: true }),
      fc.double({ min: 85, max: 95, noNaN: true }),
    ),
    leans: fc.tuple(
      fc.double({ min: -0.01, max: 0.01, noNaN: true }),
      fc.double({ min: -0.01, max: 0.01, noNaN: true }),
    ),
    widths: fc.array(fc.integer({ min: 300, max: 900 }), { minLength: 1, maxLength: 4 }),
    how: fc.constantFrom('equal' as const, 'left' as const, 'right' as const),
  })
  .map(({ length, angles, leans, widths, how }) =>
    input({
      frame: runFrame({
        length: figure(length, 0.7, ['length']),
        left: wallEnd({
          angle: figure(angles[0], 0.1, ['a']),
          lean: figure(leans[0], 0.0005, ['b']),
        }),
        right: wallEnd({
          angle: figure(angles[1], 0.1, ['c']),
          lean: figure(leans[1], 0.0005, ['d']),
        }),
      }),
      units: units(...widths),
      jointGrowthMm: 0.3,
      unitBuildToleranceMm: 0.5,
      share: { how },
    }),
  );

describe('properties', () => {
  test('fillers, units and joints fill the span in the filler plane exactly', () => {
    fc.assert(
      fc.property(anyInput, (run) => {
        const value = fillRun(run).value;
        if (!value) return;
        const span = value.right.place.xMm - value.left.place.xMm;
        const parts =
          value.left.face.value + value.right.face.value + value.unitsMm + value.jointGrowthMm;
        expect(parts).toBeCloseTo(span, 6);
        expect(value.slack.value).toBeCloseTo(
          value.room.value - value.unitsMm - value.jointGrowthMm,
          9,
        );
      }),
      { seed: 3, numRuns: 200 },
    );
  });

  test('short means a filler below its least, and only then', () => {
    fc.assert(
      fc.property(anyInput, (run) => {
        const value = fillRun(run).value;
        if (!value) return;
        expect(value.verdict === 'short').toBe(value.slack.value < -1e-6);
      }),
      { seed: 4, numRuns: 200 },
    );
  });
});

describe('uncertainty of a filler', () => {
  test('agrees with a Monte Carlo at a height that does not govern', () => {
    const build = (shift: number[]) =>
      input({
        frame: runFrame({
          length: figure(2_400 + (shift[0] ?? 0), 0.8, ['l']),
          left: wallEnd({
            angle: figure(88.5 + (shift[1] ?? 0), 0.12, ['a']),
            lean: figure(0.006 + (shift[2] ?? 0), 0.0008, ['b']),
          }),
          right: wallEnd({ angle: figure(89 + (shift[3] ?? 0), 0.15, ['c']) }),
        }),
      });
    const u = [0.8, 0.12, 0.0008, 0.15];
    const gauss = seeded(11).normal;
    const bottom = (run: FillRunInput) => fillRun(run).value?.left.widths.at(-1)?.width;
    const { sd } = monteCarlo(
      2_500,
      () => bottom(build(u.map((value) => value * gauss())))?.value ?? 0,
    );
    const stated = bottom(build([]))?.u ?? 0;
    expect(stated / sd).toBeGreaterThan(0.95);
    expect(stated / sd).toBeLessThan(1.05);
  });
});
