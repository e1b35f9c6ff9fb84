import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { roundBlankUp } from '@/lib/units/round';
import { type Combination, combinationFigure, combine, figureCombination } from './combination';
import type { Figure } from './figure';
import { type LevelPoint, levelSurface, levelTilt, tilted } from './floor-surface';
import { givenFigure, unreadable } from './reading-problems';
import { type ScribeAllowance, type ScribeRules, scribeAllowance } from './scribe';

/** The top of some cabinets along the line where it meets the ceiling: the front of the boxes. */
export type TopGapInput = {
  runId: string;
  rises: LevelPoint[];
  x0Mm: number;
  x1Mm: number;
  yMm: number;
  /** Top of the boxes over the datum. */
  topMm: number;
  /** From `kickHeights`, and the level line it counts from. */
  datumDrop: Figure;
  datumSetUpId: string;
  /** Standard u of the level line, mm per mm. */
  uLevel: number;
  scribe: ScribeRules;
};
export type TopGap = {
  left: Figure;
  right: Figure;
  least: Figure;
  greatest: Figure;
  scribe: ScribeAllowance;
  /** Crown or filler to scribe: least gap + allowance, rounded up once. */
  blankMm: number;
};

/**
 * The gap from the top of the boxes to the ceiling at both ends and at every reading between, and the
 * crown or filler blank that covers it.
 * Edge rule: below 0 the boxes do not go under the ceiling (warning); outside the readings carried on.
 * Units, frame, signs: mm; rises up from the level line, top over the datum: gap = datum drop + rise − top.
 * Example: datum drop 1000, rises 1440 and 1447 at the ends, top 2400 → gaps 40 and 47.
 * Problems: ceiling-not-read, set-ups-mixed, reading-not-a-number, uncertainty-not-known, rules-not-known;
 * warnings ceiling-too-low, ceiling-carried-on.
 * Source: common practice, no source.
 */
export function topGap(input: TopGapInput): Outcome<TopGap> {
  const { runId, rises, x0Mm, x1Mm, yMm, topMm } = input;
  const bad = unreadable([
    ...rises.map(({ id, xMm, yMm: y, valueMm, u }) => ({ id, values: [xMm, y, valueMm], u })),
    { id: runId, values: [x0Mm, x1Mm, yMm, topMm], u: input.uLevel },
    givenFigure(input.datumDrop),
  ]);
  if (bad.length > 0) return refused(...bad);
  if (rises.length === 0) {
    return refused(
      problem('ceiling-not-read', 'The ceiling over this run has not been read.', [runId]),
    );
  }
  if (rises.some(({ setUpId }) => setUpId !== input.datumSetUpId)) {
    const words = 'These rises are from another level line than the floor. Tie them to one first.';
    return refused(problem('set-ups-mixed', words, [runId]));
  }
  const gaps = gapsAlong(input);
  const figures = gaps.map(({ xMm, c }) => ({ xMm, gap: combinationFigure(c) }));
  const [left, right] = [figures[0], figures.at(-1)];
  const scribed = scribeAllowance({
    places: figures.map(({ xMm, gap }) => ({
      id: gap.from[0] ?? runId,
      atMm: xMm,
      gapMm: gap.value,
      u: gap.u,
    })),
    uShared: 0,
    held: 'by-size',
    rules: input.scribe,
  });
  const scribe = scribed.value;
  if (scribe === null || !left || !right) return refused(...scribed.problems);
  const least = figures.reduce((best, at) => (at.gap.value < best.gap.value ? at : best)).gap;
  const greatest = figures.reduce((best, at) => (at.gap.value > best.gap.value ? at : best)).gap;
  const blankMm = roundBlankUp(least.value + scribe.unrounded.value, input.scribe.stepMm);
  const value = { left: left.gap, right: right.gap, least, greatest, scribe, blankMm };
  return {
    value,
    problems: warningsOf(
      runId,
      least,
      gaps.some(({ extrapolated }) => extrapolated),
    ),
  };
}

function gapsAlong(input: TopGapInput): { xMm: number; c: Combination; extrapolated: boolean }[] {
  const { rises, x0Mm, x1Mm, yMm, topMm, datumDrop, uLevel } = input;
  const riseAt = levelSurface(rises);
  const tilt = levelTilt(uLevel);
  const datum = figureCombination(datumDrop);
  const inside = rises.map(({ xMm }) => xMm).filter((xMm) => xMm > x0Mm && xMm < x1Mm);
  const along = [...new Set([x0Mm, ...inside, x1Mm])].sort((a, b) => a - b);
  return along.map((xMm) => {
    const rise = riseAt(xMm, yMm);
    const c = combine([
      [1, tilted(rise.c, xMm, yMm, tilt)],
      [1, datum],
    ]);
    return { xMm, c: { ...c, value: c.value - topMm }, extrapolated: rise.extrapolated };
  });
}

function warningsOf(runId: string, least: Figure, carried: boolean) {
  const low = 'The boxes are higher than the ceiling allows: lower them, or make them shorter.';
  const on =
    'Part of the ceiling over this run has not been read; the nearest readings are carried on.';
  return [
    ...(least.value - least.U < 0 ? [warning('ceiling-too-low', low, [runId])] : []),
    ...(carried ? [warning('ceiling-carried-on', on, [runId])] : []),
  ];
}
