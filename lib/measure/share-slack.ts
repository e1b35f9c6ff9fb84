/** Sharing the slack of a run between its two ends, and the verdict on it. */

export type SlackShare =
  | { how: 'equal' }
  | { how: 'left' }
  | { how: 'right' }
  | { how: 'centred'; unitId: string; markMm: number };

export type RunVerdict = 'fits' | 'tight' | 'loose' | 'short';

export type EndLimit = {
  /** Least and greatest face width; an open end has 0 and no greatest. */
  leastMm: number;
  mostMm: number;
  isOpen: boolean;
};

/** What any choice of widths is judged by; none of it depends on the widths. */
export type ShareLimits =
  | {
      how: 'equal' | 'left' | 'right';
      left: EndLimit;
      right: EndLimit;
      /** Between the two ends in the filler plane, less what the joints grow. */
      spanMm: number;
      /** What U takes off the slack before the least is broken. */
      safetyMm: number;
    }
  | {
      how: 'centred';
      left: EndLimit;
      right: EndLimit;
      /** From the end to the mark, less the joints on that side. */
      leftSpanMm: number;
      rightSpanMm: number;
      leftSafetyMm: number;
      rightSafetyMm: number;
    };

/** Widths on either side of the sharing point; everything is left where nothing is centred. */
export type WidthSums = { leftMm: number; rightMm: number };

/** Within this a limit is kept. */
export const ON_THE_LIMIT_MM = 1e-6;

export type SharedSlack = {
  leftFaceMm: number;
  rightFaceMm: number;
  /** Part of the slack's change that goes to the left: 0, ½ or 1; null where a mark decides. */
  leftPart: number | null;
};

/**
 * Shares what is left of the span: equal (as the leasts and greatests allow), all left, all right, by a mark.
 * Edge rule: a closed end opposite an open one is at its least. Units: mm. Example: span 100, leasts 25,
 * greatests 75, units 0, equal: 50 and 50; all left: 75 and 25. Problems: none. Source: common practice.
 */
export function shareSlack(limits: ShareLimits, sums: WidthSums): SharedSlack {
  if (limits.how === 'centred') {
    return {
      leftFaceMm: limits.leftSpanMm - sums.leftMm,
      rightFaceMm: limits.rightSpanMm - sums.rightMm,
      leftPart: null,
    };
  }
  const { left, right, how } = limits;
  const totalMm = limits.spanMm - sums.leftMm - sums.rightMm;
  const allLeft = { leftFaceMm: totalMm - right.leastMm, rightFaceMm: right.leastMm, leftPart: 1 };
  const allRight = { leftFaceMm: left.leastMm, rightFaceMm: totalMm - left.leastMm, leftPart: 0 };
  if (left.isOpen !== right.isOpen) return left.isOpen ? allLeft : allRight;
  if (how === 'left') return allLeft;
  if (how === 'right') return allRight;
  return equally(totalMm, left, right);
}

function equally(totalMm: number, left: EndLimit, right: EndLimit): SharedSlack {
  const half = totalMm / 2;
  const atLeast = Math.max(left.leastMm, totalMm - right.mostMm);
  const atMost = Math.min(left.mostMm, totalMm - right.leastMm);
  const leftFaceMm = Math.min(Math.max(half, atLeast), Math.max(atLeast, atMost));
  const shared = { leftFaceMm, rightFaceMm: totalMm - leftFaceMm };
  if (leftFaceMm === half) return { ...shared, leftPart: 0.5 };
  const leftIsAtLimit = leftFaceMm === left.leastMm || leftFaceMm === left.mostMm;
  return { ...shared, leftPart: leftIsAtLimit ? 0 : 1 };
}

export type ShareVerdict = {
  run: RunVerdict;
  left: RunVerdict;
  right: RunVerdict;
  toLoseMm: number;
  /** Smallest shift of the mark (positive: to the right) that helps; null where none can or is needed. */
  shiftOfMarkMm: number | null;
};

