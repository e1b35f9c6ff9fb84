/** Islands and peninsulas of a fit: where they stand, what they face, which pipes they meet. */
import type { Run } from '@/lib/contracts/runs';
import { figure } from '@/lib/measure/figure';
import { type FitContext, SURE_LENGTH_U_MM } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import type { FittedKicks, StandingRun } from '@/lib/measure/fit-kicks';
import type { WorkedRun } from '@/lib/measure/fit-runs';
import { type IslandAisle, type IslandInput, islandPlacement } from '@/lib/measure/island';
import type { LevelLine } from '@/lib/measure/level-line';
import { planPlace } from '@/lib/measure/plan-place';
import { frontDepth } from '@/lib/measure/room-walk';
import type { IslandFit, RunFit } from '@/lib/measure/run-fit';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import { LASER_PLANE_U } from '@/lib/measure/wall-faces';
import type { Problem } from '@/lib/problem';

/** Set out by tape from the set line: as sure as a mark on the floor, ±2 mm; from memory. */
const SET_OUT_U_MM = 2 / Math.sqrt(3);
/** A door or drawer opens no further than this into an aisle; from memory. */
const WIDEST_OPEN_MM = 600;

/** Where an island's boxes stand along and out of its wall, for its kicks. */
export function standingIslands(context: FitContext, worked: WorkedRun[]): StandingRun[] {
  return islandsOf(context).map((run) => {
    const line = setLineOf(run, worked);
    const x0Mm = run.island?.alongMm ?? 0;
    const units = placeUnits(context, run, x0Mm);
    return {
      run,
      x0Mm,
      x1Mm: units.at(-1)?.rightMm ?? x0Mm,
      backMm: line.standOffMm + (run.island?.offsetMm ?? 0),
      units,
    };
  });
}

function islandsOf(context: FitContext): Run[] {
  return context.runs.filter(({ island }) => island !== undefined);
}

function setLineOf(run: Run, worked: WorkedRun[]): { standOffMm: number; turnDeg: number } {
  const named = worked.find((one) => one.run.id === run.island?.setLineRunId);
  return named?.plane ?? { standOffMm: 0, turnDeg: 0 };
}

function placeUnits(context: FitContext, run: Run, x0Mm: number): StandingRun['units'] {
  let x = x0Mm;
  return run.units.map(({ id, widthMm }) => {
    const placed = { unitId: id, leftMm: x, rightMm: x + widthMm };
    x += widthMm + context.rules.jointGrowthMm;
    return placed;
  });
}

