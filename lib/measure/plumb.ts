import { type Outcome, problem, refused } from '@/lib/problem';
import { type Combination, combinationFigure, combine } from './combination';
import { type Figure, figure } from './figure';
import { leastSquaresLine } from './least-squares-line';
import { stripPoint } from './narrowest-strip';
import type { ProfilePoint } from './profile';
import { unreadable } from './reading-problems';

export type Plumb = {
  /** mm per mm: positive leans into the room upward. */
  lean: Figure;
  /** The same in mm per metre. */
  perMetre: Figure;
  /** The same over `overMm`. */
  over: Figure;
  overMm: number;
  leans: 'in' | 'out' | 'plumb';
  /** Greatest less least residual about the line. */
  outOfStraight: Figure;
};
export type PlumbInput = {
  /** `atMm` is z. */
  points: ProfilePoint[];
  /** Standard u of the plumb reference itself, mm per mm (`slopeUncertainty`). */
  uReference: number;
  /** Height over which the lean is wanted. */
  overMm: number;
};

/** No reading is surer than a nanometre, so that its weight stays a number. */
const LEAST_U = 1e-6;

/**
 * Lean of one column of face readings: the slope of the least-squares line, weighed by 1/u².
 * Edge rule: smaller than its own U it is plumb. Two readings give a lean, three show its straightness.
 * Units and signs: mm; z up, s positive into the room; lean positive into the room as z grows; one set-up.
 * Example: s 0, 2, 4 at z 100, 1100, 2100 → lean 0.002, 2 mm/m, 4.8 mm over 2400, leans in.
 * Problems: too-few-heights, reading-not-a-number, uncertainty-not-known.
 * Source: least squares, JCGM 100:2008 annex H.3; mm per metre: common practice.
 */
export function plumbOf(input: PlumbInput): Outcome<Plumb> {
  const leaning = leanOfColumn(input);
  if (!leaning.value) return { value: null, problems: leaning.problems };
  const { spread, ...lean } = leaning.value;
  return { value: { ...lean, outOfStraight: combinationFigure(spread()) }, problems: [] };
}

export type ColumnLean = Omit<Plumb, 'outOfStraight'> & { spread: () => Combination };

/** As `plumbOf`, the column's own straightness only when asked for. */
export function leanOfColumn({ points, uReference, overMm }: PlumbInput): Outcome<ColumnLean> {
  const bad = unreadable([
    ...points.map(({ id, atMm, sMm, u }) => ({ id, values: [atMm, sMm], u })),
    { id: null, values: [overMm], u: uReference },
  ]);
  if (bad.length > 0) return refused(...bad);
  const weights = points.map(({ u }) => 1 / Math.max(u, LEAST_U) ** 2);
  const fit = leastSquaresLine(points.map(stripPoint), weights);
  if (fit === null) {
    const words = 'A lean needs readings at two heights. Read the same place higher or lower.';
    return refused(
      problem(
        'too-few-heights',
        words,
        points.map(({ id }) => id),
      ),
    );
  }
  const reference = { source: { ids: [], u: uReference }, weight: 1 };
  const slope = combine([
    [1, fit.slope],
    [1, { value: 0, parts: [reference] }],
  ]);
  const lean = combinationFigure(slope);
  const leans = Math.abs(lean.value) <= lean.U ? 'plumb' : lean.value > 0 ? 'in' : 'out';
  const value: ColumnLean = {
    lean,
    perMetre: times(1000, lean),
    over: times(overMm, lean),
    overMm,
    leans,
    spread: fit.spread,
  };
  return { value, problems: [] };
}

function times(factor: number, { value, u, from }: Figure): Figure {
  return figure(factor * value, Math.abs(factor) * u, from);
}
