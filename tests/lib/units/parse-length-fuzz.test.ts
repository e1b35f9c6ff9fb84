import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type LengthKind, lengthLimits } from '@/lib/units/length-limits';
import { parseLength } from '@/lib/units/parse-length';
import { plainLengthText } from '@/lib/units/plain-length-text';
import { slowLengthReader } from './slow-length-reader';

const kinds = [undefined, ...(Object.keys(lengthLimits) as LengthKind[])];
const units = ['in', 'mm'] as const;
const pieces = [
  ...'0123456789',
  ...'0123456789',
  ' ',
  ' ',
  '/',
  '/',
  '-',
  '.',
  ',',
  "'",
  '"',
  '½',
  '⅛',
  '⅓',
  '²',
  '⁄',
  '₁₆',
  '′',
  '″',
  '’',
  '”',
  'mm',
  'cm',
  'm',
  'in',
  'ft',
  'in.',
  'inches',
  'feet',
  '+',
  'e',
  'x',
  '%',
  '−',
  '\u00a0',
  '٣',
  '３',
  '34 1/2',
  '1/16',
  '876',
  `2' 10`,
  '|',
  '\n',
  'NaN',
  '∞',
];
const anyText = fc.oneof(
  fc.string({ maxLength: 30 }),
  fc.string({ unit: 'grapheme', maxLength: 12 }),
  fc.array(fc.constantFrom(...pieces), { maxLength: 9 }).map((parts) => parts.join('')),
);

describe('parseLength on any text', () => {
  it('never throws, never gives NaN, and takes nothing that a second reader does not take', () => {
    let taken = 0;
    fc.assert(
      fc.property(
        anyText,
        fc.constantFrom(...units),
        fc.constantFrom(...kinds),
        (text, unit, kind) => {
          const { value, problems } = parseLength(text, { unit, kind });
          if (value === null) return problems.length === 1 && problems[0]?.message !== '';
          taken += 1;
          if (problems.length > 0 || !Number.isFinite(value)) return false;
          const slow = slowLengthReader(plainLengthText(text), unit);
          if (slow === null || Math.abs(slow - value) > 1e-6) return false;
          if (kind === undefined) return true;
          return value <= lengthLimits[kind].mostMm && value >= lengthLimits[kind].leastMm;
        },
      ),
      { numRuns: 100_000, seed: 20261201 },
    );
    expect(taken).toBeGreaterThan(2_000);
  }, 60_000);

  it('reads back every way of writing a length', () => {
    const fraction = fc
      .constantFrom(2, 4, 8, 16, 32, 64)
      .chain((under) => fc.integer({ min: 1, max: under - 1 }).map((over) => ({ over, under })));
    fc.assert(
      fc.property(
        fc.nat(400),
        fc.nat(11),
        fraction,
        fc.nat(3),
        (whole, few, { over, under }, way) => {
          const part = over / under;
          const texts: [string, number][] = [
            [`${whole}${way % 2 ? ' ' : '-'}${over}/${under}${way > 1 ? '"' : ''}`, whole + part],
            [
              `${whole}'${way % 2 ? ' ' : '-'}${few} ${over}/${under}${way > 1 ? '"' : ''}`,
              12 * whole + few + part,
            ],
            [`${whole + part}${way % 2 ? ' in' : '″'}`, whole + part],
            [`${whole} ft ${few + part} in`, 12 * whole + few + part],
          ];
          for (const [text, inches] of texts) {
            const asked = /,\d{3}$/.test(text) || inches * 25.4 > 100_000;
            if (!asked)
              expect(parseLength(text, { unit: 'in' }).value).toBeCloseTo(inches * 25.4, 8);
          }
        },
      ),
      { numRuns: 2_000 },
    );
  });
});
