import { describe, expect, it } from 'vitest';
import { planeOf } from '@/lib/measure/minimum-zone-plane';
import { plumbOf } from '@/lib/measure/plumb';
import { straightness } from '@/lib/measure/straightness';
import { rowFrom } from '../lib/measure/row-from';
import data from './data/form-error.json';

describe('fits as published', () => {
  it('finds the minimax fit of a library’s example as a minimum-zone plane', () => {
    const { inputs, published } = data.minimax;
    const { value } = planeOf(
      inputs.t.map((t, at) => ({
        id: `${at}`,
        xMm: Math.exp(t),
        yMm: Math.exp(-t),
        sMm: inputs.y[at] ?? Number.NaN,
        u: 0.001,
      })),
    );
    expect(value?.zonePlane.slopeX).toBeCloseTo(published.a, 4);
    expect(value?.zonePlane.slopeY).toBeCloseTo(published.b, 4);
    expect(value?.zonePlane.atZeroMm).toBeCloseTo(published.c, 4);
    expect((value?.minimumZone.value ?? 0) / 2).toBeCloseTo(published.resmax, 5);
  });

  it('finds the certified regression of Norris', () => {
    const { inputs, published } = data.norris;
    const sd = Math.sqrt(published.ssr / (inputs.x.length - 2));
    const points = rowFrom(inputs.x, inputs.y, sd);
    const line = straightness(points).value?.leastSquaresLine;
    expect(line?.slope).toBeCloseTo(published.b1, 11);
    expect(line?.atZeroMm).toBeCloseTo(published.b0, 9);
    const lean = plumbOf({ points, uReference: 0, overMm: 1 }).value?.lean;
    expect(lean?.value).toBeCloseTo(published.b1, 11);
    expect(lean?.u).toBeCloseTo(published.sd_b1, 11);
  });
});