/**
 * The verdict on these widths, in the order short, loose, tight, fits.
 * Edge rule: within 1e-6 mm a limit is kept. Units: mm. Example: span 40, leasts 25 and 25: short, 10 to
 * lose. Problems: none. Source: common practice.
 */
export function verdictOf(limits: ShareLimits, sums: WidthSums): ShareVerdict {
  const shared = shareSlack(limits, sums);
  const leftSlack = shared.leftFaceMm - limits.left.leastMm;
  const rightSlack = shared.rightFaceMm - limits.right.leastMm;
  const isLoose = (faceMm: number, end: EndLimit) =>
    !end.isOpen && faceMm > end.mostMm + ON_THE_LIMIT_MM;
  const leftLoose = isLoose(shared.leftFaceMm, limits.left);
  const rightLoose = isLoose(shared.rightFaceMm, limits.right);
  const verdict = (short: boolean, loose: boolean, tight: boolean): RunVerdict =>
    short ? 'short' : loose ? 'loose' : tight ? 'tight' : 'fits';
  if (limits.how !== 'centred') {
    const slack = leftSlack + rightSlack;
    const short = slack < -ON_THE_LIMIT_MM;
    const tight = slack - limits.safetyMm < -ON_THE_LIMIT_MM;
    return {
      run: verdict(short, leftLoose || rightLoose, tight),
      left: verdict(short, leftLoose, tight),
      right: verdict(short, rightLoose, tight),
      toLoseMm: short ? -slack : 0,
      shiftOfMarkMm: null,
    };
  }
  const leftShort = leftSlack < -ON_THE_LIMIT_MM;
  const rightShort = rightSlack < -ON_THE_LIMIT_MM;
  const leftTight = leftSlack - limits.leftSafetyMm < -ON_THE_LIMIT_MM;
  const rightTight = rightSlack - limits.rightSafetyMm < -ON_THE_LIMIT_MM;
  const canShift = leftShort !== rightShort && leftSlack + rightSlack >= -ON_THE_LIMIT_MM;
  return {
    run: verdict(leftShort || rightShort, leftLoose || rightLoose, leftTight || rightTight),
    left: verdict(leftShort, leftLoose, leftTight),
    right: verdict(rightShort, rightLoose, rightTight),
    toLoseMm: (leftShort ? -leftSlack : 0) + (rightShort ? -rightSlack : 0),
    shiftOfMarkMm: canShift ? (leftShort ? -leftSlack : rightSlack) : null,
  };
}

/** Between which width sums the verdict is `fits`. */
export function sumsThatFit(limits: ShareLimits): {
  left: readonly [number, number];
  /** [0, 0] where nothing is centred: everything counts as left. */
  right: readonly [number, number];
} {
  const { left, right } = limits;
  const least = (spanMm: number, end: EndLimit) =>
    end.isOpen ? Number.NEGATIVE_INFINITY : spanMm - end.mostMm;
  if (limits.how === 'centred') {
    return {
      left: [
        least(limits.leftSpanMm, left),
        limits.leftSpanMm - left.leastMm - limits.leftSafetyMm,
      ],
      right: [
        least(limits.rightSpanMm, right),
        limits.rightSpanMm - right.leastMm - limits.rightSafetyMm,
      ],
    };
  }
  const mostMm = limits.spanMm - left.leastMm - right.leastMm - limits.safetyMm;
  return { left: [leastSum(limits), mostMm], right: [0, 0] };
}

/** Below this the fillers are wider than the shop allows. */
function leastSum(limits: Exclude<ShareLimits, { how: 'centred' }>): number {
  const { left, right, spanMm, how } = limits;
  if (left.isOpen || right.isOpen) return Number.NEGATIVE_INFINITY;
  if (how === 'left') return spanMm - left.mostMm - right.leastMm;
  if (how === 'right') return spanMm - left.leastMm - right.mostMm;
  return spanMm - left.mostMm - right.mostMm;
}
