import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { figure } from '@/lib/measure/figure';
import { type LevelPoint, levelSurface } from '@/lib/measure/floor-surface';
import { type KickInput, kickHeights } from '@/lib/measure/heights';
import type { KickRun } from '@/lib/measure/kick-run';
import { monteCarlo, seeded } from './seeded';

const drop = (xMm: number, yMm: number, valueMm: number, name = 'd'): LevelPoint => ({
  id: `${name}${xMm}/${yMm}`,
  xMm,
  yMm,
  valueMm,
  u: 0.4,
  setUpId: 'line',
});
/** A floor that falls to the right by 1 in 100 and out of the wall by 1 in 200. */
const falling = (heightOf = (x: number, y: number) => 1000 + x / 100 + y / 200) =>
  [0, 600, 1200, 1800].flatMap((x) => [0, 500].map((y) => drop(x, y, heightOf(x, y))));
const run = (drops: LevelPoint[], more: Partial<KickRun> = {}): KickRun => ({
  runId: 'run',
  drops,
  footprint: { x0Mm: 0, x1Mm: 1800, y0Mm: 0, y1Mm: 500 },
  faces: [{ side: 'front', atMm: 500 }],
  units: [{ unitId: 'sink', footprint: { x0Mm: 600, x1Mm: 1500, y0Mm: 0, y1Mm: 500 } }],
  ...more,
});
const input = (runs: KickRun[], more: Partial<KickInput> = {}): KickInput => ({
  runs,
  nominalKickMm: 100,
  fixedDatumDrop: null,
  floorToCome: { valueMm: 0, u: 0 },
  standsOn: 'finished-floor',
  legs: { minMm: 95, maxMm: 115 },
  uLevel: 0,
  scribe: { marginMm: 3, leastMm: 6, stepMm: 1 },
  ...more,
});
const kicks = (runs: KickRun[], more: Partial<KickInput> = {}) =>
  kickHeights(input(runs, more)).value;

