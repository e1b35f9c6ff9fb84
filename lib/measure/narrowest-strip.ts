import { type Bracket, bracket } from './bracket';
import { type Combination, combine, readCombination } from './combination';
import { type HullPoint, lowerHull, upperHull } from './hull';
import type { ProfilePoint } from './profile';

/** A place of a profile with what it was made of (a reading, or a value between two). */
export type StripPoint = { at: number; s: number; c: Combination };

export type Strip = {
  /** Width along s: proud edge less the far one. */
  width: Combination;
  /** Directions the strip may take; one and the same but where vertex faces vertex. */
  slopeLeast: number;
  slopeMost: number;
};

export function stripPoint({ id, atMm, sMm, u }: ProfilePoint): StripPoint {
  return { at: atMm, s: sMm, c: readCombination(id, sMm, u) };
}

/**
 * The narrowest strip of two parallel lines that holds all points, its width taken along s. The hull's
 * upper and lower boundaries are concave and convex, so the width is their greatest distance apart,
 * and that is at a vertex of one of them: exact, no search.
 * Edge rule: points at one place only → the width is their spread and every direction will do.
 * Source: minimum zone, ISO 1101 / ISO 12780 (2-1 contact); the argument is elementary.
 */
export function narrowestStrip(points: StripPoint[]): Strip | null {
  const { upper, lower, atMm } = widestOf(points);
  if (atMm === null) return null;
  const [above, below] = [slopesAt(upper, atMm), slopesAt(lower, atMm)];
  return {
    width: combine([
      [1, placeAt(upper, atMm)],
      [-1, placeAt(lower, atMm)],
    ]),
    slopeLeast: Math.max(above.right ?? -Infinity, below.left ?? -Infinity),
    slopeMost: Math.min(above.left ?? Infinity, below.right ?? Infinity),
  };
}

/** The width alone, for choosing among many strips; −∞ without points. */
export function stripWidth(points: HullPoint[]): number {
  return widestOf(points).width;
}

function widestOf<P extends HullPoint>(points: P[]) {
  const upper = upperHull(points);
  const lower = lowerHull(points);
  let atMm: number | null = null;
  let width = -Infinity;
  for (const hull of [upper, lower]) {
    for (const { at } of hull) {
      const apart = heightAt(upper, at) - heightAt(lower, at);
      if (apart <= width) continue;
      width = apart;
      atMm = at;
    }
  }
  return { upper, lower, atMm, width };
}

/** On the way through many strips nothing is made but the number. */
function heightAt(hull: HullPoint[], at: number): number {
  for (let i = 0; i < hull.length; i++) {
    const to = hull[i];
    if (!to || to.at < at) continue;
    const from = hull[i - 1];
    if (to.at === at) return to.s;
    return from ? from.s + ((at - from.at) / (to.at - from.at)) * (to.s - from.s) : Number.NaN;
  }
  return Number.NaN;
}

function placeAt(hull: StripPoint[], at: number): Combination {
  return placeOn(bracket(hull, positionOf, at));
}

function positionOf({ at }: HullPoint): number {
  return at;
}

/** The value between two neighbours. */
export function placeOn(edge: Bracket<{ c: Combination }> | null): Combination {
  if (edge === null) return { value: Number.NaN, parts: [] };
  if (edge.share === 0) return edge.from.c;
  return combine([
    [1 - edge.share, edge.from.c],
    [edge.share, edge.to.c],
  ]);
}

/** Slopes of the boundary just left and right of a place; none past its ends. */
function slopesAt(hull: StripPoint[], at: number): { left: number | null; right: number | null } {
  let left: number | null = null;
  for (let index = 1; index < hull.length; index++) {
    const [from, to] = [hull[index - 1], hull[index]];
    if (!from || !to) continue;
    const slope = (to.s - from.s) / (to.at - from.at);
    if (to.at >= at && from.at < at) left = slope;
    if (from.at <= at && to.at > at) return { left, right: slope };
  }
  return { left, right: null };
}
