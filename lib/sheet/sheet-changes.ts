import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Room, WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import { sortedJson } from '@/lib/sync/sorted-json';
import { type Region, tradeName } from '@/lib/words/trade';
import { cutChanges } from './cut-changes';
import { readingChanges } from './reading-changes';
import { fineLength } from './reading-words';
import { runChanges } from './run-changes';

/** What a sheet is made from. */
export type SheetSource = { wallBook: WallBook; runs: Run[] };
/** What a release freezes. */
export type FrozenSheet = SheetSource & { rules: FitRules; fit: Fit };

/**
 * What makes a released sheet out of date: readings, walls or runs that changed after it, in words; an
 * empty list while it holds.
 *
 * Edge: shop rules and the engine may change without unmaking a sheet that stands; a skipped reading and
 * one taken back before the next release change nothing.
 */
export function supersededBy(
  frozen: SheetSource,
  now: SheetSource,
  unit: 'in' | 'mm',
  region: Region = 'US',
): string[] {
  return [
    ...readingChanges(frozen.wallBook, now.wallBook, unit, region),
    ...roomChanges(frozen.wallBook.room, now.wallBook.room, unit, region),
    ...runChanges(frozen.runs, now.runs, { room: now.wallBook.room, unit }),
  ];
}

/** What differs between two revisions, causes first, then the cut sizes that moved. */
export function sheetChanges(before: FrozenSheet, after: FrozenSheet): string[] {
  const { unit, region } = after.rules;
  return [
    ...supersededBy(before, after, unit, region),
    ...ruleChanges(before.rules, after.rules),
    ...cutChanges(before.fit, after.fit, after.rules),
  ];
}

function roomChanges(was: Room, now: Room, unit: 'in' | 'mm', region: Region): string[] {
  const changes: string[] = [];
  if (sortedJson(was.chains) !== sortedJson(now.chains)) changes.push('The walls were drawn anew');
  const told = (words: string, before: number, after: number) => {
    if (before === after) return;
    changes.push(`${words}: ${fineLength(before, unit)} is now ${fineLength(after, unit)}`);
  };
  told(
    `${tradeName('board', region)} still to come on the walls`,
    was.wallThicknessToComeMm,
    now.wallThicknessToComeMm,
  );
  told('Floor still to come', was.floorToComeMm, now.floorToComeMm);
  if (was.cabinetsStandOn !== now.cabinetsStandOn) {
    const floor = now.cabinetsStandOn === 'rough-floor' ? 'rough' : 'finished';
    changes.push(`The cabinets now stand on the ${floor} floor`);
  }
  return changes;
}

/** "fillerLeastMm" reads "filler least". */
function ruleChanges(was: FitRules, now: FitRules): string[] {
  const changed = Object.keys(now).filter(
    (key) => sortedJson(was[key as keyof FitRules]) !== sortedJson(now[key as keyof FitRules]),
  );
  if (changed.length === 0) return [];
  const inWords = changed.map((key) =>
    key
      .replace(/Mm$/, '')
      .replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`)
      .trim(),
  );
  return [`Shop rules changed: ${inWords.join(', ')}`];
}
