/** Readings taken again before setting, held against the sheet that the crew sets by. */
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Reading, ReadingOf, Run, WallBook } from '@/lib/contracts/wall-book';
import type { CornerFit, Fit } from '@/lib/measure/fit';
import { type FitFigure, fitFigure } from '@/lib/measure/fit-figure';
import { fitRoom } from '@/lib/measure/fit-room';
import { standingReadings } from '@/lib/measure/standing-readings';
import { cutChanges } from '@/lib/sheet/cut-changes';
import { figureText } from '@/lib/sheet/figure-text';

export type Released = { wallBook: WallBook; runs: Run[]; rules: FitRules; fit: Fit };

export type AsFound = {
  /** What differs from the release by more than both are sure of, in words; empty when all agrees. */
  disagreements: string[];
  /** What the difference does to the cut sizes: `Sink wall, filler left: blank 2 1/2" is now 2 3/4"`. */
  changes: string[];
};

/** Two places this near are one; refs as for the ties of level lines. */
const SAME_PLACE_MM = 80;

/**
 * Whether the room still is what was released, and if not, which fillers and kicks change.
 *
 * Each corner read again stands in the place of the corner's readings, each drop in the place of the one
 * read there, brought to the measurer's level line at the high point; the room is then fitted anew with the
 * released runs and rules. Two figures disagree when they differ by more than √(U₁² + U₂²), both at k = 2.
 * Units: mm, degrees. Edge: what cannot be fitted again disagrees with nothing, and says nothing.
 * Example: a corner released at 90.0° ± 0.2 and found at 91.0° ± 0.2 differs by 1.0 > 0.28: it is told.
 * Source: ISO/IEC Guide 98-3, 5.1 (uncertainty of a difference of independent readings).
 */
export function asFound(released: Released, readings: readonly Reading[]): AsFound {
  const { wallBook, runs, rules, fit } = released;
  const found = fitRoom(withFound(released, readings), runs, rules);
  const disagreements = [
    ...found.corners.flatMap((corner) => cornerWords(released, corner, readings)),
    ...fallWords(released, readings),
  ];
  if (disagreements.length === 0 || wallBook.readings.length === 0) {
    return { disagreements, changes: [] };
  }
  return { disagreements, changes: cutChanges(fit, found, rules) };
}

/** Nothing to tell: the difference is no larger than what both together are unsure of. */
export function agree(one: FitFigure, other: FitFigure): boolean {
  return Math.abs(one.value - other.value) <= Math.hypot(one.U, other.U) + 1e-9;
}

/** The released book with the new readings in the place of those that they repeat. */
function withFound({ wallBook, fit }: Released, readings: readonly Reading[]): WallBook {
  const standing = standingReadings(wallBook.readings);
  const corners = new Set(
    readings.flatMap((one) => (one.kind === 'corner' ? [one.cornerWallId] : [])),
  );
  const drops = levelled(fit, standing, readings.filter(isDrop));
  const isRepeated = (one: Reading) =>
    (one.kind === 'corner' && corners.has(one.cornerWallId)) ||
    (one.kind === 'floor' && drops.some((drop) => isSamePlace(drop, one)));
  return {
    ...wallBook,
    readings: [
      ...standing.filter((one) => !isRepeated(one)),
      ...readings.filter(({ kind }) => kind === 'corner'),
      ...drops,
    ],
  };
}

/** The crew's level line is its own: its drops are moved so that the high point reads as it did. */
function levelled(
  fit: Fit,
  standing: readonly Reading[],
  drops: readonly ReadingOf<'floor'>[],
): ReadingOf<'floor'>[] {
  const high = standing.find(({ id }) => id === fit.floor?.highPoint.readingId);
  if (!high || !isDrop(high)) return [];
  const again = drops.find((drop) => isSamePlace(drop, high));
  if (!again) return [];
  const shiftMm = high.dropMm - again.dropMm;
  return drops.map((drop) => ({
    ...drop,
    dropMm: Math.max(0, drop.dropMm + shiftMm),
    setUpId: high.setUpId,
  }));
}

const isDrop = (one: Reading): one is ReadingOf<'floor'> => one.kind === 'floor';
const isSamePlace = (one: ReadingOf<'floor'>, other: ReadingOf<'floor'>) =>
  one.wallId === other.wallId &&
  Math.hypot(one.xMm - other.xMm, one.yMm - other.yMm) <= SAME_PLACE_MM;

function cornerWords(
  { fit, rules }: Released,
  found: CornerFit,
  readings: readonly Reading[],
): string[] {
  const read = readings.find(
    (one) => one.kind === 'corner' && one.cornerWallId === found.cornerWallId,
  );
  if (read?.kind !== 'corner') return [];
  const was = fit.corners.find(({ cornerWallId }) => cornerWallId === found.cornerWallId);
  const before = was?.readAt.find(({ zMm }) => Math.abs(zMm - read.zMm) < 1)?.angle ?? was?.angle;
  const now = found.readAt[0]?.angle ?? found.angle;
  if (!before || !now || agree(before, now)) return [];
  return [differs(`Corner ${found.name}`, { before, now }, rules)];
}

/** From the high point to each other place that was read again; signed, down is positive. */
function fallWords({ wallBook, runs, fit, rules }: Released, readings: readonly Reading[]) {
  const drops = readings.filter(isDrop);
  const standing = standingReadings(wallBook.readings);
  const high = standing.find(({ id }) => id === fit.floor?.highPoint.readingId);
  if (!high || !isDrop(high)) return [];
  const again = drops.find((drop) => isSamePlace(drop, high));
  if (!again) return [];
  return drops.flatMap((drop) => {
    const old = standing.filter(isDrop).find((one) => isSamePlace(one, drop));
    if (drop === again || !old) return [];
    const fallOf = (top: ReadingOf<'floor'>, low: ReadingOf<'floor'>) => {
      const pair = fitRoom({ ...wallBook, readings: [top, low] }, runs, rules).floor?.fall;
      return pair ? fitFigure('floor-fall', { ...pair, value: low.dropMm - top.dropMm }) : null;
    };
    const [before, now] = [fallOf(high, { ...old, setUpId: high.setUpId }), fallOf(again, drop)];
    // Two level lines of the measurer are not compared: only what one of them says is known.
    if (!before || !now || old.setUpId !== high.setUpId || agree(before, now)) return [];
    return [differs('Fall of the floor from the high point', { before, now }, rules)];
  });
}

function differs(
  what: string,
  { before, now }: { before: FitFigure; now: FitFigure },
  rules: FitRules,
): string {
  const [was, is] = [figureText(before, rules), figureText(now, rules)];
  return `${what}: ${is.value} ± ${is.surely} as found, ${was.value} ± ${was.surely} on the sheet`;
}
