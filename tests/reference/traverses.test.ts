import { describe, expect, it } from 'vitest';
import { closeTraverse, type Traverse, type TraverseLeg } from '@/lib/measure/close-traverse';
import data from './data/traverses.json';

/** "S68-05-35W" or "N5-30E" to an azimuth from north, degrees clockwise. */
function azimuthOf(bearing: string): number {
  const match = /^([NS])(\d+)-(\d+)(?:-(\d+))?([EW])$/.exec(bearing);
  if (!match) throw new Error(`No bearing: ${bearing}`);
  const angle = Number(match[2]) + Number(match[3]) / 60 + Number(match[4] ?? 0) / 3600;
  const fromNorth = match[1] === 'N' ? angle : 180 - angle;
  return match[5] === 'E' ? fromNorth : 360 - fromNorth;
}

function dmsOf(text: string): number {
  const [d = 0, m = 0, s = 0] = text.split('-').map(Number);
  return d + m / 60 + s / 3600;
}

/** Interior angles of a clockwise walk from its azimuths; x is north and y east. */
function walkBy(azimuths: number[], lengths: number[]): Traverse {
  const legs = lengths.map((value, i): TraverseLeg => {
    const before = azimuths[(i + azimuths.length - 1) % azimuths.length] ?? 0;
    const angle = (((180 + before - (azimuths[i] ?? 0)) % 360) + 360) % 360;
    return { length: { value, u: 0, from: [] }, leftAngle: { value: angle, u: 0, from: [] } };
  });
  const { value } = closeTraverse({ closed: true, legs, firstHeadingDeg: azimuths[0] ?? 0 });
  if (!value) throw new Error('The traverse was refused.');
  return value;
}

type BearingCase = { legs: (string | number)[][] };
const walkOf = ({ legs }: BearingCase) =>
  walkBy(
    legs.map((leg) => azimuthOf(String(leg[1]))),
    legs.map((leg) => Number(leg[2])),
  );

function expectAll(found: number[], printed: number[], within: number): void {
  expect(found).toHaveLength(printed.length);
  for (const [i, value] of printed.entries()) {
    expect(Math.abs((found[i] ?? Number.NaN) - value)).toBeLessThanOrEqual(within);
  }
}

const adjustedSteps = ({ points }: Traverse) =>
  points.map((point, i) => {
    const next = points[(i + 1) % points.length] ?? point;
    return { north: next.xMm - point.xMm, east: next.yMm - point.yMm };
  });

