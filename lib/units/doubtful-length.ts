import { type Problem, problem } from '@/lib/problem';
import type { LengthUnit } from '@/lib/units/brands';
import { MM_PER_INCH } from '@/lib/units/fraction-parts';
import type { LengthLimits } from '@/lib/units/length-limits';

/** Past this a bare number in an inch shop is asked about: tapes end at 35 ft. Common practice. */
const LONGEST_BARE_INCHES = 420;

/** "1,234": thousands in one country, thousandths in another. */
export function commaWithThreeDigits(plain: string): Problem | null {
  const found = /\d*,\d{3}(?!\d)(?:[.,]\d+)*/.exec(plain)?.[0];
  if (found === undefined) return null;
  const whole = found.replaceAll(',', '');
  const message = /^\d*,\d{3}$/.test(found)
    ? `${found} could be ${whole} or ${found.replace(',', '.')}. Type it without the comma, or with a point.`
    : `Type ${found} without commas, such as ${whole}.`;
  return problem('comma-with-three-digits', message);
}

/**
 * A size no reading of its kind can have, or one that is more likely in the other unit.
 * `bareUnit` is the shop's unit where none was typed, else null.
 */
export function outsideLimits(
  size: number,
  limits: LengthLimits,
  bareUnit: LengthUnit | null,
  plain: string,
): Problem | null {
  if (size < 0 && limits.leastMm >= 0) {
    return problem(
      'negative-length',
      `${limits.name} cannot be below 0. Type it without the minus.`,
    );
  }
  const inches = Math.abs(size) / MM_PER_INCH;
  const tooLong = size > limits.mostMm || size < Math.min(limits.leastMm, 0);
  const unlikely = tooLong || inches > LONGEST_BARE_INCHES;
  if (bareUnit === 'in' && unlikely && inches <= limits.mostMm) {
    return problem('inches-or-millimetres', `${plain} mm or ${plain}"? Type the unit with it.`);
  }
  if (size === 0 && !limits.mayBeZero) {
    return problem('zero-length', `${limits.name} cannot be 0. Type what the tape says.`);
  }
  if (!tooLong) return null;
  const most = size < 0 ? limits.leastMm : limits.mostMm;
  return problem(
    'too-long',
    `${limits.name} of ${plain} is past ${most} mm (${Math.round(most / MM_PER_INCH)}"). Check the figure and its unit.`,
  );
}
