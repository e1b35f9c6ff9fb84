import { describe, expect, it } from 'vitest';
import { adjustRoom } from '@/lib/measure/adjust-room';
import type { SparseRow } from '@/lib/measure/adjusted-room';
import { checkObservations } from '@/lib/measure/check-observations';
import { choleskyOf, invertCholesky, solveCholesky } from '@/lib/measure/cholesky';
import type { RoomObservation } from '@/lib/measure/room-observations';
import { project, varianceOf } from '@/lib/measure/row-products';
import { weightedSquares } from '@/lib/measure/solve-room';
import levelLoop from './data/level-loop.json';
import planeNetwork from './data/plane-network.json';

const wallIds = ['A', 'B', 'C', 'D', 'E', 'F'];

describe('a room adjusted by another library', () => {
  const { inputs, reckoned } = planeNetwork;
  const wallAt = (i: number) => wallIds[i] ?? '';
  const common = { readingIds: ['read'], unit: 'mm' as const, zMm: 910 };
  // The face is read and flat, so that no bow is left to guess: the plain equations of the plane.
  const flat = { valueMm: 0, uMm: 0 };
  const observations: RoomObservation[] = [
    ...inputs.lengthsMm.map(
      (valueMm, i): RoomObservation => ({
        ...common,
        kind: 'length',
        wallId: wallAt(i),
        yMm: 0,
        valueMm,
        uMm: inputs.uLengthMm,
      }),
    ),
    ...inputs.anglesDeg.map(
      (angleDeg, i): RoomObservation => ({
        ...common,
        kind: 'corner',
        cornerWallId: wallAt(i),
        angleDeg,
        uDeg: inputs.uAngleDeg,
        armLeftMm: 900,
        armRightMm: 900,
        proudLeft: flat,
        proudRight: flat,
        legs: null,
      }),
    ),
    ...inputs.diagonals.map(
      ([from = 0, to = 0, valueMm = 0]): RoomObservation => ({
        ...common,
        kind: 'diagonal',
        from: { wallId: wallAt(from), end: 'left' },
        to: { wallId: wallAt(to), end: 'left' },
        valueMm,
        uMm: inputs.uDiagonalMm,
      }),
    ),
  ];
  const walls = wallIds.map((id, i) => ({
    id,
    nominalLengthMm: inputs.lengthsMm[i] ?? 0,
    leftCornerDeg: id === 'D' ? 270 : 90,
  }));
  const room = adjustRoom({ chains: [{ closed: true, walls }] }, observations, {
    usualBowMm: 3,
    zRefMm: 910,
  }).value;

  it('stands at the same corners, to a thousandth of a millimetre', () => {
    expect(room?.corners).toHaveLength(6);
    for (const [i, corner] of (room?.corners ?? []).entries()) {
      expect(corner.xMm).toBeCloseTo(reckoned.corners[i]?.[0] ?? Number.NaN, 3);
      expect(corner.yMm).toBeCloseTo(reckoned.corners[i]?.[1] ?? Number.NaN, 3);
    }
    expect(room?.chiSquare.value).toBeCloseTo(reckoned.chiSquare, 6);
  });

  it('has the same adjusted lengths, angles and diagonals, redundancies and tests w', () => {
    for (const [i, check] of (room?.checks ?? []).entries()) {
      expect(check.adjusted).toBeCloseTo(reckoned.adjusted[i] ?? Number.NaN, 4);
      expect(check.redundancy).toBeCloseTo(reckoned.redundancies[i] ?? Number.NaN, 5);
      expect(check.w).toBeCloseTo(reckoned.w[i] ?? Number.NaN, 3);
    }
  });

  it('has the same error ellipses', () => {
    for (const [i, { ellipse }] of (room?.corners ?? []).entries()) {
      const { a = Number.NaN, b = Number.NaN, angleDeg = Number.NaN } = reckoned.ellipses[i] ?? {};
      expect(ellipse.aMm).toBeCloseTo(a, 4);
      expect(ellipse.bMm).toBeCloseTo(b, 4);
      // A long axis has two ends: 150° and −30° are one direction.
      const apart = a > 0 ? (((ellipse.angleDeg - angleDeg) % 180) + 180) % 180 : 0;
      expect(Math.min(apart, 180 - apart)).toBeLessThan(1e-2);
    }
  });
});