/** Every island as the fit shows it; without an adjusted room only its units and kicks. */
export function fitIslands(
  context: FitContext,
  level: LevelLine,
  worked: WorkedRun[],
  kicks: FittedKicks,
): { runFits: RunFit[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const runFits = standingIslands(context, worked).map((standing) => {
    const placed = placeIsland(context, level, worked, kicks, standing);
    problems.push(...placed.problems.filter(({ code }) => code !== 'floor-not-read'));
    return describeIsland(kicks, standing, placed.island);
  });
  return { runFits, problems };
}

function placeIsland(
  context: FitContext,
  level: LevelLine,
  worked: WorkedRun[],
  kicks: FittedKicks,
  standing: StandingRun,
): { island: IslandFit | null; problems: Problem[] } {
  const { run } = standing;
  const line = setLineOf(run, worked);
  const origin = planPlace(context, { wallId: run.wallId, xMm: 0, yMm: line.standOffMm });
  const heading = context.room?.walls.find(({ wallId }) => wallId === run.wallId)?.headingDeg;
  if (!run.island || !origin || heading === undefined) return { island: null, problems: [] };
  const setOut = (mm: number) => figure(mm, SET_OUT_U_MM, []);
  const opens = Math.min(WIDEST_OPEN_MM, Math.max(0, ...run.units.map(({ widthMm }) => widthMm)));
  const sink = standing.units.find(({ unitId }) =>
    run.units.some(({ id, kind }) => id === unitId && kind === 'sink'),
  );
  const { rules } = context;
  const placement = islandPlacement({
    setLine: { origin, headingDeg: heading + line.turnDeg },
    offset: setOut(run.island.offsetMm),
    along: setOut(run.island.alongMm),
    lengthMm: standing.x1Mm - standing.x0Mm,
    depthMm: frontDepth(run),
    opensMm: { front: opens, back: 0, left: 0, right: 0 },
    joined: run.island.joined ?? null,
    faces: facesAround(context, worked),
    floor: level.drops.filter(({ wallId }) => wallId === run.wallId),
    nominalKickMm: run.z0Mm > 0 ? run.z0Mm : rules.kickHeightMm,
    datumDrop: run.counterGroup === null ? null : (kicks.datumOf(run)?.drop ?? null),
    legs: { minMm: rules.legMinMm, maxMm: rules.legMaxMm },
    uLevel: LASER_PLANE_U,
    builtAngleDeg: 90,
    sink: sink
      ? {
          alongMm: (sink.leftMm + sink.rightMm) / 2 - standing.x0Mm,
          depthMm: run.carcassDepthMm / 2,
        }
      : null,
    services: pipesOf(context, run),
  });
  const { value } = placement;
  if (!value) return { island: null, problems: placement.problems };
  return {
    island: {
      corners: value.corners,
      saw: fitFigure('saw-angle', value.kickMitre.saw),
      exposedCorners: value.exposedCorners,
      aisles: value.aisles.map((aisle) => ({
        toId: aisle.faceId,
        side: aisle.side,
        clear: fitFigure('aisle', aisle.clear),
        clearOpen: fitFigure('aisle', aisle.clearBothOpen),
        words: aisleWords(context, aisle),
      })),
      services: value.services.map(({ id, kind, alongMm, acrossMm }) => ({
        readingId: id,
        kind,
        along: fitFigure('pipe-offset', alongMm),
        across: fitFigure('pipe-offset', acrossMm),
      })),
    },
    problems: placement.problems,
  };
}

function aisleWords(context: FitContext, { side, clear, clearBothOpen }: IslandAisle): string {
  const { words } = context;
  return `${side} side: ${words(clear.value)}, ${words(clearBothOpen.value)} with doors open`;
}

/** Walls that no run stands on, and the door fronts of the runs that stand on the others. */
function facesAround(context: FitContext, worked: WorkedRun[]): IslandInput['faces'] {
  return context.walk.walls.flatMap(({ wall }) => {
    const lengthMm = context.frames.get(wall.id)?.length;
    if (!lengthMm || lengthMm.u > SURE_LENGTH_U_MM) return [];
    const standing = worked.filter(({ run }) => run.wallId === wall.id && run.level !== 'wall');
    const spans = standing.map(({ run, plane, bandMm }) => ({
      id: run.id,
      name: run.name,
      x0Mm: bandMm[0],
      x1Mm: bandMm[1],
      yMm: (plane?.standOffMm ?? 0) + frontDepth(run),
      opensMm: Math.min(WIDEST_OPEN_MM, Math.max(0, ...run.units.map(({ widthMm }) => widthMm))),
    }));
    const bare = {
      id: wall.id,
      name: wall.name,
      x0Mm: 0,
      x1Mm: lengthMm.value,
      yMm: 0,
      opensMm: 0,
    };
    return (spans.length > 0 ? spans : [bare]).flatMap(({ id, name, x0Mm, x1Mm, yMm, opensMm }) => {
      const from = planPlace(context, { wallId: wall.id, xMm: x0Mm, yMm });
      const to = planPlace(context, { wallId: wall.id, xMm: x1Mm, yMm });
      return from && to ? [{ id, name, line: { from, to }, u: lengthMm.u, opensMm }] : [];
    });
  });
}

/** Pipes in the floor are read from the wall: x along it, and how far out as their projection. */
function pipesOf(context: FitContext, run: Run): IslandInput['services'] {
  return context.book.ofKind('feature').flatMap((pipe) => {
    if (pipe.wallId !== run.wallId) return [];
    if (pipe.feature !== 'water' && pipe.feature !== 'waste') return [];
    const xMm = (pipe.x0Mm + pipe.x1Mm) / 2;
    const u = lengthUncertainty(context.book.toolOf(pipe), xMm, 1);
    return [{ id: pipe.id, kind: pipe.feature, xMm, yMm: pipe.projectionMm, u }];
  });
}

function describeIsland(
  kicks: FittedKicks,
  { run, units }: StandingRun,
  island: IslandFit | null,
): RunFit {
  const [first, ...rest] = island?.aisles ?? [];
  const least = first && rest.reduce((a, b) => (b.clear.value < a.clear.value ? b : a), first);
  const end = (side: 'left' | 'right') => ({
    end: side,
    meets: 'open' as const,
    words: 'open end',
    leastMm: 0,
    mostMm: 0,
    filler: null,
    freeRoom: null,
  });
  return {
    runId: run.id,
    wallId: run.wallId,
    name: run.name,
    level: run.level,
    setLine: null,
    backGaps: [],
    clearOpening: null,
    left: end('left'),
    right: end('right'),
    fill: null,
    units: units.map(({ unitId, leftMm, rightMm }) => {
      const unit = run.units.find(({ id }) => id === unitId);
      return {
        unitId,
        name: unit?.name ?? '',
        kind: unit?.kind ?? '',
        leftMm,
        rightMm,
        backGapLeft: null,
        backGapRight: null,
        studs: null,
        tilt: null,
        applianceHeight: null,
      };
    }),
    scribes: [],
    kicks: kicks.kicks.get(run.id) ?? null,
    ceiling: null,
    upperGap: null,
    aisle: least ? { toRunId: least.toId, figure: least.clear } : null,
    island,
    verdicts: [],
  };
}
