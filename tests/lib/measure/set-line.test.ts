import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FacePoint } from '@/lib/measure/face';
import { figure } from '@/lib/measure/figure';
import { type SetLineInput, type SetLinePlane, setLine } from '@/lib/measure/set-line';
import { leastByVertices } from './linear-program';
import { monteCarlo, seeded } from './seeded';

type Place = { x: number; z?: number; s: number };
const face = (places: Place[], name = 'r', u = 0.3): FacePoint[] =>
  places.map(({ x, z = 900, s }, at) => ({
    id: `${name}${at}`,
    xMm: x,
    zMm: z,
    sMm: s,
    u,
    setUpId: name,
  }));
const plane = (places: Place[], more: Partial<SetLinePlane> = {}): SetLinePlane => ({
  id: 'run',
  points: face(places),
  bands: [{ x0Mm: 0, x1Mm: 4000, z0Mm: 0, z1Mm: 2400 }],
  edgesMm: [],
  finishedEndMm: null,
  fixed: null,
  ...more,
});
const set = (planes: SetLinePlane[], more: Partial<SetLineInput> = {}) =>
  setLine({ planes, turn: null, uReference: 0, ...more });
const largestOf = (planes: SetLinePlane[]) =>
  Math.max(
    ...(set(planes).value?.lines.map(({ largestGap }) => largestGap.gap.value) ?? [Number.NaN]),
  );

/** Least h with s ≤ oₖ + t·x ≤ s + h on every plane, by looking at every vertex. */
function byProgram(planes: { xMm: number; sMm: number }[][]): number {
  const size = planes.length + 2;
  const constraints = planes.flatMap((points, k) =>
    points.flatMap(({ xMm, sMm }) => {
      const row = Array.from({ length: size }, (_, at) =>
        at === k ? 1 : at === planes.length ? xMm / 1000 : 0,
      );
      return [
        { row: row.map((value) => -value), limit: -sMm },
        { row: [...row.slice(0, -1), -1], limit: sMm },
      ];
    }),
  );
  return (
    leastByVertices([...Array.from({ length: size - 1 }, () => 0), 1], constraints) ?? Number.NaN
  );
}

const places = (most: number) =>
  fc.array(
    fc.record({
      x: fc.integer({ min: 0, max: 20 }).map((n) => n * 200),
      s: fc.integer({ min: -40, max: 40 }).map((n) => n / 4),
    }),
    { minLength: 2, maxLength: most },
  );

