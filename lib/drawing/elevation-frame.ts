import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import type { RunFit } from '@/lib/measure/run-fit';
import type { Revised } from '@/lib/sheet/revision-marks';
import { wallsOf } from '@/lib/sheet/room-names';
import { ceilingLine } from './ceiling-line';
import { exaggerationFor } from './exaggeration';
import { floorLine } from './floor-line';
import type { Point } from './shape';

export type ElevationSource = {
  wallBook: WallBook;
  runs: readonly Run[];
  fit: Fit;
  rules: FitRules;
  wallId: string;
  /** What to cloud: it differs from the revision before. */
  revised?: Revised | null;
};

/** A place on the wall: along it from its left corner, and up from the finished floor's high point. */
export type WallPlace = { xMm: number; zMm: number };

/** What every part of an elevation is drawn from. */
export type ElevationSheet = ElevationSource & {
  wallName: string;
  lengthMm: number;
  ofWall: readonly { run: Run; runFit: RunFit }[];
  /** The two ends of the wall as they lean, floor to top; exaggerated. */
  edges: { left: readonly WallPlace[]; right: readonly WallPlace[] };
  /** Left to right, exaggerated. */
  floor: readonly WallPlace[];
  ceiling: readonly WallPlace[] | null;
  topMm: number;
  exaggeration: number;
  pxPerMm: number;
  at: (place: WallPlace) => Point;
};

/** A wall is drawn this wide unless asked otherwise. */
const wallWidthPx = 580;
/** Above the tallest box where no ceiling was read. */
const openTopMm = 250;
/** Of the least width of a filler, what its taper may take when it is drawn larger. */
const taperShare = 0.6;
const floorRoomMm = 95;
const ceilingRoomMm = 90;

export function elevationFrame(
  source: ElevationSource,
  look: { widthPx?: number } | { pxPerMm: number },
): ElevationSheet | null {
  const { wallBook, fit, runs, wallId } = source;
  const wall = wallsOf(wallBook.room).find((one) => one.wall.id === wallId)?.wall;
  if (!wall) return null;
  const fitted = fit.walls.find((one) => one.wallId === wallId);
  const lengthMm = (fitted?.length ?? fitted?.readAt[0]?.length)?.value ?? wall.nominalLengthMm;
  const ofWall = fit.runs.flatMap((runFit) => {
    const run = runs.find(({ id }) => id === runFit.runId);
    return run && runFit.wallId === wallId ? [{ run, runFit }] : [];
  });
  const ends = { left: endPlaces(ofWall, 'left'), right: endPlaces(ofWall, 'right') };
  const floorRead = floorLine(fit, wallId);
  const ceilingRead = ceilingLine(wallBook, fit, wallId);
  const exaggeration = exaggerationFor([
    ...ofWall.flatMap(({ runFit }) => fillerDeviations(runFit, ends)),
    // The floor is drawn larger from the high point, which may be at another wall.
    { size: Math.max(0, ...floorRead.map(({ zMm }) => -zMm)), room: floorRoomMm },
    { size: spread(ceilingRead), room: ceilingRoomMm },
  ]);
  const drawnFloor = stretched(floorRead, 0, exaggeration);
  const drawnCeiling = stretched(ceilingRead, average(ceilingRead), exaggeration);
  const topMm = Math.max(
    ...(drawnCeiling.length > 0
      ? drawnCeiling.map(({ zMm }) => zMm)
      : ofWall.map(({ run }) => run.z1Mm + openTopMm)),
    source.rules.counterTopMm + openTopMm,
  );
  const pxPerMm =
    'pxPerMm' in look ? look.pxPerMm : (look.widthPx ?? wallWidthPx) / Math.max(lengthMm, 1);
  const level = (end: 'left' | 'right') =>
    drawnEdge(ends[end], { plainMm: end === 'left' ? 0 : lengthMm, topMm, exaggeration });
  const edges = { left: level('left'), right: level('right') };
  return {
    ...source,
    wallName: wall.name,
    lengthMm,
    ofWall,
    edges,
    floor: across(drawnFloor, [edges.left[0]?.xMm ?? 0, edges.right[0]?.xMm ?? lengthMm]),
    ceiling:
      drawnCeiling.length > 0
        ? across(drawnCeiling, [edges.left.at(-1)?.xMm ?? 0, edges.right.at(-1)?.xMm ?? lengthMm])
        : null,
    topMm,
    exaggeration,
    pxPerMm,
    at: ({ xMm, zMm }) => [xMm * pxPerMm, (topMm - zMm) * pxPerMm],
  };
}