describe('a loop of levels as published', () => {
  const { inputs, published } = levelLoop;
  const sigma = inputs.sigmaMm;
  const columnOf = (point: string | number) => inputs.unknown.indexOf(String(point));
  const rows = inputs.differences.map(([from = '', to = '']): SparseRow => {
    const ends = [
      { column: columnOf(to), partial: 1 },
      { column: columnOf(from), partial: -1 },
    ].filter(({ column }) => column >= 0);
    return {
      columns: ends.map(({ column }) => column),
      partials: ends.map(({ partial }) => partial),
      sigma,
    };
  });
  const size = inputs.unknown.length;
  // From heights of 1000 m each: what is read is then what is left, in mm.
  const read = inputs.differences.map(([, , metres]) => 1_000 * Number(metres));
  const normal = new Float64Array(size * size);
  const right = new Float64Array(size);
  for (const [i, { columns, partials }] of rows.entries()) {
    for (const [k, column] of columns.entries()) {
      right[column] = (right[column] ?? 0) + (partials[k] ?? 0) * (read[i] ?? 0);
      for (const [m, other] of columns.entries()) {
        const at = column * size + other;
        normal[at] = (normal[at] ?? 0) + (partials[k] ?? 0) * (partials[m] ?? 0);
      }
    }
  }
  const weighted = normal.map((value) => value / sigma ** 2);
  const lower = choleskyOf(weighted, size) ?? new Float64Array(size * size);
  const heights = solveCholesky(
    lower,
    size,
    right.map((value) => value / sigma ** 2),
  );
  const cofactor = invertCholesky(lower, size);
  const residuals = Float64Array.from(rows, (row, i) => project(row, heights) - (read[i] ?? 0));
  const { checks } = checkObservations(
    inputs.differences.map(
      (_, i): RoomObservation => ({
        kind: 'width',
        wallId: 'A',
        toWallId: 'B',
        xMm: 0,
        zMm: 0,
        valueMm: read[i] ?? 0,
        uMm: sigma,
        readingIds: [`${i + 1}`],
        unit: 'mm',
      }),
    ),
    { rows, residuals, cofactor },
  );

  it('comes to the printed heights and their printed standard deviations', () => {
    for (const [column, point] of inputs.unknown.entries()) {
      const name = point as keyof typeof published.heightsM;
      const heightM = inputs.fixed.heightM + (heights[column] ?? Number.NaN) / 1_000;
      expect(heightM).toBeCloseTo(published.heightsM[name], 5);
      const alone = { columns: [column], partials: [1] };
      expect(Math.sqrt(varianceOf(cofactor, alone))).toBeCloseTo(published.stdDevMm[name], 1);
    }
  });

  it('comes to the printed differences, the printed sum of squares, and tests what is printed as worst', () => {
    for (const [i, check] of checks.entries()) {
      const printed = published.adjustedM[i] ?? Number.NaN;
      // Printed to five decimals; 1.224875 may be rounded either way.
      expect(Math.abs(check.adjusted / 1_000 - printed)).toBeLessThan(0.6e-5);
    }
    expect(rows.length - size).toBe(published.degreesOfFreedom);
    // [pvv] is printed with the weight (5/5)²: in square millimetres.
    expect(weightedSquares({ rows, residuals }) * sigma ** 2).toBeCloseTo(published.pvvMm2, 3);
    const sizes = checks.map(({ w }) => Math.abs(w));
    const { observation, value } = published.greatestNormalised;
    expect(sizes.indexOf(Math.max(...sizes)) + 1).toBe(observation);
    expect(Math.max(...sizes)).toBeCloseTo(value, 2);
  });

  it('shares its redundancy out: the numbers add up to the degrees of freedom', () => {
    const sum = checks.reduce((total, { redundancy }) => total + redundancy, 0);
    expect(sum).toBeCloseTo(published.degreesOfFreedom, 9);
  });
});
