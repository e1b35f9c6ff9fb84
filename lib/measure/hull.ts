/** A place on the plan: along a line, and its offset; `c` is what the caller knows it by. */
export type HullPoint = { at: number; s: number };

/**
 * Upper boundary of the convex hull, left to right: the line a tight cord over the points would take.
 * Edge rule: of points at one place the highest counts; points on a straight piece are left out.
 * Example: (0,0) (1,2) (2,1) (3,3) → (0,0) (1,2) (3,3).
 * Source: monotone chain (Andrew 1979).
 */
export function upperHull<P extends HullPoint>(points: P[]): P[] {
  const sorted = [...points].sort((a, b) => a.at - b.at || b.s - a.s);
  const hull: P[] = [];
  for (const point of sorted) {
    if (hull.length > 0 && hull.at(-1)?.at === point.at) continue;
    while (hull.length >= 2 && !turnsDown(hull.at(-2), hull.at(-1), point)) hull.pop();
    hull.push(point);
  }
  return hull;
}

/** Lower boundary: the mirror image of `upperHull`. */
export function lowerHull<P extends HullPoint>(points: P[]): P[] {
  const mirrored = points.map((point) => ({ at: point.at, s: -point.s, point }));
  return upperHull(mirrored).map(({ point }) => point);
}

function turnsDown(a: HullPoint | undefined, b: HullPoint | undefined, c: HullPoint): boolean {
  if (!a || !b) return true;
  return (b.s - a.s) * (c.at - a.at) > (c.s - a.s) * (b.at - a.at);
}
