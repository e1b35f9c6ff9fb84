import type { Reading } from '@/lib/contracts/readings';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { standingReadings } from '@/lib/measure/standing-readings';
import { formatLength } from '@/lib/units/format-length';
import { cutList } from './cut-list';
import { figureText } from './figure-text';
import type { FrozenSheet } from './sheet-changes';

/** Where a figure of the sheet is other than on the revision before, and what stood there; null: it is new. */
export type RevisionMark =
  | { on: 'wall'; wallId: string; was: string | null }
  | { on: 'corner'; cornerWallId: string; was: string | null }
  | { on: 'unit'; runId: string; unitId: string; was: string | null }
  | { on: 'feature'; wallId: string; readingId: string; was: string | null }
  /** A row of the cut list, by its key. */
  | { on: 'cut'; runId: string | null; wallId: string | null; key: string; was: string | null };

/** What to cloud on a drawing, and the letter to put beside it. */
export type Revised = { revision: string; marks: RevisionMark[] };

type Sheet = Pick<FrozenSheet, 'wallBook' | 'runs' | 'rules' | 'fit'>;

/**
 * Every figure of a sheet that differs from the revision before as it is shown: what rounds to the same mark
 * is not a change.
 *
 * Edge: what is gone has no place left to be marked; the words say it. Walls and corners nobody had read
 * before are new.
 * Example: a filler blank of 2 1/2" that is now 2 3/4" gives the row of that filler, was `2 1/2"`.
 */
export function revisionMarks(before: Sheet, after: Sheet): RevisionMark[] {
  return [
    ...wallMarks(before.fit, after.fit, after.rules),
    ...cornerMarks(before.fit, after.fit, after.rules),
    ...unitMarks(before, after),
    ...featureMarks(before.wallBook, after.wallBook, after.rules),
    ...cutMarks(before, after),
  ];
}

function wallMarks(before: Fit, after: Fit, rules: FitRules): RevisionMark[] {
  const lengthOf = (fit: Fit, wallId: string) => {
    const wall = fit.walls.find((one) => one.wallId === wallId);
    return wall?.length ?? wall?.readAt[0]?.length ?? null;
  };
  return after.walls.flatMap(({ wallId }): RevisionMark[] => {
    const was = changed(lengthOf(before, wallId), lengthOf(after, wallId), rules);
    return was === undefined ? [] : [{ on: 'wall', wallId, was }];
  });
}

function cornerMarks(before: Fit, after: Fit, rules: FitRules): RevisionMark[] {
  return after.corners.flatMap(({ cornerWallId, angle }): RevisionMark[] => {
    const old = before.corners.find((one) => one.cornerWallId === cornerWallId);
    const was = changed(old?.angle ?? null, angle, rules);
    return was === undefined ? [] : [{ on: 'corner', cornerWallId, was }];
  });
}

function unitMarks(before: Sheet, after: Sheet): RevisionMark[] {
  const { unit, stepMm } = after.rules;
  const length = (mm: number) => formatLength(mm, { unit, stepMm });
  return after.runs.flatMap((run) => {
    const old = before.runs.find(({ id }) => id === run.id);
    return run.units.flatMap(({ id, widthMm }): RevisionMark[] => {
      const was = old?.units.find((one) => one.id === id);
      if (was && length(was.widthMm) === length(widthMm)) return [];
      return [{ on: 'unit', runId: run.id, unitId: id, was: was ? length(was.widthMm) : null }];
    });
  });
}

/** A window read anew is a correction of the one before; it is marked where it now stands. */
function featureMarks(before: WallBook, after: WallBook, rules: FitRules): RevisionMark[] {
  const { unit, stepMm } = rules;
  const length = (mm: number) => formatLength(mm, { unit, stepMm });
  const stood = new Map(standingReadings(before.readings).map((one) => [one.id, one]));
  return standingReadings(after.readings).flatMap((reading): RevisionMark[] => {
    if (reading.kind !== 'feature' || stood.has(reading.id)) return [];
    const old = reading.replaces ? stood.get(reading.replaces) : undefined;
    return [
      {
        on: 'feature',
        wallId: reading.wallId,
        readingId: reading.id,
        was: isFeature(old) ? `${length(old.x0Mm)} to ${length(old.x1Mm)}` : null,
      },
    ];
  });
}

function isFeature(reading: Reading | undefined): reading is Extract<Reading, { kind: 'feature' }> {
  return reading?.kind === 'feature';
}

function cutMarks(before: Sheet, after: Sheet): RevisionMark[] {
  const old = new Map(
    cutList(before.fit, before.runs, after.rules.region).map((row) => [row.key, row.cut]),
  );
  return cutList(after.fit, after.runs, after.rules.region).flatMap(
    ({ key, runId, wallId, cut }): RevisionMark[] => {
      const was = changed(old.get(key) ?? null, cut, after.rules);
      return was === undefined ? [] : [{ on: 'cut', runId, wallId, key, was }];
    },
  );
}

/** What stood there; null where nothing did; undefined where it is shown the same. */
function changed(
  before: FitFigure | null,
  after: FitFigure | null,
  rules: FitRules,
): string | null | undefined {
  if (!after) return undefined;
  if (!before) return null;
  const was = figureText(before, rules).value;
  return was === figureText(after, rules).value ? undefined : was;
}
