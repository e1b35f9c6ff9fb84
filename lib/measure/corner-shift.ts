/** How the corners of a room move in plan with height, as its walls lean and twist. */
import type { LaidOutWall } from './room-layout';
import { add, addHeading, directionOf, type Equation, type RoomState } from './room-state';

/** Corners within this of straight do not move along their walls when these lean. */
export const NEARLY_STRAIGHT_SINE = 0.17;

/** What one of the walls that meet at a corner does to it. */
type Pull = {
  wall: LaidOutWall;
  /** Which part of its twist lies at this end. */
  twist: 0.5 | -0.5;
  /** How the corner moves for each mm that the wall's line moves in here. */
  x: number;
  y: number;
  /** How the corner's move itself turns, per radian that this wall turns in plan. */
  turnX: number;
  turnY: number;
};
/** A corner's move at a height, mm, and its one or two walls' share in it. */
export type Shift = { aboveMm: number; x: number; y: number; pulls: readonly Pull[] };

const NO_SHIFT: Shift = { aboveMm: 0, x: 0, y: 0, pulls: [] };

/**
 * How a corner moves in plan at a height over the plan's: each wall's line moves in by its lean there, by
 * λ + t/2 at its right end and λ − t/2 at its left, and the corner is where the two lines meet.
 */
export function cornerShift(state: RoomState, point: number, aboveMm: number): Shift {
  const { walls } = state.layout;
  const place = state.layout.points[point];
  const before = walls[place?.wallBefore ?? -1];
  const after = walls[place?.wallAfter ?? -1];
  const only = before ?? after;
  if (aboveMm === 0 || !only) return NO_SHIFT;
  if (!before || !after) return freeEndShift(state, only, before ? 0.5 : -0.5, aboveMm);
  const inBefore = aboveMm * leanHere(state, before, 0.5);
  const inAfter = aboveMm * leanHere(state, after, -0.5);
  const from = directionOf(state, before);
  const to = directionOf(state, after);
  const sine = from.cos * to.sin - from.sin * to.cos;
  if (Math.abs(sine) < NEARLY_STRAIGHT_SINE) {
    const [x, y] = [-to.sin / 2, to.cos / 2];
    const pull = { x, y, turnX: 0, turnY: 0 };
    return {
      aboveMm,
      x: (inBefore + inAfter) * x,
      y: (inBefore + inAfter) * y,
      pulls: [
        { wall: before, twist: 0.5, ...pull },
        { wall: after, twist: -0.5, ...pull },
      ],
    };
  }
  const [alongX, alongY] = [to.cos / sine, to.sin / sine];
  const [backX, backY] = [-from.cos / sine, -from.sin / sine];
  const x = inBefore * alongX + inAfter * backX;
  const y = inBefore * alongY + inAfter * backY;
  const cotangent = (from.cos * to.cos + from.sin * to.sin) / sine;
  return {
    aboveMm,
    x,
    y,
    pulls: [
      {
        wall: before,
        twist: 0.5,
        x: alongX,
        y: alongY,
        turnX: -inAfter * backY + x * cotangent,
        turnY: inAfter * backX + y * cotangent,
      },
      {
        wall: after,
        twist: -0.5,
        x: backX,
        y: backY,
        turnX: -inBefore * alongY - x * cotangent,
        turnY: inBefore * alongX - y * cotangent,
      },
    ],
  };
}

/** A free end moves with its one wall, square to it. */
function freeEndShift(
  state: RoomState,
  wall: LaidOutWall,
  twist: 0.5 | -0.5,
  aboveMm: number,
): Shift {
  const { cos, sin } = directionOf(state, wall);
  const inward = aboveMm * leanHere(state, wall, twist);
  return {
    aboveMm,
    x: -inward * sin,
    y: inward * cos,
    pulls: [{ wall, twist, x: -sin, y: cos, turnX: -inward * cos, turnY: -inward * sin }],
  };
}

/** Adds what a corner's move adds along a direction in plan (ux, uy), to the partials. */
export function addShift(
  equation: Equation,
  state: RoomState,
  { aboveMm, pulls }: Shift,
  ux: number,
  uy: number,
): void {
  for (let i = 0; i < pulls.length; i++) {
    const pull = pulls[i];
    if (!pull) continue;
    const along = aboveMm * (ux * pull.x + uy * pull.y);
    add(equation, pull.wall.leanColumn, along);
    add(equation, pull.wall.twistColumn, along * pull.twist);
    addHeading(equation, state, pull.wall, ux * pull.turnX + uy * pull.turnY);
  }
}

/** The lean of a wall at one of its ends, λ ± t/2, mm/mm, with its partials. */
export function leanAtEnd(state: RoomState, wall: LaidOutWall, end: 'left' | 'right'): Equation {
  const twist = end === 'right' ? 0.5 : -0.5;
  const equation: Equation = { columns: [], partials: [], predicted: leanHere(state, wall, twist) };
  add(equation, wall.leanColumn, 1);
  add(equation, wall.twistColumn, twist);
  return equation;
}

function leanHere(state: RoomState, wall: LaidOutWall, twist: number): number {
  const lean = state.nuisance[wall.leanColumn] ?? 0;
  return lean + twist * (state.nuisance[wall.twistColumn] ?? 0);
}
