import type { FractionParts } from '@/lib/units/fraction-parts';

/** Names of the parts of an inch: one, several. */
const parts: Record<number, [string, string]> = {
  2: ['half', 'halves'],
  4: ['quarter', 'quarters'],
  8: ['eighth', 'eighths'],
  16: ['sixteenth', 'sixteenths'],
  32: ['thirty-second', 'thirty-seconds'],
  64: ['sixty-fourth', 'sixty-fourths'],
};

const upToNineteen =
  'zero one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'.split(
    ' ',
  );
const tens = ['', '', 'twenty', 'thirty', 'forty', 'fifty', 'sixty'];

/**
 * Inches in words, for a screen reader.
 * Edge rule: no fraction, no "and"; a fraction alone is "of an inch".
 * Example: 34, 1, 2 → "34 and a half inches"; 0, 3, 16 → "three sixteenths of an inch"; 1, 0, 1 → "1 inch".
 * Source: common practice.
 */
export function spokenInches({ negative, whole, numerator, denominator }: FractionParts): string {
  const sign = negative ? 'minus ' : '';
  if (numerator === 0) return `${sign}${whole} ${whole === 1 ? 'inch' : 'inches'}`;
  if (whole === 0) {
    if (denominator === 2) return `${sign}half an inch`;
    return `${sign}${spokenFraction(numerator, denominator)} of an inch`;
  }
  return `${sign}${whole} and ${spokenFraction(numerator, denominator)} inches`;
}

function spokenFraction(numerator: number, denominator: number): string {
  const [one, several] = parts[denominator] ?? ['part', 'parts'];
  if (numerator > 1) return `${numberInWords(numerator)} ${several}`;
  return denominator <= 4 ? `a ${one}` : `one ${one}`;
}

function numberInWords(value: number): string {
  if (value < 20) return upToNineteen[value] ?? String(value);
  const rest = value % 10;
  const ten = tens[Math.floor(value / 10)] ?? '';
  return rest === 0 ? ten : `${ten}-${upToNineteen[rest]}`;
}
