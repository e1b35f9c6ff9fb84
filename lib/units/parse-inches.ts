import { type Problem, problem } from '@/lib/problem';

const FRACTION = String.raw`\d+\/\d+`;
export const NUMBER = String.raw`\d+(?:[.,]\d+)?|[.,]\d+`;
/** A number, a fraction, or a whole number and a fraction. */
export const INCHES = String.raw`(?:\d+(?: |-))?${FRACTION}|${NUMBER}`;

const fractionShape = /^(?:(\d+)[ -])?(\d+)\/(\d+)$/;

/** Inches of a text of the shape `INCHES`, or why it cannot be on a tape. */
export function parseInches(text: string): number | Problem {
  const shape = fractionShape.exec(text);
  if (!shape) return decimal(text, 0);
  const [, whole = '0', over = '', under = ''] = shape;
  const numerator = Number(over);
  const denominator = Number(under);
  if (![2, 4, 8, 16, 32, 64].includes(denominator)) {
    return problem(
      'fraction-not-on-a-tape',
      `A tape has halves, quarters, 8ths, 16ths, 32nds and 64ths, no /${under}. Type the nearest of those, such as 34 5/16.`,
    );
  }
  if (numerator < 1 || numerator >= denominator) {
    return problem(
      'fraction-not-below-one',
      `${over}/${under} is not a part of an inch. Type the whole inches and a fraction below 1, such as 35 1/2.`,
    );
  }
  return Number(whole) + numerator / denominator;
}

/** Shifted by the text's own exponent, so that 87.6 cm is 876 mm and not 875.9999999999999. */
export function decimal(text: string, tens: number): number {
  return Number(`${text.replace(',', '.')}e${tens}`);
}
