import { describe, expect, it } from 'vitest';
import { formatLength } from '@/lib/units/format-length';
import { parseLength } from '@/lib/units/parse-length';
import { roundBlankUp, roundOpeningDown } from '@/lib/units/round';
import data from './data/inches.json';

const mmOf = (text: string) => parseLength(text, { unit: 'in' }).value ?? Number.NaN;

describe('inches as published', () => {
  it.each(
    data.table.rows.map(
      ([fraction, inches, mm]) => [String(fraction), Number(inches), Number(mm)] as const,
    ),
  )('reads %s" as %d in and %d mm', (fraction, inches, mm) => {
    // Exact halves print either way in different copies: half of the last digit, and a hair.
    expect(Math.abs(mmOf(fraction) - mm)).toBeLessThanOrEqual(0.0000501);
    expect(Math.abs(mmOf(fraction) / 25.4 - inches)).toBeLessThanOrEqual(0.0000501);
    expect(formatLength(mm, { unit: 'in', stepMm: 25.4 / 64 })).toBe(`${fraction}"`);
  });

  it.each(Object.entries(data.millimetresTo64ths.pairs))(
    'writes %s mm as %s" to the nearest 64th',
    (mm, fraction) => {
      expect(formatLength(Number(mm), { unit: 'in', stepMm: 25.4 / 64 })).toBe(`${fraction}"`);
    },
  );

  it.each(data.nearestFraction.examples)(
    'writes $in in to the nearest 1/$den as $result',
    (example) => {
      const text = formatLength(example.in * 25.4, { unit: 'in', stepMm: 25.4 / example.den });
      expect(text).toBe(`${example.result}"`);
    },
  );

  it('reads 36 ft as the exact metres, and inches as the published centimetres', () => {
    expect(mmOf('36 ft')).toBeCloseTo(data.feet.published.metres * 1000, 9);
    for (const { in: inches, cm } of data.centimetres.examples) {
      const digits = cm % 1 === 0 ? 0 : 1;
      expect((mmOf(`${inches} in`) / 10).toFixed(digits)).toBe(cm.toFixed(digits));
    }
  });

  it('rounds limits inward, as the published rule has it', () => {
    expect(data.limits.published.limits).toBe('upper limit rounded down, lower limit rounded up');
    expect(roundOpeningDown(24.9, 1)).toBe(24);
    expect(roundBlankUp(24.1, 1)).toBe(25);
  });
});
