import type { PlanWall } from '@/lib/drawing/room-plan';
import { moved } from '@/lib/drawing/vector';
import type { RunSetLine } from '@/lib/measure/run-fit';
import type { TruePoint } from './true-shape';

/** A place of the plan, with y up. */
export function onPlan(wall: PlanWall, xMm: number, outMm: number): TruePoint {
  const [x, y] = moved(wall.from, wall.along, xMm, wall.inward, outMm);
  return [x, -y];
}

/**
 * From a run's own frame to the plan: along its set line from the foot of the wall's left corner, and
 * square out of it. Lengths and right angles of the run stay what they are.
 *
 * Edge: a run without a set line stands on the straight line corner to corner.
 * Example: on a wall along x with a set line 10 in front of it, 600 along and 580 out is at 600, −590.
 */
export function placeOnPlan(
  wall: PlanWall,
  setLine: RunSetLine | null,
): (xMm: number, outMm: number) => TruePoint {
  const spanMm = setLine ? setLine.xRightMm - setLine.xLeftMm : 0;
  const slope =
    setLine && spanMm > 0 ? (setLine.offsetAtRightMm - setLine.offsetAtLeftMm) / spanMm : 0;
  const standOffMm = setLine ? setLine.offsetAtLeftMm - slope * setLine.xLeftMm : 0;
  const turn = Math.atan(slope);
  const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
  return (xMm, outMm) =>
    onPlan(wall, xMm * cos - outMm * sin, standOffMm + xMm * sin + outMm * cos);
}
