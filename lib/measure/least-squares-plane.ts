import { type Combination, combine } from './combination';
import { spreadOf } from './least-squares-line';

export type PlanePoint = { x: number; y: number; c: Combination };
export type FittedPlane = {
  slopeX: Combination;
  slopeY: Combination;
  atZero: Combination;
  /** Greatest less least residual. */
  spread: Combination;
};
/** The same plane in numbers alone. */
export type PlaneNumbers = { slopeX: number; slopeY: number; residuals: number[] };

/** Each point's weight in the two slopes; null where all points lie on one line. */
function sharesOf(points: PlanePoint[]) {
  const count = points.length;
  const middleX = points.reduce((sum, { x }) => sum + x, 0) / count;
  const middleY = points.reduce((sum, { y }) => sum + y, 0) / count;
  let [xx, xy, yy] = [0, 0, 0];
  for (const { x, y } of points) {
    xx += (x - middleX) ** 2;
    xy += (x - middleX) * (y - middleY);
    yy += (y - middleY) ** 2;
  }
  const determinant = xx * yy - xy * xy;
  if (!(determinant > 1e-12 * (xx + yy) ** 2)) return null;
  const shareOf = (alongX: number, alongY: number) =>
    points.map(({ x, y }) => ((x - middleX) * alongX + (y - middleY) * alongY) / determinant);
  return { inSlopeX: shareOf(yy, -xy), inSlopeY: shareOf(-xy, xx), middleX, middleY };
}

/** Slopes and residuals of the least-squares plane; null where all points lie on one line. */
export function planeNumbers(points: PlanePoint[]): PlaneNumbers | null {
  const shares = sharesOf(points);
  if (shares === null) return null;
  const { inSlopeX, inSlopeY, middleX, middleY } = shares;
  let [slopeX, slopeY, mean] = [0, 0, 0];
  points.forEach(({ c }, i) => {
    slopeX += (inSlopeX[i] ?? 0) * c.value;
    slopeY += (inSlopeY[i] ?? 0) * c.value;
    mean += c.value / points.length;
  });
  const atZero = mean - middleX * slopeX - middleY * slopeY;
  const residuals = points.map(({ x, y, c }) => c.value - atZero - x * slopeX - y * slopeY);
  return { slopeX, slopeY, residuals };
}

/**
 * Least-squares plane s = atZero + slopeX · x + slopeY · y; every result is a combination of the readings.
 * Edge rule: null where all points lie on one line.
 * Example: s 0, 1, 2, 3 at (0,0) (1,0) (0,1) (1,1) → slopes 1 and 2.
 * Source: Gauss.
 */
export function leastSquaresPlane(points: PlanePoint[]): FittedPlane | null {
  const shares = sharesOf(points);
  if (shares === null) return null;
  const { inSlopeX, inSlopeY, middleX, middleY } = shares;
  const slopeX = combine(points.map(({ c }, i) => [inSlopeX[i] ?? 0, c]));
  const slopeY = combine(points.map(({ c }, i) => [inSlopeY[i] ?? 0, c]));
  const atZero = combine([
    ...points.map(({ c }): [number, Combination] => [1 / points.length, c]),
    [-middleX, slopeX],
    [-middleY, slopeY],
  ]);
  const spread = spreadOf(
    points.map(({ x, y, c }) => c.value - atZero.value - x * slopeX.value - y * slopeY.value),
    (index) => {
      const { x, y, c } = points[index] ?? { x: 0, y: 0, c: atZero };
      return combine([
        [1, c],
        [-1, atZero],
        [-x, slopeX],
        [-y, slopeY],
      ]);
    },
  );
  return { slopeX, slopeY, atZero, spread };
}
