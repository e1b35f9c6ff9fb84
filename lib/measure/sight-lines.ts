/** Which corners see each other across the room, so that a tape or a laser can be laid between them. */

type Plan = { x: ArrayLike<number>; y: ArrayLike<number> };
export type WallLine = { left: number; right: number; closed: boolean };

/** A line that passes a corner closer than this is not free: the tape would lie on it. */
const FREE_OF_CORNER_MM = 20;

/**
 * True when the straight line between two points of the plan meets no wall and no other corner, leaves both
 * into the room, and runs inside the room where the walls close it.
 *
 * Frame: x east, y south; the room lies to the right of each wall's direction. Edge: along a wall is not
 * across the room; a line that merely touches a corner is not free; round an outside corner of an open
 * chain there is no line through what stands behind it.
 */
export function seesAcross(plan: Plan, walls: WallLine[], from: number, to: number): boolean {
  if (from === to) return false;
  const [fx, fy] = [plan.x[from] ?? 0, plan.y[from] ?? 0];
  const [tx, ty] = [plan.x[to] ?? 0, plan.y[to] ?? 0];
  const length = Math.hypot(tx - fx, ty - fy);
  if (length === 0) return false;
  if (!leavesIntoRoom(plan, walls, from, tx - fx, ty - fy)) return false;
  if (!leavesIntoRoom(plan, walls, to, fx - tx, fy - ty)) return false;
  for (const wall of walls) {
    const ends = [wall.left, wall.right];
    if (ends.includes(from) && ends.includes(to)) return false;
    for (const end of ends) {
      if (end === from || end === to) continue;
      const [px, py] = [(plan.x[end] ?? 0) - fx, (plan.y[end] ?? 0) - fy];
      const along = (px * (tx - fx) + py * (ty - fy)) / length;
      const aside = Math.abs((px * (ty - fy) - py * (tx - fx)) / length);
      if (aside < FREE_OF_CORNER_MM && along > 0 && along < length) return false;
    }
    if (!ends.includes(from) && !ends.includes(to) && crosses(plan, wall, [fx, fy, tx, ty])) {
      return false;
    }
  }
  return isInside(plan, walls, (fx + tx) / 2, (fy + ty) / 2);
}

/** A direction from a corner lies on the room's side of its walls: of both, or of either past 180°. */
function leavesIntoRoom(
  plan: Plan,
  walls: WallLine[],
  at: number,
  dx: number,
  dy: number,
): boolean {
  const direction = (wall: WallLine | undefined) =>
    wall && {
      x: (plan.x[wall.right] ?? 0) - (plan.x[wall.left] ?? 0),
      y: (plan.y[wall.right] ?? 0) - (plan.y[wall.left] ?? 0),
    };
  const before = direction(walls.find((wall) => wall.right === at));
  const after = direction(walls.find((wall) => wall.left === at));
  const isRight = (wall: { x: number; y: number }) => wall.x * dy - wall.y * dx > 0;
  if (!before || !after) {
    const only = before ?? after;
    return only === undefined || isRight(only);
  }
  const isOutside = before.x * after.y - before.y * after.x < 0;
  return isOutside ? isRight(before) || isRight(after) : isRight(before) && isRight(after);
}

function crosses(plan: Plan, wall: WallLine, [fx, fy, tx, ty]: [number, number, number, number]) {
  const [ax, ay] = [plan.x[wall.left] ?? 0, plan.y[wall.left] ?? 0];
  const [bx, by] = [plan.x[wall.right] ?? 0, plan.y[wall.right] ?? 0];
  const side = (px: number, py: number, qx: number, qy: number, rx: number, ry: number) =>
    (qx - px) * (ry - py) - (qy - py) * (rx - px);
  const wallEndsApart = side(fx, fy, tx, ty, ax, ay) * side(fx, fy, tx, ty, bx, by) <= 0;
  const lineEndsApart = side(ax, ay, bx, by, fx, fy) * side(ax, ay, bx, by, tx, ty) <= 0;
  return wallEndsApart && lineEndsApart;
}

/** Inside the closed walls (even–odd rule); anywhere when no chain is closed. */
function isInside(plan: Plan, walls: WallLine[], px: number, py: number): boolean {
  let closedWalls = 0;
  let inside = false;
  for (const wall of walls) {
    if (!wall.closed) continue;
    closedWalls++;
    const [ax, ay] = [plan.x[wall.left] ?? 0, plan.y[wall.left] ?? 0];
    const [bx, by] = [plan.x[wall.right] ?? 0, plan.y[wall.right] ?? 0];
    if (ay > py !== by > py && px < ax + ((bx - ax) * (py - ay)) / (by - ay)) inside = !inside;
  }
  return closedWalls === 0 || inside;
}
