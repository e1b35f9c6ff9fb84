/** The whole fit of a room for its runs. */

import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { ruleFor } from '@/lib/measure/check-rule';
import { ENGINE_VERSION } from '@/lib/measure/engine-version';
import { finishRun } from '@/lib/measure/finish-run';
import type { CornerFit, Fit, FloorFit } from '@/lib/measure/fit';
import { fitAisles } from '@/lib/measure/fit-aisles';
import { fitClosure } from '@/lib/measure/fit-closure';
import { type FitContext, fitContext } from '@/lib/measure/fit-context';
import { fitCorners } from '@/lib/measure/fit-corners';
import { fitFloor } from '@/lib/measure/fit-floor';
import { fitIslands, standingIslands } from '@/lib/measure/fit-islands';
import { fitKicks, type StandingRun } from '@/lib/measure/fit-kicks';
import { type WorkedRun, workRuns } from '@/lib/measure/fit-runs';
import { fitCollisions } from '@/lib/measure/fit-studs';
import {
  cornerVerdicts,
  floorVerdicts,
  type Judge,
  judgeBy,
  piecesVerdicts,
  runVerdicts,
  straightedgeOf,
  wallVerdicts,
  worstFirst,
} from '@/lib/measure/fit-verdicts';
import { fitWalls } from '@/lib/measure/fit-walls';
import { fitWayIn } from '@/lib/measure/fit-way-in';
import { extraInstallMinutes } from '@/lib/measure/install-minutes';
import { oneLevelLine } from '@/lib/measure/level-line';
import { planPlace } from '@/lib/measure/plan-place';
import { roundFit } from '@/lib/measure/round-fit';
import type { RuleSet } from '@/lib/measure/rules/rule-set';
import { ruleSetsOf } from '@/lib/measure/rules/rule-sets';
import type { RunFit } from '@/lib/measure/run-fit';
import type { Problem } from '@/lib/problem';

/**
 * What the readings of a room mean for its runs: every figure with its U and its readings, in one value.
 *
 * Edge rule: whatever has been read so far gives what it can; what is missing is null, and said as a
 * problem of the run. Deterministic; numbers are rounded to 1e-4 and ties within 1e-6 go by order, so
 * that phone and server agree to the byte. Units: mm, deg, leans in mm/m; frames of MEASURE 1.
 * Example: an L of 2400 and 3000 at 90° with one run of 600 + 900 on the first wall: the run's slack is
 * 2400 less boxes, joints and least fillers. Problems: those of every part, each once.
 * Source: each part names its own.
 */
export function fitRoom(wallBook: WallBook, runs: Run[], rules: FitRules): Fit {
  const context = fitContext(wallBook, runs, rules);
  const ruleSets = ruleSetsOf(rules);
  const judge = judgeBy(context, ruleSets);
  const level = oneLevelLine(context.book);
  const corners = judgedCorners(context, judge);
  const walls = judgedWalls(context, judge, ruleSets);
  const floor = judgedFloor(context, judge, fitFloor(level));
  const worked = workRuns(context);
  const kicks = fitKicks(context, level, [
    ...worked.runs.flatMap(standing),
    ...standingIslands(context, worked.runs),
  ]);
  const aisles = fitAisles(context, worked.runs);
  const fitted = worked.runs.map((work) =>
    finishRun({ context, level, kicks, aisles, floor, judge }, work),
  );
  const islands = fitIslands(context, level, worked.runs, kicks);
  const runFits = inOrder(context, [
    ...fitted.map(({ runFit }) => runFit),
    ...islands.runFits.map((run) => ({ ...run, verdicts: runVerdicts(judge, run) })),
  ]);
  const fit: Fit = {
    engineVersion: ENGINE_VERSION,
    roomId: wallBook.room.id,
    corners,
    walls: walls.walls,
    floor,
    runs: runFits,
    collisions: worked.runs.flatMap((work) => fitCollisions(context, work)),
    wayIn: fitWayIn(context),
    closure: fitClosure(context),
    verdicts: worstFirst(
      [...corners, ...walls.walls, ...(floor ? [floor] : []), ...runFits].flatMap(
        ({ verdicts }) => verdicts,
      ),
    ),
    problems: onceEach([
      ...context.problems,
      ...walls.problems,
      ...level.problems,
      ...worked.problems,
      ...kicks.problems,
      ...fitted.flatMap(({ problems }) => problems),
      ...islands.problems,
    ]),
    readingIds: context.book.readings.map(({ id }) => id),
    extraInstallMinutes: extraInstallMinutes(runFits, walls.walls),
  };
  return roundFit(fit);
}

function judgedCorners(context: FitContext, judge: Judge): CornerFit[] {
  return fitCorners(context).map((corner) => {
    const depthMm = corner.offset?.depthMm ?? context.rules.cornerFlagOverMm;
    return { ...corner, verdicts: cornerVerdicts(judge, corner, depthMm) };
  });
}

function judgedWalls(context: FitContext, judge: Judge, ruleSets: readonly RuleSet[]) {
  const { walls, problems } = fitWalls(context, straightedgeOf(ruleSets));
  const isOverEdge = ruleFor(ruleSets, 'wall-straightness')?.rule.overMm !== null;
  const judged = walls.map((wall) => ({
    ...wall,
    verdicts: [...piecesVerdicts(judge, context, wall), ...wallVerdicts(judge, wall, isOverEdge)],
  }));
  return { walls: judged, problems };
}

function judgedFloor(context: FitContext, judge: Judge, floor: FloorFit | null): FloorFit | null {
  if (!floor) return null;
  const places = [floor.highPoint, floor.lowPoint].map((point) => planPlace(context, point));
  const [high, low] = places;
  const spanMm = high && low ? Math.hypot(high.xMm - low.xMm, high.yMm - low.yMm) : 0;
  return { ...floor, verdicts: floorVerdicts(judge, floor, spanMm) };
}

function standing({ run, plane, bandMm, filled }: WorkedRun): StandingRun[] {
  if (!plane) return [];
  const units = (filled?.placed ?? []).map(({ id, leftMm, rightMm }) => ({
    unitId: id,
    leftMm,
    rightMm,
  }));
  const middle = (bandMm[0] + bandMm[1]) / 2;
  const backMm = plane.standOffMm + plane.slope * middle;
  return [{ run, x0Mm: bandMm[0], x1Mm: bandMm[1], backMm, units }];
}

/** Runs in the order the shop gave them. */
function inOrder(context: FitContext, runFits: RunFit[]): RunFit[] {
  return context.runs.flatMap((run) => runFits.filter(({ runId }) => runId === run.id));
}

/** The same words about the same things, said by two parts, are one problem. */
function onceEach(problems: Problem[]): Problem[] {
  const seen = new Set<string>();
  return problems.filter(({ code, about }) => {
    const key = `${code}:${about.join()}`;
    if (seen.has(key)) return false;
    seen.add(key);
    return true;
  });
}
