import type { WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import { standingReadings } from '@/lib/measure/standing-readings';
import type { WallPlace } from './elevation-frame';

/**
 * The ceiling along a wall, as high over the floor's high point as it was read, left to right.
 *
 * Edge: only readings of the set-up in which the high point was read can be compared with it; without one
 * there is no line.
 * Example: a high point 1200 below the laser and a rise of 1238 give a ceiling at 2438.
 */
export function ceilingLine(wallBook: WallBook, fit: Fit, wallId: string): WallPlace[] {
  const standing = standingReadings(wallBook.readings);
  const highPoint = standing.find(({ id }) => id === fit.floor?.highPoint.readingId);
  if (highPoint?.kind !== 'floor') return [];
  return standing
    .flatMap((reading) =>
      reading.kind === 'ceiling' &&
      reading.wallId === wallId &&
      reading.setUpId === highPoint.setUpId
        ? [{ xMm: reading.xMm, zMm: highPoint.dropMm + reading.riseMm }]
        : [],
    )
    .sort((one, other) => one.xMm - other.xMm);
}
