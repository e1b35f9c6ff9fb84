import { type Combination, combine } from './combination';
import type { StripPoint } from './narrowest-strip';

export type FittedLine = {
  slope: Combination;
  atZero: Combination;
  /** Greatest less least residual. */
  spread: Combination;
};

/** Nearer than this two places are one. */
const ONE_PLACE = 1e-6;

/**
 * Least-squares line s = atZero + slope · at; every result is a combination of the readings.
 * Edge rule: null where all points are at one place. `weights` left out: all the same.
 * Example: (0, 0) (1, 1) (2, 3) → slope 1.5, atZero −0.167.
 * Source: Gauss; JCGM 100:2008 annex H.3.
 */
export function leastSquaresLine(points: StripPoint[], weights?: number[]): FittedLine | null {
  const weight = (index: number) => weights?.[index] ?? 1;
  const places = points.map(({ at }) => at);
  if (!(Math.max(...places) - Math.min(...places) > ONE_PLACE)) return null;
  const total = points.reduce((sum, _, index) => sum + weight(index), 0);
  const middle = points.reduce((sum, { at }, index) => sum + weight(index) * at, 0) / total;
  const moment = points.reduce((sum, { at }, index) => sum + weight(index) * (at - middle) ** 2, 0);
  const slope = combine(
    points.map(({ at, c }, index) => [(weight(index) * (at - middle)) / moment, c]),
  );
  const mean = combine(points.map(({ c }, index) => [weight(index) / total, c]));
  const atZero = combine([
    [1, mean],
    [-middle, slope],
  ]);
  const spread = spreadOf(
    points.map(({ at, s }) => s - atZero.value - at * slope.value),
    (index) => {
      const { at, c } = points[index] ?? { at: 0, c: atZero };
      return combine([
        [1, c],
        [-1, atZero],
        [-at, slope],
      ]);
    },
  );
  return { slope, atZero, spread };
}

/** Greatest less least of some values, as a combination of what those two were made of. */
export function spreadOf(
  values: number[],
  combinationAt: (index: number) => Combination,
): Combination {
  let [greatest, least] = [0, 0];
  for (const [index, value] of values.entries()) {
    if (value > (values[greatest] ?? value)) greatest = index;
    if (value < (values[least] ?? value)) least = index;
  }
  return combine([
    [1, combinationAt(greatest)],
    [-1, combinationAt(least)],
  ]);
}
