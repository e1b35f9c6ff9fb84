import type { FitRules } from '@/lib/contracts/shop-rules';
import { formatLength } from '@/lib/units/format-length';
import { roundBlankUp, roundNearest } from '@/lib/units/round';

/** How the shop reads and writes lengths. */
export type LengthSpeech = Pick<FitRules, 'unit' | 'stepMm'>;

/** A place or a whole reading: `36"`, `914 mm`. */
export function sayLength(mm: number, { unit, stepMm }: LengthSpeech): string {
  return formatLength(mm, { unit, stepMm });
}

/** A small difference, never as nothing: `under 1/16"` where the step cannot show it. */
export function sayDifference(mm: number, speech: LengthSpeech): string {
  const size = Math.abs(mm);
  return roundNearest(size, speech.stepMm) > 0
    ? sayLength(size, speech)
    : `under ${sayLength(speech.stepMm, speech)}`;
}

/** How sure: `± 1/16"`, rounded up to the step. */
export function sayPlusMinus(expandedMm: number, speech: LengthSpeech): string {
  return `± ${sayLength(roundBlankUp(expandedMm, speech.stepMm), speech)}`;
}
