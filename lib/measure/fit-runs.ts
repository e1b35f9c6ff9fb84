/** Every run of a fit, from its set line to its cut sizes. */
import type { Run } from '@/lib/contracts/runs';
import { type ClearOpening, clearOpening, placeWords } from '@/lib/measure/clear-opening';
import type { FacePlace } from '@/lib/measure/end-view';
import { type FilledRun, type FillRunInput, fillRun, layOut } from '@/lib/measure/fill-run';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { fillInput, fitFill } from '@/lib/measure/fit-fill';
import { fitFiller } from '@/lib/measure/fit-filler';
import { backGaps, finishedEndScribes, runSetLine, sameEdge } from '@/lib/measure/fit-run-gaps';
import {
  assumedSetLines,
  firstBand,
  fitSetLines,
  type RunPlane,
} from '@/lib/measure/fit-set-lines';
import { frontDepth } from '@/lib/measure/room-walk';
import { type FramedRun, frameRun, unitAt } from '@/lib/measure/run-ends';
import type { OpeningPlace, RunEndFit, RunFit, RunOpening } from '@/lib/measure/run-fit';
import type { Problem } from '@/lib/problem';
import { roundOpeningDown } from '@/lib/units/round';

/** A run on its way through the fit. */
export type WorkedRun = {
  run: Run;
  plane: RunPlane | null;
  framed: FramedRun | null;
  input: FillRunInput | null;
  opening: ClearOpening | null;
  filled: FilledRun | null;
  /** Where its boxes stand along the wall, as far as known. */
  bandMm: readonly [number, number];
  problems: Problem[];
};

/** Lays the boxes out on the straight walls first, so that the set line is sought behind them alone. */
export function workRuns(context: FitContext): { runs: WorkedRun[]; problems: Problem[] } {
  const againstWalls = context.runs.filter(({ island }) => !island);
  const requests = againstWalls
    .filter(({ wallId }) => context.frames.has(wallId))
    .map((run) => ({ run, bandMm: firstBand(context, run), edgesMm: [] as number[] }));
  const straight = assumedSetLines(context, requests);
  const placed = requests.map((request) => {
    const framed = frameRun(context, request.run, straight).value;
    const units = framed ? layOut(fillInput(context, request.run, framed)) : [];
    const [left, right] = [units[0], units[units.length - 1]];
    if (!left || !right) return request;
    return {
      run: request.run,
      bandMm: toCornerUnits(context, request.run, [left.leftMm, right.rightMm]),
      edgesMm: [...units.map(({ leftMm }) => leftMm), ...units.map(({ rightMm }) => rightMm)],
    };
  });
  const lines = fitSetLines(context, placed);
  const bands = new Map(placed.map(({ run, bandMm }) => [run.id, bandMm]));
  const runs = againstWalls.map((run) =>
    workRun(context, run, lines.planes, bands.get(run.id) ?? [0, 0]),
  );
  return { runs, problems: [...lines.problems, ...runs.flatMap(({ problems }) => problems)] };
}

/** Behind the arm of a corner unit that the run on the next wall holds, this wall's face counts too. */
function toCornerUnits(
  context: FitContext,
  run: Run,
  [x0Mm, x1Mm]: readonly [number, number],
): readonly [number, number] {
  const holdsNone = (end: 'left' | 'right') => {
    const meets = run[end];
    const isJoined = meets.kind === 'run' && meets.through === 'corner-unit';
    return isJoined && unitAt(run, end)?.kind !== 'corner';
  };
  const lengthMm = context.frames.get(run.wallId)?.length.value ?? x1Mm;
  return [holdsNone('left') ? 0 : x0Mm, holdsNone('right') ? Math.max(x1Mm, lengthMm) : x1Mm];
}

