/** The observation equations of a room: what each reading should be, and how it moves with the unknowns. */
import { addShift, cornerShift, NEARLY_STRAIGHT_SINE } from './corner-shift';
import { FIXED, type LaidOutWall, pointAt } from './room-layout';
import type { CornerEnd, RoomObservation } from './room-observations';
import {
  addHeading,
  addLength,
  addNuisance,
  addPoint,
  type Equation,
  headingOf,
  lengthOf,
  type RoomState,
  radians,
  wallOf,
} from './room-state';

/** A bow changes by this share of the usual one in each metre of height; our judgement. */
const BOW_GROWTH_PER_MM = 0.6 / 1_000;

/**
 * The equation of one observation at a state, or null when it names a wall the room has not got.
 *
 * Frames: x east, y south seen from above; the room lies to the right of each wall's direction.
 * Leans move a corner by what the two walls' lines move at that height (MEASURE "Does the room close?").
 */
export function equationOf(state: RoomState, observation: RoomObservation): Equation | null {
  const equation = bareEquation(state, observation);
  if (equation && observation.tool) {
    const column = state.layout.toolColumns.get(observation.tool.toolId) ?? FIXED;
    const share =
      observation.kind === 'corner' ? radians(observation.tool.uCommon) : observation.tool.uCommon;
    addNuisance(state, equation, column, share);
  }
  return equation;
}

function bareEquation(state: RoomState, observation: RoomObservation): Equation | null {
  const { layout } = state;
  switch (observation.kind) {
    // Pieces of a wall come as the whole that they make: the marks between lie on one line and drop out of the sum.
    case 'length': {
      const wall = wallOf(layout, observation.wallId);
      if (!wall) return null;
      const equation = distance(state, wall.left, wall.right, observation.zMm - state.zRefMm);
      if (observation.yMm > 0) moveToFront(state, equation, wall, observation.yMm);
      return equation;
    }
    case 'diagonal': {
      const from = pointAt(layout, observation.from);
      const to = pointAt(layout, observation.to);
      if (from === null || to === null || from === to) return null;
      return distance(state, from, to, observation.zMm - state.zRefMm);
    }
    case 'corner': {
      const wall = wallOf(layout, observation.cornerWallId);
      const before = wall && wall.wallBefore !== null ? layout.walls[wall.wallBefore] : undefined;
      if (!wall || !before) return null;
      const aboveMm = observation.zMm - state.zRefMm;
      const equation = cornerAngleEquation(state, before, wall, 1);
      addTwist(state, equation, before, wall, aboveMm);
      if (!observation.proudLeft) addBow(state, equation, before, observation.armLeftMm, aboveMm);
      if (!observation.proudRight) addBow(state, equation, wall, observation.armRightMm, aboveMm);
      return equation;
    }
    case 'width': {
      const wall = wallOf(layout, observation.wallId);
      const facing = wallOf(layout, observation.toWallId);
      if (!wall || !facing || wall === facing) return null;
      return width(state, wall, facing, observation.xMm, observation.zMm - state.zRefMm);
    }
    case 'plumb': {
      const wall = wallOf(layout, observation.wallId);
      if (!wall) return null;
      return {
        columns: [wall.leanColumn],
        partials: [1],
        predicted: state.nuisance[wall.leanColumn] ?? 0,
      };
    }
  }
}

/** What was read, in the equation's own unit, carried to the chords where the face was read. */
export function observedValue(observation: RoomObservation): { value: number; sigma: number } {
  switch (observation.kind) {
    case 'plumb':
      return { value: observation.leanMmPerMm, sigma: observation.u };
    case 'corner': {
      let value = radians(observation.angleDeg);
      let variance = radians(observation.uDeg) ** 2;
      for (const [proud, arm] of [
        [observation.proudLeft, observation.armLeftMm],
        [observation.proudRight, observation.armRightMm],
      ] as const) {
        if (!proud) continue;
        value += proud.valueMm / arm;
        variance += (proud.uMm / arm) ** 2;
      }
      return { value, sigma: Math.sqrt(variance) };
    }
    default:
      return { value: observation.valueMm, sigma: observation.uMm };
  }
}

/** A twisted wall's line turns in plan by t/L for each mm of height, and the corner with it. */
function addTwist(
  state: RoomState,
  equation: Equation,
  before: LaidOutWall,
  after: LaidOutWall,
  aboveMm: number,
): void {
  if (aboveMm === 0) return;
  addNuisance(state, equation, before.twistColumn, aboveMm / (lengthOf(state, before) || 1));
  addNuisance(state, equation, after.twistColumn, -aboveMm / (lengthOf(state, after) || 1));
}

function distance(state: RoomState, from: number, to: number, aboveMm: number): Equation {
  const shiftFrom = cornerShift(state, from, aboveMm);
  const shiftTo = cornerShift(state, to, aboveMm);
  const dx = (state.x[to] ?? 0) + shiftTo.x - (state.x[from] ?? 0) - shiftFrom.x;
  const dy = (state.y[to] ?? 0) + shiftTo.y - (state.y[from] ?? 0) - shiftFrom.y;
  const length = Math.sqrt(dx * dx + dy * dy);
  const ux = length === 0 ? 1 : dx / length;
  const uy = length === 0 ? 0 : dy / length;
  const equation: Equation = { columns: [], partials: [], predicted: length };
  addPoint(equation, state, to, ux, uy);
  addPoint(equation, state, from, -ux, -uy);
  addShift(equation, state, shiftTo, ux, uy);
  addShift(equation, state, shiftFrom, -ux, -uy);
  return equation;
}

