/** Rounding of cut sizes to the shop's step. Add up unrounded, round once; the name says which way. */

/** Closer to a mark than this, a value is on it: sums of sixteenths in binary miss by 1e-13 mm. */
const ON_THE_MARK_MM = 1e-6;

/**
 * Rounds a size up to the step, so that a blank, a U or a projection is never too small.
 * Edge rule: within 1e-6 mm of a mark is on it. Units: mm.
 * Example: 95.3 mm at 1/16 in (1.5875 mm) → 96.8375 mm; 95.25 mm stays.
 * Throws RangeError on a size that is not finite or a step that is not above 0 (a programmer's error).
 * Source: common practice (stock is cut down, never up).
 */
export function roundBlankUp(mm: number, stepMm: number): number {
  return onTheMark(mm, stepMm) ?? withoutMinusZero(Math.ceil(mm / stepMm) * stepMm);
}

/**
 * Rounds a size down to the step, so that an opening, a clear height or an aisle is never promised.
 * Edge rule: within 1e-6 mm of a mark is on it. Units: mm.
 * Example: 876.9 mm at 1 mm → 876 mm; 876.9999999 mm → 877 mm.
 * Throws as `roundBlankUp`. Source: common practice; limits rounded inward as in ASME A112.18.1 annex A.
 */
export function roundOpeningDown(mm: number, stepMm: number): number {
  return onTheMark(mm, stepMm) ?? withoutMinusZero(Math.floor(mm / stepMm) * stepMm);
}

/**
 * Rounds a size to the nearest step.
 * Edge rule: a tie (within 1e-6 mm) goes away from zero. Units: mm.
 * Example: 0.79375 mm (1/32 in) at 1/16 in → 1.5875 mm; −2.5 mm at 1 mm → −3 mm.
 * Throws as `roundBlankUp`. Source: common practice.
 */
export function roundNearest(mm: number, stepMm: number): number {
  const marked = onTheMark(mm, stepMm);
  if (marked !== null) return marked;
  const steps = Math.floor((Math.abs(mm) + ON_THE_MARK_MM) / stepMm + 0.5);
  return withoutMinusZero(Math.sign(mm) * steps * stepMm);
}

function onTheMark(mm: number, stepMm: number): number | null {
  if (!Number.isFinite(mm) || !Number.isFinite(stepMm) || stepMm <= 0) {
    throw new RangeError(`cannot round ${mm} mm to a step of ${stepMm} mm`);
  }
  const mark = Math.round(mm / stepMm) * stepMm;
  return Math.abs(mm - mark) <= ON_THE_MARK_MM ? withoutMinusZero(mark) : null;
}

function withoutMinusZero(value: number): number {
  return value === 0 ? 0 : value;
}
