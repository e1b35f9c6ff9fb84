import type { FractionParts } from './fraction-text';

const names: Record<number, string> = {
  2: 'half',
  4: 'quarter',
  8: 'eighth',
  16: 'sixteenth',
  32: 'thirty-second',
  64: 'sixty-fourth',
};

/**
 * A length as it is said: 34 and a half inches, 13 sixteenths of an inch, minus 1 inch.
 * The fraction is in lowest terms; a denominator of no tape is said in figures.
 */
export function lengthWords({ isNegative, whole, numerator, denominator }: FractionParts): string {
  const sign = isNegative ? 'minus ' : '';
  if (numerator === 0) return `${sign}${whole} ${whole === 1 ? 'inch' : 'inches'}`;
  const fraction = fractionWords(numerator, denominator);
  return whole === 0 ? `${sign}${fraction} of an inch` : `${sign}${whole} and ${fraction} inches`;
}

function fractionWords(numerator: number, denominator: number): string {
  const name = names[denominator];
  if (!name) return `${numerator} over ${denominator}`;
  if (numerator === 1) return name === 'eighth' ? 'an eighth' : `a ${name}`;
  return `${numerator} ${name}s`;
}
