import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { roundBlankUp, roundNearest, roundOpeningDown } from '@/lib/units/round';

const steps = [25.4 / 16, 25.4 / 32, 1, 0.5, 25.4 / 64, 0.1];

describe('rounding', () => {
  it('rounds a blank up, an opening down, and the rest to the nearest', () => {
    expect(roundBlankUp(95.3, 25.4 / 16)).toBeCloseTo(96.8375, 9);
    expect(roundOpeningDown(876.9, 1)).toBe(876);
    expect(roundNearest(876.9, 1)).toBe(877);
  });

  it('keeps every exact sixteenth where it is, however it was added up', () => {
    const step = 25.4 / 16;
    let sum = 0;
    for (let count = 1; count <= 6_000; count += 1) {
      sum += step;
      expect(roundBlankUp(sum, step)).toBeCloseTo(count * step, 6);
      expect(roundOpeningDown(sum, step)).toBeCloseTo(count * step, 6);
      expect(roundBlankUp((count / 16) * 25.4, step)).toBeCloseTo(count * step, 6);
    }
  });

  it('finds plain ceiling and floor going wrong at exact sixteenths, which is why it has a tolerance', () => {
    const step = 25.4 / 16;
    let wrong = 0;
    for (let sixteenths = 1; sixteenths <= 3_200; sixteenths += 1) {
      const size = Math.floor(sixteenths / 16) * 25.4 + (sixteenths % 16) * step;
      if (Math.ceil(size / step) !== sixteenths || Math.floor(size / step) !== sixteenths)
        wrong += 1;
    }
    expect(wrong).toBeGreaterThan(100);
  });

  it('sends a tie away from zero, also one that binary fractions miss', () => {
    expect(roundNearest(2.5, 1)).toBe(3);
    expect(roundNearest(-2.5, 1)).toBe(-3);
    expect(roundNearest(0.1 + 0.7 - 0.3, 1)).toBe(1);
    expect(roundNearest(25.4 / 32, 25.4 / 16)).toBeCloseTo(25.4 / 16, 9);
  });

  it('never gives minus zero', () => {
    for (const round of [roundBlankUp, roundOpeningDown, roundNearest]) {
      expect(Object.is(round(-1e-9, 1), -0)).toBe(false);
    }
    expect(Object.is(roundBlankUp(-0.4, 1), -0)).toBe(false);
    expect(Object.is(roundNearest(-0.4, 1), -0)).toBe(false);
  });

  it('brackets the size within one step, on a mark, in the direction of its name', () => {
    const size = fc.double({ min: -50_000, max: 50_000, noNaN: true });
    fc.assert(
      fc.property(size, fc.constantFrom(...steps), (value, step) => {
        const [down, near, up] = [roundOpeningDown, roundNearest, roundBlankUp].map((round) =>
          round(value, step),
        ) as [number, number, number];
        expect(down).toBeLessThanOrEqual(value + 1e-6);
        expect(up).toBeGreaterThanOrEqual(value - 1e-6);
        expect(up - down).toBeLessThan(1.001 * step);
        expect(Math.abs(near - value)).toBeLessThanOrEqual(step / 2 + 1e-6);
        for (const marked of [down, near, up]) {
          expect(Math.abs(marked / step - Math.round(marked / step))).toBeLessThan(1e-7);
          expect(roundNearest(marked, step)).toBeCloseTo(marked, 9);
        }
        expect(roundBlankUp(-value, step)).toBeCloseTo(-down, 9);
        expect(roundNearest(-value, step)).toBeCloseTo(-near, 9);
      }),
      { numRuns: 1_000 },
    );
  });

  it('refuses to round by no step, printing what it was given', () => {
    expect(() => roundBlankUp(1, 0)).toThrow('cannot round 1 mm to a step of 0 mm');
    expect(() => roundNearest(Number.NaN, 1)).toThrow('NaN');
  });
});
