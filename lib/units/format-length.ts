import type { LengthUnit } from '@/lib/units/brands';
import { fractionParts } from '@/lib/units/fraction-parts';
import { roundNearest } from '@/lib/units/round';
import { spokenInches } from '@/lib/units/spoken-inches';

/**
 * A length as people of the shop write it, to the nearest step.
 * Edge rule: ties away from zero; round up or down first (`roundBlankUp`, `roundOpeningDown`) where
 * nearest will not do. Inches are in fractions of the step (1/64 where the step is none).
 * Units: mm in.
 * Example: 876.3 mm, in, 1.5875 → `34 1/2"` (spoken: "34 and a half inches"); mm, 0.5 → "876.5 mm".
 * Throws RangeError on a length that is not finite. Source: common practice.
 */
export function formatLength(
  mm: number,
  { unit, stepMm, spoken = false }: { unit: LengthUnit; stepMm: number; spoken?: boolean },
): string {
  if (unit === 'mm') return formatMillimetres(mm, stepMm, spoken);
  const parts = fractionParts(mm, stepMm);
  if (spoken) return spokenInches(parts);
  const { negative, whole, numerator, denominator } = parts;
  const fraction = numerator === 0 ? '' : `${numerator}/${denominator}`;
  const shown = fraction === '' || whole > 0 ? `${whole} ${fraction}`.trim() : fraction;
  return `${negative ? '-' : ''}${shown}"`;
}

function formatMillimetres(mm: number, stepMm: number, spoken: boolean): string {
  const shown = roundNearest(mm, stepMm)
    .toFixed(decimalsOf(stepMm))
    .replace(/^-(0(\.0*)?)$/, '$1');
  if (!spoken) return `${shown} mm`;
  const words = Number(shown) === 1 ? 'millimetre' : 'millimetres';
  return `${shown.replace('-', 'minus ')} ${words}`;
}

function decimalsOf(stepMm: number): number {
  for (let decimals = 0; decimals < 3; decimals += 1) {
    const scaled = stepMm * 10 ** decimals;
    if (Math.abs(scaled - Math.round(scaled)) < 1e-9) return decimals;
  }
  return 3;
}
