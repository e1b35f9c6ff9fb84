import { type Outcome, type Problem, problem, refused, warning } from '@/lib/problem';
import { bothUnits } from '@/lib/units/both-units';
import { type Figure, figure } from './figure';
import type { Read } from './read';
import { unreadable } from './reading-problems';

/** A corner taken by two legs and a diagonal, in mm. Left arm: the wall before; right arm: this wall. */
export type CornerLegs = {
  method: 'legs';
  legLeft: Read;
  legRight: Read;
  diagonal: Read;
  /** Outside corner: the left leg lies on a straightedge carried past the corner. */
  carriedPast: boolean;
  /** u of a leg or diagonal of another length, for the advice on longer legs; left out: the same u. */
  uOfLength?: (lengthMm: number) => number;
};
/** A corner taken with an angle finder: the interior angle in degrees. */
export type CornerAngleRead = { method: 'angle'; angle: Read };

/** Legs under this make a corner unsure. Common practice, no source. */
const SHORT_LEG_MM = 600;
/** Nearer than this to straight, a diagonal hardly moves with the angle. Common practice, no source. */
const TOO_FLAT_DEG = 15;
/** Anything shorter is no leg. */
const LEAST_LEG_MM = 1;
const DEGREES = 180 / Math.PI;

/**
 * Interior angle of a corner as read, degrees: θ = acos((a² + b² − c²)/2ab), or as an angle finder says.
 * Edge rule: an outside corner's left leg is carried past it and θ = 180 + acos(…). The angle belongs to
 * the lines from the corner to the marks (`chordAngle` carries it to the straight wall). Each reading's
 * u counts for itself: an error the tape makes in all three mostly cancels, so U is on the safe side.
 * Units: mm in, degrees out, 1 ≤ θ < 360.
 * Example: 900, 1200, 1500 → 90.000°; u 0.5 mm each → u = 0.0563°.
 * Problems: reading-not-a-number, uncertainty-not-known, leg-not-positive, diagonal-too-long,
 * diagonal-too-short, too-flat, too-sharp, angle-out-of-range; warning short-legs.
 * Source: law of cosines; JCGM 100:2008, 5.1.2.
 */
export function cornerAngle(input: CornerLegs | CornerAngleRead): Outcome<Figure> {
  if (input.method === 'legs') return angleOfLegs(input);
  const { id, value, u } = input.angle;
  const bad = unreadable([{ id, values: [value], u }]);
  if (bad.length > 0) return refused(...bad);
  if (value < 1 || value >= 360) {
    return refused(
      problem('angle-out-of-range', 'A corner is between 1° and 360°. Read it again.', [id]),
    );
  }
  return { value: figure(value, u, [id]), problems: [] };
}

/**
 * Where the left arm's face stands at a depth, along +x from the corner, mm: depth / tan θ.
 * Edge rule: positive where it is in the way at the front (θ < 90); from 180° on the end is open.
 * Units: degrees and mm in, mm out.
 * Example: 89.5° over 600 mm → 5.236 mm; u(θ) = 0.1° → u = 600/sin²θ · 0.001745 = 1.047 mm.
 * Problems: end-open, angle-out-of-range, depth-not-positive, reading-not-a-number,
 * uncertainty-not-known. Source: elementary geometry.
 */
export function cornerOffset(theta: Figure, depthMm: number): Outcome<Figure> {
  const bad = unreadable([{ id: null, values: [depthMm], u: theta.u }]);
  if (bad.length > 0) return refused(...bad);
  if (depthMm < 0) {
    return refused(problem('depth-not-positive', 'The depth is a length from 0 up.', theta.from));
  }
  if (!(theta.value >= 1 && theta.value < 360)) {
    return refused(
      problem('angle-out-of-range', 'A corner is between 1° and 360°. Read it again.', theta.from),
    );
  }
  if (theta.value >= 180) {
    const open = 'This end is open: the wall turns away, and nothing is in the way.';
    return refused(problem('end-open', open, theta.from));
  }
  const radians = theta.value / DEGREES;
  const sine = Math.sin(radians);
  const u = ((depthMm / (sine * sine)) * theta.u) / DEGREES;
  return { value: figure((depthMm * Math.cos(radians)) / sine, u, theta.from), problems: [] };
}

