import { describe, expect, it } from 'vitest';
import { combinationFigure, combine, readCombination } from '@/lib/measure/combination';
import { plumbOf } from '@/lib/measure/plumb';
import { straightness } from '@/lib/measure/straightness';
import { toolCommonPart } from '@/lib/measure/uncertainty';
import { rowFrom } from '../lib/measure/row-from';
import data from './data/uncertainty.json';

describe('uncertainty as published', () => {
  it('propagates the end gauge of GUM H.1: value, u and its largest parts', () => {
    const { inputs, published } = data.endGauge;
    const [ls = 0, uLs = 0] = inputs.ls_nm;
    const [d = 0, uMean = 0] = inputs.d_mean_nm;
    const uD = Math.hypot(uMean, inputs.d1_nm[1] ?? 0, inputs.d2_nm[1] ?? 0);
    const rectangular = (halfWidth: number) => halfWidth / Math.sqrt(3);
    const [theta = 0] = inputs.theta_mean_C;
    const u = {
      alpha: rectangular(inputs.delta_alpha.uniform_half_width),
      theta: rectangular(inputs.delta_theta.uniform_half_width),
    };
    // l = ls + d − ls(δα·θ + αs·δθ), linearised at δα = δθ = 0.
    const length = combine([
      [1, readCombination('standard', ls, uLs)],
      [1, readCombination('difference', d, uD)],
      [-ls * theta, readCombination('expansion', 0, u.alpha)],
      [-ls * inputs.alpha_s.mean, readCombination('temperature', 0, u.theta)],
    ]);
    const { value, u: stated } = combinationFigure(length);
    expect(value).toBeCloseTo(published.l_nm, 6);
    expect(stated).toBeCloseTo(published.u_more_digits_nm, 1);
    const part = (index: number) => {
      const { weight = 0, source } = length.parts[index] ?? {};
      return Math.abs(weight) * (source?.u ?? 0);
    };
    expect(part(3)).toBeCloseTo(published.components_nm.delta_theta, 1);
    expect(part(2)).toBeCloseTo(published.components_nm.delta_alpha, 1);
    expect(part(1)).toBeCloseTo(published.components_nm.d, 1);
  });

  it('fits the thermometer of GUM H.3: slope, its u, and the line carried on', () => {
    const { inputs, published } = data.thermometer;
    const sd = Math.sqrt(published.ssr / published.dof);
    const points = rowFrom(
      inputs.t.map((t) => t - inputs.t0),
      inputs.b,
      sd,
    );
    const line = straightness(points).value?.leastSquaresLine;
    expect(line?.atZeroMm).toBeCloseTo(published.y1[0] ?? Number.NaN, 4);
    expect(line?.slope).toBeCloseTo(published.y2[0] ?? Number.NaN, 5);
    expect((line?.atZeroMm ?? 0) + 10 * (line?.slope ?? 0)).toBeCloseTo(published.b_30, 4);
    const lean = plumbOf({ points, uReference: 0, overMm: 1 }).value?.lean;
    expect(lean?.u).toBeCloseTo(published.y2[1] ?? Number.NaN, 5);
  });

  it('fits a published weighted line', () => {
    const { inputs, published } = data.weightedLine;
    const lean = plumbOf({
      points: rowFrom(inputs.x, inputs.y, inputs.u),
      uReference: 0,
      overMm: 1,
    }).value?.lean;
    expect(lean?.value).toBeCloseTo(published.b[0] ?? Number.NaN, 5);
    // Published with relative weights: its u carries the weighted residual spread, √0.33488.
    expect((lean?.u ?? 0) * Math.sqrt(0.33488)).toBeCloseTo(published.b[1] ?? Number.NaN, 4);
  });

  it('takes tapes by the published classes', () => {
    for (const [accuracyClass, { a, b, c }] of Object.entries(data.tapes.classes)) {
      const tool = {
        id: 'tape',
        name: 'Tape',
        spec: {
          kind: 'tape',
          accuracyClass: accuracyClass as 'I' | 'II' | 'III',
          stepMm: 1,
          repeatabilityMm: 0,
        },
      } as const;
      for (const [lengthMm, ends] of [
        [400, 0],
        [3000, 1],
        [3200, 2],
        [9999, 0],
      ] as const) {
        const mpe = a + b * Math.ceil(lengthMm / 1000) + c * ends;
        expect(toolCommonPart(tool, lengthMm, ends)).toBeCloseTo(mpe / Math.sqrt(3), 12);
      }
    }
  });
});
