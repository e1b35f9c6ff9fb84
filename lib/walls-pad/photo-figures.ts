import type { WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wallIdsOf } from '@/lib/measure/wall-ids';
import { readingWords } from './reading-words';
import type { LengthSpeech } from './say-length';

/** More than this is not looked through with a thumb. */
const MOST = 60;

/**
 * The figures that may be written on a photo: what stands of its wall, the newest first; of the whole
 * room where it is of no wall.
 * Example: after "Length, 36 up" was read on wall B, a photo of wall B offers 95 1/16".
 */
export function photoFigures(
  { room, readings }: WallBook,
  wallId: string,
  speech: LengthSpeech,
): { id: string; what: string; value: string }[] {
  return standingReadings(readings)
    .filter((reading) => wallId === '' || wallIdsOf(reading).includes(wallId))
    .reverse()
    .slice(0, MOST)
    .map((reading) => ({ id: reading.id, ...readingWords(reading, room, speech) }));
}
