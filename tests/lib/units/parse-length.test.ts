import { describe, expect, it } from 'vitest';
import { parseLength } from '@/lib/units/parse-length';

const inInches = (text: string) => parseLength(text, { unit: 'in' });
const inMillimetres = (text: string) => parseLength(text, { unit: 'mm' });
const codeOf = (text: string, unit: 'in' | 'mm' = 'in') =>
  parseLength(text, { unit }).problems[0]?.code;

describe('parseLength', () => {
  it.each([
    ['34 1/2', 876.3],
    ['34-1/2"', 876.3],
    ['34½', 876.3],
    ['34 ½', 876.3],
    ['34-½', 876.3],
    ['½', 12.7],
    ['34³⁄₁₆', 868.3625],
    ['⅟16', 1.5875],
    [`2' 10 1/2"`, 876.3],
    [`2'-10 1/2"`, 876.3],
    [`2' - 10 1/2"`, 876.3],
    [`2'10½`, 876.3],
    ['2ft 10.5in', 876.3],
    ['2 ft. 10.5 in.', 876.3],
    ['2 feet 10.5 inches', 876.3],
    ['2’ 10 1/2”', 876.3],
    ['2′ 10 1⁄2″', 876.3],
    [`2' 10 1/2''`, 876.3],
    [`2'`, 609.6],
    ['2.5 ft', 762],
    ['34.5', 876.3],
    ['34,5', 876.3],
    ['.5', 12.7],
    ['876mm', 876],
    ['876 MM', 876],
    ['87,6 cm', 876],
    ['87.6cm', 876],
    ['0.876m', 876],
    ['0,876 m', 876],
    ['1,234 m', 1234],
    ['  34 1/2  ', 876.3],
    ['34\u00a01/2', 876.3],
    ['1/64', 0.396875],
    ['95 1/16', 2414.5875],
    ['0', 0],
  ])('reads %s in an inch shop as %d mm', (text, expected) => {
    expect(inInches(text)).toEqual({ value: expect.closeTo(expected, 9), problems: [] });
  });

  it.each([
    ['876', 876],
    ['876,5', 876.5],
    ['34 1/2"', 876.3],
    [`2' 10 1/2`, 876.3],
    ['2414.5', 2414.5],
  ])('reads %s in a millimetre shop as %d mm', (text, expected) => {
    expect(inMillimetres(text)).toEqual({ value: expect.closeTo(expected, 9), problems: [] });
  });

  it('makes 87.6 cm exactly 876 mm', () => {
    expect(inMillimetres('87.6 cm').value).toBe(876);
    expect(inMillimetres('1.1 cm').value).toBe(11);
  });

  it.each([
    ['', 'nothing-typed'],
    ['   ', 'nothing-typed'],
    ['34 3/2', 'fraction-not-below-one'],
    ['34 16/16', 'fraction-not-below-one'],
    ['34 0/2', 'fraction-not-below-one'],
    ['1/3"', 'fraction-not-on-a-tape'],
    ['34⅓', 'fraction-not-on-a-tape'],
    ['34 1/128', 'fraction-not-on-a-tape'],
    ['34 1/0', 'fraction-not-on-a-tape'],
    ['--5', 'not-a-length'],
    [`2' 12"`, 'inches-past-twelve'],
    [`2' 34 1/2"`, 'inches-past-twelve'],
    [`2.5' 3"`, 'not-a-length'],
    [`2 1/2'`, 'not-a-length'],
    ['34.5 1/2', 'not-a-length'],
    ['34 1/2 1/2', 'not-a-length'],
    ['34 - 1/2', 'not-a-length'],
    ['34 1/2 mm', 'not-a-length'],
    ['34.', 'not-a-length'],
    ['1e3', 'not-a-length'],
    ['0x10', 'not-a-length'],
    ['Infinity', 'not-a-length'],
    ['NaN', 'not-a-length'],
    ['12 34', 'not-a-length'],
    ['½4', 'not-a-length'],
    ['⅓2', 'not-a-length'],
    ['34²', 'not-a-length'],
    ['900 / 1200 / 1502', 'not-a-length'],
    ['1.234.567', 'not-a-length'],
    ['5mm 3in', 'not-a-length'],
    ['-34', 'negative-length'],
    ['9'.repeat(70), 'too-long'],
    ['9'.repeat(100), 'not-a-length'],
  ])('refuses %s (%s) and says what to type', (text, code) => {
    const outcome = parseLength(text, { unit: 'in', kind: 'length' });
    expect(outcome.value).toBeNull();
    expect(outcome.problems[0]?.code).toBe(code);
    expect(outcome.problems[0]?.message.length).toBeGreaterThan(20);
  });

  it.each(['1,234', '1,234 mm', '12,500 cm', '34,125"', '0,125', '1,234.5', '1,234,567'])(
    'asks about the comma in %s',
    (text) => {
      expect(codeOf(text)).toBe('comma-with-three-digits');
      expect(codeOf(text, 'mm')).toBe('comma-with-three-digits');
    },
  );

  it('asks whether 876 in an inch shop is millimetres', () => {
    expect(codeOf('876')).toBe('inches-or-millimetres');
    expect(codeOf('876.5')).toBe('inches-or-millimetres');
    expect(inInches('876"').value).toBeCloseTo(22250.4, 9);
    expect(inInches('414').value).toBeCloseTo(10515.6, 9);
  });

  it('asks about a gap of 25 in an inch shop, because 25 inches are no gap', () => {
    const gap = (text: string) => parseLength(text, { unit: 'in', kind: 'gap' });
    expect(gap('25').problems[0]?.code).toBe('inches-or-millimetres');
    expect(gap('-25').problems[0]?.code).toBe('inches-or-millimetres');
    expect(gap('25"').problems[0]?.code).toBe('too-long');
    expect(gap('1/4').value).toBeCloseTo(6.35, 9);
    expect(gap('-1/4').value).toBeCloseTo(-6.35, 9);
    expect(gap('−1/4').value).toBeCloseTo(-6.35, 9);
  });

  it('asks what a fraction without a mark means in a millimetre shop', () => {
    expect(codeOf('34 1/2', 'mm')).toBe('fraction-of-a-millimetre');
  });

  it('refuses a length of nothing where nothing cannot be, and takes it where it can', () => {
    expect(parseLength('0', { unit: 'mm', kind: 'length' }).problems[0]?.code).toBe('zero-length');
    expect(parseLength('-0', { unit: 'mm', kind: 'gap' })).toEqual({ value: 0, problems: [] });
  });

  it('holds every kind of reading to its largest length', () => {
    expect(parseLength('31000', { unit: 'mm', kind: 'length' }).problems[0]?.code).toBe('too-long');
    expect(parseLength('301', { unit: 'mm', kind: 'gap' }).problems[0]?.code).toBe('too-long');
    expect(parseLength('-301', { unit: 'mm', kind: 'gap' }).problems[0]?.code).toBe('too-long');
    expect(parseLength('3001', { unit: 'mm', kind: 'drop' }).problems[0]?.code).toBe('too-long');
  });
});
