import { solveSmall } from './solve-small';

export type SpacePoint = { x: number; y: number; s: number };
/** A point the slab rests on: on its proud side or its far side, and how much it carries (0 … 1). */
export type Contact = { index: number; proud: boolean; weight: number };
/** Widest place across the hull, and the slopes of the slab there. */
export type WidestAcross = { contacts: Contact[]; slopeX: number; slopeY: number };

type Side = { index: number; proud: boolean };

/** Of the scaled spread: a gain below this is rounding. */
const NO_GAIN = 1e-11;
/** Past this many exchanges the careful rule is used, which cannot go round in circles (Bland 1977). */
const FAST_EXCHANGES = 200;

/**
 * The narrowest slab between two parallel planes, its width taken along s: by duality the greatest
 * distance along s across the convex hull. Simplex on four contacts: each step takes in the point
 * furthest outside the slab and lets one contact go, so face-and-vertex (3–1) and edge-and-edge (2–2)
 * contacts both come up by themselves.
 * Edge rule: null where all points lie on one line in plan.
 * Source: minimum zone, ISO 12781; linear programming duality; Radon's theorem for the start.
 */
export function widestAcross(points: SpacePoint[]): WidestAcross | null {
  let basis = startingContacts(points);
  if (basis === null) return null;
  const careful = FAST_EXCHANGES;
  for (let exchange = 0; exchange < careful * 50; exchange += 1) {
    const columns = basis.map((side) => columnOf(points, side));
    const weights = solveSmall(transposed(columns), [1, 1, 0, 0]);
    const slab = solveSmall(
      columns,
      basis.map((side) => costOf(points, side)),
    );
    if (weights === null || slab === null) return null;
    const entering = furthestOutside(points, slab, exchange < careful);
    if (entering === null)
      return { contacts: contactsOf(basis, weights), slopeX: slab[2] ?? 0, slopeY: slab[3] ?? 0 };
    const direction = solveSmall(transposed(columns), columnOf(points, entering));
    if (direction === null) return null;
    const leaving = firstToLift(weights, direction, basis);
    if (leaving === null) return null;
    basis = basis.map((side, at) => (at === leaving ? entering : side));
  }
  return null;
}

/** Rows: proud weights sum to 1, far weights sum to 1, and both sides balance over one place (x, y). */
function columnOf(points: SpacePoint[], { index, proud }: Side): number[] {
  const { x, y } = points[index] ?? { x: 0, y: 0 };
  return proud ? [1, 0, x, y] : [0, 1, -x, -y];
}

function costOf(points: SpacePoint[], { index, proud }: Side): number {
  const s = points[index]?.s ?? 0;
  return proud ? s : -s;
}

function transposed(columns: number[][]): number[][] {
  return [0, 1, 2, 3].map((row) => columns.map((column) => column[row] ?? 0));
}

function furthestOutside(points: SpacePoint[], slab: number[], fast: boolean): Side | null {
  const [proudLevel = 0, farLevel = 0, slopeX = 0, slopeY = 0] = slab;
  let best: Side | null = null;
  let gain = NO_GAIN;
  for (let index = 0; index < points.length; index++) {
    const point = points[index];
    if (!point) continue;
    const level = point.s - slopeX * point.x - slopeY * point.y;
    const above = level - proudLevel;
    const below = -level - farLevel;
    const proud = above > gain;
    if (!proud && !(below > gain)) continue;
    if (!fast) return { index, proud };
    // A point may stand outside both sides of a slab that is still thinner than nothing.
    const isBelow = below > Math.max(gain, above);
    best = { index, proud: !isBelow };
    gain = isBelow ? below : above;
  }
  return best;
}

/** The contact whose weight reaches 0 first; of equals the lowest numbered, for the careful rule. */
function firstToLift(weights: number[], direction: number[], basis: Side[]): number | null {
  let leaving: number | null = null;
  let least = Infinity;
  const order = (at: number) => (basis[at]?.index ?? 0) * 2 + (basis[at]?.proud ? 0 : 1);
  for (const [at, rate] of direction.entries()) {
    if (rate <= NO_GAIN) continue;
    const ratio = Math.max(0, weights[at] ?? 0) / rate;
    const tie = Math.abs(ratio - least) <= 1e-14;
    if (tie && leaving !== null && order(at) > order(leaving)) continue;
    if (!tie && ratio > least) continue;
    leaving = at;
    least = Math.min(least, ratio);
  }
  return leaving;
}

function contactsOf(basis: Side[], weights: number[]): Contact[] {
  return basis.map((side, at) => ({ ...side, weight: Math.max(0, weights[at] ?? 0) }));
}

/**
 * Four points, three of them not in line: by Radon's theorem they part into two sets with a common
 * place; one set bears the proud side and the other the far side.
 */
function startingContacts(points: SpacePoint[]): Side[] | null {
  const first = points[0];
  if (!first || points.length < 4) return null;
  const second = greatest(points, ({ x, y }) => (x - first.x) ** 2 + (y - first.y) ** 2);
  const end = points[second] ?? first;
  const across = ({ x, y }: SpacePoint) =>
    Math.abs((end.x - first.x) * (y - first.y) - (end.y - first.y) * (x - first.x));
  const third = greatest(points, across);
  const apex = points[third];
  if (!apex || across(apex) < 1e-9) return null;
  const corners = [0, second, third];
  const fourth = points.findIndex((_, index) => !corners.includes(index));
  const last = points[fourth];
  if (!last) return null;
  const shares = solveSmall(
    [
      [1, 1, 1],
      [first.x, end.x, apex.x],
      [first.y, end.y, apex.y],
    ],
    [1, last.x, last.y],
  );
  if (shares === null) return null;
  const sides = corners.map((index, at) => ({ index, proud: (shares[at] ?? 0) > 0 }));
  return [...sides, { index: fourth, proud: false }];
}

function greatest(points: SpacePoint[], of: (point: SpacePoint) => number): number {
  let best = 0;
  for (const [index, point] of points.entries()) {
    if (of(point) > of(points[best] ?? point)) best = index;
  }
  return best;
}