describe('setLine', () => {
  it('touches a bulge in the middle, splits the gap, and says that it rocks', () => {
    const { value, problems } = set([
      plane(
        [
          { x: 0, s: 0 },
          { x: 1000, s: 2 },
          { x: 2000, s: 0 },
        ],
        { bands: [{ x0Mm: 0, x1Mm: 2000, z0Mm: 0, z1Mm: 1000 }] },
      ),
    ]);
    expect(problems).toEqual([]);
    const [line] = value?.lines ?? [];
    expect(value?.turn.value).toBeCloseTo(0, 12);
    expect(line?.atLeft.s.value).toBeCloseTo(2, 12);
    expect(line?.gaps.map(({ gap }) => gap.value)).toEqual([
      expect.closeTo(2, 9),
      expect.closeTo(0, 9),
      expect.closeTo(2, 9),
    ]);
    expect(line?.rocks).toBe(true);
    expect(line?.touches).toEqual([{ xMm: 1000, zMm: 900, ids: ['r1'] }]);
  });

  it('lies across two proud places of a hollow and does not rock', () => {
    const [line] =
      set([
        plane([
          { x: 0, s: 3 },
          { x: 1000, s: 0 },
          { x: 2000, s: 4 },
        ]),
      ]).value?.lines ?? [];
    expect(line?.largestGap).toMatchObject({ xMm: 1000, gap: { value: expect.closeTo(3.5, 9) } });
    expect(line?.rocks).toBe(false);
    expect(line?.touches.map(({ ids }) => ids[0])).toEqual(['r0', 'r2']);
    expect(line?.largestGap.gap.from).toEqual(['r0', 'r2', 'r1']);
  });

  it('turns with the wall and gives the turn in degrees, further out at the right positive', () => {
    const { value } = set([
      plane([
        { x: 0, s: 0 },
        { x: 1000, s: 10 },
        { x: 2000, s: 20 },
      ]),
    ]);
    expect(value?.turn.value).toBeCloseTo(0.01, 12);
    expect(value?.turnDeg.value).toBeCloseTo(0.5729, 4);
    expect(value?.lines[0]?.atRight).toMatchObject({
      xMm: 4000,
      s: { value: expect.closeTo(40, 9) },
    });
  });

  it('stays plumb: it touches whichever height stands proudest', () => {
    const leaning = [0, 1000, 2000].flatMap((x) => [
      { x, z: 100, s: 0 },
      { x, z: 2000, s: 6 },
    ]);
    const [line] = set([plane(leaning)]).value?.lines ?? [];
    expect(line?.largestGap).toMatchObject({ zMm: 100, gap: { value: expect.closeTo(6, 9) } });
    expect(line?.touches.every(({ zMm }) => zMm === 2000)).toBe(true);
  });

  it('sees only the wall behind the cabinets, and the slope of the wall at their ends', () => {
    const wall = [
      { x: 0, s: 20 },
      { x: 1000, s: 0 },
      { x: 2000, s: 0 },
      { x: 3000, s: 20 },
    ];
    const behind = (x0Mm: number, x1Mm: number) =>
      set([plane(wall, { bands: [{ x0Mm, x1Mm, z0Mm: 0, z1Mm: 2400 }] })]).value?.lines[0];
    expect(behind(1000, 2000)?.largestGap.gap.value).toBeCloseTo(0, 9);
    expect(behind(900, 2100)?.largestGap.gap.value).toBeCloseTo(2, 9);
    expect(behind(900, 2100)?.touches.map(({ xMm, ids }) => ({ xMm, ids }))).toEqual([
      { xMm: 900, ids: ['r0', 'r1'] },
      { xMm: 2100, ids: ['r2', 'r3'] },
    ]);
  });

  it('sees the wall up to the top of the band between two rows', () => {
    const wall = [0, 1000].flatMap((x) => [
      { x, z: 0, s: 0 },
      { x, z: 1000, s: 10 },
    ]);
    const [line] =
      set([plane(wall, { bands: [{ x0Mm: 0, x1Mm: 1000, z0Mm: 0, z1Mm: 870 }] })]).value?.lines ??
      [];
    expect(line?.atLeft.s.value).toBeCloseTo(8.7, 9);
    expect(line?.gaps.map(({ id }) => id)).toEqual(['r0', 'r2']);
  });

  it('carries the nearest readings on behind cabinets where nobody read, and says so', () => {
    const { value, problems } = set([
      plane(
        [
          { x: 0, z: 900, s: 1 },
          { x: 1000, z: 900, s: 3 },
        ],
        { bands: [{ x0Mm: 0, x1Mm: 1000, z0Mm: 1400, z1Mm: 2100 }] },
      ),
    ]);
    expect(problems).toMatchObject([
      { code: 'face-carried-on', severity: 'warning', about: ['run'] },
    ]);
    expect(value?.turn.value).toBeCloseTo(0.002, 12);
    const beside = set([
      plane(
        [
          { x: 0, s: 1 },
          { x: 500, s: 3 },
        ],
        { bands: [{ x0Mm: 1000, x1Mm: 2000, z0Mm: 0, z1Mm: 1000 }] },
      ),
    ]);
    expect(beside.problems.map(({ code }) => code)).toContain('face-carried-on');
    expect(beside.value?.lines[0]?.atLeft.s.value).toBeCloseTo(3, 9);
  });

  it('equals a linear program for one plane', () => {
    fc.assert(
      fc.property(places(7), (all) => {
        const found = largestOf([plane(all)]);
        if (new Set(all.map(({ x }) => x)).size < 2) return;
        expect(found).toBeCloseTo(byProgram([face(all)]), 6);
      }),
      { numRuns: 150 },
    );
  }, 30_000);

  it('equals a linear program for two walls that share one turn', () => {
    fc.assert(
      fc.property(places(4), places(4), (one, other) => {
        if (new Set([...one, ...other].map(({ x }) => x)).size < 2) return;
        const planes = [
          plane(one, { id: 'a' }),
          { ...plane(other, { id: 'b' }), points: face(other, 'b') },
        ];
        const program = byProgram([face(one), face(other)]);
        if (Number.isFinite(program)) expect(largestOf(planes)).toBeCloseTo(program, 6);
      }),
      { numRuns: 60 },
    );
  }, 30_000);

  it('is mirrored with its wall, tilts with its reference, and does not mind order', () => {
    fc.assert(
      fc.property(places(7), fc.integer({ min: -10, max: 10 }), (all, tilt) => {
        const line = (of: Place[]) => set([plane(of)]).value;
        const [seen, mirrored] = [line(all), line(all.map(({ x, s }) => ({ x: 4000 - x, s })))];
        expect(mirrored?.turn.value).toBeCloseTo(-(seen?.turn.value ?? 0), 9);
        expect(mirrored?.lines[0]?.atLeft.s.value).toBeCloseTo(
          seen?.lines[0]?.atRight.s.value ?? Number.NaN,
          6,
        );
        const tilted = line(all.map(({ x, s }) => ({ x, s: s + (tilt / 1000) * x })));
        expect(tilted?.lines[0]?.largestGap.gap.value).toBeCloseTo(
          seen?.lines[0]?.largestGap.gap.value ?? Number.NaN,
          7,
        );
        if (seen?.turnNotRead === false)
          expect(tilted?.turn.value).toBeCloseTo(seen.turn.value + tilt / 1000, 9);
        expect(line([...all].reverse())?.turn.value).toBeCloseTo(seen?.turn.value ?? Number.NaN, 9);
      }),
      { numRuns: 100 },
    );
  }, 30_000);

  it('takes the turn nearest least squares where several leave the same gap', () => {
    // Proudest and hollowest at one place: the gap of 4 there is the same for many turns.
    const all = [
      { x: 0, s: -1 },
      { x: 1000, z: 100, s: 2 },
      { x: 1000, z: 2000, s: -2 },
      { x: 2000, s: 1 },
    ];
    expect(set([plane(all)]).value?.turn.value).toBeCloseTo(0.001, 9);
    expect(largestOf([plane(all)])).toBeCloseTo(4, 9);
  });

  it('shares one turn between runs joined at a corner, each with its own offset', () => {
    const straight = plane(
      [
        { x: 0, s: 0 },
        { x: 2000, s: 0 },
      ],
      { id: 'a' },
    );
    const turned = {
      ...plane([], { id: 'b' }),
      points: face(
        [
          { x: 0, s: 0 },
          { x: 2000, s: 8 },
        ],
        'b',
      ),
    };
    const { value } = set([straight, turned]);
    expect(value?.turn.value).toBeCloseTo(0.002, 9);
    expect(value?.lines.map(({ largestGap }) => largestGap.gap.value)).toEqual([
      expect.closeTo(4, 9),
      expect.closeTo(4, 9),
    ]);
  });

  it('ties base and wall cabinets of a tall unit into one plane of two bands', () => {
    const wall = [0, 1000, 2000].flatMap((x) => [
      { x, z: 400, s: 0 },
      { x, z: 1200, s: 50 },
      { x, z: 1800, s: 5 },
    ]);
    const bands = [
      { x0Mm: 0, x1Mm: 2000, z0Mm: 400, z1Mm: 401 },
      { x0Mm: 0, x1Mm: 2000, z0Mm: 1800, z1Mm: 1801 },
    ];
    const [line] = set([plane(wall, { bands })]).value?.lines ?? [];
    expect(line?.largestGap.gap.value).toBeCloseTo(5, 6);
  });

  it('takes the front plane and turn of cabinets already set, and says what wall to cut', () => {
    const fixed = { atMm: 0, s: figure(3, 0.4, ['old-left']) };
    const { value } = set(
      [
        plane(
          [
            { x: 0, s: 0 },
            { x: 1000, s: 6 },
            { x: 2000, s: 0 },
          ],
          { fixed },
        ),
      ],
      { turn: figure(0.001, 0.0002, ['old-right']) },
    );
    const [line] = value?.lines ?? [];
    expect(line?.gaps.map(({ gap }) => gap.value)).toEqual([
      expect.closeTo(3, 9),
      expect.closeTo(-2, 9),
      expect.closeTo(5, 9),
    ]);
    expect(line?.wallToCut).toMatchObject([
      { ids: ['r1'], xMm: 1000, proud: { value: expect.closeTo(2, 9) } },
    ]);
    expect(line?.wallToCut[0]?.proud.u).toBeCloseTo(Math.hypot(0.4, 0.2, 0.3), 9);
    expect(line?.wallToCut[0]?.proud.from).toEqual(['old-left', 'old-right', 'r1']);
    expect(set([plane([{ x: 0, s: 0 }], { fixed })]).problems[0]?.code).toBe('turn-not-known');
  });

  it('puts the least gap at a finished end first, where the shop asks for it', () => {
    const all = [
      { x: 0, s: 0 },
      { x: 1000, s: 4 },
      { x: 2000, s: 0 },
    ];
    const free = set([plane(all)]).value?.lines[0];
    const shown = set([plane(all, { finishedEndMm: 2000 })]).value?.lines[0];
    const endOf = (line: typeof free) => line?.gaps.find(({ xMm }) => xMm === 2000)?.gap.value;
    expect(endOf(free)).toBeCloseTo(4, 9);
    expect(endOf(shown)).toBeCloseTo(0, 9);
    expect(shown?.largestGap).toMatchObject({ xMm: 0, gap: { value: expect.closeTo(8, 9) } });
    expect(shown?.edges).toMatchObject([
      { xMm: 2000, greatest: { gap: { value: expect.closeTo(0, 9) } } },
    ]);
    expect(set([plane(all, { finishedEndMm: 0 })]).value?.turn.value).toBeCloseTo(0.004, 9);
  });

  it('gives least and greatest gap behind each unit edge, over the rows', () => {
    const wall = [0, 1000].flatMap((x) => [
      { x, z: 100, s: 0 },
      { x, z: 800, s: x / 500 },
    ]);
    const [line] =
      set([
        plane(wall, {
          edgesMm: [0, 500, 1000, 1500],
          bands: [{ x0Mm: 0, x1Mm: 2000, z0Mm: 0, z1Mm: 900 }],
        }),
      ]).value?.lines ?? [];
    const middle = line?.edges.find(({ xMm }) => xMm === 500);
    expect(middle?.greatest).toMatchObject({
      zMm: 100,
      gap: { value: expect.closeTo(1.5, 9) },
    });
    expect(middle?.least.zMm).toBe(800);
    expect(middle?.extrapolated).toBe(false);
    expect(line?.edges.find(({ xMm }) => xMm === 1500)?.extrapolated).toBe(true);
  });

  it('says when one column of readings cannot fix the turn', () => {
    const { value, problems } = set([
      plane([
        { x: 500, z: 100, s: 0 },
        { x: 500, z: 2000, s: 3 },
      ]),
    ]);
    expect(value?.turnNotRead).toBe(true);
    expect(value?.turn.value).toBe(0);
    expect(problems.map(({ code }) => code)).toContain('turn-not-read');
  });

  it('states the spread of its gaps that Monte Carlo finds, the plumb of the reference with it', () => {
    const random = seeded(9);
    const shape = [
      { x: 0, z: 100, s: 0 },
      { x: 900, z: 1500, s: 8 },
      { x: 1600, z: 800, s: 1 },
      { x: 2400, z: 300, s: 7 },
    ];
    const drawn = () => {
      const reference = 0.0004 * random.normal();
      const moved = shape.map(({ x, z, s }) => ({
        x,
        z,
        s: s + 0.3 * random.normal() + reference * z,
      }));
      return set([plane(moved, { bands: [{ x0Mm: 0, x1Mm: 2400, z0Mm: 0, z1Mm: 2000 }] })], {
        uReference: 0.0004,
      }).value;
    };
    const stated = set([plane(shape, { bands: [{ x0Mm: 0, x1Mm: 2400, z0Mm: 0, z1Mm: 2000 }] })], {
      uReference: 0.0004,
    }).value;
    for (const of of [
      (value: typeof stated) => value?.lines[0]?.largestGap.gap,
      (value: typeof stated) => value?.lines[0]?.gaps[0]?.gap,
      (value: typeof stated) => value?.turnDeg,
      (value: typeof stated) => value?.lines[0]?.atRight.s,
    ]) {
      const { sd } = monteCarlo(700, () => of(drawn())?.value ?? Number.NaN);
      expect(Math.abs(sd / (of(stated)?.u ?? 0) - 1)).toBeLessThan(0.1);
    }
  }, 30_000);

  it('refuses mixed set-ups, no readings, and readings that are none', () => {
    const mixed = plane([], {
      points: [...face([{ x: 0, s: 0 }], 'a'), ...face([{ x: 900, s: 0 }], 'b')],
    });
    expect(set([mixed])).toMatchObject({ value: null, problems: [{ code: 'set-ups-mixed' }] });
    expect(set([plane([])]).problems[0]?.code).toBe('face-not-read');
    expect(set([]).problems[0]?.code).toBe('face-not-read');
    expect(set([plane([{ x: 0, s: Number.NaN }])]).problems[0]).toMatchObject({
      code: 'reading-not-a-number',
      about: ['r0'],
    });
  });
});
