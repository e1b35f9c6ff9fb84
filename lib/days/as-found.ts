/** Readings taken again before setting, held against the sheet that the crew sets by. */

import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import { cornerOffset } from '@/lib/measure/corner';
import type { CornerFit, Fit } from '@/lib/measure/fit';
import { type FitFigure, fitFigure } from '@/lib/measure/fit-figure';
import { fitRoom } from '@/lib/measure/fit-room';
import { standingReadings } from '@/lib/measure/standing-readings';
import { figureText } from '@/lib/sheet/figure-text';
import { formatLength } from '@/lib/units/format-length';
import { type AsFoundWords, asFoundWords } from '@/lib/words/as-found-words';
import type { CrewLanguage } from '@/lib/words/crew';

export type Released = { wallBook: WallBook; runs: Run[]; rules: FitRules; fit: Fit };

export type AsFound = {
  /** What differs from the release by more than both are sure of, in words; empty when all agrees. */
  disagreements: string[];
  /** What the difference does to what was cut: `Sink wall, filler right: 1/2" narrower at the front`. */
  changes: string[];
};

/** Two places this near are one; as for the ties of level lines. */
const SAME_PLACE_MM = 80;

/**
 * Whether the room still is what was released, and if not, which fillers and kicks change.
 *
 * Two figures disagree when they differ by more than √(U₁² + U₂²), both at k = 2. A corner that disagrees
 * takes the difference of its offsets at the front of each run that meets that wall from the run's filler
 * there: it is compared reading against reading, and not spread over the room as an adjustment would.
 * Told in English unless another language is asked for. Units: mm, degrees; a corner found more closed makes the filler narrower at the front. Edge: what was
 * not read for the release disagrees with nothing.
 * Example: a corner released at 90.0° and found at 89.0°, a front at 610 mm: 10.6 mm narrower.
 * Source: ISO/IEC Guide 98-3, 5.1 (uncertainty of a difference of independent readings); plane geometry.
 */
export function asFound(
  released: Released,
  readings: readonly Reading[],
  language: CrewLanguage = 'en',
): AsFound {
  const words = asFoundWords[language];
  const told = [
    ...readings.flatMap((one) => (one.kind === 'corner' ? cornerTold(released, one, words) : [])),
    ...fallTold(released, readings.filter(isDrop), words),
  ];
  return {
    disagreements: told.map(({ disagreement }) => disagreement),
    changes: told.flatMap(({ changes }) => changes),
  };
}

/** Nothing to tell: the difference is no larger than what both together are unsure of. */
export function agree(one: FitFigure, other: FitFigure): boolean {
  return Math.abs(one.value - other.value) <= Math.hypot(one.U, other.U) + 1e-9;
}

type Told = { disagreement: string; changes: string[] };

function cornerTold(released: Released, read: ReadingOf<'corner'>, words: AsFoundWords): Told[] {
  const { fit, rules } = released;
  const was = fit.corners.find(({ cornerWallId }) => cornerWallId === read.cornerWallId);
  const before = was?.readAt.find(({ zMm }) => Math.abs(zMm - read.zMm) < 1)?.angle ?? was?.angle;
  const now = alone(released, [read]).corners.find(
    ({ cornerWallId }) => cornerWallId === read.cornerWallId,
  )?.readAt[0]?.angle;
  if (!was || !before || !now || agree(before, now)) return [];
  return [
    {
      disagreement: differs(words, words.corner(was.name), { before, now, rules }),
      changes: fillerChanges(released, was, { before, now, words }),
    },
  ];
}

/** The fit of a book with nothing but these readings: what they say by themselves, and how surely. */
function alone({ wallBook, runs, rules }: Released, readings: Reading[]): Fit {
  return fitRoom({ ...wallBook, readings }, runs, rules);
}

/** Each run that meets the corner's wall ends at it: by its left end at its own wall's corner, by its right at the next. */
function fillerChanges(
  { runs, fit, rules }: Released,
  corner: CornerFit,
  { before, now, words }: { before: FitFigure; now: FitFigure; words: AsFoundWords },
): string[] {
  return runs.flatMap((run) =>
    (['left', 'right'] as const).flatMap((end) => {
      const cornerWall = end === 'left' ? corner.cornerWallId : corner.leftWallId;
      const filler = fit.runs.find(({ runId }) => runId === run.id)?.[end].filler;
      if (run.wallId !== cornerWall || run[end].kind !== 'wall' || !filler) return [];
      const depthMm = run.carcassDepthMm + run.bumperMm + run.doorMm;
      const offset = (angle: FitFigure) => cornerOffset(angle, depthMm).value?.value;
      const [was, is] = [offset(before), offset(now)];
      if (was === undefined || is === undefined) return [];
      const narrowerMm = is - was;
      const by = formatLength(Math.abs(narrowerMm), rules);
      return [words.filler(run.name, { end, by, isNarrower: narrowerMm > 0 })];
    }),
  );
}

const isDrop = (one: Reading): one is ReadingOf<'floor'> => one.kind === 'floor';
const isSamePlace = (one: ReadingOf<'floor'>, other: ReadingOf<'floor'>) =>
  one.wallId === other.wallId &&
  Math.hypot(one.xMm - other.xMm, one.yMm - other.yMm) <= SAME_PLACE_MM;

/** From the high point to each other place that was read again; down is positive. */
function fallTold(
  released: Released,
  drops: readonly ReadingOf<'floor'>[],
  words: AsFoundWords,
): Told[] {
  const { wallBook, fit, runs, rules } = released;
  const standing = standingReadings(wallBook.readings).filter(isDrop);
  const high = standing.find(({ id }) => id === fit.floor?.highPoint.readingId);
  const again = high && drops.find((drop) => isSamePlace(drop, high));
  if (!high || !again) return [];
  const fallOf = (top: ReadingOf<'floor'>, low: ReadingOf<'floor'>): FitFigure | null => {
    const fall = alone(released, [top, low]).floor?.fall;
    return fall ? fitFigure('floor-fall', { ...fall, value: low.dropMm - top.dropMm }) : null;
  };
  return drops.flatMap((drop) => {
    // Two level lines of the measurer are not compared: only what one of them says is known.
    const old = standing.find((one) => isSamePlace(one, drop) && one.setUpId === high.setUpId);
    if (drop === again || !old) return [];
    const [before, now] = [fallOf(high, old), fallOf(again, drop)];
    if (!before || !now || agree(before, now)) return [];
    const moreMm = now.value - before.value;
    const by = formatLength(Math.abs(moreMm), rules);
    const kicked = runs.filter((run) => run.wallId === drop.wallId && run.level !== 'wall');
    return [
      {
        disagreement: differs(words, words.fall, { before, now, rules }),
        changes: kicked.map(({ name }) => words.kick(name, { by, isHigher: moreMm > 0 })),
      },
    ];
  });
}

function differs(
  words: AsFoundWords,
  what: string,
  { before, now, rules }: { before: FitFigure; now: FitFigure; rules: FitRules },
): string {
  const [was, is] = [figureText(before, rules), figureText(now, rules)];
  return words.differs(what, `${is.value} ± ${is.surely}`, `${was.value} ± ${was.surely}`);
}
