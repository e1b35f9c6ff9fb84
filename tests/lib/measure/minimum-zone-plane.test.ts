import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planeOf, type SurfacePoint } from '@/lib/measure/minimum-zone-plane';
import { leastByVertices } from './linear-program';
import { monteCarlo, seeded } from './seeded';

const surface = (points: [number, number, number][], u = 0.3): SurfacePoint[] =>
  points.map(([xMm, yMm, sMm], at) => ({ id: `p${at}`, xMm, yMm, sMm, u }));
const zoneOf = (points: SurfacePoint[]) => planeOf(points).value?.minimumZone.value ?? Number.NaN;

/** Least 2h with |s − o − a·x − b·y| ≤ h, by looking at every vertex. */
function zoneByProgram(points: SurfacePoint[]): number {
  const constraints = points.flatMap(({ xMm, yMm, sMm }) => [
    { row: [-1, -xMm / 1000, -yMm / 1000, -1], limit: -sMm },
    { row: [1, xMm / 1000, yMm / 1000, -1], limit: sMm },
  ]);
  return 2 * (leastByVertices([0, 0, 0, 1], constraints) ?? Number.NaN);
}

describe('planeOf', () => {
  it('finds a saddle, where the slab rests edge on edge', () => {
    const saddle = surface([
      [0, 0, 1],
      [1000, 0, 0],
      [0, 1000, 0],
      [1000, 1000, 1],
    ]);
    const { value } = planeOf(saddle);
    expect(value?.minimumZone.value).toBeCloseTo(1, 12);
    expect(value?.leastSquares.value).toBeCloseTo(1, 12);
    expect(value?.contact).toBe('edge-edge');
    expect(value?.minimumZone.u).toBeCloseTo(0.3, 9);
  });

  it('finds a hump over a triangle, where the slab rests on a face and a place', () => {
    const { value } = planeOf(
      surface([
        [0, 0, 0],
        [2000, 0, 0],
        [0, 2000, 0],
        [600, 600, 5],
      ]),
    );
    expect(value?.minimumZone.value).toBeCloseTo(5, 9);
    expect(value?.contact).toBe('face');
    expect(value?.zonePlane).toMatchObject({
      slopeX: expect.closeTo(0, 9),
      slopeY: expect.closeTo(0, 9),
      atZeroMm: expect.closeTo(2.5, 9),
    });
  });

  it('gives no width and the plane itself for readings on a plane', () => {
    const points = surface([
      [0, 0, 5],
      [1000, 0, 6],
      [0, 1000, 3],
      [1000, 1000, 4],
      [500, 300, 4.9],
    ]);
    const { value } = planeOf(points);
    expect(value?.minimumZone.value).toBeCloseTo(0, 9);
    expect(value?.leastSquaresPlane.slopeX).toBeCloseTo(0.001, 12);
    expect(value?.leastSquaresPlane.slopeY).toBeCloseTo(-0.002, 12);
    expect(value?.slopeX.value).toBeCloseTo(0.001, 12);
  });

  it('equals a linear program on grids and on places anywhere, and lies under least squares', () => {
    const places = fc.oneof(
      fc.constant(
        Array.from({ length: 9 }, (_, at) => [(at % 3) * 600, Math.floor(at / 3) * 500] as const),
      ),
      fc.array(fc.tuple(fc.integer({ min: 0, max: 3000 }), fc.integer({ min: 0, max: 2400 })), {
        minLength: 4,
        maxLength: 9,
      }),
    );
    let seen = 0;
    fc.assert(
      fc.property(
        places,
        fc.array(fc.integer({ min: -60, max: 60 }), { minLength: 9, maxLength: 9 }),
        (at, s) => {
          const points = surface(at.map(([x, y], index) => [x, y, s[index]! / 8]));
          const { value } = planeOf(points);
          if (value === null) return;
          seen += 1;
          expect(value.minimumZone.value).toBeCloseTo(zoneByProgram(points), 6);
          expect(value.minimumZone.value).toBeLessThanOrEqual(value.leastSquares.value + 1e-9);
          const { slopeX, slopeY, atZeroMm } = value.zonePlane;
          const off = points.map(({ xMm, yMm, sMm }) =>
            Math.abs(sMm - atZeroMm - slopeX * xMm - slopeY * yMm),
          );
          expect(Math.max(...off)).toBeCloseTo(value.minimumZone.value / 2, 7);
        },
      ),
      { numRuns: 25 },
    );
    expect(seen).toBeGreaterThan(20);
  }, 30_000);

  it('does not mind tilt, turn, mirror or order, on a floor of 200 readings', () => {
    const random = seeded(5);
    const points = surface(
      Array.from({ length: 200 }, () => [
        random.between(0, 4000),
        random.between(0, 3000),
        random.between(-6, 6),
      ]),
    );
    const zone = zoneOf(points);
    const changed = (change: (point: SurfacePoint) => Partial<SurfacePoint>) =>
      zoneOf(points.map((point) => ({ ...point, ...change(point) })));
    expect(
      changed(({ xMm, yMm, sMm }) => ({ sMm: sMm + 0.05 * xMm - 0.3 * yMm + 900 })),
    ).toBeCloseTo(zone, 7);
    expect(
      changed(({ xMm, yMm }) => ({ xMm: 0.6 * xMm - 0.8 * yMm, yMm: 0.8 * xMm + 0.6 * yMm })),
    ).toBeCloseTo(zone, 8);
    expect(changed(({ xMm, sMm }) => ({ xMm: -xMm, sMm: -sMm }))).toBeCloseTo(zone, 8);
    expect(zoneOf([...points].reverse())).toBeCloseTo(zone, 8);
    // No direction found by a search of slopes is narrower.
    for (let trial = 0; trial < 400; trial += 1) {
      const [a, b] = [random.between(-0.002, 0.002), random.between(-0.002, 0.002)];
      const levels = points.map(({ xMm, yMm, sMm }) => sMm - a * xMm - b * yMm);
      expect(Math.max(...levels) - Math.min(...levels)).toBeGreaterThanOrEqual(zone - 1e-9);
    }
  });

  it('comes to an end on level grids, where many contacts tie', () => {
    for (const pattern of [
      () => 0,
      (at: number) => at % 2,
      (at: number) => (at % 7 === 0 ? 1 : 0),
    ]) {
      const grid = surface(
        Array.from({ length: 100 }, (_, at) => [
          (at % 10) * 300,
          Math.floor(at / 10) * 300,
          pattern(at),
        ]),
      );
      const { value } = planeOf(grid);
      const levels = grid.map(({ sMm }) => sMm);
      expect(value?.minimumZone.value).toBeLessThanOrEqual(
        Math.max(...levels) - Math.min(...levels) + 1e-9,
      );
    }
  });

  it('states the spread that Monte Carlo finds, of width and of slope', () => {
    const random = seeded(6);
    const shape: [number, number, number][] = [
      [0, 0, 0],
      [2400, 0, 4],
      [0, 2000, 4],
      [2400, 2000, 0],
      [900, 800, 12],
    ];
    const drawn = () =>
      planeOf(surface(shape.map(([x, y, s]) => [x, y, s + 0.3 * random.normal()]))).value;
    const stated = planeOf(surface(shape)).value;
    for (const of of [
      (value: typeof stated) => value?.minimumZone,
      (value: typeof stated) => value?.slopeX,
      (value: typeof stated) => value?.leastSquares,
    ]) {
      const { sd } = monteCarlo(1_000, () => of(drawn())?.value ?? Number.NaN);
      expect(Math.abs(sd / (of(stated)?.u ?? 0) - 1)).toBeLessThan(0.08);
    }
  }, 30_000);

  it('refuses three readings, readings in line, and readings that are none', () => {
    const code = (points: SurfacePoint[]) => planeOf(points).problems[0]?.code;
    expect(
      code(
        surface([
          [0, 0, 0],
          [1, 0, 0],
          [0, 1, 0],
        ]),
      ),
    ).toBe('too-few-readings');
    expect(
      code(
        surface([
          [0, 0, 0],
          [100, 50, 1],
          [200, 100, 3],
          [300, 150, 0],
        ]),
      ),
    ).toBe('places-in-line');
    expect(
      code(
        surface([
          [0, 0, 0],
          [0, 0, 1],
          [0, 0, 3],
          [0, 0, 0],
        ]),
      ),
    ).toBe('places-in-line');
    expect(
      code(
        surface([
          [0, 0, 0],
          [1, 0, Number.NaN],
          [0, 1, 0],
          [1, 1, 1],
        ]),
      ),
    ).toBe('reading-not-a-number');
  });
});
