/** Everything the parts of a fit look things up in; built once from the wall book. */

import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { actualWidths } from '@/lib/measure/actual-widths';
import { adjustBook } from '@/lib/measure/adjust-book';
import { type AdjustedFrame, adjustedFrame } from '@/lib/measure/adjusted-frame';
import type { AdjustedRoom } from '@/lib/measure/adjusted-room';
import {
  type CombinedCorner,
  type CombinedLength,
  combinedCorners,
  combinedLengths,
} from '@/lib/measure/combined-readings';
import { type FacesToCome, facesToCome, pushedFrame } from '@/lib/measure/faces-to-come';
import type { Figure } from '@/lib/measure/figure';
import { observeRoom } from '@/lib/measure/observe-room';
import { type PlacedFace, placedFaces } from '@/lib/measure/placed-faces';
import { openBook, type RoomBook } from '@/lib/measure/room-book';
import type { RoomWalk } from '@/lib/measure/room-walk';
import { type WallFaces, wallFaces } from '@/lib/measure/wall-faces';
import { leanOfWall, type PlumbColumn, plumbColumns } from '@/lib/measure/wall-lean';
import { type Problem, warning } from '@/lib/problem';
import { formatLength } from '@/lib/units/format-length';

export type FitContext = {
  book: RoomBook;
  walk: RoomWalk;
  rules: FitRules;
  /** Runs on walls of this room, in the order given. */
  runs: Run[];
  runById: ReadonlyMap<string, Run>;
  lengths: CombinedLength[];
  corners: CombinedCorner[];
  faces: ReadonlyMap<string, WallFaces>;
  columns: ReadonlyMap<string, PlumbColumn[]>;
  placed: ReadonlyMap<string, PlacedFace[]>;
  facesToCome: FacesToCome;
  room: AdjustedRoom | null;
  /** By wall, faces to come already on. */
  frames: ReadonlyMap<string, AdjustedFrame>;
  /** A length in the shop's unit and step, for words. */
  words: (mm: number) => string;
  problems: Problem[];
};

/** A length less sure than this was not read: only the drawing holds it. */
export const SURE_LENGTH_U_MM = 20;
/** A corner less sure than this was not read. */
export const SURE_ANGLE_U_DEG = 1;

/**
 * Opens the book, brings repeats together, places the faces and adjusts the room.
 * Edge: runs on walls that the room has not got are left out, and said.
 */
export function fitContext(wallBook: WallBook, runs: Run[], rules: FitRules): FitContext {
  const book = openBook(wallBook, rules);
  const { walk } = book;
  const { lengths, problems: lengthProblems } = combinedLengths(book);
  const { corners, problems: cornerProblems } = combinedCorners(book);
  const zRefMm = middleHeight(lengths);
  const faces = new Map(
    walk.walls.map(({ wall }) => {
      const length = nearestTo(lengths, wall.id, zRefMm) ?? wall.nominalLengthMm;
      return [wall.id, wallFaces(book, wall.id, length, zRefMm)] as const;
    }),
  );
  const columns = new Map([...faces].map(([id, one]) => [id, plumbColumns(one)] as const));
  const leans = new Map<string, Figure>();
  for (const [id, ofWall] of columns) {
    const lean = leanOfWall(ofWall);
    if (lean) leans.set(id, lean);
  }
  const observed = observeRoom({ book, lengths, corners, faces, leans });
  const { room, problems: roomProblems } = adjustBook(observed, rules.usualBowMm);
  const toCome = facesToCome(book);
  const frames = new Map<string, AdjustedFrame>();
  for (const { wall } of room ? walk.walls : []) {
    const frame = room ? adjustedFrame(room, wall.id, rules.usualBowMm) : null;
    if (frame) frames.set(wall.id, pushedFrame(frame, wall.id, toCome.faces));
  }
  const known = runs.filter((run) => walk.byId.has(run.wallId));
  const actual = actualWidths(known, rules);
  return {
    book,
    walk,
    rules,
    runs: actual.runs,
    runById: new Map(actual.runs.map((run) => [run.id, run])),
    lengths,
    corners,
    faces,
    columns,
    placed: new Map(
      [...faces].map(([id, one]) => [id, placedFaces(one, room?.zRefMm ?? zRefMm)] as const),
    ),
    facesToCome: toCome.faces,
    room,
    frames,
    words: (mm) => formatLength(mm, { unit: rules.unit, stepMm: rules.stepMm }),
    problems: [
      ...book.problems,
      ...lengthProblems,
      ...cornerProblems,
      ...roomProblems,
      ...toCome.problems,
      ...strandedRuns(runs, known),
      ...actual.problems,
    ],
  };
}

function strandedRuns(runs: Run[], known: Run[]): Problem[] {
  const stranded = runs.filter((run) => !known.includes(run)).map(({ id }) => id);
  if (stranded.length === 0) return [];
  const words = 'A run stands on a wall that this room no longer has. Give it a wall.';
  return [warning('run-without-wall', words, stranded)];
}

/** As the adjustment chooses it: the middle of the heights at which lengths were read. */
function middleHeight(lengths: CombinedLength[]): number {
  const heights = lengths.map(({ zMm }) => zMm).sort((a, b) => a - b);
  return heights[Math.floor((heights.length - 1) / 2)] ?? 0;
}

function nearestTo(lengths: CombinedLength[], wallId: string, zMm: number): number | null {
  let found: CombinedLength | null = null;
  for (const length of lengths) {
    if (length.wallId !== wallId || length.yMm > 0) continue;
    if (!found || Math.abs(length.zMm - zMm) < Math.abs(found.zMm - zMm)) found = length;
  }
  return found?.length.value ?? null;
}
