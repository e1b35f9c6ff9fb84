/** From the tops of tall and hung boxes to the ceiling. */

import { crownCuts } from '@/lib/measure/crown-cuts';
import { figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import type { FitDatum } from '@/lib/measure/fit-kicks';
import type { WorkedRun } from '@/lib/measure/fit-runs';
import { edgeScribe } from '@/lib/measure/fit-scribe';
import type { LevelLine } from '@/lib/measure/level-line';
import { hasTallUnit } from '@/lib/measure/plan-levels';
import type { RunCeiling } from '@/lib/measure/run-fit';
import { topGap } from '@/lib/measure/top-gap';
import { LASER_PLANE_U } from '@/lib/measure/wall-faces';
import type { Problem } from '@/lib/problem';

/** Boxes that end further below the ceiling than this are left open above; from memory. */
const CLOSED_TO_CEILING_MM = 400;

/**
 * The gap over tall and hung boxes, and the piece that closes it.
 * Edge: null for base runs, without rises, or without a datum; unless the run says what closes it, boxes
 * that end more than 400 below the ceiling are left open above.
 * Example: rises 1440 and 1447, datum drop 1000, top 2400: 40 and 47.
 */
export function fitCeiling(
  context: FitContext,
  level: LevelLine,
  worked: WorkedRun,
  datum: FitDatum | null,
): { ceiling: RunCeiling | null; problems: Problem[] } {
  const { run, plane, bandMm } = worked;
  const rises = level.rises.filter(({ wallId }) => wallId === run.wallId);
  const isHigh = run.level !== 'base' || hasTallUnit(run);
  if (!isHigh || !datum || rises.length === 0) return { ceiling: null, problems: [] };
  const { rules } = context;
  const gap = topGap({
    runId: run.id,
    rises,
    x0Mm: bandMm[0],
    x1Mm: bandMm[1],
    yMm: (plane?.standOffMm ?? 0) + run.carcassDepthMm,
    topMm: run.z1Mm,
    datumDrop: datum.drop,
    datumSetUpId: datum.setUpId,
    uLevel: LASER_PLANE_U,
    scribe: {
      marginMm: rules.scribeMarginMm,
      leastMm: rules.ceilingScribeLeastMm,
      stepMm: rules.scribeStepMm,
    },
  });
  if (!gap.value) return { ceiling: null, problems: gap.problems };
  const { left, right, least, greatest, scribe, blankMm } = gap.value;
  const isClosed =
    run.overBoxes !== 'open' &&
    (run.overBoxes !== undefined || least.value <= CLOSED_TO_CEILING_MM);
  const from = [...new Set([...least.from, ...greatest.from])];
  const words = `${context.words(left.value)} at the left, ${context.words(right.value)} at the right`;
  return {
    ceiling: {
      left: fitFigure('ceiling-gap', left),
      right: fitFigure('ceiling-gap', right),
      least: fitFigure('ceiling-gap', least),
      blank: isClosed
        ? fitFigure('ceiling-blank', figure(blankMm, scribe.unrounded.u, from))
        : null,
      scribe: isClosed ? edgeScribe('ceiling', 'top, to the ceiling', null, scribe) : null,
      crown: run.overBoxes === 'crown' ? crownCuts(context, run) : [],
      words: isClosed ? `${words}; blank ${context.words(blankMm)}` : words,
    },
    problems: gap.problems,
  };
}
