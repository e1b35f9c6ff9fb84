import { type Figure, figure } from './figure';
import type { Read } from './read';

/** One arm of a corner as it was read: from the corner to the mark (or the length of the blade). */
export type CornerArm = {
  armMm: number;
  /** How far the mark stands proud of the straight line corner to corner; null: no face row. */
  proud: Read | null;
  wallLengthMm: number;
  /** The shop's usual bow, counted where there is no face row. */
  usualBowMm: number;
};

const DEGREES = 180 / Math.PI;

/**
 * The angle between the straight lines corner to corner, degrees: θ + p_left/a + p_right/b (radians).
 * Edge rule: with no face row a bow of ±β may lie there and u(θ) grows by (4β/L)(1 − a/L)/√3 per wall;
 * a mark at or past the wall's other end lies on the chord.
 * Units: mm and degrees; proud is positive into the room.
 * Example: 89.8° with both marks 2 mm proud at 900 → 89.8 + 2·(2/900 rad) = 90.055°.
 * Problems: none. Source: elementary geometry; the bow is taken as a parabola, JCGM 100:2008, 4.3.7.
 */
export function chordAngle(
  theta: Figure,
  { left, right }: { left: CornerArm; right: CornerArm },
): Figure {
  const arms = [left, right].map(turnOfArm);
  const turned = arms.reduce((sum, arm) => sum + arm.value, 0);
  const u = Math.hypot(theta.u, ...arms.map((arm) => arm.u * DEGREES));
  const from = [...new Set([...theta.from, ...arms.flatMap((arm) => arm.from)])];
  return figure(theta.value + turned * DEGREES, u, from);
}

/** What one arm adds, in radians. */
function turnOfArm({ armMm, proud, wallLengthMm, usualBowMm }: CornerArm) {
  if (proud !== null && armMm > 0) {
    return { value: proud.value / armMm, u: proud.u / armMm, from: [proud.id] };
  }
  const share = Math.max(0, 1 - armMm / wallLengthMm);
  const bow = wallLengthMm > 0 ? ((4 * usualBowMm) / wallLengthMm) * share : 0;
  return { value: 0, u: bow / Math.sqrt(3), from: [] };
}
