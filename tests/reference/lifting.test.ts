import { describe, expect, it } from 'vitest';
import {
  type Grip,
  type Lift,
  LOAD_CONSTANT_KG,
  liftMultipliers,
  oneHangingLimitKg,
  weightLimitKg,
} from '@/lib/cautions/lifting';
import data from './data/lifting.json';

const ideal: Lift = {
  reachMm: 250,
  heightMm: 750,
  travelMm: 250,
  twistDeg: 0,
  grip: 'good',
  frequency: 1,
};

describe('the revised NIOSH lifting equation as published', () => {
  const { published } = data.equation;

  it('gives what may be lifted at the very best, in kilograms and in pounds', () => {
    expect(weightLimitKg(liftMultipliers(ideal))).toBeCloseTo(data.osha.published.kg, 9);
    expect(LOAD_CONSTANT_KG).toBe(published.loadConstantKg);
    expect(Math.round(LOAD_CONSTANT_KG * 2.2046)).toBe(published.loadConstantLb);
  });

  it.each([
    ['reach', 'reachMm', published.reach],
    ['height', 'heightMm', published.height],
    ['travel', 'travelMm', published.travel],
    ['twist', 'twistDeg', published.twist],
  ] as const)('lessens it with the %s, and to nothing past the limit', (name, field, rows) => {
    for (const [at = 0, multiplier = 0] of rows) {
      expect(liftMultipliers({ ...ideal, [field]: at })[name]).toBeCloseTo(multiplier, 3);
    }
  });

  it('takes a grip for less below the waist', () => {
    for (const [grip, [low, high]] of Object.entries(published.grip)) {
      const at = (heightMm: number) =>
        liftMultipliers({ ...ideal, grip: grip as Grip, heightMm }).grip;
      expect([at(500), at(750)]).toEqual([low, high]);
    }
  });

  it('gives the limit of the manual’s example 4, and of the Canadian centre’s example', () => {
    const { inputs, published: ex4 } = data.example4;
    const pounds = (weightLimitKg(inputs.multipliers) / LOAD_CONSTANT_KG) * inputs.loadConstantLb;
    expect(Math.abs(pounds - ex4.limitLb)).toBeLessThanOrEqual(0.11);
    expect(weightLimitKg(data.ccohs.inputs.multipliers)).toBeCloseTo(
      data.ccohs.published.limitKg,
      2,
    );
  });

  it('lets one person hang less the deeper the box and the higher it goes', () => {
    const shallow = oneHangingLimitKg({ depthMm: 330, undersideMm: 1372 });
    expect(shallow).toBeGreaterThan(5);
    expect(shallow).toBeLessThan(LOAD_CONSTANT_KG / 2);
    expect(oneHangingLimitKg({ depthMm: 600, undersideMm: 1372 })).toBeLessThan(shallow);
    expect(oneHangingLimitKg({ depthMm: 330, undersideMm: 1600 })).toBeLessThanOrEqual(shallow);
  });
});
