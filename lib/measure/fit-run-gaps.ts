/** The set line of a run as the fit shows it: gaps behind, scribes of finished ends. */

import { figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import type { WorkedRun } from '@/lib/measure/fit-runs';
import { edgeScribe } from '@/lib/measure/fit-scribe';
import type { RunPlane } from '@/lib/measure/fit-set-lines';
import type { BackGap, EdgeScribe, RunSetLine } from '@/lib/measure/run-fit';
import { scribeAllowance } from '@/lib/measure/scribe';
import type { EdgeGap } from '@/lib/measure/set-line-gaps';
import type { Problem } from '@/lib/problem';

/** The set line of a run as the fit shows it; where nobody read the face its gap is 0 ± the usual bow. */
export function runSetLine(context: FitContext, plane: RunPlane): RunSetLine {
  const { line } = plane;
  const offsetAt = (xMm: number) => plane.standOffMm + plane.slope * xMm;
  return {
    offsetAtLeftMm: offsetAt(plane.xLeftMm),
    offsetAtRightMm: offsetAt(plane.xRightMm),
    xLeftMm: plane.xLeftMm,
    xRightMm: plane.xRightMm,
    turnDeg: plane.turnDeg,
    turnFixedBy: plane.turnFixedBy,
    assumed: plane.assumed,
    touches: (line?.touches ?? []).map(({ xMm, zMm, ids }) => ({
      xMm,
      zMm,
      readingId: ids[0] ?? '',
    })),
    rocks: line?.rocks ?? false,
    greatestGap: fitFigure('set-line-gap', line?.largestGap.gap ?? unreadGap(context)),
    wallToCut: (line?.wallToCut ?? []).map(({ xMm, zMm, proud }) => ({
      xMm,
      zMm,
      proud: fitFigure('wall-to-cut', proud),
    })),
  };
}

/** The set line turns the boxes a little after their edges were laid out on the straight wall. */
const SAME_EDGE_MM = 20;

/** The one that stands nearest to a place, if near enough to be the same edge. */
export function sameEdge<T>(things: T[], placeOf: (thing: T) => number, xMm: number): T | null {
  let found: T | null = null;
  for (const thing of things) {
    const apartMm = Math.abs(placeOf(thing) - xMm);
    if (apartMm >= SAME_EDGE_MM) continue;
    if (found === null || apartMm < Math.abs(placeOf(found) - xMm)) found = thing;
  }
  return found;
}

/** Nobody read the face: nothing, as sure as the usual bow. */
function unreadGap(context: FitContext) {
  return figure(0, context.rules.usualBowMm / Math.sqrt(3), []);
}

/** The gap behind every reading, unit edge and finished end of a run; none where the face is not read. */
export function backGaps(context: FitContext, { run, plane, filled }: WorkedRun): BackGap[] {
  const line = plane?.line;
  if (!line) return [];
  const [from, to] = [plane.xLeftMm - 1, plane.xRightMm + 1];
  const atReadings = line.gaps
    .filter(({ xMm }) => xMm >= from && xMm <= to)
    .map(
      ({ xMm, zMm, gap }): BackGap => ({
        words: `${context.words(xMm)} from the left, ${context.words(zMm)} up`,
        at: 'reading',
        unitId: null,
        xMm,
        zMm,
        gap: fitFigure('back-gap', gap),
      }),
    );
  const units = filled?.placed ?? [];
  const atEdges = line.edges.flatMap((edge): BackGap[] => {
    const unit = sameEdge(units, ({ leftMm }) => leftMm, edge.xMm) ?? units.at(-1);
    const finished = finishedEndAt(run, edge, units);
    if (!unit) return [];
    return [
      {
        words: finished ? `behind the finished end, ${finished}` : 'behind a unit’s edge',
        at: finished ? 'finished-end' : 'unit-edge',
        unitId: unit.id,
        xMm: edge.xMm,
        zMm: edge.greatest.zMm,
        gap: fitFigure('back-gap', edge.greatest.gap),
      },
    ];
  });
  return [...atReadings, ...atEdges];
}

function finishedEndAt(
  run: WorkedRun['run'],
  edge: EdgeGap,
  units: { leftMm: number; rightMm: number }[],
): 'left' | 'right' | null {
  const near = (xMm: number | undefined) =>
    xMm !== undefined && Math.abs(xMm - edge.xMm) < SAME_EDGE_MM / 2;
  if (run.left.kind === 'open' && near(units[0]?.leftMm)) return 'left';
  if (run.right.kind === 'open' && near(units.at(-1)?.rightMm)) return 'right';
  return null;
}

/** What a finished end is left long at the back, to be drawn to the wall. */
export function finishedEndScribes(
  context: FitContext,
  { run, plane, filled }: WorkedRun,
): { scribes: EdgeScribe[]; problems: Problem[] } {
  const scribes: EdgeScribe[] = [];
  const problems: Problem[] = [];
  const units = filled?.placed ?? [];
  for (const edge of plane?.line?.edges ?? []) {
    const end = finishedEndAt(run, edge, units);
    if (!end) continue;
    const index = end === 'left' ? 0 : run.units.length - 1;
    const places = [edge.least, edge.greatest].map(({ zMm, gap }) => ({
      id: gap.from[0] ?? run.id,
      atMm: zMm,
      gapMm: gap.value,
      u: gap.u,
    }));
    const scribed = scribeAllowance({
      places,
      uShared: 0,
      held: 'at-contact',
      rules: {
        marginMm: context.rules.scribeMarginMm,
        leastMm: leastScribe(context, run, index),
        stepMm: context.rules.scribeStepMm,
      },
    });
    problems.push(...scribed.problems);
    if (!scribed.value) continue;
    const unitId = run.units[index]?.id ?? null;
    scribes.push(edgeScribe('finished-end', `finished end, ${end}`, unitId, scribed.value));
  }
  return { scribes, problems };
}

/** Tall units and refrigerator panels come longer; ref F11. */
function leastScribe({ rules }: FitContext, run: WorkedRun['run'], index: number): number {
  const unit = run.units[index];
  const beside = [run.units[index - 1], run.units[index + 1]];
  if (unit?.kind === 'panel' && beside.some((other) => other?.kind === 'refrigerator')) {
    return rules.scribeLeastFridgePanelMm;
  }
  if (unit?.kind === 'tall' || run.level === 'tall') return rules.scribeLeastTallMm;
  return rules.scribeLeastMm;
}
