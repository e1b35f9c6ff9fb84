import { describe, expect, it } from 'vitest';
import { straightedgeGap } from '@/lib/measure/straightedge-gap';
import { straightness } from '@/lib/measure/straightness';
import { rowFrom } from '../lib/measure/row-from';
import data from './data/floor-curvature.json';

const heights: Record<string, number[]> = data.inputs.heightsMm;
const curvatures: Record<string, number[]> = data.published.curvatureMm;
const spacing = data.inputs.spacingMm;
const lines = Object.keys(curvatures);

/** Under a straightedge over three readings the middle one stands off by half the curvature. */
describe('curvatures of a measured floor as published', () => {
  it.each(lines)(
    'finds half of each published curvature under a straightedge on line %s',
    (name) => {
      for (const [at, curvature] of (curvatures[name] ?? []).entries()) {
        const three = rowFrom([0, spacing, 2 * spacing], (heights[name] ?? []).slice(at, at + 3));
        const half = Math.abs(curvature) / 2;
        expect(
          Math.abs((straightness(three).value?.minimumZone.value ?? Number.NaN) - half),
        ).toBeLessThan(0.0011);
        expect(
          Math.abs((straightedgeGap(three, 2 * spacing).value?.gap.value ?? Number.NaN) - half),
        ).toBeLessThan(0.0011);
      }
    },
  );

  it.each(lines)(
    'finds no less than the greatest of them with the straightedge laid anywhere on line %s',
    (name) => {
      const row = (heights[name] ?? []).map((_, at) => at * spacing);
      const gap =
        straightedgeGap(rowFrom(row, heights[name] ?? []), 2 * spacing).value?.gap.value ??
        Number.NaN;
      const greatest = Math.max(...(curvatures[name] ?? []).map(Math.abs)) / 2;
      expect(gap).toBeGreaterThanOrEqual(greatest - 0.0011);
      expect(gap).toBeLessThan(2 * greatest);
    },
  );
});
