import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ProfilePoint } from '@/lib/measure/profile';
import { straightedgeGap } from '@/lib/measure/straightedge-gap';
import { straightness } from '@/lib/measure/straightness';
import { leastByVertices } from './linear-program';
import { monteCarlo, seeded } from './seeded';

const row = (s: number[], step = 500, u = 0.3): ProfilePoint[] =>
  s.map((sMm, at) => ({ id: `r${at}`, atMm: at * step, sMm, u }));
const zoneOf = (points: ProfilePoint[]) =>
  straightness(points).value?.minimumZone.value ?? Number.NaN;

/** Least 2h with |s − o − t · at| ≤ h, by looking at every vertex. */
function zoneByProgram(points: { atMm: number; sMm: number }[]): number {
  const constraints = points.flatMap(({ atMm, sMm }) => [
    { row: [-1, -atMm, -1], limit: -sMm },
    { row: [1, atMm, -1], limit: sMm },
  ]);
  return 2 * (leastByVertices([0, 0, 1], constraints) ?? Number.NaN);
}

const drawnRow = fc
  .uniqueArray(fc.integer({ min: 0, max: 60 }), { minLength: 3, maxLength: 8 })
  .chain((places) =>
    fc.tuple(
      ...places.map((place) => fc.integer({ min: -80, max: 80 }).map((s) => ({ place, s }))),
    ),
  )
  .map((all) =>
    all.map(({ place, s }, at) => ({ id: `r${at}`, atMm: place * 50, sMm: s / 8, u: 0.3 })),
  );

describe('straightness', () => {
  it('finds a bulge of 3 mm and how sure it is', () => {
    const { value } = straightness(row([0, 3, 0]));
    expect(value?.minimumZone.value).toBeCloseTo(3, 12);
    expect(value?.minimumZone.u).toBeCloseTo(0.3674, 4);
    expect(value?.leastSquares.value).toBeCloseTo(3, 12);
    expect(value?.shape).toBe('bulge');
    expect(value?.minimumZone.from).toHaveLength(3);
  });

  it('takes widths along s, also for a row that leans', () => {
    const leaning = [0, 800, 1000].map((atMm, at) => ({
      id: `${at}`,
      atMm,
      sMm: [0, 3, 0][at]! + 0.02 * atMm,
      u: 0.3,
    }));
    expect(zoneOf(leaning)).toBeCloseTo(3, 9);
  });

  it('tells hollow, bulge, wavy, and straight within the reading', () => {
    const shape = (s: number[]) => straightness(row(s)).value?.shape;
    expect(shape([4, 0, 0, 4])).toBe('hollow');
    expect(shape([0, 4, 4, 0])).toBe('bulge');
    expect(shape([0, 4, -4, 4, 0])).toBe('wavy');
    expect(shape([0, 4, -4, 0])).toBe('wavy');
    expect(shape([1, 0, 4, 8, 5, 0])).toBe('bulge');
    expect(shape([8, 5, 6, 0, 7])).toBe('hollow');
    expect(shape([0, 0.5, 0])).toBe('straight');
  });

  it('equals a linear program, lies under least squares, and does not mind order, tilt or mirror', () => {
    fc.assert(
      fc.property(drawnRow, fc.integer({ min: -20, max: 20 }), (points, tilt) => {
        const { value } = straightness(points);
        const zone = value?.minimumZone.value ?? Number.NaN;
        expect(zone).toBeCloseTo(zoneByProgram(points), 6);
        expect(zone).toBeLessThanOrEqual((value?.leastSquares.value ?? 0) + 1e-9);
        expect(zoneOf([...points].reverse())).toBeCloseTo(zone, 9);
        expect(zoneOf(points.map((point) => ({ ...point, atMm: -point.atMm })))).toBeCloseTo(
          zone,
          9,
        );
        const tilted = points.map((point) => ({
          ...point,
          sMm: point.sMm + (tilt / 1000) * point.atMm + 7,
        }));
        expect(zoneOf(tilted)).toBeCloseTo(zone, 8);
        const line = value?.zoneLine ?? { slope: Number.NaN, atZeroMm: Number.NaN };
        const gaps = points.map(({ atMm, sMm }) => line.atZeroMm + line.slope * atMm - sMm);
        expect(Math.min(...gaps)).toBeCloseTo(0, 8);
        expect(Math.max(...gaps)).toBeCloseTo(zone, 8);
      }),
      { numRuns: 120 },
    );
  }, 30_000);

  it('states the spread that Monte Carlo finds', () => {
    const random = seeded(3);
    const s = [0, 2, 6, 3, 0];
    const drawn = () => zoneOf(row(s.map((value) => value + 0.3 * random.normal())));
    const { sd } = monteCarlo(4_000, drawn);
    expect(Math.abs(sd / (straightness(row(s)).value?.minimumZone.u ?? 0) - 1)).toBeLessThan(0.05);
    const { sd: squares } = monteCarlo(
      8_000,
      () =>
        straightness(row(s.map((value) => value + 0.3 * random.normal()))).value?.leastSquares
          .value ?? Number.NaN,
    );
    expect(squares / (straightness(row(s)).value?.leastSquares.u ?? 0)).toBeLessThan(1.05);
  }, 30_000);

  it('does not change what it is given', () => {
    const points = row([0, 3, 1, 2]).reverse();
    const copy = structuredClone(points);
    straightness(points);
    straightedgeGap(points, 700);
    expect(points).toEqual(copy);
  });

  it('refuses too few places and readings that are none', () => {
    const code = (points: ProfilePoint[]) => straightness(points).problems[0]?.code;
    expect(code(row([0, 3]))).toBe('too-few-readings');
    expect(code([...row([0, 3]), ...row([1])])).toBe('too-few-readings');
    expect(code([])).toBe('too-few-readings');
    expect(straightness(row([0, Number.NaN, 0])).problems[0]).toMatchObject({
      code: 'reading-not-a-number',
      about: ['r1'],
    });
  });
});

