import { type Combination, combine } from './combination';
import { spreadOf } from './least-squares-line';

export type PlanePoint = { x: number; y: number; c: Combination };
export type FittedPlane = {
  slopeX: Combination;
  slopeY: Combination;
  atZero: Combination;
  residuals: number[];
  /** Greatest less least residual. */
  spread: Combination;
};

/**
 * Least-squares plane s = atZero + slopeX · x + slopeY · y; every result is a combination of the readings.
 * Edge rule: null where all points lie on one line.
 * Example: s 0, 1, 2, 3 at (0,0) (1,0) (0,1) (1,1) → slopes 1 and 2.
 * Source: Gauss.
 */
export function leastSquaresPlane(points: PlanePoint[]): FittedPlane | null {
  const count = points.length;
  const [middleX, middleY] = [
    points.reduce((sum, { x }) => sum + x, 0) / count,
    points.reduce((sum, { y }) => sum + y, 0) / count,
  ];
  let [xx, xy, yy] = [0, 0, 0];
  for (const { x, y } of points) {
    xx += (x - middleX) ** 2;
    xy += (x - middleX) * (y - middleY);
    yy += (y - middleY) ** 2;
  }
  const determinant = xx * yy - xy * xy;
  if (!(determinant > 1e-12 * (xx + yy) ** 2)) return null;
  const slopeOf = (alongX: number, alongY: number) =>
    combine(
      points.map(({ x, y, c }) => [
        ((x - middleX) * alongX + (y - middleY) * alongY) / determinant,
        c,
      ]),
    );
  const slopeX = slopeOf(yy, -xy);
  const slopeY = slopeOf(-xy, xx);
  const atZero = combine([
    ...points.map(({ c }): [number, Combination] => [1 / count, c]),
    [-middleX, slopeX],
    [-middleY, slopeY],
  ]);
  const residuals = points.map(
    ({ x, y, c }) => c.value - atZero.value - x * slopeX.value - y * slopeY.value,
  );
  const spread = spreadOf(residuals, (index) => {
    const { x, y, c } = points[index] ?? { x: 0, y: 0, c: atZero };
    return combine([
      [1, c],
      [-1, atZero],
      [-x, slopeX],
      [-y, slopeY],
    ]);
  });
  return { slopeX, slopeY, atZero, residuals, spread };
}
