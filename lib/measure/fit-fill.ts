/** The fill of a run and the widths that would make it fit, as the fit shows them. */
import type { Run } from '@/lib/contracts/runs';
import type { FilledRun, FillRunInput } from '@/lib/measure/fill-run';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { frontDepth } from '@/lib/measure/room-walk';
import type { FramedRun } from '@/lib/measure/run-ends';
import type { RunFill, WidthSuggestion } from '@/lib/measure/run-fit';
import { suggestWidths } from '@/lib/measure/suggest-widths';
import { roundBlankUp } from '@/lib/units/round';

/** What `fillRun` is asked for a run of the fit. */
export function fillInput(context: FitContext, run: Run, framed: FramedRun): FillRunInput {
  const { rules } = context;
  const fillerPlaneMm = rules.fillerPlane === 'door-front' ? frontDepth(run) : run.carcassDepthMm;
  return {
    frame: framed.frame,
    carcassDepthMm: run.carcassDepthMm,
    fillerPlaneMm,
    z0Mm: run.z0Mm,
    z1Mm: run.z1Mm,
    left: framed.left.rule,
    right: framed.right.rule,
    units: run.units.map(({ id, widthMm }) => ({ id, widthMm })),
    jointGrowthMm: rules.jointGrowthMm,
    unitBuildToleranceMm: rules.unitBuildToleranceMm,
    share: run.share,
  };
}

/** The fill of a run in words, with the smallest change of widths that makes it fit where it does not. */
export function fitFill(
  context: FitContext,
  run: Run,
  input: FillRunInput,
  filled: FilledRun,
): RunFill {
  return {
    room: fitFigure('run-room', filled.room),
    unitsMm: filled.unitsMm,
    jointGrowthMm: filled.jointGrowthMm,
    slack: fitFigure('run-slack', filled.slack),
    verdict: filled.verdict,
    words: verdictWords(context, filled),
    toLoseMm: filled.toLoseMm,
    shiftOfMarkMm: filled.shiftOfMarkMm,
    suggestion: filled.verdict === 'fits' ? null : suggestion(context, run, input),
  };
}

function verdictWords(context: FitContext, filled: FilledRun): string {
  const { words, rules } = context;
  switch (filled.verdict) {
    case 'fits':
      return `Fits: ${endWords(context, filled, 'left')}, ${endWords(context, filled, 'right')}.`;
    case 'tight':
      return `Tight: it goes as read, but ±${words(roundBlankUp(filled.slack.U, rules.stepMm))} could break the least filler.`;
    case 'loose':
      return `Loose: ${endWords(context, filled, 'left')}, ${endWords(context, filled, 'right')}, wider than the shop allows.`;
    case 'short': {
      const lose = `Short: ${words(roundBlankUp(filled.toLoseMm, rules.stepMm))} to lose`;
      if (filled.shiftOfMarkMm === null) return `${lose}.`;
      const way = filled.shiftOfMarkMm > 0 ? 'right' : 'left';
      return `${lose}, or the mark moved ${words(Math.abs(filled.shiftOfMarkMm))} to the ${way}.`;
    }
  }
}

function endWords(context: FitContext, filled: FilledRun, end: 'left' | 'right'): string {
  const { face, isOpen } = filled[end];
  const what = isOpen ? 'free' : 'filler';
  return `${end} ${what} ${context.words(face.value)}`;
}

function suggestion(context: FitContext, run: Run, input: FillRunInput): WidthSuggestion | null {
  const units = run.units.map(({ id, widthMm, alterable }) => ({
    id,
    widthMm,
    alterable: alterable && {
      minMm: alterable.minMm,
      maxMm: alterable.maxMm,
      stepMm: alterable.stepMm,
      ...(alterable.stockMm ? { stockMm: alterable.stockMm } : {}),
    },
  }));
  if (units.every(({ alterable }) => alterable === null)) return null;
  const found = suggestWidths({ ...input, units }).value;
  if (!found) return null;
  const { words } = context;
  if (!found.possible) {
    return { ...found, words: 'No change of these units can do it.' };
  }
  const nameOf = (unitId: string) => {
    const index = run.units.findIndex(({ id }) => id === unitId);
    return run.units[index]?.name || `unit ${index + 1}`;
  };
  const changes = found.changes
    .map(({ unitId, fromMm, toMm }) => `${nameOf(unitId)} ${words(fromMm)} to ${words(toMm)}`)
    .join(', ');
  const fillers = [found.leftFillerMm, found.rightFillerMm]
    .filter((mm) => mm !== null)
    .map(words)
    .join(' and ');
  return { ...found, words: fillers === '' ? `${changes}.` : `${changes}: fillers ${fillers}.` };
}
