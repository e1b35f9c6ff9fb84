import { describe, expect, it } from 'vitest';
import { cornerAngle } from '@/lib/measure/corner';
import { straightness } from '@/lib/measure/straightness';
import { rowFrom } from '../lib/measure/row-from';
import data from './data/squareness.json';

const legs = (a: number, b: number, c: number) =>
  cornerAngle({
    method: 'legs',
    legLeft: { id: 'a', value: a, u: 0.5 },
    legRight: { id: 'b', value: b, u: 0.5 },
    diagonal: { id: 'c', value: c, u: 0.5 },
    carriedPast: false,
  }).value?.value ?? Number.NaN;

describe('squareness as published', () => {
  it.each(data.triples.published)('takes %d, %d and %d feet as square', (a = 0, b = 0, c = 0) => {
    expect(legs(a * 304.8, b * 304.8, c * 304.8)).toBeCloseTo(90, 9);
  });

  it('takes a square’s side and its diagonal by the published factor as square, to the factor’s digits', () => {
    expect(legs(1000, 1000, 1000 * data.square.published.squareDiagonalFactor)).toBeCloseTo(90, 1);
  });

  it('finds slopes, residuals and squareness of two measured axes by least squares', () => {
    const { inputs, published } = data.twoAxes;
    const arcseconds = (microns: number) => (Math.atan(microns / 1e6) * 180 * 3600) / Math.PI;
    const [first, second] = [inputs.axis1, inputs.axis2].map(
      ({ x_m, y_um }) => straightness(rowFrom(x_m, y_um)).value,
    );
    const squares = published.least_squares;
    expect(first?.leastSquaresLine.slope).toBeCloseTo(squares.m1_um_per_m, 2);
    expect(second?.leastSquaresLine.slope).toBeCloseTo(squares.m2_um_per_m, 2);
    expect(second?.leastSquaresLine.atZeroMm).toBeCloseTo(squares.b2_um, 3);
    const line = second?.leastSquaresLine ?? { slope: Number.NaN, atZeroMm: Number.NaN };
    for (const [at, x] of inputs.axis2.x_m.entries()) {
      const residual = (inputs.axis2.y_um[at] ?? 0) - line.atZeroMm - line.slope * x;
      const printed = squares.abs_residual2_um[at] ?? Number.NaN;
      // Printed to two or three digits, some from rounded slopes.
      expect(Math.abs(Math.abs(residual) - printed)).toBeLessThan(0.006);
    }
    const theta = [first, second].map((axis) =>
      arcseconds(axis?.leastSquaresLine.slope ?? Number.NaN),
    );
    expect(theta[0]).toBeCloseTo(squares.theta1_arcsec, 1);
    expect(theta[1]).toBeCloseTo(squares.theta2_arcsec, 1);
    expect((theta[1] ?? 0) - (theta[0] ?? 0)).toBeCloseTo(squares.squareness_arcsec, 1);
  });

  it('finds a minimum zone no wider than least squares and than end points', () => {
    for (const { x_m, y_um } of [data.twoAxes.inputs.axis1, data.twoAxes.inputs.axis2]) {
      const value = straightness(rowFrom(x_m, y_um)).value;
      const [x0 = 0, y0 = 0] = [x_m[0], y_um[0]];
      const slope = ((y_um.at(-1) ?? 0) - y0) / ((x_m.at(-1) ?? 0) - x0);
      const residuals = y_um.map((y, at) => y - y0 - slope * ((x_m[at] ?? 0) - x0));
      const endPoint = Math.max(...residuals) - Math.min(...residuals);
      expect(value?.minimumZone.value).toBeLessThanOrEqual(value?.leastSquares.value ?? 0);
      expect(value?.minimumZone.value).toBeLessThanOrEqual(endPoint);
    }
  });
});
