/** A place on the plan: along a line, and its offset; `c` is what the caller knows it by. */
export type HullPoint = { at: number; s: number };

/**
 * Upper boundary of the convex hull, left to right: the line a tight cord over the points would take.
 * Edge rule: of points at one place the highest counts; points on a straight piece are left out.
 * Example: (0,0) (1,2) (2,1) (3,3) → (0,0) (1,2) (3,3).
 * Source: monotone chain (Andrew 1979).
 */
export function upperHull<P extends HullPoint>(points: P[]): P[] {
  return boundary(points, 1);
}

/** Lower boundary: the mirror image of `upperHull`. */
export function lowerHull<P extends HullPoint>(points: P[]): P[] {
  return boundary(points, -1);
}

/** `up`: 1 for the upper boundary, −1 for the lower. */
function boundary<P extends HullPoint>(points: P[], up: 1 | -1): P[] {
  const sorted = isInOrder(points)
    ? points
    : [...points].sort((a, b) => a.at - b.at || up * (b.s - a.s));
  const hull: P[] = [];
  for (const point of sorted) {
    if (hull[hull.length - 1]?.at === point.at) continue;
    while (hull.length >= 2 && !turnsIn(hull, point, up)) hull.pop();
    hull.push(point);
  }
  return hull;
}

/** Each place after the one before it: most rows come so. */
function isInOrder(points: HullPoint[]): boolean {
  for (let i = 1; i < points.length; i++) {
    if (!((points[i]?.at ?? 0) > (points[i - 1]?.at ?? 0))) return false;
  }
  return true;
}

/** Whether the last point stands out from the straight line between the one before it and the next. */
function turnsIn(hull: HullPoint[], c: HullPoint, up: 1 | -1): boolean {
  const [a, b] = [hull[hull.length - 2], hull[hull.length - 1]];
  if (!a || !b) return true;
  return up * (b.s - a.s) * (c.at - a.at) > up * (c.s - a.s) * (b.at - a.at);
}
