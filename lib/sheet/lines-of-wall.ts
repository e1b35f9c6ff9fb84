import type { WallBook } from '@/lib/contracts/wall-book';
import { wallIdsOf } from '@/lib/measure/wall-ids';
import type { ReadingLine } from './reading-lines';

/** The lines of the readings that name a wall; a corner belongs to both of its walls. */
export function linesOfWall(
  lines: readonly ReadingLine[],
  wallBook: WallBook,
  wallId: string,
): ReadingLine[] {
  const after = wallAfter(wallBook, wallId);
  const named = new Set(
    wallBook.readings
      .filter(
        (reading) =>
          wallIdsOf(reading).includes(wallId) ||
          (reading.kind === 'corner' && reading.cornerWallId === after),
      )
      .map(({ id }) => id),
  );
  return lines.filter(({ id }) => named.has(id));
}

function wallAfter({ room }: WallBook, wallId: string): string | null {
  for (const { walls, closed } of room.chains) {
    const index = walls.findIndex(({ id }) => id === wallId);
    if (index >= 0) return (walls[index + 1] ?? (closed ? walls[0] : undefined))?.id ?? null;
  }
  return null;
}
