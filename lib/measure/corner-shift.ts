/** How the corners of a room move in plan with height, as its walls lean and twist. */
import { FIXED, type LaidOutWall } from './room-layout';
import { addNuisance, type Equation, headingOf, type RoomState } from './room-state';

/** Corners within this of straight do not move along their walls when these lean. */
export const NEARLY_STRAIGHT_SINE = 0.17;

export type Shift = {
  /** By unknown: how the corner moves for each unit of it. */
  by: { column: number; x: number; y: number }[];
  /** By the direction of a wall in plan: how the move itself turns, per radian. */
  turning: { wall: LaidOutWall; x: number; y: number }[];
  x: number;
  y: number;
};
const NO_SHIFT: Shift = { by: [], turning: [], x: 0, y: 0 };

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
  const [headingBefore, headingAfter] = [headingOf(state, before), headingOf(state, after)];
  const sine = Math.sin(headingAfter - headingBefore);
  if (Math.abs(sine) < NEARLY_STRAIGHT_SINE) {
    const [x, y] = [-Math.sin(headingAfter) / 2, Math.cos(headingAfter) / 2];
    return shiftOf(state, aboveMm, [
      { wall: before, twist: 0.5, x, y },
      { wall: after, twist: -0.5, x, y },
    ]);
  }
  const along = { x: Math.cos(headingAfter) / sine, y: Math.sin(headingAfter) / sine };
  const back = { x: -Math.cos(headingBefore) / sine, y: -Math.sin(headingBefore) / sine };
  const shift = shiftOf(state, aboveMm, [
    { wall: before, twist: 0.5, ...along },
    { wall: after, twist: -0.5, ...back },
  ]);
  const cotangent = Math.cos(headingAfter - headingBefore) / sine;
  const inBefore = aboveMm * leanAtEnd(state, before, 'right').predicted;
  const inAfter = aboveMm * leanAtEnd(state, after, 'left').predicted;
  shift.turning = [
    {
      wall: after,
      x: -inBefore * along.y - shift.x * cotangent,
      y: inBefore * along.x - shift.y * cotangent,
    },
    {
      wall: before,
      x: -inAfter * back.y + shift.x * cotangent,
      y: inAfter * back.x + shift.y * cotangent,
    },
  ];
  return shift;
}

/** A free end moves with its one wall, square to it. */
function freeEndShift(state: RoomState, wall: LaidOutWall, twist: number, aboveMm: number): Shift {
  const heading = headingOf(state, wall);
  const [x, y] = [-Math.sin(heading), Math.cos(heading)];
  const shift = shiftOf(state, aboveMm, [{ wall, twist, x, y }]);
  const inward = shift.x * x + shift.y * y;
  shift.turning = [{ wall, x: -inward * y, y: inward * x }];
  return shift;
}

function shiftOf(
  state: RoomState,
  aboveMm: number,
  parts: { wall: LaidOutWall; twist: number; x: number; y: number }[],
): Shift {
  const shift: Shift = { by: [], turning: [], x: 0, y: 0 };
  for (const { wall, twist, x, y } of parts) {
    for (const [column, share] of [
      [wall.leanColumn, aboveMm],
      [wall.twistColumn, aboveMm * twist],
    ] as const) {
      if (column === FIXED) continue;
      const value = state.nuisance[column] ?? 0;
      shift.by.push({ column, x: share * x, y: share * y });
      shift.x += share * x * value;
      shift.y += share * y * value;
    }
  }
  return shift;
}

/** The lean of a wall at one of its ends, λ ± t/2, mm/mm. */
export function leanAtEnd(state: RoomState, wall: LaidOutWall, end: 'left' | 'right'): Equation {
  const equation: Equation = { columns: [], partials: [], predicted: 0 };
  addNuisance(state, equation, wall.leanColumn, 1);
  addNuisance(state, equation, wall.twistColumn, end === 'right' ? 0.5 : -0.5);
  return equation;
}