describe('closed traverses as published', () => {
  it('walks, closes and adjusts a surveying library’s bearing traverse, with its coordinates and area', () => {
    const { inputs, published } = data['mahun-bearing'];
    const walk = walkOf(inputs);
    expect(walk.perimeterMm).toBeCloseTo(published.perimeter, 6);
    expectAll(
      walk.steps.map(({ dxMm }) => dxMm),
      published.lat,
      0.0011,
    );
    expectAll(
      walk.steps.map(({ dyMm }) => dyMm),
      published.dep,
      0.0011,
    );
    expect(walk.gap.dxMm).toBeCloseTo(published.sum_lat, 2);
    expect(walk.gap.dyMm).toBeCloseTo(published.sum_dep, 2);
    expectAll(
      adjustedSteps(walk).map(({ north }) => north),
      published.adj_lat,
      0.0015,
    );
    expectAll(
      adjustedSteps(walk).map(({ east }) => east),
      published.adj_dep,
      0.0015,
    );
    const coordinates = walk.points.map(({ xMm, yMm }) => [
      inputs.start.N + xMm,
      inputs.start.E + yMm,
    ]);
    for (const [i, printed] of Object.values(published.coords_NE).entries()) {
      expectAll(coordinates[i] ?? [], printed, 0.0025);
    }
    expect(Math.abs((walk.areaMm2 ?? 0) - published.area_sqft)).toBeLessThan(0.6);
  });

  it('adjusts the library’s second traverse', () => {
    const { inputs, published } = data['mahun-adj-1'];
    const walk = walkOf(inputs);
    expect(walk.gap.dxMm).toBeCloseTo(published.sum_lat, 2);
    expect(walk.gap.dyMm).toBeCloseTo(published.sum_dep, 2);
    expectAll(
      adjustedSteps(walk).map(({ north }) => north),
      published.adj_lat,
      0.0015,
    );
    expectAll(
      adjustedSteps(walk).map(({ east }) => east),
      published.adj_dep,
      0.0015,
    );
  });

  it('agrees with a six-leg traverse printed to four decimals, closure, precision and area', () => {
    const { inputs, published } = data['six-leg-dmd'];
    const walk = walkOf(inputs);
    expectAll(
      walk.steps.map(({ dxMm }) => dxMm),
      published.lat,
      0.00011,
    );
    expectAll(
      walk.steps.map(({ dyMm }) => dyMm),
      published.dep,
      0.00011,
    );
    expect(walk.linearMisclosure?.value).toBeCloseTo(published.linear_error, 3);
    expect(walk.relativePrecision).toBeGreaterThan(200);
    expect(walk.relativePrecision).toBeLessThan(205);
    expectAll(
      adjustedSteps(walk).map(({ north }) => north),
      published.adj_lat,
      0.00011,
    );
    expectAll(
      adjustedSteps(walk).map(({ east }) => east),
      published.adj_dep,
      0.00011,
    );
    expectAll(
      adjustedSteps(walk).map(({ north, east }) => Math.hypot(north, east)),
      published.adj_length,
      0.0006,
    );
    expect(Math.abs((walk.areaMm2 ?? 0) - published.area)).toBeLessThan(0.5);
  });

  it('balances six measured angles, one of them re-entrant, and closes at 1 to 78000', () => {
    const { inputs, published } = data['angles-right-6'];
    // This one is walked the other way round: seen in a mirror, headings turn about.
    const legs = Object.values(inputs.angles_right).map(
      (angle, i): TraverseLeg => ({
        length: { value: inputs.lengths[i] ?? 0, u: 0, from: [] },
        leftAngle: { value: dmsOf(angle), u: 0, from: [] },
      }),
    );
    const first = dmsOf(inputs.azimuth_AB);
    const { value } = closeTraverse({ closed: true, legs, firstHeadingDeg: -first });
    const sum = legs.reduce((total, { leftAngle }) => total + (leftAngle?.value ?? 0), 0);
    expect(sum).toBeCloseTo(dmsOf(published.angle_sum), 9);
    expect(value?.angleMisclosure?.value).toBeCloseTo(18 / 3600, 9);
    const corrections = legs.map(
      ({ leftAngle }, i) => ((value?.balancedAnglesDeg[i] ?? 0) - (leftAngle?.value ?? 0)) * 3600,
    );
    expectAll(
      corrections,
      corrections.map(() => published.correction_per_angle_sec),
      1e-6,
    );
    const azimuths = value?.headingsDeg.map((heading) => ((-heading % 360) + 360) % 360) ?? [];
    expectAll(azimuths, published.azimuths.map(dmsOf), 1.1 / 3600);
    expectAll(value?.steps.map(({ dxMm }) => dxMm) ?? [], published.lat, 0.0025);
    expectAll(value?.steps.map(({ dyMm }) => -dyMm) ?? [], published.dep, 0.0025);
    expect(value?.linearMisclosure?.value).toBeCloseTo(published.misclosure, 2);
    expect(Math.abs((value?.relativePrecision ?? 0) - 78_000)).toBeLessThan(4_000);
  });

  it('finds the area of five published corners', () => {
    const { inputs, published } = data['mahun-area-5'];
    const corners = inputs.coords_NE.map(
      ([, north, east]) => [Number(north), Number(east)] as const,
    );
    const legs = corners.map(([north, east], i) => {
      const [toNorth, toEast] = corners[(i + 1) % corners.length] ?? [0, 0];
      const azimuth = (Math.atan2(toEast - east, toNorth - north) * 180) / Math.PI;
      return { azimuth, length: Math.hypot(toNorth - north, toEast - east) };
    });
    const walk = walkBy(
      legs.map(({ azimuth }) => azimuth),
      legs.map(({ length }) => length),
    );
    // The printed sums are rounded to whole square feet, product by product.
    expect(Math.abs(Math.abs(walk.areaMm2 ?? 0) - published.area_sqft)).toBeLessThan(1.5);
  });
});
