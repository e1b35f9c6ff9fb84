import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { fitRoom } from '@/lib/measure/fit-room';
import type { RunFit, WidthSuggestion } from '@/lib/measure/run-fit';

/** The run with the widths of a suggestion in place of its own. */
export function withWidths(run: Run, { changes }: Pick<WidthSuggestion, 'changes'>): Run {
  const widths = new Map(changes.map(({ unitId, toMm }) => [unitId, toMm]));
  return {
    ...run,
    units: run.units.map((unit) => ({ ...unit, widthMm: widths.get(unit.id) ?? unit.widthMm })),
  };
}

export type WayOut = {
  /** The run with the suggested widths. */
  run: Run;
  /** What it then comes to. */
  after: RunFit;
};

/**
 * The way out of a run that does not come out well: its suggested widths, and the whole room worked out again with
 * them, because another run may meet it.
 *
 * Edge: null where the run fits, or where no change of its units can help.
 */
export function wayOutOf(
  { wallBook, runs, rules }: { wallBook: WallBook; runs: Run[]; rules: FitRules },
  { runId, fill }: RunFit,
): WayOut | null {
  const run = runs.find(({ id }) => id === runId);
  if (!run || !fill?.suggestion?.possible) return null;
  const changed = withWidths(run, fill.suggestion);
  const all = runs.map((one) => (one.id === runId ? changed : one));
  const after = fitRoom(wallBook, all, rules).runs.find((one) => one.runId === runId);
  return after ? { run: changed, after } : null;
}
