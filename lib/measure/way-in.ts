/** Does the box come through the doorway, and round the corner of the passage behind it? */
import { type Outcome, problem, refused } from '@/lib/problem';
import { bothUnits } from '@/lib/units/both-units';
import { type Figure, figure } from './figure';
import { isMeasured, isSize, type Measured } from './measured';

export type Box = { widthMm: number; depthMm: number; heightMm: number };

export type Passes = {
  passes: boolean;
  /** Room to spare at the tightest; negative: by how much it fails. */
  margin: Figure;
  /** Straight: two sides as they are. Leaning: those two sides turned in the opening. */
  how: 'straight' | 'leaning' | 'not';
  words: string;
};

/**
 * Whether a box passes a doorway, its two smaller sides going first.
 *
 * Clear width is past the leaf and the stop. Edge: it passes only when the margin is at least its U.
 * Leaning is the largest rectangle test: a × b turned in the opening.
 * Example: 600 × 580 × 2150 through 762 × 1981 (± 1): passes, 182 to spare.
 * Problems: `size-impossible`. Source: common practice; leaning: Carver, "Boxes, rectangles", 1957,
 * recalled.
 */
export function passesDoor(
  box: Box,
  doorway: { clearWidth: Measured; clearHeight: Measured },
): Outcome<Passes> {
  const { clearWidth, clearHeight } = doorway;
  const sides = [box.widthMm, box.depthMm, box.heightMm].sort((a, b) => a - b);
  const [thin = 0, middle = 0] = sides;
  if (!sides.every(isSize) || ![clearWidth, clearHeight].every(isClear)) {
    return refused(impossible([...clearWidth.from, ...clearHeight.from]));
  }
  const straight = Math.max(
    Math.min(clearWidth.value - thin, clearHeight.value - middle),
    Math.min(clearWidth.value - middle, clearHeight.value - thin),
  );
  const narrow = Math.min(clearWidth.value, clearHeight.value);
  const wide = Math.max(clearWidth.value, clearHeight.value);
  const leaning = middle > wide ? narrow - leastOpeningLeaning(thin, middle, wide) : -Infinity;
  const u = Math.max(clearWidth.u, clearHeight.u);
  const margin = figure(Math.max(straight, leaning), u, [...clearWidth.from, ...clearHeight.from]);
  const passes = margin.value >= margin.U;
  const how = !passes ? 'not' : straight >= leaning ? 'straight' : 'leaning';
  return { value: { passes, margin, how, words: doorWords(how, margin) }, problems: [] };
}

/** The narrow side of an opening that a rectangle thin × middle needs when it is turned in it. */
function leastOpeningLeaning(thin: number, middle: number, wide: number): number {
  const squares = thin * thin + middle * middle;
  if (squares <= wide * wide) return thin;
  return (
    (2 * thin * middle * wide +
      (middle * middle - thin * thin) * Math.sqrt(squares - wide * wide)) /
    squares
  );
}

function doorWords(how: Passes['how'], margin: Figure): string {
  const size = bothUnits(Math.abs(margin.value));
  if (how === 'straight') return `Goes straight through, ${size} to spare.`;
  if (how === 'leaning') return `Goes through leaning, ${size} to spare.`;
  if (margin.value < 0) return `Too big for this doorway by ${size}.`;
  return `Only ${size} to spare, less than the readings are sure of. Measure the doorway again.`;
}

export type Turns = {
  passes: boolean;
  /** Room to spare in the best way found; negative: by how much it fails. */
  margin: Figure;
  how: 'turning' | 'sliding' | 'not';
  /** Which side of the box stands upright in the best way. */
  upright: keyof Box;
  words: string;
};

/**
 * Whether a box gets round the corner of an L-shaped passage, each of its sides tried upright.
 *
 * Turning: thickness t ≤ min(p, q) and length ℓ ≤ min over α of (p sin α + q cos α − t)/(sin α cos α).
 * Sliding, without turning: t ≤ p and ℓ ≤ q, or t ≤ q and ℓ ≤ p. Widths in mm.
 * Edge: no known height lets any side stand upright; it passes only when the margin is at least its U.
 * Example: a board of no thickness in passages of 1000 and 1000 turns up to 2828 long.
 * Problems: `size-impossible`. Source: the ladder problem, with thickness; common practice.
 */
