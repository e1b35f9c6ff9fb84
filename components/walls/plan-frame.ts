import type { PlanCorner, PlanWall, RoomPlan } from '@/lib/walls-pad/room-plan';
import type { PlanPoint } from '@/lib/walls-pad/walk';

/** The picture's own size; it is scaled to whatever room the screen leaves. */
export const FRAME = { width: 360, height: 190, margin: 30 };

export type Place = { x: number; y: number };

/** From millimetres of the plan to the picture: as large as it goes, in the middle. */
export function planFrame(plan: RoomPlan): (point: PlanPoint) => Place {
  const points = plan.outlines.flatMap((outline) => outline.points);
  const xs = points.map(({ xMm }) => xMm);
  const ys = points.map(({ yMm }) => yMm);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const [top, bottom] = [Math.min(...ys), Math.max(...ys)];
  const { width, height, margin } = FRAME;
  const scale = Math.min(
    (width - 2 * margin) / Math.max(1, right - left),
    (height - 2 * margin) / Math.max(1, bottom - top),
  );
  return ({ xMm, yMm }) => ({
    x: width / 2 + (xMm - (left + right) / 2) * scale,
    y: height / 2 + (yMm - (top + bottom) / 2) * scale,
  });
}

/** A wall in the picture: its ends, its middle, and one step out of the room, whose right hand is inside. */
export function wallInFrame(wall: PlanWall, place: (point: PlanPoint) => Place) {
  const [from, to] = [place(wall.from), place(wall.to)];
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const out =
    length > 0 ? { x: (to.y - from.y) / length, y: -(to.x - from.x) / length } : { x: 0, y: -1 };
  return { from, to, length, out, middle: { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 } };
}

/** Where a corner's angle is written: inside the room, on the line that halves it. */
export function insideCorner(
  corner: PlanCorner,
  walls: PlanWall[],
  place: (point: PlanPoint) => Place,
  stepsIn: number,
): Place {
  const at = place(corner.at);
  const own = walls.findIndex(({ wallId }) => wallId === corner.cornerWallId);
  const wall = walls[own];
  const before = walls.find(
    ({ to, wallId }) =>
      wallId !== corner.cornerWallId &&
      Math.hypot(to.xMm - corner.at.xMm, to.yMm - corner.at.yMm) < 1,
  );
  if (!wall || !before) return at;
  const [here, there] = [wallInFrame(wall, place).out, wallInFrame(before, place).out];
  const [x, y] = [-(here.x + there.x), -(here.y + there.y)];
  const size = Math.hypot(x, y) || 1;
  return { x: at.x + (x / size) * stepsIn, y: at.y + (y / size) * stepsIn };
}