/** Adds `scale` times the interior angle between two walls that meet, to the partials. */
function addAngle(
  equation: Equation,
  state: RoomState,
  before: LaidOutWall,
  after: LaidOutWall,
  scale: number,
): void {
  addHeading(equation, state, before, scale);
  addHeading(equation, state, after, -scale);
}

function interiorAngle(state: RoomState, before: LaidOutWall, after: LaidOutWall): number {
  const turn = headingOf(state, after) - headingOf(state, before);
  const full = 2 * Math.PI;
  return (((Math.PI - turn) % full) + full) % full;
}

function cornerAngleEquation(
  state: RoomState,
  before: LaidOutWall,
  after: LaidOutWall,
  scale: number,
): Equation {
  const equation: Equation = {
    columns: [],
    partials: [],
    predicted: scale * interiorAngle(state, before, after),
  };
  addAngle(equation, state, before, after, scale);
  return equation;
}

/** The mark on a bowed wall stands proud by a parabola's height; the angle read is smaller by p/a. */
function addBow(
  state: RoomState,
  equation: Equation,
  wall: LaidOutWall,
  armMm: number,
  aboveMm: number,
): void {
  const length = lengthOf(state, wall) || 1;
  const past = Math.max(0, 1 - armMm / length);
  const perBow = (-4 / length) * past;
  addNuisance(state, equation, wall.bowColumn, perBow);
  const bow = state.nuisance[wall.bowColumn] ?? 0;
  if (past > 0)
    addLength(equation, state, wall, (4 * bow * (1 - (2 * armMm) / length)) / length ** 2);
  const growth = (BOW_GROWTH_PER_MM * aboveMm * state.usualBowMm) / Math.sqrt(3);
  equation.leftOut = (equation.leftOut ?? 0) + (perBow * growth) ** 2;
}

/** A length read out in the room loses y/tan θ at each end, and what the end walls bow there. */
function moveToFront(state: RoomState, equation: Equation, wall: LaidOutWall, yMm: number): void {
  const { walls } = state.layout;
  for (const neighbour of [wall.wallBefore, wall.wallAfter]) {
    const end = walls[neighbour ?? -1];
    if (!end) continue;
    const [before, after] = neighbour === wall.wallBefore ? [end, wall] : [wall, end];
    const angle = interiorAngle(state, before, after);
    const sine = Math.sin(angle);
    if (angle >= Math.PI || Math.abs(sine) < NEARLY_STRAIGHT_SINE) continue;
    equation.predicted -= yMm / Math.tan(angle);
    addAngle(equation, state, before, after, yMm / (sine * sine));
    const length = lengthOf(state, end) || 1;
    const perBow = (-4 * (yMm / length) * Math.max(0, 1 - yMm / length)) / sine;
    addNuisance(state, equation, end.bowColumn, perBow);
  }
}

function width(
  state: RoomState,
  wall: LaidOutWall,
  facing: LaidOutWall,
  xMm: number,
  aboveMm: number,
): Equation {
  const heading = headingOf(state, wall);
  const facingHeading = headingOf(state, facing);
  const length = lengthOf(state, wall) || 1;
  const facingLength = lengthOf(state, facing) || 1;
  const [nx, ny] = [-Math.sin(facingHeading), Math.cos(facingHeading)];
  const px = (state.x[wall.left] ?? 0) + xMm * Math.cos(heading) - (state.x[facing.left] ?? 0);
  const py = (state.y[wall.left] ?? 0) + xMm * Math.sin(heading) - (state.y[facing.left] ?? 0);
  const along = px * Math.cos(facingHeading) + py * Math.sin(facingHeading);
  const facingCosine = -nx * Math.sin(heading) + ny * Math.cos(heading);
  const leanHere = aboveMm * facingCosine;
  const equation: Equation = {
    columns: [],
    partials: [],
    predicted: nx * px + ny * py,
  };
  addPoint(equation, state, wall.left, nx, ny);
  addPoint(equation, state, facing.left, -nx, -ny);
  // The wall's own turn moves the place by x; the facing wall's turn swings its line by the run along it.
  const byTurn = (xMm * facingCosine) / length;
  addPoint(equation, state, wall.right, -Math.sin(heading) * byTurn, Math.cos(heading) * byTurn);
  addPoint(equation, state, wall.left, Math.sin(heading) * byTurn, -Math.cos(heading) * byTurn);
  const bySwing = -along / facingLength;
  addPoint(equation, state, facing.right, nx * bySwing, ny * bySwing);
  addPoint(equation, state, facing.left, -nx * bySwing, -ny * bySwing);
  addNuisance(state, equation, wall.leanColumn, leanHere);
  addNuisance(state, equation, wall.twistColumn, leanHere * (xMm / length - 0.5));
  addNuisance(state, equation, facing.leanColumn, -aboveMm);
  addNuisance(state, equation, facing.twistColumn, -aboveMm * (along / facingLength - 0.5));
  return equation;
}

/** Distance between two ends of walls as it would be read, for weighing a further diagonal. */
export function diagonalEquation(
  state: RoomState,
  from: CornerEnd,
  to: CornerEnd,
  zMm: number,
): Equation | null {
  const fromPoint = pointAt(state.layout, from);
  const toPoint = pointAt(state.layout, to);
  if (fromPoint === null || toPoint === null || fromPoint === toPoint) return null;
  return distance(state, fromPoint, toPoint, zMm - state.zRefMm);
}

/** Distance between two points at the plan's own height. */
export function planDistance(state: RoomState, from: number, to: number): Equation {
  return distance(state, from, to, 0);
}

/** Interior angle between two walls that meet, in radians. */
export function planAngle(state: RoomState, before: LaidOutWall, after: LaidOutWall): Equation {
  return cornerAngleEquation(state, before, after, 1);
}
