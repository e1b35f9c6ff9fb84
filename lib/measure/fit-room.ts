/** The whole fit of a room for its runs. */
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Run, WallBook } from '@/lib/contracts/wall-book';
import { ENGINE_VERSION } from '@/lib/measure/engine-version';
import type { Fit } from '@/lib/measure/fit';
import { fitCeiling } from '@/lib/measure/fit-ceiling';
import { fitClosure } from '@/lib/measure/fit-closure';
import { fitContext } from '@/lib/measure/fit-context';
import { fitCorners } from '@/lib/measure/fit-corners';
import { fitFloor } from '@/lib/measure/fit-floor';
import { fitKicks, type StandingRun } from '@/lib/measure/fit-kicks';
import { describeRun, type WorkedRun, workRuns } from '@/lib/measure/fit-runs';
import { fitWalls } from '@/lib/measure/fit-walls';
import { extraInstallMinutes } from '@/lib/measure/install-minutes';
import { oneLevelLine } from '@/lib/measure/level-line';
import { roundFit } from '@/lib/measure/round-fit';
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
  const corners = fitCorners(context);
  const { walls, problems: wallProblems } = fitWalls(context);
  const level = oneLevelLine(context.book);
  const worked = workRuns(context);
  const kicks = fitKicks(context, level, worked.runs.flatMap(standing));
  const described = worked.runs.map((work) => {
    const { runFit, problems } = describeRun(context, work);
    const ceiling = fitCeiling(context, level, work, kicks.datumOf(work.run));
    return {
      runFit: { ...runFit, kicks: kicks.kicks.get(work.run.id) ?? null, ceiling: ceiling.ceiling },
      problems: [...problems, ...ceiling.problems],
    };
  });
  const runFits = described.map(({ runFit }) => runFit);
  const fit: Fit = {
    engineVersion: ENGINE_VERSION,
    roomId: wallBook.room.id,
    corners,
    walls,
    floor: fitFloor(level),
    runs: runFits,
    collisions: [],
    wayIn: [],
    closure: fitClosure(context),
    verdicts: [],
    problems: onceEach([
      ...context.problems,
      ...wallProblems,
      ...level.problems,
      ...worked.problems,
      ...kicks.problems,
      ...described.flatMap(({ problems }) => problems),
    ]),
    readingIds: context.book.readings.map(({ id }) => id),
    extraInstallMinutes: extraInstallMinutes(runFits, walls),
  };
  return roundFit(fit);
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