describe('kickHeights', () => {
  it('hangs the datum on the high point and grows the kick where the floor falls', () => {
    const value = kicks([run(falling())]);
    expect(value?.datumDrop.value).toBeCloseTo(1000, 9);
    expect(value?.highPoint).toEqual({ runId: 'run', xMm: 0, yMm: 0, readingIds: ['d0/0'] });
    expect(value?.fall.value).toBeCloseTo(20.5, 9);
    expect(value?.runs[0]?.least.height.value).toBeCloseTo(100, 9);
    expect(value?.runs[0]?.greatest).toMatchObject({
      xMm: 1800,
      yMm: 500,
      height: { value: expect.closeTo(120.5, 9) },
    });
    expect(value?.words).toBe('Stands on the finished floor.');
  });

  it('gives the height at each unit corner, and says where the legs do not reach', () => {
    const corners =
      kicks([run(falling())], { legs: { minMm: 107, maxMm: 116 } })?.runs[0]?.corners ?? [];
    expect(corners.map(({ corner, height, legs }) => [corner, height.value, legs])).toEqual([
      ['back-left', expect.closeTo(106, 9), 'too-low'],
      ['back-right', expect.closeTo(115, 9), 'within'],
      ['front-left', expect.closeTo(108.5, 9), 'within'],
      ['front-right', expect.closeTo(117.5, 9), 'too-high'],
    ]);
    expect(corners.map(({ inDoubt }) => inDoubt)).toEqual([true, false, false, false]);
  });

  it('cuts the kick face from its least height plus the scribe allowance of its edge', () => {
    const [face] = kicks([run(falling())])?.runs[0]?.faces ?? [];
    expect(face?.least).toMatchObject({
      xMm: 0,
      yMm: 500,
      height: { value: expect.closeTo(102.5, 9) },
    });
    expect(face?.scribe.outOfTrue.value).toBeCloseTo(18, 9);
    const greatest = 120.5;
    const u = Math.hypot(0.4, 0.4);
    expect(face?.blankMm).toBe(Math.ceil(greatest + 2 * u + 3));
  });

  it('goes all round an island', () => {
    const faces = (['front', 'back', 'left', 'right'] as const).map((side) => ({
      side,
      atMm: { front: 500, back: 0, left: 0, right: 1800 }[side],
    }));
    const found = kicks([run(falling(), { faces })])?.runs[0]?.faces ?? [];
    expect(found.map(({ side, least }) => [side, least.height.value])).toEqual([
      ['front', expect.closeTo(102.5, 9)],
      ['back', expect.closeTo(100, 9)],
      ['left', expect.closeTo(100, 9)],
      ['right', expect.closeTo(118, 9)],
    ]);
  });

  it('gives runs that share a counter one datum', () => {
    const low = run(
      [0, 600].flatMap((x) => [0, 500].map((y) => drop(x, y, 1010, 'low'))),
      { runId: 'low', footprint: { x0Mm: 0, x1Mm: 600, y0Mm: 0, y1Mm: 500 }, units: [] },
    );
    const value = kicks([low, run(falling())]);
    expect(value?.highPoint?.runId).toBe('run');
    expect(value?.runs[0]?.least.height.value).toBeCloseTo(110, 9);
    expect(kicks([low])?.runs[0]?.least.height.value).toBeCloseTo(100, 9);
  });

  it('takes the datum of what is already set, and warns where the floor rises over it', () => {
    const value = kicks([run(falling())], { fixedDatumDrop: figure(1004, 0.5, ['old']) });
    expect(value?.highPoint).toBeNull();
    expect(value?.runs[0]?.least.height.value).toBeCloseTo(96, 9);
    expect(value?.runs[0]?.least.height.from).toEqual(['d0/0', 'old']);
    const sunk = kickHeights(
      input([run(falling())], { fixedDatumDrop: figure(1104, 0.5, ['old']) }),
    );
    expect(sunk.problems).toMatchObject([
      { code: 'kick-below-nothing', severity: 'warning', about: ['run'] },
    ]);
  });

  it('grows every kick by the floor to come where the boxes stand on the rough floor', () => {
    const floorToCome = { valueMm: 12, u: 0.5 };
    const rough = kicks([run(falling())], { floorToCome, standsOn: 'rough-floor' });
    expect(rough?.datumDrop.value).toBeCloseTo(988, 9);
    expect(rough?.runs[0]?.least.height.value).toBeCloseTo(112, 9);
    expect(rough?.runs[0]?.least.height.u).toBeCloseTo(0.5, 9);
    expect(rough?.words).toContain('12 mm (1/2")');
    const finished = kicks([run(falling())], { floorToCome });
    expect(finished?.runs[0]?.least.height.value).toBeCloseTo(100, 9);
    expect(finished?.runs[0]?.least.height.u).toBeCloseTo(0, 9);
  });

  it('says where it carries readings on', () => {
    const few = [0, 600].flatMap((x) => [0, 500].map((y) => drop(x, y, 1000)));
    const { problems, value } = kickHeights(input([run(few)]));
    expect(problems).toMatchObject([{ code: 'floor-carried-on', about: ['run'] }]);
    expect(value?.runs[0]?.corners.filter(({ extrapolated }) => extrapolated)).toHaveLength(2);
  });

  it('states the spread that Monte Carlo finds, the tilt of the level line with it', () => {
    const random = seeded(21);
    const drawn = () => {
      const [tiltX, tiltY] = [0.0005 * random.normal(), 0.0005 * random.normal()];
      const drops = falling().map((point) => ({
        ...point,
        valueMm: point.valueMm + tiltX * point.xMm + tiltY * point.yMm + 0.4 * random.normal(),
      }));
      return (
        kicks([run(drops)], { uLevel: 0.0005 })?.runs[0]?.corners[3]?.height.value ?? Number.NaN
      );
    };
    const stated = kicks([run(falling())], { uLevel: 0.0005 })?.runs[0]?.corners[3]?.height.u ?? 0;
    expect(Math.abs(monteCarlo(1_200, drawn).sd / stated - 1)).toBeLessThan(0.08);
  }, 30_000);

  it('is mirrored with its floor', () => {
    const s = fc.array(fc.integer({ min: -40, max: 40 }), { minLength: 8, maxLength: 8 });
    fc.assert(
      fc.property(s, (heights) => {
        const drops = falling().map((point, at) => ({
          ...point,
          valueMm: 1000 + heights[at]! / 4,
        }));
        const mirrored = drops.map((point) => ({ ...point, xMm: 1800 - point.xMm }));
        const units = [
          { unitId: 'sink', footprint: { x0Mm: 300, x1Mm: 1200, y0Mm: 0, y1Mm: 500 } },
        ];
        const [one, other] = [kicks([run(drops)]), kicks([run(mirrored, { units })])];
        const corner = (value: typeof one, name: string) =>
          value?.runs[0]?.corners.find(({ corner }) => corner === name)?.height.value ?? Number.NaN;
        expect(corner(other, 'front-left')).toBeCloseTo(corner(one, 'front-right'), 9);
        expect(corner(other, 'back-right')).toBeCloseTo(corner(one, 'back-left'), 9);
        expect(other?.runs[0]?.faces[0]?.blankMm).toBe(one?.runs[0]?.faces[0]?.blankMm);
      }),
      { numRuns: 60 },
    );
  }, 30_000);

  it('refuses a floor nobody read, mixed level lines, and readings that are none', () => {
    const code = (runs: KickRun[], more: Partial<KickInput> = {}) =>
      kickHeights(input(runs, more)).problems[0]?.code;
    expect(code([run([])])).toBe('floor-not-read');
    expect(code([])).toBe('floor-not-read');
    expect(code([run([drop(0, 0, 1000), { ...drop(600, 0, 900), setUpId: 'other' }])])).toBe(
      'set-ups-mixed',
    );
    expect(code([run([drop(0, 0, Number.NaN)])])).toBe('reading-not-a-number');
    expect(code([run(falling())], { scribe: { marginMm: 1, leastMm: 1, stepMm: 0 } })).toBe(
      'rules-not-known',
    );
    expect(code([run(falling())], { uLevel: -1 })).toBe('uncertainty-not-known');
  });
});

describe('levelSurface', () => {
  const at = levelSurface(falling());

  it('passes through every reading and is straight between them', () => {
    for (const point of falling()) {
      expect(at(point.xMm, point.yMm)).toMatchObject({
        extrapolated: false,
        c: { value: expect.closeTo(point.valueMm, 9) },
      });
    }
    expect(at(150, 250).c.value).toBeCloseTo(1000 + 1.5 + 1.25, 9);
  });

  it('leaves out a line that does not reach, and a lone reading beside full lines', () => {
    const lone = levelSurface([...falling(), drop(900, 250, 1500)]);
    expect(lone(300, 250).c.value).toBeCloseTo(1000 + 3 + 1.25, 9);
    expect(lone(900, 250).c.value).toBeCloseTo(1500, 9);
  });

  it('marks what lies outside the readings', () => {
    expect(at(2400, 0)).toMatchObject({
      extrapolated: true,
      c: { value: expect.closeTo(1018, 9) },
    });
    expect(at(600, 900).extrapolated).toBe(true);
    expect(levelSurface([])(0, 0)).toMatchObject({ extrapolated: true, c: { value: 0 } });
  });
});
