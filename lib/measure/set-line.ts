import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { type Combination, combinationFigure, combine, figureCombination } from './combination';
import { type FacePlace, type FacePoint, facePlace } from './face';
import { type Band, faceBehind } from './face-behind';
import { type Figure, figure } from './figure';
import { givenFigure, unreadable } from './reading-problems';
import { describeSetLine, type SetLine } from './set-line-gaps';
import { turnOfPlanes } from './set-line-turn';

/** One plumb plane: one run, or runs on one wall that a tall unit ties (several bands). */
export type SetLinePlane = {
  id: string;
  /** Every face reading of the wall, in one frame; those outside the bands shape their edges. */
  points: FacePoint[];
  bands: Band[];
  /** Unit edges: the gap behind each is given. */
  edgesMm: number[];
  /** A finished end that shows: the least gap there comes first. */
  finishedEndMm: number | null;
  /** Fixed by cabinets already set: s of the plane at `atMm`; its turn is the input's `turn`. */
  fixed: { atMm: number; s: Figure } | null;
};

export type SetLineInput = {
  /** All share one turn: a single run, or runs joined by a corner unit or one square top. */
  planes: SetLinePlane[];
  /** mm per mm, positive further out at the right; null: free. */
  turn: Figure | null;
  /** Standard u of plumb of the reference the faces were read from, mm per mm. */
  uReference: number;
};

export type SetLines = {
  /** mm per mm. */
  turn: Figure;
  /** Degrees, positive further out at the right: ψ. */
  turnDeg: Figure;
  /** Nothing read fixes the turn (one column of readings): left at none. */
  turnNotRead: boolean;
  lines: SetLine[];
};

const DEGREES = 180 / Math.PI;

/**
 * The plumb plane behind the cabinets of a run: it touches the proudest places of the wall behind them
 * and leaves the smallest largest gap.
 * Edge rule: planes given together share one turn, in plan the same for each wall, and the smallest
 * largest gap is over all of them. Where several turns leave the same gap, the one nearest the
 * least-squares line. A plane fixed by what is already set may be proud of by the wall: wall to cut.
 * A finished end comes first: least gap there, then the smallest largest gap.
 * Units, frame, signs: mm; x along the wall from its left corner, z up, s positive into the room, plane
 * s = s(0) + turn · x; turn positive further out at the right.
 * Example: s 0, 2, 0 at x 0, 1000, 2000 → turn 0, plane at 2, gaps 2, 0, 2: it rocks, shim the ends.
 * Problems: face-not-read, set-ups-mixed, turn-not-known (a fixed plane without a turn),
 * reading-not-a-number, uncertainty-not-known; warnings turn-not-read, face-carried-on.
 * Source: common practice; the minimax is exact by linear programming duality.
 */
export function setLine(input: SetLineInput): Outcome<SetLines> {
  const { planes, turn, uReference } = input;
  const wrong = planes.flatMap((plane) => refusePlane(plane, input));
  if (wrong.length > 0 || planes.length === 0) {
    const none = problem('face-not-read', 'There is no wall to set the cabinets against.');
    return refused(...(wrong.length > 0 ? wrong : [none]));
  }
  const seen = planes.map((plane) => {
    const plumb = { ids: [], u: uReference };
    const wall = plane.points.map((point) => facePlace(point, plumb));
    return { plane, behind: faceBehind(wall, plane.bands) };
  });
  const turned = turn === null ? (turnOfPlanes(seen)?.c ?? null) : figureCombination(turn);
  const slope = turned ?? { value: 0, parts: [] };
  const lines = seen.map(({ plane, behind }) =>
    describeSetLine({
      plane,
      behind,
      offset: offsetOf(plane, behind.places, slope),
      turn: slope,
    }),
  );
  const problems = [
    ...(turned === null ? [notTurned(planes)] : []),
    ...seen.flatMap(({ plane, behind }) => (behind.extrapolated ? [carriedOn(plane)] : [])),
  ];
  const shown = combinationFigure(slope);
  const turnDeg = figure(
    Math.atan(shown.value) * DEGREES,
    (shown.u / (1 + shown.value ** 2)) * DEGREES,
    shown.from,
  );
  return { value: { turn: shown, turnDeg, turnNotRead: turned === null, lines }, problems };
}

/** s of the plane at x = 0. */
function offsetOf(plane: SetLinePlane, places: FacePlace[], turn: Combination): Combination {
  if (plane.fixed !== null) {
    return combine([
      [1, figureCombination(plane.fixed.s)],
      [-plane.fixed.atMm, turn],
    ]);
  }
  let proudest: FacePlace | null = null;
  const over = ({ c, xMm }: FacePlace) => c.value - turn.value * xMm;
  for (const place of places) {
    if (proudest === null || over(place) > over(proudest)) proudest = place;
  }
  if (proudest === null) return { value: 0, parts: [] };
  return combine([
    [1, proudest.c],
    [-proudest.xMm, turn],
  ]);
}

function refusePlane(plane: SetLinePlane, { turn, uReference }: SetLineInput) {
  const { id, bands, edgesMm, finishedEndMm, fixed } = plane;
  const places = [...bands.flatMap(Object.values<number>), ...edgesMm, finishedEndMm ?? 0];
  const bad = unreadable([
    ...plane.points.map((point) => ({
      id: point.id,
      values: [point.xMm, point.zMm, point.sMm],
      u: point.u,
    })),
    { id, values: [...places, fixed?.atMm ?? 0], u: uReference },
    givenFigure(fixed?.s ?? null),
    givenFigure(turn),
  ]);
  if (bad.length > 0) return bad;
  if (plane.points.length === 0 || bands.length === 0) {
    return [problem('face-not-read', 'Nobody has read how flat this wall is.', [plane.id])];
  }
  if (new Set(plane.points.map(({ setUpId }) => setUpId)).size > 1) {
    const words = 'Gaps of several set-ups cannot be compared. Tie them to one first.';
    return [problem('set-ups-mixed', words, [plane.id])];
  }
  if (plane.fixed !== null && turn === null) {
    const words = 'The cabinets already set fix the turn too: give it.';
    return [problem('turn-not-known', words, [plane.id])];
  }
  return [];
}

function notTurned(planes: SetLinePlane[]) {
  const words = 'Read at one place along the wall only: how the wall runs in plan is not known.';
  return warning(
    'turn-not-read',
    words,
    planes.map(({ id }) => id),
  );
}

function carriedOn(plane: SetLinePlane) {
  const words =
    'Behind part of these cabinets nobody has read the wall; the nearest readings are carried on.';
  return warning('face-carried-on', words, [plane.id]);
}
