import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatLength } from '@/lib/units/format-length';
import { fractionParts } from '@/lib/units/fraction-parts';
import { parseLength } from '@/lib/units/parse-length';

const sixteenth = 25.4 / 16;

describe('formatLength', () => {
  it.each([
    [876.3, sixteenth, '34 1/2"'],
    [0, sixteenth, '0"'],
    [25.4, sixteenth, '1"'],
    [4.7625, sixteenth, '3/16"'],
    [-4.7625, sixteenth, '-3/16"'],
    [-876.3, sixteenth, '-34 1/2"'],
    [0.79375, 25.4 / 32, '1/32"'],
    [12.699999, sixteenth, '1/2"'],
    [25.39, sixteenth, '1"'],
    [-0.1, sixteenth, '0"'],
    [876.3, 1, '34 1/2"'],
  ])('writes %d mm to a step of %d as %s', (mm, stepMm, expected) => {
    expect(formatLength(mm, { unit: 'in', stepMm })).toBe(expected);
  });

  it.each([
    [876.3, 1, '876 mm'],
    [876.3, 0.5, '876.5 mm'],
    [-0.2, 1, '0 mm'],
    [-0.2, 0.5, '0.0 mm'],
    [-3.5, 1, '-4 mm'],
    [2414.5875, 0.1, '2414.6 mm'],
  ])('writes %d mm to a step of %d mm as %s', (mm, stepMm, expected) => {
    expect(formatLength(mm, { unit: 'mm', stepMm })).toBe(expected);
  });

  it.each([
    [876.3, '34 and a half inches'],
    [876.3 - 12.7 + 6.35, '34 and a quarter inches'],
    [34 * 25.4, '34 inches'],
    [25.4, '1 inch'],
    [0, '0 inches'],
    [12.7, 'half an inch'],
    [6.35, 'a quarter of an inch'],
    [19.05, 'three quarters of an inch'],
    [3.175, 'one eighth of an inch'],
    [15 * sixteenth, 'fifteen sixteenths of an inch'],
    [25.4 + sixteenth, '1 and one sixteenth inches'],
    [-3 * sixteenth, 'minus three sixteenths of an inch'],
  ])('says %d mm as "%s"', (mm, expected) => {
    expect(formatLength(mm, { unit: 'in', stepMm: sixteenth, spoken: true })).toBe(expected);
  });

  it('says fine fractions and millimetres', () => {
    const fine = { unit: 'in', stepMm: 25.4 / 64, spoken: true } as const;
    expect(formatLength((31 * 25.4) / 32, fine)).toBe('thirty-one thirty-seconds of an inch');
    expect(formatLength((63 * 25.4) / 64, fine)).toBe('sixty-three sixty-fourths of an inch');
    expect(formatLength((30.5 * 25.4) / 32, fine)).toBe('sixty-one sixty-fourths of an inch');
    expect(formatLength(876, { unit: 'mm', stepMm: 1, spoken: true })).toBe('876 millimetres');
    expect(formatLength(1, { unit: 'mm', stepMm: 1, spoken: true })).toBe('1 millimetre');
    expect(formatLength(-2, { unit: 'mm', stepMm: 1, spoken: true })).toBe('minus 2 millimetres');
  });

  it('is read back by parseLength to within half a step', () => {
    const size = fc.double({ min: -250, max: 250, noNaN: true });
    fc.assert(
      fc.property(
        size,
        fc.constantFrom<'in' | 'mm'>('in', 'mm'),
        fc.constantFrom(0, 1),
        (mm, unit, fine) => {
          const stepMm = unit === 'in' ? 25.4 / [16, 32][fine]! : [1, 0.5][fine]!;
          const text = formatLength(mm, { unit, stepMm });
          const { value } = parseLength(text, { unit, kind: 'gap' });
          expect(Math.abs((value ?? Number.NaN) - mm)).toBeLessThanOrEqual(stepMm / 2 + 1e-5);
        },
      ),
      { numRuns: 3_000 },
    );
  });
});

describe('fractionParts', () => {
  it('gives whole, numerator and denominator, reduced', () => {
    expect(fractionParts(876.3, sixteenth)).toEqual({
      negative: false,
      whole: 34,
      numerator: 1,
      denominator: 2,
    });
    expect(fractionParts(-4.7625, sixteenth)).toEqual({
      negative: true,
      whole: 0,
      numerator: 3,
      denominator: 16,
    });
    expect(fractionParts(-0.01, sixteenth)).toEqual({
      negative: false,
      whole: 0,
      numerator: 0,
      denominator: 1,
    });
    expect(fractionParts(50.8, 25.4)).toEqual({
      negative: false,
      whole: 2,
      numerator: 0,
      denominator: 1,
    });
  });
});
