/** The chi-square distribution, for the global test of an adjustment. */

/**
 * The value that a chi-square variable with `degreesOfFreedom` passes with probability `alpha`.
 *
 * Edge: no degrees of freedom gives 0 (nothing to test).
 * Example: `chiSquareLimit(3, 0.01)` is 11.3449. Source: DLMF 8.2 and 8.11 (regularised gamma).
 */
export function chiSquareLimit(degreesOfFreedom: number, alpha: number): number {
  if (degreesOfFreedom <= 0) return 0;
  let low = 0;
  let high = degreesOfFreedom + 20 * Math.sqrt(2 * degreesOfFreedom) + 60;
  while (high - low > 1e-9 * (1 + high)) {
    const middle = (low + high) / 2;
    if (chiSquareTail(middle, degreesOfFreedom) > alpha) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/**
 * Probability that a chi-square variable is greater than `value`.
 *
 * Edge: 1 at and below zero. Example: `chiSquareTail(11.3449, 3)` is 0.0100.
 */
export function chiSquareTail(value: number, degreesOfFreedom: number): number {
  if (value <= 0) return 1;
  const shape = degreesOfFreedom / 2;
  const x = value / 2;
  const scale = Math.exp(shape * Math.log(x) - x - logGamma(shape));
  return x < shape + 1 ? 1 - scale * lowerSeries(shape, x) : scale * upperFraction(shape, x);
}

function lowerSeries(shape: number, x: number): number {
  let term = 1 / shape;
  let sum = term;
  for (let n = 1; n < 500 && term > sum * 1e-15; n++) {
    term *= x / (shape + n);
    sum += term;
  }
  return sum;
}

/** Continued fraction of the upper gamma function, by Lentz's method. */
function upperFraction(shape: number, x: number): number {
  const tiny = 1e-300;
  let b = x + 1 - shape;
  let c = 1 / tiny;
  let d = 1 / b;
  let fraction = d;
  for (let n = 1; n < 500; n++) {
    const a = -n * (n - shape);
    b += 2;
    d = 1 / nonZero(a * d + b, tiny);
    c = nonZero(b + a / c, tiny);
    fraction *= d * c;
    if (Math.abs(d * c - 1) < 1e-15) break;
  }
  return fraction;
}

const nonZero = (value: number, tiny: number) => (Math.abs(value) < tiny ? tiny : value);

/** Lanczos's series (g = 7, nine terms), good to 1e-13 for the half-integers asked here. */
function logGamma(z: number): number {
  const terms = [
    0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313,
    -176.61502916214059, 12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6,
    1.5056327351493116e-7,
  ];
  if (z < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * z)) - logGamma(1 - z);
  const base = z - 1 + 7.5;
  const sum = terms.reduce((total, term, i) => (i === 0 ? term : total + term / (z - 1 + i)), 0);
  return 0.5 * Math.log(2 * Math.PI) + (z - 0.5) * Math.log(base) - base + Math.log(sum);
}
