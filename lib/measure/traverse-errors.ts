/** Uncertainty of a closed walk's linear misclosure, from its lengths and its balanced angles. */
import type { TraverseLeg } from './close-traverse';

/**
 * Standard uncertainty along the gap (along its widest direction when the walk closes exactly).
 * A change of one angle, balanced, turns every later leg by −1 + k/n for the k-th heading after it.
 */
export function traverseErrors(
  legs: TraverseLeg[],
  headingsDeg: number[],
  steps: { dxMm: number; dyMm: number }[],
  end: { xMm: number; yMm: number },
): number {
  let [xx, yy, xy] = [0, 0, 0];
  const add = (x: number, y: number, u: number) => {
    xx += (x * u) ** 2;
    yy += (y * u) ** 2;
    xy += x * y * u * u;
  };
  for (const [i, leg] of legs.entries()) {
    const heading = ((headingsDeg[i] ?? 0) * Math.PI) / 180;
    add(Math.cos(heading), Math.sin(heading), leg.length.u);
  }
  const count = legs.length;
  for (const [j, leg] of legs.entries()) {
    let [byX, byY] = [0, 0];
    for (const [k, step] of steps.entries()) {
      // heading[k] = first + Σ over 1…k of (180 − angle + misclosure/n).
      const turn = k / count - (j >= 1 && j <= k ? 1 : 0);
      byX -= step.dyMm * turn;
      byY += step.dxMm * turn;
    }
    add(byX, byY, ((leg.leftAngle?.u ?? 0) * Math.PI) / 180);
  }
  const gap = Math.hypot(end.xMm, end.yMm);
  if (gap < 1e-9) return Math.sqrt((xx + yy) / 2 + Math.hypot((xx - yy) / 2, xy));
  const [ux, uy] = [end.xMm / gap, end.yMm / gap];
  return Math.sqrt(Math.max(0, ux * ux * xx + 2 * ux * uy * xy + uy * uy * yy));
}
