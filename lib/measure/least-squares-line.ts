import { type Combination, combine } from './combination';
import type { StripPoint } from './narrowest-strip';

export type FittedLine = {
  slope: Combination;
  atZero: Combination;
  /** Greatest less least residual; reckoned when asked for. */
  spread: () => Combination;
};

/** Nearer than this two places are one. */
const ONE_PLACE = 1e-6;

/** Each point's weight in the slope and in the mean; null where all points are at one place. */
function sharesOf(points: { at: number }[], weights?: number[]) {
  let [least, greatest, total, middle, moment] = [Infinity, -Infinity, 0, 0, 0];
  for (let i = 0; i < points.length; i++) {
    const at = points[i]?.at ?? 0;
    least = Math.min(least, at);
    greatest = Math.max(greatest, at);
    total += weights?.[i] ?? 1;
    middle += (weights?.[i] ?? 1) * at;
  }
  if (!(greatest - least > ONE_PLACE)) return null;
  middle /= total;
  points.forEach(({ at }, i) => {
    moment += (weights?.[i] ?? 1) * (at - middle) ** 2;
  });
  const inSlope = points.map(({ at }, i) => ((weights?.[i] ?? 1) * (at - middle)) / moment);
  return { inSlope, inMean: points.map((_, i) => (weights?.[i] ?? 1) / total), middle };
}

/** The slope of the least-squares line alone; null where all points are at one place. */
export function leastSquaresSlope(points: StripPoint[]): number | null {
  const shares = sharesOf(points);
  return shares && points.reduce((sum, { s }, i) => sum + (shares.inSlope[i] ?? 0) * s, 0);
}

/**
 * Least-squares line s = atZero + slope · at; every result is a combination of the readings.
 * Edge rule: null where all points are at one place. `weights` left out: all the same.
 * Example: (0, 0) (1, 1) (2, 3) → slope 1.5, atZero −0.167.
 * Source: Gauss; JCGM 100:2008 annex H.3.
 */
export function leastSquaresLine(points: StripPoint[], weights?: number[]): FittedLine | null {
  const shares = sharesOf(points, weights);
  if (shares === null) return null;
  const { inSlope, inMean, middle } = shares;
  const slope = combine(points.map(({ c }, i) => [inSlope[i] ?? 0, c]));
  const mean = combine(points.map(({ c }, i) => [inMean[i] ?? 0, c]));
  const atZero = combine([
    [1, mean],
    [-middle, slope],
  ]);
  const spread = () =>
    spreadOf(
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
