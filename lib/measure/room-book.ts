/** A wall book made ready for the engine: what stands, what it was read with, and what cannot be used. */

import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Tool, WallBook } from '@/lib/contracts/wall-book';
import { type RoomWalk, walkRoom } from '@/lib/measure/room-walk';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wallIdsOf } from '@/lib/measure/wall-ids';
import { type Problem, warning } from '@/lib/problem';

export type RoomBook = {
  room: WallBook['room'];
  rules: FitRules;
  walk: RoomWalk;
  /** Standing readings of walls that the room has, in the order given. */
  readings: Reading[];
  ofKind: <K extends Reading['kind']>(kind: K) => ReadingOf<K>[];
  toolOf: (reading: { toolId: string }) => Tool;
  problems: Problem[];
};

/** A tool that nobody described is counted as a class III tape read to the millimetre; from memory. */
const UNKNOWN_TOOL: Tool = {
  id: 'unknown',
  name: 'Unknown tool',
  spec: { kind: 'tape', accuracyClass: 'III', stepMm: 1, repeatabilityMm: 0.5 },
};

/**
 * Opens a wall book: drops what was withdrawn or corrected, and says what names a wall or tool it has not got.
 * Edge rule: a reading of an unknown wall is left out; a reading with an unknown tool stays, less sure.
 * Problems: warnings `unknown-wall`, `unknown-tool`, `not-a-number`.
 */
export function openBook(wallBook: WallBook, rules: FitRules): RoomBook {
  const walk = walkRoom(wallBook.room);
  const tools = new Map(wallBook.tools.map((tool) => [tool.id, tool]));
  const problems: Problem[] = [];
  const standing = standingReadings(wallBook.readings);
  const strange = standing.filter((reading) => wallIdsOf(reading).some((id) => !walk.byId.has(id)));
  const notNumbers = standing.filter((reading) => !hasOnlyNumbers(reading));
  const leftOut = new Set([...strange, ...notNumbers].map(({ id }) => id));
  const readings = standing.filter(({ id }) => !leftOut.has(id));
  const toolless = readings.filter(({ toolId }) => !tools.has(toolId));
  const idsOf = (some: Reading[]) => some.map(({ id }) => id);
  if (strange.length > 0) {
    const words = 'Some readings are of a wall that this room no longer has. Take them again.';
    problems.push(warning('unknown-wall', words, idsOf(strange)));
  }
  if (notNumbers.length > 0) {
    const words = 'Some readings are not numbers. Take them again.';
    problems.push(warning('not-a-number', words, idsOf(notNumbers)));
  }
  if (toolless.length > 0) {
    const words =
      'Some readings were taken with a tool that is not described: they count as a plain tape’s.';
    problems.push(warning('unknown-tool', words, idsOf(toolless)));
  }
  const kinds = new Map<Reading['kind'], Reading[]>();
  for (const reading of readings) {
    const sameKind = kinds.get(reading.kind);
    if (sameKind) sameKind.push(reading);
    else kinds.set(reading.kind, [reading]);
  }
  return {
    room: wallBook.room,
    rules,
    walk,
    readings,
    ofKind: <K extends Reading['kind']>(kind: K) => (kinds.get(kind) ?? []) as ReadingOf<K>[],
    toolOf: ({ toolId }) => tools.get(toolId) ?? UNKNOWN_TOOL,
    problems,
  };
}

function hasOnlyNumbers(reading: Reading): boolean {
  const fields: Record<string, unknown> = reading.kind === 'corner' ? reading.by : reading;
  for (const key in fields) {
    const field = fields[key];
    if (typeof field === 'number' && !Number.isFinite(field)) return false;
    if (Array.isArray(field) && !field.every(Number.isFinite)) return false;
  }
  return true;
}

/** Groups of things no further apart than `withinMm` from the first of the group, lowest first. */
export function cluster<T>(things: T[], at: (thing: T) => number, withinMm: number): T[][] {
  const groups: T[][] = [];
  // The sort keeps equals in the order given.
  const sorted = things.length > 1 ? [...things].sort((a, b) => at(a) - at(b)) : things;
  let startedAt = Number.NEGATIVE_INFINITY;
  for (const thing of sorted) {
    const last = groups[groups.length - 1];
    if (last && at(thing) - startedAt <= withinMm) last.push(thing);
    else {
      groups.push([thing]);
      startedAt = at(thing);
    }
  }
  return groups;
}