export function turnsCorner(
  box: Box,
  passage: { widthIn: Measured; widthOut: Measured; clearHeight: Measured | null },
): Outcome<Turns> {
  const { widthIn, widthOut, clearHeight } = passage;
  const from = [...widthIn.from, ...widthOut.from, ...(clearHeight?.from ?? [])];
  const sizes = [box.widthMm, box.depthMm, box.heightMm];
  const clears = clearHeight ? [widthIn, widthOut, clearHeight] : [widthIn, widthOut];
  if (!sizes.every(isSize) || !clears.every(isClear)) return refused(impossible(from));
  const ways = (['heightMm', 'widthMm', 'depthMm'] as const).flatMap((upright) => {
    const lying = (['widthMm', 'depthMm', 'heightMm'] as const).filter((side) => side !== upright);
    const [one = 0, other = 0] = lying.map((side) => box[side]);
    const length = Math.max(one, other);
    const thickness = Math.min(one, other);
    const over = clearHeight
      ? { value: clearHeight.value - box[upright], u: clearHeight.u }
      : { value: Infinity, u: 0 };
    return (['sliding', 'turning'] as const).map((how) => {
      const way = how === 'sliding' ? sliding : turning;
      return { how, upright, ...lesser(way(length, thickness, widthIn, widthOut), over) };
    });
  });
  const best = ways.reduce((most, way) =>
    way.value - 2 * way.u > most.value - 2 * most.u ? way : most,
  );
  const margin = figure(best.value, best.u, from);
  const passes = margin.value >= margin.U;
  const how = passes ? best.how : 'not';
  const size = bothUnits(Math.abs(margin.value));
  const words = passes
    ? `Gets round the corner ${how}, ${size} to spare.`
    : margin.value < 0
      ? `Does not get round the corner: ${size} too long.`
      : `Only ${size} to spare, less than the readings are sure of. Measure the passage again.`;
  return { value: { passes, margin, how, upright: best.upright, words }, problems: [] };
}

type Margin = { value: number; u: number };

const lesser = (one: Margin, other: Margin) => (other.value < one.value ? other : one);

function turning(length: number, thickness: number, p: Measured, q: Measured): Margin {
  const narrow = p.value < q.value ? p : q;
  const beside = { value: narrow.value - thickness, u: narrow.u };
  if (beside.value < 0) return beside;
  const reach = (angle: number) =>
    (p.value * Math.sin(angle) + q.value * Math.cos(angle) - thickness) /
    (Math.sin(angle) * Math.cos(angle));
  const angle = leastAt(reach);
  const u = Math.hypot(p.u / Math.cos(angle), q.u / Math.sin(angle));
  return lesser({ value: reach(angle) - length, u }, beside);
}

function sliding(length: number, thickness: number, p: Measured, q: Measured): Margin {
  return [
    [p, q],
    [q, p],
  ]
    .map(([across, along]) => ({
      value: Math.min((across?.value ?? 0) - thickness, (along?.value ?? 0) - length),
      u: Math.max(p.u, q.u),
    }))
    .reduce((most, way) => (way.value > most.value ? way : most));
}

/** Angle of the least of a function on (0°, 90°): a sweep, then golden section about the best. */
function leastAt(of: (angle: number) => number): number {
  const steps = 180;
  let best = 1;
  for (let i = 1; i < steps; i++) {
    if (of((i * Math.PI) / 2 / steps) < of((best * Math.PI) / 2 / steps)) best = i;
  }
  let low = ((best - 1) * Math.PI) / 2 / steps;
  let high = ((best + 1) * Math.PI) / 2 / steps;
  const golden = (Math.sqrt(5) - 1) / 2;
  while (high - low > 1e-9) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    if (of(left) < of(right)) high = right;
    else low = left;
  }
  return (low + high) / 2;
}

const isClear = (clear: Measured) => isMeasured(clear) && isSize(clear.value);
const impossible = (about: string[]) =>
  problem('size-impossible', 'A size of the box or of the way in cannot be true.', about);
