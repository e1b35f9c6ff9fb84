/** Published thickness limits of sheet goods. */
import { exactInches } from './exact-inches';

export type SheetLimits = { leastMm: number; mostMm: number; source: string };

/**
 * PS 1 performance categories (unsanded, touch-sanded, overlaid): name, least and most in inches.
 * Source: US Voluntary Product Standard PS 1, APA performance category table,
 * https://www.apawood-europe.org, read.
 */
export const PS_1_CATEGORIES: readonly (readonly [string, number, number, number])[] = [
  ['1/4', 1 / 4, 0.219, 0.281],
  ['11/32', 11 / 32, 0.313, 0.375],
  ['3/8', 3 / 8, 0.344, 0.406],
  ['7/16', 7 / 16, 0.406, 0.469],
  ['15/32', 15 / 32, 0.438, 0.5],
  ['1/2', 1 / 2, 0.469, 0.531],
  ['19/32', 19 / 32, 0.563, 0.625],
  ['5/8', 5 / 8, 0.594, 0.656],
  ['23/32', 23 / 32, 0.688, 0.75],
  ['3/4', 3 / 4, 0.719, 0.781],
  ['13/16', 13 / 16, 0.781, 0.844],
  ['7/8', 7 / 8, 0.831, 0.919],
  ['1', 1, 0.95, 1.05],
  ['1-1/8', 9 / 8, 1.069, 1.181],
  ['1-1/4', 5 / 4, 1.188, 1.313],
];

/**
 * Limits of a nominal thickness, or null where the standard lists none.
 *
 * Edge: PS 1 by its listed categories only; EN 315 (sanded) by its formula from 3 to 60 mm:
 * t + (0.2 + 0.03 t), t − (0.4 + 0.03 t).
 * Example: PS 1, 19.05 (3/4 in): 18.26 to 19.84. EN 315, 18: 17.06 to 18.74.
 * Source: PS 1 as above; EN 315 formula from a maker's page, partly from memory.
 */
export function sheetLimits(standard: 'PS 1' | 'EN 315', nominalMm: number): SheetLimits | null {
  if (standard === 'EN 315') {
    if (!(nominalMm >= 3 && nominalMm <= 60)) return null;
    const share = 0.03 * nominalMm;
    return {
      leastMm: nominalMm - (0.4 + share),
      mostMm: nominalMm + 0.2 + share,
      source: 'EN 315 (sanded)',
    };
  }
  const row = PS_1_CATEGORIES.find(
    ([, nominal]) => Math.abs(exactInches(nominal) - nominalMm) < 0.05,
  );
  if (!row) return null;
  const [, , least, most] = row;
  return { leastMm: exactInches(least), mostMm: exactInches(most), source: 'PS 1' };
}
