/** Uncertainty of a closed walk's misclosures, from its lengths and its angles. */
import type { TraverseLeg, TraverseReading } from './close-traverse';

/** Adds up what readings do to a place in plan: own parts by squares, what a tool shares as it is. */
export class ErrorSum {
  private xx = 0;
  private yy = 0;
  private xy = 0;
  private readonly shared = new Map<string, { x: number; y: number }>();

  /** A reading that moves the place by (x, y) for each unit of its error. */
  add({ u, tool }: TraverseReading, x: number, y: number): void {
    const uCommon = Math.min(tool?.uCommon ?? 0, u);
    if (tool && uCommon > 0) {
      const sum = this.shared.get(tool.toolId) ?? { x: 0, y: 0 };
      this.shared.set(tool.toolId, { x: sum.x + x * uCommon, y: sum.y + y * uCommon });
    }
    const own = u * u - uCommon * uCommon;
    this.xx += x * x * own;
    this.yy += y * y * own;
    this.xy += x * y * own;
  }

  /** Standard uncertainty along a direction of unit length. */
  along(x: number, y: number): number {
    const { xx, yy, xy } = this.squares();
    return Math.sqrt(Math.max(0, x * x * xx + 2 * x * y * xy + y * y * yy));
  }

  /** Standard uncertainty along the direction in which it is greatest. */
  greatest(): number {
    const { xx, yy, xy } = this.squares();
    return Math.sqrt((xx + yy) / 2 + Math.hypot((xx - yy) / 2, xy));
  }

  private squares() {
    let { xx, yy, xy } = this;
    for (const { x, y } of this.shared.values()) {
      xx += x * x;
      yy += y * y;
      xy += x * y;
    }
    return { xx, yy, xy };
  }
}

/**
 * Standard uncertainty of the linear misclosure along the gap (along its widest direction when the walk
 * closes exactly). A change of one angle, balanced, turns the k-th leg by k/n, less 1 past that corner.
 */
export function traverseErrors(
  legs: TraverseLeg[],
  headingsDeg: number[],
  steps: { dxMm: number; dyMm: number }[],
  end: { xMm: number; yMm: number },
): number {
  const errors = new ErrorSum();
  for (const [i, leg] of legs.entries()) {
    const heading = ((headingsDeg[i] ?? 0) * Math.PI) / 180;
    errors.add(leg.length, Math.cos(heading), Math.sin(heading));
  }
  const count = legs.length;
  const radian = Math.PI / 180;
  for (const [j, leg] of legs.entries()) {
    let [byX, byY] = [0, 0];
    for (const [k, step] of steps.entries()) {
      // heading[k] = first + Σ over 1…k of (180 − angle + misclosure/n).
      const turn = k / count - (j >= 1 && j <= k ? 1 : 0);
      byX -= step.dyMm * turn;
      byY += step.dxMm * turn;
    }
    if (leg.leftAngle) errors.add(leg.leftAngle, byX * radian, byY * radian);
  }
  const gap = Math.hypot(end.xMm, end.yMm);
  return gap < 1e-9 ? errors.greatest() : errors.along(end.xMm / gap, end.yMm / gap);
}
