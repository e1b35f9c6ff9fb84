/** The standard error ellipse of a place in plan, from its covariance. */

export type Ellipse = { aMm: number; bMm: number; angleDeg: number };

/**
 * Half axes (one standard uncertainty) and direction of the long axis.
 *
 * Frame: the angle is from x towards y, −90 < angle ≤ 90. Edge: a round ellipse gives angle 0.
 * Example: variances 4 and 1, no covariance: a = 2, b = 1, angle 0.
 * Source: eigenvalues of a symmetric 2 × 2 matrix; common surveying practice.
 */
export function errorEllipse(varianceX: number, varianceY: number, covariance: number): Ellipse {
  const mean = (varianceX + varianceY) / 2;
  const halfDifference = (varianceX - varianceY) / 2;
  const radius = Math.hypot(halfDifference, covariance);
  return {
    aMm: Math.sqrt(Math.max(0, mean + radius)),
    bMm: Math.sqrt(Math.max(0, mean - radius)),
    angleDeg: radius === 0 ? 0 : (Math.atan2(covariance, halfDifference) * 90) / Math.PI,
  };
}
