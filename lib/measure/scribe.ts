import { type Outcome, type Problem, problem, refused } from '@/lib/problem';
import { roundBlankUp } from '@/lib/units/round';
import { type Figure, figure } from './figure';
import { unreadable } from './reading-problems';

/** The gap (or face width) at one place along an edge, `atMm` along it. */
export type EdgePlace = { id: string; atMm: number; gapMm: number; u: number };
export type ScribeRules = { marginMm: number; leastMm: number; stepMm: number };
export type ScribeInput = {
  places: EdgePlace[];
  /** Standard u that every place shares (the run's length, say); 0 where the gaps are read direct. */
  uShared: number;
  /**
   * by-size: the piece is cut to a size (filler, crown, kick face), so what counts is how sure the
   * greatest gap is. at-contact: it is pushed to the wall and drawn (finished end), so what counts is how
   * sure the greatest less the least is.
   */
  held: 'by-size' | 'at-contact';
  rules: ScribeRules;
};
export type ScribeAllowance = {
  /** Greatest less least gap. */
  outOfTrue: Figure;
  /** Out of true + U + margin, or the least scribe: not rounded, for sums that are rounded once. */
  unrounded: Figure;
  /** Rounded up to the shop's step. */
  roundedUpMm: number;
  governedBy: 'edge' | 'least-scribe';
  least: EdgePlace;
  greatest: EdgePlace;
};

/**
 * What is left on an edge to be scribed: its out-of-true beyond first contact + U + the shop's margin.
 * Edge rule: never under the shop's least scribe; rounded up to its step. A blank is the LEAST gap plus
 * the unrounded allowance, rounded up once: held by size that is the greatest + U + margin.
 * Units: mm.
 * Example: face widths 38, 41, 40, u 0.5 each, margin 3, least 6, step 1, by size: out of true 3,
 * 3 + 1 + 3 = 7 → 7 mm; the blank is 38 + 7 = 45.
 * Problems: edge-not-read, reading-not-a-number, uncertainty-not-known, rules-not-known.
 * Source: common practice, no source; U = 2u, JCGM 100:2008, 6.2.1.
 */
export function scribeAllowance(input: ScribeInput): Outcome<ScribeAllowance> {
  const { places, uShared, held, rules } = input;
  const bad = unreadable([
    ...places.map(({ id, atMm, gapMm, u }) => ({ id, values: [atMm, gapMm], u })),
    { id: null, values: [], u: uShared },
  ]);
  if (bad.length > 0) return refused(...bad);
  const wrong = refuseScribeRules(rules);
  if (wrong.length > 0) return refused(...wrong);
  const [first] = places;
  if (first === undefined) {
    return refused(problem('edge-not-read', 'No gap along this edge has been read.'));
  }
  let [least, greatest] = [first, first];
  for (const place of places) {
    if (place.gapMm < least.gapMm) least = place;
    if (place.gapMm > greatest.gapMm) greatest = place;
  }
  const outOfTrue = spreadOf(least, greatest);
  const u = held === 'by-size' ? Math.hypot(greatest.u, uShared) : outOfTrue.u;
  const { marginMm, leastMm, stepMm } = rules;
  const needed = outOfTrue.value + 2 * u + marginMm;
  if (!Number.isFinite(needed / stepMm)) {
    return refused(problem('uncertainty-not-known', 'This edge is too unsure to be cut by.'));
  }
  const unrounded = figure(Math.max(needed, leastMm), u, outOfTrue.from);
  const value: ScribeAllowance = {
    outOfTrue,
    unrounded,
    roundedUpMm: roundBlankUp(unrounded.value, stepMm),
    governedBy: needed >= leastMm ? 'edge' : 'least-scribe',
    least,
    greatest,
  };
  return { value, problems: [] };
}

/** A shop's scribe rules that no edge can be cut by. */
export function refuseScribeRules({ marginMm, leastMm, stepMm }: ScribeRules): Problem[] {
  const steps = (marginMm + leastMm) / stepMm;
  if (marginMm >= 0 && leastMm >= 0 && stepMm > 0 && stepMm < Infinity && steps < Infinity)
    return [];
  const words = 'The shop’s scribe rules are lengths from 0 up, its step above 0.';
  return [problem('rules-not-known', words)];
}

function spreadOf(least: EdgePlace, greatest: EdgePlace): Figure {
  if (least === greatest) return figure(0, least.u, [least.id]);
  const u = Math.hypot(least.u, greatest.u);
  return figure(greatest.gapMm - least.gapMm, u, [greatest.id, least.id]);
}
