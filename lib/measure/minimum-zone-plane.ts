import { type Outcome, type Problem, problem, refused } from '@/lib/problem';
import { combinationFigure, combine, readCombination } from './combination';
import type { Figure } from './figure';
import {
  leastSquaresPlane,
  type PlaneNumbers,
  type PlanePoint,
  planeNumbers,
} from './least-squares-plane';
import { unreadable } from './reading-problems';
import { type Contact, widestAcross } from './widest-across';

/** A place on a face (x, z of the wall) or floor (x, y) and its offset square to it. */
export type SurfacePoint = { id: string; xMm: number; yMm: number; sMm: number; u: number };
/** s = atZeroMm + slopeX · x + slopeY · y. */
export type Plane = { slopeX: number; slopeY: number; atZeroMm: number };

export type Flatness = {
  /** Width along s of the narrowest slab of two parallel planes that holds every point. */
  minimumZone: Figure;
  /** Greatest less least residual about the least-squares plane. */
  leastSquares: Figure;
  /** Middle of the narrowest slab. */
  zonePlane: Plane;
  leastSquaresPlane: Plane;
  /** Slopes of the least-squares plane, mm per mm. */
  slopeX: Figure;
  slopeY: Figure;
  /** How the slab rests: a face and a place, two edges, or (degenerate) an edge and a place, two places. */
  contact: 'face' | 'edge-edge' | 'line' | 'places';
};

/**
 * How far a face or floor is from flat, mm: minimum zone, exact, beside least squares.
 * Edge rule: widths are taken along s, which for walls and floors is square to them within 1e-4.
 * Units and signs: mm; s positive out of the surface; readings of one set-up only.
 * Example: the saddle s 1, 0, 0, 1 at the corners of a square → 1 mm, edge-edge; least squares 1 mm too.
 * Problems: too-few-readings (under 4), places-in-line, reading-not-a-number, uncertainty-not-known.
 * Source: minimum zone and least squares as in ISO 12781.
 */
export function planeOf(points: SurfacePoint[]): Outcome<Flatness> {
  const zone = flatZone(points);
  if (!zone.value) return { value: null, problems: zone.problems };
  const { minimumZone, plane, contacts, reads } = zone.value;
  const fit = leastSquaresPlane(reads);
  if (fit === null) return refused(inLine(points));
  const value: Flatness = {
    minimumZone,
    leastSquares: combinationFigure(fit.spread),
    zonePlane: plane,
    leastSquaresPlane: {
      slopeX: fit.slopeX.value,
      slopeY: fit.slopeY.value,
      atZeroMm: fit.atZero.value,
    },
    slopeX: combinationFigure(fit.slopeX),
    slopeY: combinationFigure(fit.slopeY),
    contact: contactOf(contacts),
  };
  return { value, problems: [] };
}

type FlatZone = {
  minimumZone: Figure;
  plane: Plane;
  contacts: Contact[];
  reads: PlanePoint[];
};

/** The narrowest slab, without the least-squares figures that a fit has no use for. */
export function flatZone(points: SurfacePoint[]): Outcome<FlatZone> {
  const bad = unreadable(
    points.map(({ id, xMm, yMm, sMm, u }) => ({ id, values: [xMm, yMm, sMm], u })),
  );
  if (bad.length > 0) return refused(...bad);
  if (points.length < 4) {
    const ids = points.map(({ id }) => id);
    return refused(problem('too-few-readings', 'Flatness needs four readings or more.', ids));
  }
  const reads = points.map(({ id, xMm, yMm, sMm, u }) => ({
    x: xMm,
    y: yMm,
    c: readCombination(id, sMm, u),
  }));
  const numbers = planeNumbers(reads);
  const zone = numbers && narrowestSlab(points, numbers);
  if (!zone) return refused(inLine(points));
  const width = combine(
    zone.contacts.map(({ index, proud, weight }) => [
      proud ? weight : -weight,
      reads[index]?.c ?? { value: 0, parts: [] },
    ]),
  );
  return { value: { minimumZone: combinationFigure(width), ...zone, reads }, problems: [] };
}

function inLine(points: SurfacePoint[]): Problem {
  const words = 'These readings lie on one line. Take some beside it to see how flat it is.';
  return problem(
    'places-in-line',
    words,
    points.map(({ id }) => id),
  );
}

/** Worked on what the least-squares plane leaves, scaled to 1, so that a steep or huge plane costs no digits. */
function narrowestSlab(
  points: SurfacePoint[],
  fit: PlaneNumbers,
): { contacts: Contact[]; plane: Plane } | null {
  const centreX = points.reduce((sum, { xMm }) => sum + xMm, 0) / points.length;
  const centreY = points.reduce((sum, { yMm }) => sum + yMm, 0) / points.length;
  const reach = Math.max(
    ...points.map(({ xMm, yMm }) => Math.max(Math.abs(xMm - centreX), Math.abs(yMm - centreY))),
  );
  const height = Math.max(...fit.residuals.map(Math.abs)) || 1;
  const scaled = points.map(({ xMm, yMm }, index) => ({
    x: (xMm - centreX) / reach,
    y: (yMm - centreY) / reach,
    s: (fit.residuals[index] ?? 0) / height,
  }));
  const widest = widestAcross(scaled);
  if (widest === null) return null;
  const slopeX = fit.slopeX + (widest.slopeX * height) / reach;
  const slopeY = fit.slopeY + (widest.slopeY * height) / reach;
  const levels = points.map(({ xMm, yMm, sMm }) => sMm - slopeX * xMm - slopeY * yMm);
  const atZeroMm = (Math.max(...levels) + Math.min(...levels)) / 2;
  return { contacts: widest.contacts, plane: { slopeX, slopeY, atZeroMm } };
}

function contactOf(contacts: Contact[]): Flatness['contact'] {
  const bearing = contacts.filter(({ weight }) => weight > 1e-9);
  const proud = bearing.filter((contact) => contact.proud).length;
  if (bearing.length === 4) return proud === 2 ? 'edge-edge' : 'face';
  return bearing.length === 3 ? 'line' : 'places';
}