function workRun(
  context: FitContext,
  run: Run,
  planes: ReadonlyMap<string, RunPlane>,
  bandMm: readonly [number, number],
): WorkedRun {
  const plane = planes.get(run.id) ?? null;
  const framed = frameRun(context, run, planes);
  if (!framed.value) {
    return {
      run,
      plane,
      framed: null,
      input: null,
      opening: null,
      filled: null,
      bandMm,
      problems: framed.problems,
    };
  }
  const input = fillInput(context, run, framed.value);
  const opening = clearOpening({
    frame: framed.value.frame,
    depthMm: frontDepth(run),
    z0Mm: run.z0Mm,
    z1Mm: run.z1Mm,
  });
  const filled = opening.value ? fillRun(input) : { value: null, problems: [] };
  return {
    run,
    plane,
    framed: framed.value,
    input,
    opening: opening.value,
    filled: filled.value,
    bandMm,
    problems: [...framed.problems, ...opening.problems, ...filled.problems],
  };
}

/** What the set line, opening and fill of a run come to; kicks, ceiling, studs and verdicts are added later. */
export function describeRun(
  context: FitContext,
  worked: WorkedRun,
): { runFit: RunFit; problems: Problem[] } {
  const { run, plane, framed, input, opening, filled } = worked;
  const left = endFit(context, worked, 'left');
  const right = endFit(context, worked, 'right');
  const scribes = finishedEndScribes(context, worked);
  const gapAt = (xMm: number) => {
    const edge = sameEdge(plane?.line?.edges ?? [], (one) => one.xMm, xMm);
    return edge ? fitFigure('back-gap', edge.greatest.gap) : null;
  };
  const runFit: RunFit = {
    runId: run.id,
    wallId: run.wallId,
    name: run.name,
    level: run.level,
    setLine: plane ? runSetLine(context, plane) : null,
    backGaps: backGaps(context, worked),
    clearOpening: opening && framed ? runOpening(context, run, opening) : null,
    left: left.endFit,
    right: right.endFit,
    fill: filled && input ? fitFill(context, run, input, filled) : null,
    units: (filled?.placed ?? []).map(({ id, leftMm, rightMm }) => {
      const unit = run.units.find((one) => one.id === id);
      return {
        unitId: id,
        name: unit?.name ?? '',
        kind: unit?.kind ?? '',
        leftMm,
        rightMm,
        backGapLeft: gapAt(leftMm),
        backGapRight: gapAt(rightMm),
        studs: null,
        tilt: null,
        applianceHeight: null,
      };
    }),
    scribes: scribes.scribes,
    kicks: null,
    ceiling: null,
    upperGap: null,
    aisle: null,
    island: null,
    verdicts: [],
  };
  return { runFit, problems: [...left.problems, ...right.problems, ...scribes.problems] };
}

function runOpening(context: FitContext, run: Run, opening: ClearOpening): RunOpening {
  const band = { depthMm: frontDepth(run), z0Mm: run.z0Mm, z1Mm: run.z1Mm };
  const place = (at: FacePlace): OpeningPlace => ({
    end: at.end,
    yMm: at.yMm,
    zMm: at.zMm,
    xMm: at.xMm,
    words: placeWords(at, band, context.words),
    readingId: at.readingId,
    extrapolated: at.extrapolated,
  });
  return {
    opening: fitFigure('clear-opening', opening.opening),
    governing: { left: place(opening.left), right: place(opening.right) },
    safeMm: opening.safeMm,
    safeRoundedDownMm: roundOpeningDown(opening.safeMm, context.rules.stepMm),
  };
}

function endFit(
  context: FitContext,
  { run, framed, filled }: WorkedRun,
  end: 'left' | 'right',
): { endFit: RunEndFit; problems: Problem[] } {
  const meets = framed?.[end].meets ?? run[end].kind;
  const base = { end, meets, words: framed?.[end].words ?? '' };
  const side = filled?.[end];
  if (!side) {
    const rule = framed?.[end].rule;
    const limits = { leastMm: rule?.leastMm ?? 0, mostMm: rule?.mostMm ?? 0 };
    return { endFit: { ...base, ...limits, filler: null, freeRoom: null }, problems: [] };
  }
  const { filler, problems } = fitFiller(context, end, side);
  const freeRoom = side.isOpen ? fitFigure('free-room', side.face) : null;
  return {
    endFit: { ...base, leastMm: side.leastMm, mostMm: side.mostMm, filler, freeRoom },
    problems,
  };
}
