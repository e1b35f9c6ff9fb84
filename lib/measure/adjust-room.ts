/** Least-squares adjustment of a room: every reading at once, each with its own weight. */
import type { Outcome, Problem } from '@/lib/problem';
import type { AdjustedCornerPoint, AdjustedRoom, AdjustedWall, SparseRow } from './adjusted-room';
import { checkObservations } from './check-observations';
import { chiSquareLimit } from './chi-square';
import { errorEllipse } from './error-ellipse';
import { type Figure, figure } from './figure';
import { refuseObservations } from './refuse-observations';
import { planAngle, planDistance } from './room-equations';
import { FIXED, layOutRoom } from './room-layout';
import type { AdjustOptions, RoomObservation, RoomShape } from './room-observations';
import { startingPoints } from './room-start';
import { degrees, type Equation, headingOf, lengthOf } from './room-state';
import { project, spread } from './row-products';
import { type Solution, solveRoom, weightedSquares } from './solve-room';

const ALPHA = 0.01;
/** A corner less sure than this is not determined by the readings. */
const NOT_DETERMINED_MM = 10_000;
/** Readings named beside a figure that none gives directly. */
const MOST_NAMED = 4;

/**
 * Finds the plan that fits all lengths, corner angles, diagonals, widths and plumb readings best.
 *
 * Unknowns: corner coordinates (first corner at 0,0 and first wall along x), a lean and a twist for
 * each wall read off the plan's height, a bow for each wall an angle leans on without a face row, one error for each
 * tool whose readings share one. x along the first wall, y into the room (x east, y south from above).
 * Edge: a chain that stands alone keeps its own frame; a chain tied by widths alone may slide along its
 * walls, and its ellipses say so.
 * Example: four straight walls 3000, 2000, 3000, 2003 (u 0.6) and four corners of 90° (u 0.12°): the
 * corners give way, 89.97° and 90.03°, and the lengths hardly: 2000.03 and 2002.97.
 * Problems: `reading-impossible` (named), `unknown-wall`, `room-not-determined` (no value).
 * Source: least squares by observation equations, Gauss–Newton; reliability after Baarda (1968),
 * recalled; the bow term is ours (MEASURE "Does the room close?").
 */
export function adjustRoom(
  room: RoomShape,
  observations: RoomObservation[],
  options: AdjustOptions,
): Outcome<AdjustedRoom> {
  const refused = refuseObservations(room, observations);
  if (refused.length > 0) return { value: null, problems: refused };
  const zRefMm = options.zRefMm ?? middleHeight(observations);
  const layout = layOutRoom(room, observations, zRefMm);
  const start = startingPoints(room, layout, observations);
  const nuisance = new Float64Array(layout.unknownCount);
  const solution = solveRoom(
    { layout, zRefMm, usualBowMm: options.usualBowMm, ...start, nuisance },
    observations,
    options,
  );
  if (!solution || leastSure(solution) > NOT_DETERMINED_MM) {
    return { value: null, problems: [notDetermined(room, observations)] };
  }
  return { value: describe(room, observations, options, solution), problems: [] };
}

function describe(
  room: RoomShape,
  observations: RoomObservation[],
  options: AdjustOptions,
  solution: Solution,
): AdjustedRoom {
  const { state, rows, cofactor } = solution;
  const { checks, alarmW, reliability } = checkObservations(observations, solution);
  const value = weightedSquares(solution);
  const degreesOfFreedom = rows.length - state.layout.unknownCount;
  const limit = chiSquareLimit(degreesOfFreedom, ALPHA);
  return {
    zRefMm: state.zRefMm,
    corners: cornerPoints(solution),
    walls: adjustedWalls(solution, observations),
    angles: adjustedAngles(solution, observations),
    chiSquare: { value, degreesOfFreedom, limit, passes: degreesOfFreedom <= 0 || value <= limit },
    checks,
    alarmW,
    system: { room, observations, options, rows, cofactor, state, reliability },
  };
}

function cornerPoints({ state, cofactor }: Solution): AdjustedCornerPoint[] {
  const wallId = (index: number | null) => state.layout.walls[index ?? -1]?.id ?? null;
  return state.layout.points.map((point, i) => ({
    chain: point.chain,
    cornerWallId: wallId(point.wallAfter),
    afterWallId: wallId(point.wallBefore),
    xMm: state.x[i] ?? 0,
    yMm: state.y[i] ?? 0,
    ellipse: errorEllipse(
      at(cofactor, point.xColumn, point.xColumn),
      at(cofactor, point.yColumn, point.yColumn),
      at(cofactor, point.xColumn, point.yColumn),
    ),
  }));
}

