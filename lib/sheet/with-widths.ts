import type { Run } from '@/lib/contracts/wall-book';
import type { WidthSuggestion } from '@/lib/measure/run-fit';

/** The run with the widths of a suggestion in place of its own. */
export function withWidths(run: Run, { changes }: Pick<WidthSuggestion, 'changes'>): Run {
  const widths = new Map(changes.map(({ unitId, toMm }) => [unitId, toMm]));
  return {
    ...run,
    units: run.units.map((unit) => ({ ...unit, widthMm: widths.get(unit.id) ?? unit.widthMm })),
  };
}
