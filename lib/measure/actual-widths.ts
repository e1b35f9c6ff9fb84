/** Units as their sheets really are: a width that stacks sheets is corrected before anything is laid out. */

import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { sheetCorrection } from '@/lib/measure/sheet-correction';
import type { Problem } from '@/lib/problem';

/** A calliper read to 0.1 mm: ±0.05, rectangular (JCGM 100:2008, 4.3.7). */
const CALLIPER_U_MM = 0.05 / Math.sqrt(3);

/**
 * The runs with each unit that stacks n sheets wider or narrower by n × (actual − nominal).
 * Edge rule: nothing changes until a sheet was read (shops from before have no such rule at all), nor for a unit built to its width; a unit that would
 * come to nothing keeps its width. Units: mm. Example: a panel of 19.05, one sheet read at 18.3 → 18.3.
 * Problems: those of `sheetCorrection`, each once. Source: PS 1 in inch shops, else EN 315.
 */
export function actualWidths(
  runs: Run[],
  rules: Pick<FitRules, 'sheetNominalMm' | 'sheetActualMm' | 'unit'>,
): { runs: Run[]; problems: Problem[] } {
  const { sheetNominalMm: nominalMm, sheetActualMm, unit } = rules;
  if (!sheetActualMm || !runs.some((run) => run.units.some(({ sheets }) => sheets))) {
    return { runs, problems: [] };
  }
  const actual = { value: sheetActualMm, u: CALLIPER_U_MM, from: [] };
  const standard = unit === 'in' ? 'PS 1' : 'EN 315';
  const one = sheetCorrection({ nominalMm, actual, thicknesses: 1, standard });
  const perSheetMm = one.value?.correction.value ?? 0;
  const corrected = runs.map((run) => ({
    ...run,
    units: run.units.map((each) => {
      const widthMm = each.widthMm + (each.sheets ?? 0) * perSheetMm;
      return widthMm > 0 ? { ...each, widthMm } : each;
    }),
  }));
  const about = runs.flatMap(({ units }) =>
    units.flatMap(({ id, sheets }) => (sheets ? [id] : [])),
  );
  return { runs: corrected, problems: one.problems.map((problem) => ({ ...problem, about })) };
}
