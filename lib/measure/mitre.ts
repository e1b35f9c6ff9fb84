/** Saw angles for the corners as they are. */
import { type Outcome, problem, refused } from '@/lib/problem';
import { type Figure, figure } from './figure';
import { isMeasured, type Measured } from './measured';

export type HalfMitre = {
  /** Angle of each piece at the corner, θ/2, degrees. */
  piece: Figure;
  /** What the saw's scale reads, |90 − θ/2|, degrees. */
  saw: Figure;
};

/**
 * Mitre of an exposed kick or panel corner: each piece at half the corner.
 *
 * Edge: an outside corner (θ over 180) gives the same saw reading as 360 − θ, cut the other way. A built
 * cabinet corner uses the angle it is built to, with u = 0.
 * Example: θ = 91° → pieces of 45.5°, the saw reads 44.5°.
 * Problems: `angle-impossible`. Source: geometry; common practice.
 */
export function halfMitre(corner: Measured): Outcome<HalfMitre> {
  if (!isAngle(corner)) return refused(impossible(corner));
  return {
    value: {
      piece: figure(corner.value / 2, corner.u / 2, corner.from),
      saw: figure(Math.abs(90 - corner.value / 2), corner.u / 2, corner.from),
    },
    problems: [],
  };
}

export type CrownMitre = {
  /** Turn of the saw's table, degrees. */
  mitre: Figure;
  /** Tilt of the blade, degrees. */
  bevel: Figure;
  /** Outside corners are cut the other way. */
  corner: 'inside' | 'outside';
};

/**
 * Compound cut of a crown moulding laid flat on the saw.
 *
 * Spring: between the back of the moulding and the WALL. Corner θ: interior angle of the two walls.
 * mitre = atan(sin s / tan(θ/2)), bevel = asin(cos s · cos(θ/2)); sizes only, so 270° cuts as 90°.
 * Edge: a straight wall (180°) needs neither. Example: 38° spring, 90° corner: 31.62° and 33.86°.
 * Problems: `angle-impossible`. Source: compound-mitre formula, checked against the printed tables of
 * three saw manuals and Corwin's table for 38° (tests/reference).
 */
export function crownMitre(spring: Measured, corner: Measured): Outcome<CrownMitre> {
  if (!isAngle(corner)) return refused(impossible(corner));
  if (!isAngle(spring) || spring.value >= 90) return refused(impossible(spring));
  const springRad = (spring.value * Math.PI) / 180;
  const half = (corner.value * Math.PI) / 360;
  const [sinS, cosS] = [Math.sin(springRad), Math.cos(springRad)];
  const [sinHalf, cosHalf] = [Math.sin(half), Math.abs(Math.cos(half))];
  const mitre = Math.atan2(sinS * cosHalf, sinHalf);
  const bevel = Math.asin(cosS * cosHalf);
  const squared = sinHalf ** 2 + (sinS * cosHalf) ** 2;
  const level = Math.sqrt(1 - (cosS * cosHalf) ** 2);
  const from = [...spring.from, ...corner.from];
  const u = (bySpring: number, byHalf: number) =>
    Math.hypot(bySpring * spring.u, (byHalf * corner.u) / 2);
  return {
    value: {
      mitre: figure(degrees(mitre), u((cosS * sinHalf * cosHalf) / squared, sinS / squared), from),
      bevel: figure(degrees(bevel), u((sinS * cosHalf) / level, (cosS * sinHalf) / level), from),
      corner: corner.value > 180 ? 'outside' : 'inside',
    },
    problems: [],
  };
}

const degrees = (radians: number) => (radians * 180) / Math.PI;
const isAngle = (angle: Measured) => isMeasured(angle) && angle.value > 0 && angle.value < 360;
const impossible = (angle: Measured) =>
  problem('angle-impossible', 'This angle cannot be true. Take it again.', angle.from);
