/** What a run's place in the room adds to its set line and fill: kicks, ceiling, studs, heights, verdicts. */
import type { FloorFit } from '@/lib/measure/fit';
import type { FoundAisle } from '@/lib/measure/fit-aisles';
import { fitCeiling } from '@/lib/measure/fit-ceiling';
import type { FitContext } from '@/lib/measure/fit-context';
import { applianceHeight, counterProblems, overCounter, tiltOf } from '@/lib/measure/fit-heights';
import type { FittedKicks } from '@/lib/measure/fit-kicks';
import { describeRun, type WorkedRun } from '@/lib/measure/fit-runs';
import { fitStuds } from '@/lib/measure/fit-studs';
import { aisleOf, type Judge, runVerdicts } from '@/lib/measure/fit-verdicts';
import type { LevelLine } from '@/lib/measure/level-line';
import type { PlacedUnit, RunFit } from '@/lib/measure/run-fit';
import type { Problem } from '@/lib/problem';

export type RoomAround = {
  context: FitContext;
  level: LevelLine;
  kicks: FittedKicks;
  aisles: FoundAisle[];
  floor: FloorFit | null;
  judge: Judge;
};

/** Adds kicks, ceiling, studs, heights and verdicts to a run; each is null where its readings are missing. */
export function finishRun(
  around: RoomAround,
  work: WorkedRun,
): { runFit: RunFit; problems: Problem[] } {
  const { context, level, kicks, floor, judge } = around;
  const datum = kicks.datumOf(work.run);
  const described = describeRun(context, work);
  const ceiling = fitCeiling(context, level, work, datum);
  const studs = fitStuds(context, work);
  const upper = overCounter(context, work);
  const problems = [
    ...described.problems,
    ...ceiling.problems,
    ...studs.problems,
    ...upper.problems,
    ...counterProblems(context, work, datum),
  ];
  const units = described.runFit.units.map((placed): PlacedUnit => {
    const unit = work.run.units.find(({ id }) => id === placed.unitId);
    if (!unit) return placed;
    const height = applianceHeight(context, level, work, unit, datum);
    problems.push(...height.problems);
    return {
      ...placed,
      studs: studs.studs.get(unit.id) ?? null,
      tilt: tiltOf(context, work, unit, floor),
      applianceHeight: height.height,
    };
  });
  const runFit: RunFit = {
    ...described.runFit,
    units,
    kicks: kicks.kicks.get(work.run.id) ?? null,
    ceiling: ceiling.ceiling,
    upperGap: upper.gap,
    aisle: aisleOf(work.run.id, around.aisles),
  };
  return { runFit: { ...runFit, verdicts: runVerdicts(judge, runFit) }, problems };
}