function angleOfLegs(input: CornerLegs): Outcome<Figure> {
  const reads = [input.legLeft, input.legRight, input.diagonal];
  const bad = unreadable(reads.map(({ id, value, u }) => ({ id, values: [value], u })));
  if (bad.length > 0) return refused(...bad);
  const none = reads.filter(({ value }) => value < LEAST_LEG_MM).map(({ id }) => id);
  if (none.length > 0) {
    return refused(
      problem('leg-not-positive', 'Legs and diagonal are longer than 0. Read them again.', none),
    );
  }
  const impossible = impossibleTriangle(input);
  if (impossible !== null) return refused(impossible);
  const theta = angleFigure(input);
  return { value: theta, problems: shortLegs(input, theta) };
}

/** θ and u(θ) of a triangle that can be. */
function angleFigure({ legLeft, legRight, diagonal, carriedPast }: CornerLegs): Figure {
  const [a, b, c] = [legLeft.value, legRight.value, diagonal.value];
  const cosine = (a * a + b * b - c * c) / (2 * a * b);
  const sine = Math.sqrt(1 - cosine * cosine);
  const byLeft = (cosine / a - 1 / b) / sine;
  const byRight = (cosine / b - 1 / a) / sine;
  const byDiagonal = c / (a * b * sine);
  const u = Math.hypot(byLeft * legLeft.u, byRight * legRight.u, byDiagonal * diagonal.u) * DEGREES;
  const from = [...new Set([legLeft.id, legRight.id, diagonal.id])];
  return figure((carriedPast ? 180 : 0) + Math.acos(cosine) * DEGREES, u, from);
}

function impossibleTriangle(input: CornerLegs): Problem | null {
  const { legLeft, legRight, diagonal, carriedPast } = input;
  const about = [...new Set([legLeft.id, legRight.id, diagonal.id])];
  const doubt = 2 * Math.hypot(legLeft.u, legRight.u, diagonal.u);
  const [a, b, c] = [legLeft.value, legRight.value, diagonal.value];
  if (c - (a + b) > doubt) {
    const words = 'The diagonal is longer than both legs together. Read it again.';
    return problem('diagonal-too-long', words, about);
  }
  if (Math.abs(a - b) - c > doubt) {
    const words = 'The diagonal is shorter than the legs allow. Read it again.';
    return problem('diagonal-too-short', words, about);
  }
  const cosine = Math.min(1, Math.max(-1, (a * a + b * b - c * c) / (2 * a * b)));
  const between = Math.acos(cosine) * DEGREES;
  const fromStraight = carriedPast ? between : 180 - between;
  if (fromStraight < TOO_FLAT_DEG) {
    const words =
      'Too flat to take by a diagonal. Use an angle finder, or read gaps to a straightedge.';
    return problem('too-flat', words, about);
  }
  if (180 - fromStraight < TOO_FLAT_DEG) {
    const words = 'Too sharp to be a corner of a room. Read the legs and the diagonal again.';
    return problem('too-sharp', words, about);
  }
  return null;
}

function shortLegs(input: CornerLegs, theta: Figure): Problem[] {
  const shorter = Math.min(input.legLeft.value, input.legRight.value);
  if (shorter >= SHORT_LEG_MM) return [];
  const longer = legsThatHalveU(input, theta);
  const sure = `Short legs: the corner is sure to ±${theta.U.toFixed(2)}° only.`;
  const advice =
    longer === null
      ? 'Longer legs would make it surer.'
      : `Legs of ${bothUnits(longer.leftMm)} and ${bothUnits(longer.rightMm)} would halve that.`;
  return [warning('short-legs', `${sure} ${advice}`, theta.from)];
}

/** The shortest legs in the same proportion, to whole 50 mm, that halve U; null past tenfold. */
function legsThatHalveU(input: CornerLegs, theta: Figure) {
  const { legLeft, legRight, diagonal, uOfLength } = input;
  for (let percent = 110; percent <= 1_000; percent += 10) {
    const longer = (read: Read): Read => {
      const value = (read.value * percent) / 100;
      return { ...read, value, u: uOfLength ? uOfLength(value) : read.u };
    };
    const [left, right] = [longer(legLeft), longer(legRight)];
    const { U } = angleFigure({
      ...input,
      legLeft: left,
      legRight: right,
      diagonal: longer(diagonal),
    });
    if (U > theta.U / 2 + 1e-12) continue;
    const to50 = (value: number) => Math.ceil(value / 50 - 1e-9) * 50;
    return { leftMm: to50(left.value), rightMm: to50(right.value) };
  }
  return null;
}
