import { roundNearest } from '@/lib/units/round';

/** Exactly (NIST SP 811, B.8). */
export const MM_PER_INCH = 25.4;

export type FractionParts = {
  negative: boolean;
  whole: number;
  /** 0 where the value is whole. */
  numerator: number;
  /** 1 where the value is whole. */
  denominator: number;
};

/**
 * Whole inches and a reduced fraction, for a fraction set as a fraction.
 * Edge rule: nearest step, ties away from zero; a step that is no 1/2ⁿ inch down to 1/64 counts as 1/64.
 * Units: mm in, inches out.
 * Example: 876.3 mm at 1.5875 mm → 34, 1, 2; −4.7625 mm → negative, 0, 3, 16.
 * Throws RangeError on a size that is not finite. Source: common practice.
 */
export function fractionParts(mm: number, stepMm: number): FractionParts {
  const denominator = denominatorOf(stepMm);
  const step = MM_PER_INCH / denominator;
  const count = Math.round(roundNearest(mm, step) / step);
  const size = Math.abs(count);
  const numerator = size % denominator;
  const common = numerator === 0 ? denominator : highestCommonFactor(numerator, denominator);
  return {
    negative: count < 0,
    whole: Math.floor(size / denominator),
    numerator: numerator / common,
    denominator: denominator / common,
  };
}

function denominatorOf(stepMm: number): number {
  for (let denominator = 1; denominator <= 32; denominator *= 2) {
    if (Math.abs(MM_PER_INCH / denominator - stepMm) < 1e-6) return denominator;
  }
  return 64;
}

function highestCommonFactor(a: number, b: number): number {
  return b === 0 ? a : highestCommonFactor(b, a % b);
}
