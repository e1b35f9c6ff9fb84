/** Floor and ceiling readings brought to one level line. */
import type { ReadingOf } from '@/lib/contracts/readings';
import type { LevelPoint } from '@/lib/measure/floor-surface';
import type { RoomBook } from '@/lib/measure/room-book';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import { type Problem, warning } from '@/lib/problem';

export type LevelReading = LevelPoint & { wallId: string };
export type LevelLine = {
  /** Null where nothing was read. */
  setUpId: string | null;
  drops: LevelReading[];
  rises: LevelReading[];
  problems: Problem[];
};

/** Two drops this near are of one place, and tie their level lines. */
const SAME_PLACE_MM = 80;

/**
 * All drops and rises from the level line that has the most of them; others are tied to it where they
 * share a place, and left out where they do not.
 * Edge rule: the first set-up among equals leads. Units: mm; drops down, rises up.
 * Example: line 1 reads 1000 at a place, line 2 reads 1200 there: 200 is taken off line 2's drops and put on its rises.
 * Problems: warning `level-not-tied`, about the readings left out.
 */
export function oneLevelLine(book: RoomBook): LevelLine {
  const drops = book.ofKind('floor').map((reading) => levelReading(book, reading, reading.dropMm));
  const rises = book
    .ofKind('ceiling')
    .map((reading) => levelReading(book, reading, reading.riseMm));
  const counts = new Map<string, number>();
  for (const { setUpId } of [...drops, ...rises]) {
    counts.set(setUpId, (counts.get(setUpId) ?? 0) + 1);
  }
  const [lead] = [...counts].sort((a, b) => b[1] - a[1]);
  const setUpId = lead?.[0] ?? null;
  if (setUpId === null || counts.size === 1) return { setUpId, drops, rises, problems: [] };
  const shifts = shiftsTo(setUpId, drops);
  const tie = (reading: LevelReading, sign: 1 | -1): LevelReading[] => {
    const shift = shifts.get(reading.setUpId);
    if (!shift) return [];
    const valueMm = reading.valueMm + sign * shift.byMm;
    return [{ ...reading, valueMm, u: Math.hypot(reading.u, shift.u), setUpId }];
  };
  const lost = [...drops, ...rises].filter((reading) => !shifts.has(reading.setUpId));
  const words =
    'Some floor or ceiling readings are from another level line that shares no place with the rest. Read one place again from it.';
  return {
    setUpId,
    drops: drops.flatMap((reading) => tie(reading, 1)),
    rises: rises.flatMap((reading) => tie(reading, -1)),
    problems:
      lost.length > 0
        ? [
            warning(
              'level-not-tied',
              words,
              lost.map(({ id }) => id),
            ),
          ]
        : [],
  };
}

function levelReading(
  book: RoomBook,
  reading: ReadingOf<'floor'> | ReadingOf<'ceiling'>,
  valueMm: number,
): LevelReading {
  const { id, wallId, xMm, yMm, setUpId } = reading;
  const u = lengthUncertainty(book.toolOf(reading), valueMm, 1);
  return { id, wallId, xMm, yMm, valueMm, u, setUpId };
}

/** What turns each line's drops into the leading line's. */
function shiftsTo(lead: string, drops: LevelReading[]): Map<string, { byMm: number; u: number }> {
  const shifts = new Map([[lead, { byMm: 0, u: 0 }]]);
  const leading = drops.filter(({ setUpId }) => setUpId === lead);
  for (const setUpId of new Set(drops.map((drop) => drop.setUpId))) {
    if (setUpId === lead) continue;
    const pairs = drops
      .filter((drop) => drop.setUpId === setUpId)
      .flatMap((drop) => {
        const same = leading.find((other) => isSamePlace(drop, other));
        return same ? [{ byMm: same.valueMm - drop.valueMm, u: Math.hypot(same.u, drop.u) }] : [];
      });
    if (pairs.length === 0) continue;
    const byMm = pairs.reduce((sum, pair) => sum + pair.byMm, 0) / pairs.length;
    shifts.set(setUpId, { byMm, u: Math.hypot(...pairs.map(({ u }) => u)) / pairs.length });
  }
  return shifts;
}

function isSamePlace(a: LevelReading, b: LevelReading): boolean {
  return (
    a.wallId === b.wallId &&
    Math.abs(a.xMm - b.xMm) <= SAME_PLACE_MM &&
    Math.abs(a.yMm - b.yMm) <= SAME_PLACE_MM
  );
}
