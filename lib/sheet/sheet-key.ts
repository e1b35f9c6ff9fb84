import type { Run } from '@/lib/contracts/runs';
import type { Room } from '@/lib/contracts/wall-book';
import { sortedJson } from '@/lib/sync/sorted-json';

/**
 * One text for everything that a sheet hangs on: walls, runs and the readings that stand. Two states of a
 * room with the same key give the same sheet under the same rules.
 *
 * Edge: names of rooms, the order of runs and readings, and which units may be altered do not count.
 */
export function sheetKey(state: {
  room: Room;
  runs: readonly Run[];
  standingIds: readonly string[];
}) {
  const { chains, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn } = state.room;
  return sortedJson({
    room: { chains, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn },
    runs: state.runs.map(cutRelevant).sort((one, other) => (one.id < other.id ? -1 : 1)),
    readings: [...state.standingIds].sort(),
  });
}

/** A run without what no cut size hangs on. */
export function cutRelevant(run: Run) {
  return { ...run, units: run.units.map(({ alterable: _alterable, ...unit }) => unit) };
}
