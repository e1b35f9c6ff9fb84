/** Nominal is not actual: what n stacked thicknesses of a sheet really come to. */
import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { type Figure, figure } from './figure';
import { isMeasured, isSize, type Measured } from './measured';
import { type SheetLimits, sheetLimits } from './rules/sheet-limits';

export type SheetCorrection = {
  /** To be added to a size that stacks n thicknesses. */
  correction: Figure;
  /** What the n thicknesses come to. */
  stacked: Figure;
  /** Published limits for the nominal thickness, when it is a listed one. */
  limits: SheetLimits | null;
};

/**
 * Corrects a size that STACKS n thicknesses by n × (actual − nominal); the built overall width of a unit
 * is not such a size.
 *
 * Edge: all n are of one sheet, so the u of the reading counts n-fold. mm.
 * Example: three thicknesses of a nominal 19.05 sheet read at 18.3 ± 0.1 (U): −2.25 ± 0.3 (U).
 * Problems: `size-impossible`; warning `sheet-out-of-limits` where the reading lies outside the published
 * limits by more than its U. Source: limits of PS 1 and EN 315 as in `rules/sheet-limits.ts`.
 */
export function sheetCorrection(input: {
  nominalMm: number;
  actual: Measured;
  thicknesses: number;
  standard?: 'PS 1' | 'EN 315';
}): Outcome<SheetCorrection> {
  const { nominalMm, actual, thicknesses } = input;
  const isSheet = isSize(nominalMm) && isMeasured(actual) && isSize(actual.value);
  if (!isSheet || !Number.isInteger(thicknesses) || thicknesses < 0) {
    const message = 'A sheet’s thickness cannot be true. Take it again.';
    return refused(problem('size-impossible', message, actual.from));
  }
  const limits = input.standard ? sheetLimits(input.standard, nominalMm) : null;
  const uncertain = 2 * actual.u;
  const isOut =
    limits !== null &&
    (actual.value + uncertain < limits.leastMm || actual.value - uncertain > limits.mostMm);
  const by = (value: number) => figure(value, thicknesses * actual.u, actual.from);
  return {
    value: {
      correction: by(thicknesses * (actual.value - nominalMm)),
      stacked: by(thicknesses * actual.value),
      limits,
    },
    problems: isOut
      ? [
          warning(
            'sheet-out-of-limits',
            `This sheet is outside ${limits.source} for its nominal thickness. Check what was delivered.`,
            actual.from,
          ),
        ]
      : [],
  };
}
