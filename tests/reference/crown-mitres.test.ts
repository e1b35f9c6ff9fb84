import { describe, expect, it } from 'vitest';
import { crownMitre } from '@/lib/measure/mitre';
import data from './data/crown-mitres.json';

const exact = (value: number) => ({ value, u: 0, from: [] });
function cut(spring: number, corner: number): { mitre: number; bevel: number } {
  const { value } = crownMitre(exact(spring), exact(corner));
  return { mitre: value?.mitre.value ?? Number.NaN, bevel: value?.bevel.value ?? Number.NaN };
}

describe('crown cuts as published', () => {
  it.each(data['crown-90-manuals'].published)(
    'agrees with saw manuals at $corner° for a spring of $spring_wall°',
    ({ spring_wall, corner, miter, bevel }) => {
      const found = cut(spring_wall, corner);
      expect(Math.abs(found.mitre - miter)).toBeLessThan(0.051);
      expect(Math.abs(found.bevel - bevel)).toBeLessThan(0.051);
    },
  );

  it.each(data['crown-corwin-38'].published)(
    'agrees with a printed table for 38° at a corner of $corner°',
    ({ corner, miter, bevel }) => {
      const found = cut(38, corner);
      expect(Math.abs(found.mitre - miter)).toBeLessThan(0.0035);
      expect(Math.abs(found.bevel - bevel)).toBeLessThan(0.0035);
    },
  );

  it.each(data['crown-sbe-52'].published)(
    'agrees with a table of five decimals at a corner of $corner°',
    ({ corner, miter, bevel, on_edge }) => {
      const found = cut(52, corner);
      expect(Math.abs(found.mitre - miter)).toBeLessThan(0.00006);
      expect(Math.abs(found.bevel - bevel)).toBeLessThan(0.00006);
      if (!on_edge) return;
      const onEdge = cut(38, corner);
      expect(Math.abs(onEdge.mitre - (on_edge[0] ?? 0))).toBeLessThan(0.006);
      expect(Math.abs(onEdge.bevel - (on_edge[1] ?? 0))).toBeLessThan(0.00006);
    },
  );

  it('agrees with a saw manual’s box to whole degrees', () => {
    const { published } = data['compound-box-26'];
    const found = cut(90 - published.exterior_angle, 360 / published.sides);
    expect(Math.round(found.mitre)).toBe(published.miter);
    expect(Math.round(found.bevel)).toBe(published.bevel);
  });

  it('does not follow a web table that runs the wrong way near 90°', () => {
    for (const { corner, miter } of data['crown-wrong-table'].published) {
      expect(cut(38, corner).mitre).toBeGreaterThan(31.62);
      expect(miter).toBeLessThan(31.62);
    }
  });
});
