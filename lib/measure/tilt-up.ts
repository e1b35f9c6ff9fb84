/** Can a tall unit be stood up where it is to stand? */
import { type Outcome, problem, refused } from '@/lib/problem';
import { bothUnits } from '@/lib/units/both-units';
import { type Figure, figure } from './figure';
import { isMeasured, isSize, type Measured } from './measured';

export type TallUnit = {
  /** Of the box, without a kick base that comes off. */
  heightMm: number;
  widthMm: number;
  depthMm: number;
  /** Kick base: built on, or set first with the box lifted onto it. */
  kickMm: number;
  kickComesOff: boolean;
};

export type TiltUp = {
  standsUp: boolean;
  /** Least clear height where it is tilted, less diagonal and margin. */
  tiltMargin: Figure;
  /** Clear height where it will stand, less height, kick and lift. */
  standMargin: Figure;
  diagonalMm: number;
  words: string;
  /** What would help, best first; empty when it stands up. */
  helps: string[];
};

export type TiltUpInput = {
  unit: TallUnit;
  /** Least clear height over the floor where it is tilted. */
  clearWhereTilted: Measured;
  clearWhereItStands: Measured;
  /** The shop's air over the corner while it is stood up. */
  marginMm: number;
  /** How far it must be lifted to set it on its base. */
  liftMm: number;
};

/**
 * A tall unit stands up only if √(h² + min(d, w)²) + margin + U ≤ the least clear height where it is
 * tilted, and h + kick + lift + U ≤ the clear height where it will stand.
 *
 * Edge: a kick base that comes off is left off while tilting; one built on counts in h.
 * Example: 2150 × 600 × 580 under 2400 ± 2 (U), margin 12: the diagonal is 2226.9, 161.1 to spare.
 * Problems: `size-impossible`. Source: geometry; the margin is common practice, no source.
 */
export function tiltUp(input: TiltUpInput): Outcome<TiltUp> {
  const { unit, clearWhereTilted, clearWhereItStands, marginMm, liftMm } = input;
  const sizes = [unit.heightMm, unit.widthMm, unit.depthMm];
  const clears = [clearWhereTilted, clearWhereItStands];
  const isClear = (clear: Measured) => isMeasured(clear) && isSize(clear.value);
  const extras = [unit.kickMm, marginMm, liftMm];
  if (
    !sizes.every(isSize) ||
    !clears.every(isClear) ||
    !extras.every((mm) => mm === 0 || isSize(mm))
  ) {
    const from = clears.flatMap((clear) => clear.from);
    return refused(problem('size-impossible', 'A size or a clear height cannot be true.', from));
  }
  const tilted = unit.kickComesOff ? unit.heightMm : unit.heightMm + unit.kickMm;
  const diagonalMm = Math.hypot(tilted, Math.min(unit.depthMm, unit.widthMm));
  const tiltMargin = spare(clearWhereTilted, diagonalMm + marginMm);
  const standMargin = spare(clearWhereItStands, unit.heightMm + unit.kickMm + liftMm);
  const tilts = tiltMargin.value >= tiltMargin.U;
  const stands = standMargin.value >= standMargin.U;
  return {
    value: {
      standsUp: tilts && stands,
      tiltMargin,
      standMargin,
      diagonalMm,
      words: wordsOf(tilts, stands, tiltMargin, standMargin),
      helps: tilts && stands ? [] : helpsOf(input, tilts, stands),
    },
    problems: [],
  };
}

function wordsOf(tilts: boolean, stands: boolean, tilt: Figure, stand: Figure): string {
  if (tilts && stands) {
    return `Stands up with ${bothUnits(Math.min(tilt.value, stand.value))} to spare.`;
  }
  const short = stands ? tilt : stand;
  const what = stands ? 'to be stood up' : 'where it will stand';
  if (short.value >= 0) {
    return `Only ${bothUnits(short.value)} to spare ${what}, less than the readings are sure of.`;
  }
  return `Too tall ${what} by ${bothUnits(-short.value)}.`;
}

function helpsOf(input: TiltUpInput, tilts: boolean, stands: boolean): string[] {
  const { unit, clearWhereTilted, marginMm } = input;
  const helps: string[] = [];
  const clear = clearWhereTilted.value - 2 * clearWhereTilted.u - marginMm;
  const side = Math.min(unit.depthMm, unit.widthMm);
  if (!stands) {
    helps.push('Build it lower, or check the clear height where it will stand again.');
  }
  if (!tilts) {
    if (!unit.kickComesOff && unit.kickMm > 0 && Math.hypot(unit.heightMm, side) <= clear) {
      helps.push('Build the kick base loose and set it first.');
    }
    if (clear > side) {
      const highest = Math.sqrt(clear * clear - side * side);
      helps.push(`Build it in two, none higher than ${bothUnits(Math.floor(highest))}.`);
    }
    helps.push('Stand it up in a higher room and walk it in upright, if the way in allows.');
  }
  return helps;
}

const spare = (clear: Measured, takesMm: number) =>
  figure(clear.value - takesMm, clear.u, clear.from);
