/** A room as the adjustment has it, and an equation of it with its partials. */
import { FIXED, type LaidOutWall, type RoomLayout } from './room-layout';

export type RoomState = {
  layout: RoomLayout;
  zRefMm: number;
  usualBowMm: number;
  x: Float64Array;
  y: Float64Array;
  /** Leans and twists (mm/mm), bows (mm) and tool errors (in units of their own uncertainty), by column. */
  nuisance: Float64Array;
};

/** One linearised equation; `predicted` in mm, radians or mm/mm. */
export type Equation = {
  columns: number[];
  partials: number[];
  predicted: number;
  /** What the equation leaves out, as a variance: the bow of a wall is another at another height. */
  leftOut?: number;
};

export const radians = (degrees: number) => (degrees * Math.PI) / 180;
export const degrees = (radiansValue: number) => (radiansValue * 180) / Math.PI;

export function wallOf(layout: RoomLayout, wallId: string): LaidOutWall | undefined {
  return layout.walls[layout.wallById.get(wallId) ?? -1];
}

export function headingOf(state: RoomState, wall: LaidOutWall): number {
  return Math.atan2(
    (state.y[wall.right] ?? 0) - (state.y[wall.left] ?? 0),
    (state.x[wall.right] ?? 0) - (state.x[wall.left] ?? 0),
  );
}

export function lengthOf(state: RoomState, wall: LaidOutWall): number {
  const dx = (state.x[wall.right] ?? 0) - (state.x[wall.left] ?? 0);
  const dy = (state.y[wall.right] ?? 0) - (state.y[wall.left] ?? 0);
  // Not Math.hypot: it guards against lengths that no room has, at ten times the price.
  return Math.sqrt(dx * dx + dy * dy);
}

/** Cosine and sine of a wall's heading, and its length; a wall of no length runs along x. */
export function directionOf(
  state: RoomState,
  wall: LaidOutWall,
): { cos: number; sin: number; length: number } {
  const dx = (state.x[wall.right] ?? 0) - (state.x[wall.left] ?? 0);
  const dy = (state.y[wall.right] ?? 0) - (state.y[wall.left] ?? 0);
  const length = Math.sqrt(dx * dx + dy * dy);
  return length === 0
    ? { cos: 1, sin: 0, length: 1 }
    : { cos: dx / length, sin: dy / length, length };
}

export function add(equation: Equation, column: number, partial: number): void {
  if (column === FIXED) return;
  const known = equation.columns.indexOf(column);
  if (known < 0) {
    equation.columns.push(column);
    equation.partials.push(partial);
  } else equation.partials[known] = (equation.partials[known] ?? 0) + partial;
}

export function addPoint(
  equation: Equation,
  state: RoomState,
  point: number,
  byX: number,
  byY: number,
) {
  const place = state.layout.points[point];
  if (!place) return;
  add(equation, place.xColumn, byX);
  add(equation, place.yColumn, byY);
}

export function addNuisance(
  state: RoomState,
  equation: Equation,
  column: number,
  partial: number,
): void {
  equation.predicted += partial * (state.nuisance[column] ?? 0);
  add(equation, column, partial);
}

/** Adds `scale` times the direction of a wall in plan, to the partials. */
export function addHeading(
  equation: Equation,
  state: RoomState,
  wall: LaidOutWall,
  scale: number,
): void {
  const { cos, sin, length } = directionOf(state, wall);
  const byX = (-sin / length) * scale;
  const byY = (cos / length) * scale;
  addPoint(equation, state, wall.right, byX, byY);
  addPoint(equation, state, wall.left, -byX, -byY);
}

/** Adds `scale` times the length of a wall in plan, to the partials. */
export function addLength(
  equation: Equation,
  state: RoomState,
  wall: LaidOutWall,
  scale: number,
): void {
  const { cos, sin } = directionOf(state, wall);
  addPoint(equation, state, wall.right, cos * scale, sin * scale);
  addPoint(equation, state, wall.left, -cos * scale, -sin * scale);
}
