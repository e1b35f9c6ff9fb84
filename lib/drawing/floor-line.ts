import type { Fit } from '@/lib/measure/fit';
import type { WallPlace } from './elevation-frame';

/** Readings so near to the one nearest the wall are of the same row. */
const rowMm = 60;

/**
 * The floor along a wall as it was read nearest to it, left to right, over the floor's high point.
 *
 * Edge: without readings by this wall, an empty line; heights are never above nought.
 * Example: drops of 1200 and 1209 where the least is 1200 give 0 and −9.
 */
export function floorLine(fit: Fit, wallId: string): WallPlace[] {
  const points = (fit.floor?.points ?? []).filter((point) => point.wallId === wallId);
  const nearestMm = Math.min(...points.map(({ yMm }) => yMm));
  return points
    .filter(({ yMm }) => yMm <= nearestMm + rowMm)
    .map(({ xMm, heightMm }) => ({ xMm, zMm: heightMm }))
    .sort((one, other) => one.xMm - other.xMm);
}
