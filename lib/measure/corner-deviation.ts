import { type Figure, figure } from './figure';

export type CornerDeviation = {
  /** θ − nominal in degrees: positive open, negative closed. */
  deviation: Figure;
  lies: 'open' | 'closed' | 'true-within-the-reading';
};

/**
 * How far a corner is from its nominal angle, degrees.
 * Edge rule: smaller than its own U, it is "true within the reading".
 * Example: 90.4 ± 0.2 (U) against 90 → 0.4 open; 90.1 ± 0.2 → true within the reading.
 * Problems: none. Source: common practice; U = 2u, JCGM 100:2008, 6.2.1.
 */
export function cornerDeviation(theta: Figure, nominalDeg: number): CornerDeviation {
  const deviation = figure(theta.value - nominalDeg, theta.u, theta.from);
  if (Math.abs(deviation.value) <= deviation.U)
    return { deviation, lies: 'true-within-the-reading' };
  return { deviation, lies: deviation.value > 0 ? 'open' : 'closed' };
}

/**
 * Twist of a corner: the greatest less the least angle over the heights read, degrees.
 * Edge rule: null with fewer than two heights. Each height counts for itself in u.
 * Example: 89.6, 90.1, 90.0, u 0.1 each → 0.5, u = 0.141.
 * Problems: none. Source: common practice.
 */
export function cornerTwist(angles: Figure[]): Figure | null {
  const [first] = angles;
  if (first === undefined || angles.length < 2) return null;
  let [least, greatest] = [first, first];
  for (const angle of angles) {
    if (angle.value < least.value) least = angle;
    if (angle.value > greatest.value) greatest = angle;
  }
  const from = [...new Set([...greatest.from, ...least.from])];
  return figure(greatest.value - least.value, Math.hypot(greatest.u, least.u), from);
}