/** Where the end wall stands, from the face widths of the fillers against it. */
function endPlaces(ofWall: ElevationSheet['ofWall'], end: 'left' | 'right'): WallPlace[] {
  return ofWall
    .flatMap(({ runFit }) => {
      const { filler, meets } = runFit[end];
      const unit = end === 'left' ? runFit.units[0] : runFit.units.at(-1);
      if (!filler || !unit || meets !== 'wall') return [];
      return filler.widths.map(({ zMm, width }) => ({
        zMm,
        xMm: end === 'left' ? unit.leftMm - width.value : unit.rightMm + width.value,
      }));
    })
    .sort((one, other) => one.zMm - other.zMm);
}

/** An end leans about its own middle; drawn larger it must not run into the box beside it. */
function fillerDeviations(
  runFit: RunFit,
  ends: { left: WallPlace[]; right: WallPlace[] },
): { size: number; room: number }[] {
  return (['left', 'right'] as const).flatMap((end) => {
    const { filler, meets } = runFit[end];
    if (!filler || meets !== 'wall') return [];
    const middle = middleOf(ends[end]);
    const room = Math.max(0, filler.least.value) * taperShare;
    return ends[end].map(({ xMm }) => ({ size: xMm - middle, room }));
  });
}

function drawnEdge(
  places: readonly WallPlace[],
  { plainMm, topMm, exaggeration }: { plainMm: number; topMm: number; exaggeration: number },
): WallPlace[] {
  const middle = middleOf(places);
  const drawn = places.map(({ xMm, zMm }) => ({
    zMm,
    xMm: middle + (xMm - middle) * exaggeration,
  }));
  const [lowest, highest] = [drawn[0], drawn.at(-1)];
  if (!lowest || !highest)
    return [
      { xMm: plainMm, zMm: 0 },
      { xMm: plainMm, zMm: topMm },
    ];
  const rise = highest.zMm - lowest.zMm;
  const slope = rise > 0 ? (highest.xMm - lowest.xMm) / rise : 0;
  return [
    { zMm: 0, xMm: lowest.xMm - slope * lowest.zMm },
    ...drawn.filter(({ zMm }) => zMm > 0 && zMm < topMm),
    { zMm: topMm, xMm: highest.xMm + slope * (topMm - highest.zMm) },
  ];
}

function across(
  places: readonly WallPlace[],
  [leftMm, rightMm]: readonly [number, number],
): WallPlace[] {
  const [first, last] = [places[0], places.at(-1)];
  return [
    { xMm: leftMm, zMm: first?.zMm ?? 0 },
    ...places.filter(({ xMm }) => xMm > leftMm && xMm < rightMm),
    { xMm: rightMm, zMm: last?.zMm ?? 0 },
  ];
}

function stretched(places: readonly WallPlace[], about: number, by: number): WallPlace[] {
  return places.map(({ xMm, zMm }) => ({ xMm, zMm: about + (zMm - about) * by }));
}

function spread(places: readonly WallPlace[]): number {
  if (places.length === 0) return 0;
  const heights = places.map(({ zMm }) => zMm);
  return Math.max(...heights) - Math.min(...heights);
}

function average(places: readonly WallPlace[]): number {
  return places.reduce((sum, { zMm }) => sum + zMm, 0) / Math.max(places.length, 1);
}

function middleOf(places: readonly WallPlace[]): number {
  const xs = places.map(({ xMm }) => xMm);
  return xs.length > 0 ? (Math.min(...xs) + Math.max(...xs)) / 2 : 0;
}

/** The height of a drawn line at a place along the wall. */
export function heightAt(line: readonly WallPlace[], xMm: number): number {
  const next = line.findIndex((place) => place.xMm >= xMm);
  const [before, after] = [line[next - 1], line[next]];
  if (!after) return line.at(-1)?.zMm ?? 0;
  if (!before || after.xMm === before.xMm) return after.zMm;
  return before.zMm + ((after.zMm - before.zMm) * (xMm - before.xMm)) / (after.xMm - before.xMm);
}

/** Where a drawn edge stands at a height. */
export function edgeAt(edge: readonly WallPlace[], zMm: number): number {
  const flipped = edge.map((place) => ({ xMm: place.zMm, zMm: place.xMm }));
  return heightAt(flipped, zMm);
}