const at = (matrix: Float64Array[], i: number, j: number) =>
  i === FIXED || j === FIXED ? 0 : (matrix[i]?.[j] ?? 0);

function adjustedWalls(solution: Solution, observations: RoomObservation[]): AdjustedWall[] {
  const { state, cofactor } = solution;
  return state.layout.walls.map((wall) => {
    const row = planDistance(state, wall.left, wall.right);
    const direct = observations.filter((o) => o.kind === 'length' && o.wallId === wall.id);
    const plumbed = observations.filter((o) => o.kind === 'plumb' && o.wallId === wall.id);
    const lean = wall.leanColumn;
    return {
      wallId: wall.id,
      lengthMm: figureOf(row, lengthOf(state, wall), direct, solution, observations),
      headingDeg: degrees(headingOf(state, wall)),
      leanMmPerMm:
        lean === FIXED
          ? null
          : figure(state.nuisance[lean] ?? 0, Math.sqrt(at(cofactor, lean, lean)), [
              ...idsOf(plumbed.length > 0 ? plumbed : direct),
            ]),
    };
  });
}

function adjustedAngles(solution: Solution, observations: RoomObservation[]) {
  const { state } = solution;
  return state.layout.walls.flatMap((wall) => {
    const before = state.layout.walls[wall.wallBefore ?? -1];
    if (!before) return [];
    const row = planAngle(state, before, wall);
    const direct = observations.filter((o) => o.kind === 'corner' && o.cornerWallId === wall.id);
    const inRadians = figureOf(row, row.predicted, direct, solution, observations);
    return [
      {
        cornerWallId: wall.id,
        angleDeg: figure(degrees(inRadians.value), degrees(inRadians.u), inRadians.from),
      },
    ];
  });
}

/** A figure from the plan; without a direct reading, the readings that move it most are named. */
function figureOf(
  row: Equation,
  value: number,
  direct: RoomObservation[],
  { rows, cofactor }: Solution,
  observations: RoomObservation[],
): Figure {
  const spreadRow = spread(cofactor, row);
  const u = Math.sqrt(Math.max(0, project(row, spreadRow)));
  if (direct.length > 0) return figure(value, u, idsOf(direct));
  const pulls = observations
    .map((observation, i) => ({ observation, pull: pullOf(rows[i], spreadRow) }))
    .sort((one, other) => other.pull - one.pull);
  return figure(value, u, idsOf(pulls.slice(0, MOST_NAMED).map(({ observation }) => observation)));
}

/** How far one standard uncertainty of a reading moves the figure. */
function pullOf(row: SparseRow | undefined, spreadRow: Float64Array): number {
  return row ? Math.abs(project(row, spreadRow)) / row.sigma : 0;
}

const idsOf = (observations: RoomObservation[]) => observations.flatMap((o) => o.readingIds);

function leastSure({ state, cofactor }: Solution): number {
  const variances = state.layout.points.flatMap((point) => [
    at(cofactor, point.xColumn, point.xColumn),
    at(cofactor, point.yColumn, point.yColumn),
  ]);
  return Math.sqrt(Math.max(0, ...variances));
}

function middleHeight(observations: RoomObservation[]): number {
  const heights = observations
    .flatMap((o) => (o.kind === 'length' || o.kind === 'diagonal' ? [o.zMm] : []))
    .sort((a, b) => a - b);
  return heights[Math.floor((heights.length - 1) / 2)] ?? 0;
}

function notDetermined(room: RoomShape, observations: RoomObservation[]): Problem {
  const lengths = new Set(observations.flatMap((o) => (o.kind === 'length' ? [o.wallId] : [])));
  const corners = new Set(
    observations.flatMap((o) => (o.kind === 'corner' ? [o.cornerWallId] : [])),
  );
  const about = room.chains.flatMap((chain) =>
    chain.walls.flatMap((wall, i) => {
      const noCorner = (chain.closed || i > 0) && !corners.has(wall.id);
      return lengths.has(wall.id) && !noCorner ? [] : [wall.id];
    }),
  );
  return {
    code: 'room-not-determined',
    message:
      'There is too little read to lay the room out. Read the lengths and corners still missing.',
    about,
    severity: 'error',
  };
}