describe('straightedgeGap', () => {
  const gapOf = (points: ProfilePoint[], length: number) =>
    straightedgeGap(points, length).value?.gap.value ?? Number.NaN;

  it('finds where it shows most', () => {
    const { value } = straightedgeGap(row([0, 0, 4, 0, 0]), 1000);
    expect(value).toMatchObject({ fromMm: 500, toMm: 1500, wholeRow: false });
    expect(value?.gap.value).toBeCloseTo(4, 12);
    expect(value?.gap.u).toBeCloseTo(0.3674, 4);
  });

  it('takes a shorter row whole wherever its readings lie along the wall', () => {
    for (let shift = 0; shift < 700; shift += 13.37) {
      const points = [0, 450.1, 900.7].map((at, i) => ({
        id: `r${i}`,
        atMm: shift + at,
        sMm: i === 1 ? 1.5 : 0,
        u: 0.3,
      }));
      const { value } = straightedgeGap(points, 2_000);
      expect(value?.wholeRow).toBe(true);
      expect(value?.gap.value).toBeCloseTo(1.5, 9);
    }
  });

  it('takes a shorter row whole', () => {
    expect(straightedgeGap(row([0, 3, 0]), 3000).value).toMatchObject({
      fromMm: 0,
      toMm: 1000,
      wholeRow: true,
    });
    expect(gapOf(row([0, 3, 0]), 3000)).toBeCloseTo(3, 12);
  });

  it('finds a gap that shows with both ends between readings', () => {
    // A hollow between two slopes: the chord is deepest over the middle when it lies level across it.
    const valley = [0, 400, 1000, 1600, 2000].map((atMm, at) => ({
      id: `${at}`,
      atMm,
      sMm: [6, 5, 0, 5, 2][at]!,
      u: 0.3,
    }));
    const found = straightedgeGap(valley, 1400);
    const dense = Math.max(
      ...Array.from({ length: 6001 }, (_, at) => windowZone(valley, at / 10, 1400)),
    );
    expect(found.value?.gap.value).toBeGreaterThanOrEqual(dense - 1e-9);
    expect(found.value?.gap.value).toBeCloseTo(dense, 5);
  });

  it('is never less than a straightedge slid along in small steps, and that comes as near as the steps', () => {
    fc.assert(
      fc.property(drawnRow, fc.integer({ min: 200, max: 2500 }), (points, length) => {
        const ats = points.map(({ atMm }) => atMm);
        const [first, last] = [Math.min(...ats), Math.max(...ats)];
        const whole = last - first <= length;
        const run = whole ? 0 : last - first - length;
        let dense = 0;
        for (let step = 0; step <= 400; step += 1) {
          dense = Math.max(
            dense,
            windowZone(points, first + (run * step) / 400, whole ? last - first : length),
          );
        }
        const found = gapOf(points, length);
        expect(found).toBeGreaterThanOrEqual(dense - 1e-7);
        expect(found - dense).toBeLessThan(0.05 * (1 + dense));
      }),
      { numRuns: 30 },
    );
  }, 30_000);

  it('states the spread that Monte Carlo finds, with both ends between readings', () => {
    const random = seeded(14);
    const s = [0, 1, 7, 2, 0, 1];
    const drawn = () => gapOf(row(s.map((value) => value + 0.3 * random.normal())), 1300);
    const stated = straightedgeGap(row(s), 1300).value;
    const { sd } = monteCarlo(3_000, drawn);
    expect(Math.abs(sd / (stated?.gap.u ?? 0) - 1)).toBeLessThan(0.06);
  }, 30_000);

  it('refuses a straightedge of no length', () => {
    expect(straightedgeGap(row([0, 3, 0]), 0).problems[0]?.code).toBe('edge-not-positive');
    expect(straightedgeGap(row([0, 3, 0]), Number.NaN).problems[0]?.code).toBe('edge-not-positive');
    expect(straightedgeGap(row([0, 3]), 1000).problems[0]?.code).toBe('too-few-readings');
  });

  /** Narrowest strip of the profile in one window, by trying the slope of every pair of its points. */
  function windowZone(points: ProfilePoint[], from: number, length: number): number {
    const sorted = [...points].sort((a, b) => a.atMm - b.atMm);
    const at = (x: number) => {
      const to = sorted.findIndex(({ atMm }) => atMm >= x - 1e-9);
      const [a, b] = [sorted[Math.max(0, to - 1)]!, sorted[to]!];
      return a === b ? a.sMm : a.sMm + ((b.sMm - a.sMm) * (x - a.atMm)) / (b.atMm - a.atMm);
    };
    const inside = sorted
      .filter(({ atMm }) => atMm > from && atMm < from + length)
      .map(({ atMm, sMm }) => [atMm, sMm] as const);
    const window = [
      [from, at(from)] as const,
      ...inside,
      [from + length, at(from + length)] as const,
    ];
    let least = Infinity;
    for (const [i, [x1, s1]] of window.entries()) {
      for (const [x2, s2] of window.slice(i + 1)) {
        const slope = (s2 - s1) / (x2 - x1);
        const levels = window.map(([x, s]) => s - slope * x);
        least = Math.min(least, Math.max(...levels) - Math.min(...levels));
      }
    }
    return least;
  }
});
