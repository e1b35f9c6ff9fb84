/** Distances between straight edges in plan. */

export type PlanPoint = { xMm: number; yMm: number };
export type PlanEdge = { from: PlanPoint; to: PlanPoint };

/** Least distance between two edges and where on each it is taken; 0 where they cross. */
export function edgeDistance(
  one: PlanEdge,
  other: PlanEdge,
): { distanceMm: number; on: PlanPoint; onOther: PlanPoint } {
  const crossing = crossingOf(one, other);
  if (crossing) return { distanceMm: 0, on: crossing, onOther: crossing };
  const tries = [
    ...[one.from, one.to].map((on) => ({ on, onOther: nearestOn(other, on) })),
    ...[other.from, other.to].map((onOther) => ({ on: nearestOn(one, onOther), onOther })),
  ].map((pair) => ({
    ...pair,
    distanceMm: Math.hypot(pair.on.xMm - pair.onOther.xMm, pair.on.yMm - pair.onOther.yMm),
  }));
  return tries.reduce((best, pair) => (pair.distanceMm < best.distanceMm ? pair : best));
}

export function nearestOn(edge: PlanEdge, point: PlanPoint): PlanPoint {
  const dx = edge.to.xMm - edge.from.xMm;
  const dy = edge.to.yMm - edge.from.yMm;
  const squared = dx * dx + dy * dy;
  if (squared === 0) return edge.from;
  const along = ((point.xMm - edge.from.xMm) * dx + (point.yMm - edge.from.yMm) * dy) / squared;
  const share = Math.min(1, Math.max(0, along));
  return { xMm: edge.from.xMm + share * dx, yMm: edge.from.yMm + share * dy };
}

function crossingOf(one: PlanEdge, other: PlanEdge): PlanPoint | null {
  const ax = one.to.xMm - one.from.xMm;
  const ay = one.to.yMm - one.from.yMm;
  const bx = other.to.xMm - other.from.xMm;
  const by = other.to.yMm - other.from.yMm;
  const cross = ax * by - ay * bx;
  if (cross === 0) return null;
  const cx = other.from.xMm - one.from.xMm;
  const cy = other.from.yMm - one.from.yMm;
  const s = (cx * by - cy * bx) / cross;
  const t = (cx * ay - cy * ax) / cross;
  if (s < 0 || s > 1 || t < 0 || t > 1) return null;
  return { xMm: one.from.xMm + s * ax, yMm: one.from.yMm + s * ay };
}
