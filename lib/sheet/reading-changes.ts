import type { Reading } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import type { Region } from '@/lib/words/trade';
import { readingWords } from './reading-words';

/** Past this many of one sort they are counted, not told one by one. */
const MOST_TOLD = 6;

/**
 * What was read, corrected or taken back between two states of one book, in words.
 *
 * Edge: what does not stand in either state is not told; with more than six of a sort they are counted.
 * Example: a length on wall B corrected gives `Wall B, length at 36": 95 1/16" is now 95 1/4"`.
 */
export function readingChanges(
  before: WallBook,
  after: WallBook,
  unit: 'in' | 'mm',
  region: Region = 'US',
): string[] {
  const stoodBefore = new Map(standingReadings(before.readings).map((one) => [one.id, one]));
  const standsNow = new Map(standingReadings(after.readings).map((one) => [one.id, one]));
  const inBook = new Map(after.readings.map((one) => [one.id, one]));
  const words = (reading: Reading) => readingWords(reading, after.room, unit, region);
  const corrected: string[] = [];
  const added: string[] = [];
  const told = new Set<string>();
  for (const [id, reading] of standsNow) {
    if (stoodBefore.has(id)) continue;
    const first = replacedIn(stoodBefore, inBook, reading);
    const { what, came } = words(reading);
    if (first) {
      told.add(first.id);
      corrected.push(`${what}: ${words(first).came} is now ${came}`);
    } else {
      added.push(`Read since: ${what}, ${came}`);
    }
  }
  const gone = [...stoodBefore.values()].filter(({ id }) => !standsNow.has(id) && !told.has(id));
  const takenBack = gone.map((reading) => `Taken back: ${words(reading).what}`);
  return [
    ...counted(corrected, 'readings corrected'),
    ...counted(added, 'readings more'),
    ...counted(takenBack, 'readings taken back'),
  ];
}

/** The reading of the earlier state that this one corrects, over any corrections in between. */
function replacedIn(
  stood: ReadonlyMap<string, Reading>,
  inBook: ReadonlyMap<string, Reading>,
  reading: Reading,
): Reading | null {
  const seen = new Set([reading.id]);
  for (let id = reading.replaces; id && !seen.has(id); id = inBook.get(id)?.replaces) {
    const found = stood.get(id);
    if (found) return found;
    seen.add(id);
  }
  return null;
}

function counted(lines: string[], words: string): string[] {
  return lines.length > MOST_TOLD ? [`${lines.length} ${words}`] : lines;
}
