/** What planning the readings looks things up in, and the words for places. */

import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { type RoomWalk, type WalkedWall, walkRoom } from '@/lib/measure/room-walk';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { formatLength } from '@/lib/units/format-length';
import { lengthLimits } from '@/lib/units/length-limits';

/** A reading asked for, before it is looked up whether it was taken. */
export type AskedSlot = Omit<PlannedReading, 'takenBy' | 'skipped'>;

export type PlanContext = {
  walk: RoomWalk;
  /** Runs that stand against their wall. */
  runs: Run[];
  /** Runs that stand free in the room. */
  islands: Run[];
  rules: FitRules;
  readings: Reading[];
  byKind: <K extends Reading['kind']>(kind: K) => ReadingOf<K>[];
  skips: ReadonlyMap<string, ReadingOf<'skip'>>;
};

/** Opens a book for planning; withdrawn skips count as never made. */
export function planContext(wallBook: WallBook, runs: Run[], rules: FitRules): PlanContext {
  const walk = walkRoom(wallBook.room);
  const readings = standingReadings(wallBook.readings);
  const kinds = new Map<Reading['kind'], Reading[]>();
  for (const reading of readings) {
    kinds.set(reading.kind, [...(kinds.get(reading.kind) ?? []), reading]);
  }
  const withdrawn = new Set(
    wallBook.readings.flatMap((line) => (line.kind === 'withdrawal' ? [line.readingId] : [])),
  );
  const skips = wallBook.readings.flatMap((line) =>
    line.kind === 'skip' && !withdrawn.has(line.id) ? [[line.slot, line] as const] : [],
  );
  return {
    walk,
    runs: runs.filter((run) => walk.byId.has(run.wallId) && !run.island),
    islands: runs.filter((run) => walk.byId.has(run.wallId) && run.island),
    rules,
    readings,
    byKind: <K extends Reading['kind']>(kind: K) => (kinds.get(kind) ?? []) as ReadingOf<K>[],
    skips: new Map(skips),
  };
}

/** As read if it can be, else as drawn: where places along the wall are asked for. */
export function lengthSoFar(context: PlanContext, walked: WalkedWall): number {
  const longestMm = lengthLimits.length.mostMm;
  const ofWall = ({ wallId }: { wallId: string }) => wallId === walked.wall.id;
  const read = [
    ...context
      .byKind('length')
      .filter(ofWall)
      .map(({ valueMm }) => valueMm),
    ...context.byKind('pieces').filter(ofWall).map(wholeOfPieces),
  ].find((valueMm) => valueMm > 0 && valueMm <= longestMm);
  return read ?? Math.min(walked.wall.nominalLengthMm, longestMm);
}

/** Runs that stand against a wall. */
export function runsOn(context: PlanContext, walked: WalkedWall): Run[] {
  return context.runs.filter((run) => run.wallId === walked.wall.id);
}

/** Runs of the neighbours that end at this wall, and at which of its ends. */
export function runsAgainst(
  context: PlanContext,
  walked: WalkedWall,
): { run: Run; at: 'left' | 'right' }[] {
  return context.runs.flatMap((run) => {
    const own = context.walk.byId.get(run.wallId);
    const found: { run: Run; at: 'left' | 'right' }[] = [];
    if (own?.before?.id === walked.wall.id && reachesCorner(run, 'left')) {
      found.push({ run, at: 'right' });
    }
    if (own?.after?.id === walked.wall.id && reachesCorner(run, 'right')) {
      found.push({ run, at: 'left' });
    }
    return found;
  });
}

/** The run goes into its corner, or another run stands there. */
export function reachesCorner(run: Run, end: 'left' | 'right'): boolean {
  return run[end].kind === 'wall' || run[end].kind === 'run';
}

/** Where along its wall a run stands: as far as its ends say before it is filled. */
export function extentOf(run: Run, lengthMm: number): readonly [number, number] {
  const left = 'xMm' in run.left ? run.left.xMm : 'limitMm' in run.left ? run.left.limitMm : 0;
  const right =
    'xMm' in run.right ? run.right.xMm : 'limitMm' in run.right ? run.right.limitMm : lengthMm;
  const onWall = (xMm: number) => Math.min(Math.max(xMm, 0), lengthMm);
  return [onWall(Math.min(left, right)), onWall(Math.max(left, right))];
}

const NEAR_FLOOR_MM = 160;
const NEAR_COUNTER_MM = 60;
const NEAR_CEILING_MM = 2_000;

/** "at the floor", "at the counter", "at the ceiling", "at 57"". */
export function heightWords(zMm: number, rules: FitRules): string {
  if (zMm <= NEAR_FLOOR_MM) return 'at the floor';
  if (Math.abs(zMm - rules.counterTopMm) <= NEAR_COUNTER_MM) return 'at the counter';
  if (zMm >= NEAR_CEILING_MM) return 'at the ceiling';
  return `at ${lengthWords(zMm, rules)}`;
}

/** A length in the shop’s unit and step. */
export function lengthWords(mm: number, rules: FitRules): string {
  return formatLength(mm, { unit: rules.unit, stepMm: rules.stepMm });
}

/** The shop's reading height nearest to the counter: where the plan is laid out. */
export function planHeight(rules: FitRules): number {
  return rules.readingHeightsMm.reduce((nearest, height) =>
    Math.abs(height - rules.counterTopMm) < Math.abs(nearest - rules.counterTopMm)
      ? height
      : nearest,
  );
}

/** Reading heights that matter to bands of height, and the plan's own. */
export function heightsFor(rules: FitRules, bands: { z0Mm: number; z1Mm: number }[]): number[] {
  const reach = 160;
  const plan = planHeight(rules);
  return [...rules.readingHeightsMm]
    .sort((a, b) => a - b)
    .filter(
      (height) =>
        height === plan ||
        bands.some(({ z0Mm, z1Mm }) => height >= z0Mm - reach && height <= z1Mm + reach),
    );
}

/** Evenly spread places from one end to the other, no further apart than `mostApartMm`. */
export function spreadPlaces(fromMm: number, toMm: number, mostApartMm: number): number[] {
  const spans = Math.max(1, Math.ceil((toMm - fromMm) / mostApartMm - 1e-6));
  if (toMm - fromMm < 1) return [fromMm];
  return Array.from({ length: spans + 1 }, (_, i) => fromMm + ((toMm - fromMm) * i) / spans);
}
