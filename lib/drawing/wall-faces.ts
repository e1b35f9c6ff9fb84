import type { WallFit } from '@/lib/measure/fit';

/** How far a wall's face stands proud of the straight line from its first to its last reading. */
export type FaceProfile = readonly { xMm: number; proudMm: number }[];

/**
 * The face of a wall along the row nearest to a height, against its own end readings.
 *
 * Edge: under three readings in a row there is nothing to show; the leaning of the row as a whole is left
 * out, because the corners carry it.
 * Example: 0, 5, 0 mm at 0, 1000, 2000 gives a bulge of 5 in the middle.
 */
export function faceProfile(wall: WallFit, zMm: number): FaceProfile {
  const rows = wall.rows.filter(({ points }) => points.length >= 3);
  const [row] = rows.sort((one, other) => Math.abs(one.zMm - zMm) - Math.abs(other.zMm - zMm));
  const points = [...(row?.points ?? [])].sort((one, other) => one.xMm - other.xMm);
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last || last.xMm === first.xMm) return [];
  const slope = (last.sMm - first.sMm) / (last.xMm - first.xMm);
  return points.map(({ xMm, sMm }) => ({
    xMm,
    proudMm: sMm - first.sMm - slope * (xMm - first.xMm),
  }));
}
