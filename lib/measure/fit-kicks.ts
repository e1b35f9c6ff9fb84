/** Kick bases of the runs of a fit: one datum for each group that shares a counter. */
import type { Run } from '@/lib/contracts/runs';
import type { Figure } from '@/lib/measure/figure';
import { figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { edgeScribe } from '@/lib/measure/fit-scribe';
import { type KickHeights, kickHeights } from '@/lib/measure/heights';
import type { KickFace, KickRun, RunKick } from '@/lib/measure/kick-run';
import type { LevelLine } from '@/lib/measure/level-line';
import type { EdgeScribe, RunKicks } from '@/lib/measure/run-fit';
import { LASER_PLANE_U } from '@/lib/measure/wall-faces';
import type { Problem } from '@/lib/problem';

/** Where a run's boxes stand, once it is filled (or as far as its ends say). */
export type StandingRun = {
  run: Run;
  x0Mm: number;
  x1Mm: number;
  /** The set line's distance from the wall, where the backs stand. */
  backMm: number;
  units: { unitId: string; leftMm: number; rightMm: number }[];
};

export type FitDatum = {
  /** Drop from the level line to the finished floor at the high point (or what is set). */
  drop: Figure;
  setUpId: string;
};
export type FittedKicks = {
  kicks: ReadonlyMap<string, RunKicks>;
  /** By counter group, and for the whole room where a run has none. */
  datumOf: (run: Run) => FitDatum | null;
  problems: Problem[];
};

/** A floor still to be laid comes out this much thicker or thinner than stated, ±mm; from memory. */
const FLOOR_TO_COME_LIMIT_MM = 1;

/**
 * Kick heights of all runs on the floor, by counter group, and the datum that what hangs goes by.
 * Edge: a run without a group stands alone; a group on an unread floor has no kicks.
 */
export function fitKicks(
  context: FitContext,
  level: LevelLine,
  standing: StandingRun[],
): FittedKicks {
  const onFloor = standing.filter(({ run }) => run.level !== 'wall');
  const groups = new Map<string, StandingRun[]>();
  for (const one of onFloor) {
    const key = one.run.counterGroup ?? `alone:${one.run.id}`;
    groups.set(key, [...(groups.get(key) ?? []), one]);
  }
  const kicks = new Map<string, RunKicks>();
  const datums = new Map<string, FitDatum>();
  const problems: Problem[] = [];
  for (const group of groups.values()) {
    const heights = groupHeights(context, level, group);
    problems.push(...heights.problems.filter(({ code }) => code !== 'floor-not-read'));
    if (!heights.value) continue;
    for (const { run } of group) {
      datums.set(run.id, { drop: heights.value.datumDrop, setUpId: heights.value.setUpId });
      const kick = heights.value.runs.find(({ runId }) => runId === run.id);
      if (kick) kicks.set(run.id, describe(context, run, group, heights.value, kick));
    }
  }
  const roomDatum = [...datums.values()][0] ?? floorDatum(context, level);
  return {
    kicks,
    datumOf: (run) => datums.get(run.id) ?? datumBelow(context, run, datums) ?? roomDatum,
    problems,
  };
}

/** What hangs goes by the run that stands below it on the same wall. */
function datumBelow(
  context: FitContext,
  run: Run,
  datums: ReadonlyMap<string, FitDatum>,
): FitDatum | null {
  const below = context.runs.find(({ id, wallId }) => wallId === run.wallId && datums.has(id));
  return below ? (datums.get(below.id) ?? null) : null;
}

/** No run stands on the floor: the high point of all that was read. */
function floorDatum(context: FitContext, level: LevelLine): FitDatum | null {
  const high = level.drops.reduce<(typeof level.drops)[number] | null>(
    (best, drop) => (best && best.valueMm <= drop.valueMm ? best : drop),
    null,
  );
  if (!high || level.setUpId === null) return null;
  const drop = figure(high.valueMm - context.book.room.floorToComeMm, high.u, [high.id]);
  return { drop, setUpId: level.setUpId };
}

/** The floor still to be laid, ±1 mm; nothing where it is down. */
export function floorToCome(context: FitContext): { valueMm: number; u: number } {
  const valueMm = context.book.room.floorToComeMm;
  return { valueMm, u: valueMm > 0 ? FLOOR_TO_COME_LIMIT_MM / Math.sqrt(3) : 0 };
}

/** The underside of the boxes over the datum; the shop’s kick height where a run begins at the floor. */
export function nominalKick(context: FitContext, run: Run): number {
  return run.z0Mm > 0 ? run.z0Mm : context.rules.kickHeightMm;
}

function groupHeights(context: FitContext, level: LevelLine, group: StandingRun[]) {
  const { rules, book } = context;
  const first = group[0];
  const nominalKickMm = first ? nominalKick(context, first.run) : rules.kickHeightMm;
  return kickHeights({
    runs: group.map((standing) => kickRun(context, level, standing)),
    nominalKickMm,
    fixedDatumDrop: datumAlreadySet(group, nominalKickMm),
    floorToCome: floorToCome(context),
    standsOn: book.room.cabinetsStandOn ?? 'finished-floor',
    legs: { minMm: rules.legMinMm, maxMm: rules.legMaxMm },
    uLevel: LASER_PLANE_U,
    scribe: {
      marginMm: rules.scribeMarginMm,
      leastMm: rules.scribeLeastMm,
      stepMm: rules.scribeStepMm,
    },
  });
}

/** Boxes of an earlier phase carry the counter on: theirs is the datum. */
function datumAlreadySet(group: StandingRun[], nominalKickMm: number): Figure | null {
  for (const { run } of group) {
    for (const end of [run.left, run.right]) {
      if (end.kind === 'existing' && end.undersideDropMm !== undefined) {
        return figure(end.undersideDropMm + nominalKickMm, 1 / Math.sqrt(3), []);
      }
    }
  }
  return null;
}

function kickRun(context: FitContext, level: LevelLine, standing: StandingRun): KickRun {
  const { run, x0Mm, x1Mm, backMm, units } = standing;
  const y1Mm = backMm + Math.max(0, run.carcassDepthMm - context.rules.kickDepthMm);
  const sides = (['left', 'right', 'back'] as const).filter((side) =>
    run.island ? run.island.joined !== side : side !== 'back' && run[side].kind === 'open',
  );
  const placeOf = { left: x0Mm, right: x1Mm, back: backMm };
  return {
    runId: run.id,
    drops: level.drops.filter(({ wallId }) => wallId === run.wallId),
    footprint: { x0Mm, x1Mm, y0Mm: backMm, y1Mm },
    faces: [{ side: 'front', atMm: y1Mm }, ...sides.map((side) => ({ side, atMm: placeOf[side] }))],
    units: units.map(({ unitId, leftMm, rightMm }) => ({
      unitId,
      footprint: { x0Mm: leftMm, x1Mm: rightMm, y0Mm: backMm, y1Mm },
    })),
  };
}

function describe(
  context: FitContext,
  run: Run,
  group: StandingRun[],
  heights: KickHeights,
  kick: RunKick,
): RunKicks {
  const { highPoint } = heights;
  const front = kick.faces.find(({ side }) => side === 'front');
  return {
    nominalMm: nominalKick(context, run),
    datumMm: 0,
    sharedWithRunIds: group.map((other) => other.run.id).filter((id) => id !== run.id),
    highPoint:
      highPoint?.runId === run.id
        ? { xMm: highPoint.xMm, yMm: highPoint.yMm, readingId: highPoint.readingIds[0] ?? '' }
        : null,
    corners: kick.corners.map(
      ({ unitId, corner, xMm, yMm, height, extrapolated, legs, inDoubt }) => ({
        unitId,
        corner,
        xMm,
        yMm,
        height: fitFigure('kick-height', height),
        extrapolated,
        legs,
        inDoubt,
      }),
    ),
    faceBlank: front ? faceBlank(front) : null,
    returns: kick.faces.flatMap((face) =>
      face.side === 'front' ? [] : [{ side: face.side, ...faceBlank(face) }],
    ),
    least: fitFigure('kick-height', kick.least.height),
    greatest: fitFigure('kick-height', kick.greatest.height),
    words: heights.words,
  };
}

function faceBlank(face: KickFace): { blank: ReturnType<typeof fitFigure>; scribe: EdgeScribe } {
  const { height } = face.least;
  const from = [...new Set([...height.from, ...face.scribe.outOfTrue.from])];
  return {
    blank: fitFigure('kick-face-blank', figure(face.blankMm, face.scribe.unrounded.u, from)),
    scribe: edgeScribe('kick', `kick face, ${face.side}`, null, face.scribe),
  };
}
