import type { FitRules } from '@/lib/contracts/shop-rules';
import type { LengthUnit } from '@/lib/units/brands';
import { formatLength } from '@/lib/units/format-length';
import { MM_PER_INCH } from '@/lib/units/fraction-parts';
import { roundBlankUp, roundNearest } from '@/lib/units/round';

/** How the shop reads and writes lengths. */
export type LengthSpeech = Pick<FitRules, 'unit' | 'stepMm'> & {
  /** How things of the trade are called; left out: as in the US. */
  region?: FitRules['region'];
};

/**
 * Speech in the unit that the measurer reads in: the shop's step in the shop's own unit, else the plain one.
 * Example: an inch shop read in millimetres: to 1 mm.
 */
export function speechIn(rules: LengthSpeech, unit: LengthUnit): LengthSpeech {
  const region = rules.region ? { region: rules.region } : {};
  if (unit === rules.unit) return { unit, stepMm: rules.stepMm, ...region };
  return { unit, stepMm: unit === 'in' ? MM_PER_INCH / 16 : 1, ...region };
}

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
