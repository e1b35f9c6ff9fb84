import { describe, expect, it } from 'vitest';
import { plumbOf } from '@/lib/measure/plumb';
import { monteCarlo, seeded } from './seeded';

const column = (s: number[], z: number[], u = 0.3) =>
  s.map((sMm, at) => ({ id: `c${at}`, atMm: z[at]!, sMm, u }));
const heights = [100, 1100, 2100];

describe('plumbOf', () => {
  it('gives the lean per mm, per metre and over the height asked', () => {
    const { value } = plumbOf({ points: column([0, 2, 4], heights), uReference: 0, overMm: 2400 });
    expect(value?.lean.value).toBeCloseTo(0.002, 12);
    expect(value?.perMetre.value).toBeCloseTo(2, 9);
    expect(value?.over.value).toBeCloseTo(4.8, 9);
    expect(value?.leans).toBe('in');
    expect(value?.outOfStraight.value).toBeCloseTo(0, 9);
    expect(value?.perMetre.from).toEqual(['c0', 'c2']);
  });

  it('leans out when the top falls back, and is plumb when the lean is smaller than its U', () => {
    expect(
      plumbOf({ points: column([4, 2, 0], heights), uReference: 0, overMm: 1000 }).value?.leans,
    ).toBe('out');
    expect(
      plumbOf({ points: column([0, 0.2, 0.3], heights), uReference: 0, overMm: 1000 }).value?.leans,
    ).toBe('plumb');
    expect(
      plumbOf({ points: column([0, 2, 4], heights), uReference: 0.002, overMm: 1000 }).value?.leans,
    ).toBe('plumb');
  });

  it('weighs each reading by how sure it is', () => {
    const points = column([0, 2, 40], heights).map((point, at) => ({
      ...point,
      u: at === 2 ? 1000 : 0.3,
    }));
    expect(plumbOf({ points, uReference: 0, overMm: 1000 }).value?.perMetre.value).toBeCloseTo(
      2,
      3,
    );
  });

  it('states the spread that Monte Carlo finds, the level’s own error with it', () => {
    const random = seeded(8);
    const drawn = () => {
      const reference = 0.0003 * random.normal();
      const s = heights.map((z) => 0.002 * z + 0.3 * random.normal() + reference * z);
      return plumbOf({ points: column(s, heights), uReference: 0.0003, overMm: 2400 }).value;
    };
    const { sd, mean } = monteCarlo(10_000, () => drawn()?.over.value ?? Number.NaN);
    expect(mean).toBeCloseTo(4.8, 1);
    expect(Math.abs(sd / (drawn()?.over.u ?? 0) - 1)).toBeLessThan(0.04);
  }, 30_000);

  it('needs two heights', () => {
    expect(
      plumbOf({ points: column([0], [100]), uReference: 0, overMm: 1 }).problems[0]?.code,
    ).toBe('too-few-heights');
    expect(
      plumbOf({ points: column([0, 1], [100, 100]), uReference: 0, overMm: 1 }).problems[0]?.code,
    ).toBe('too-few-heights');
    expect(plumbOf({ points: [], uReference: 0, overMm: 1 }).problems[0]?.code).toBe(
      'too-few-heights',
    );
    expect(
      plumbOf({ points: column([0, Infinity], [0, 1]), uReference: 0, overMm: 1 }).problems[0]
        ?.about,
    ).toEqual(['c1']);
  });
});
