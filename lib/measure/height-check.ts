import { type Figure, figure } from './figure';

export type HeightCheck = {
  height: Figure;
  needMm: number;
  /** height − need. */
  margin: Figure;
  /** in-doubt: enough as read, or too low as read, by less than U. */
  verdict: 'enough' | 'in-doubt' | 'too-low';
};

/**
 * A clear height against what is needed.
 * Edge rule: a margin smaller than its own U is in doubt, either way.
 * Example: 865 ± 2 (U) against 863 → margin 2: in doubt; against 860 → enough.
 * Source: JCGM 106:2012 (guard band of one U).
 */
export function heightCheck(height: Figure, needMm: number): HeightCheck {
  const margin = figure(height.value - needMm, height.u, height.from);
  const verdict =
    margin.value >= margin.U ? 'enough' : margin.value <= -margin.U ? 'too-low' : 'in-doubt';
  return { height, needMm, margin, verdict };
}
