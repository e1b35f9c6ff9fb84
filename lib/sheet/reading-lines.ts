import type { WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import type { Region } from '@/lib/words/trade';
import { readingWords } from './reading-words';

/** One reading as a list shows it. */
export type ReadingLine = {
  id: string;
  what: string;
  came: string;
  /** As typed on site. */
  typed: string;
  /** Who and when; empty where it is not told. */
  taken: string;
  tool: string;
  stands: boolean;
};

/** Every reading of a book as a line, in the order in which it was read. */
export function readingLines(
  wallBook: WallBook,
  takenBy: Record<string, string>,
  unit: 'in' | 'mm',
  region: Region = 'US',
): ReadingLine[] {
  const standing = new Set(standingReadings(wallBook.readings).map(({ id }) => id));
  const tools = new Map(wallBook.tools.map((tool) => [tool.id, tool.name]));
  return wallBook.readings.map((reading) => ({
    id: reading.id,
    ...readingWords(reading, wallBook.room, unit, region),
    typed: reading.typed,
    taken: takenBy[reading.id] ?? '',
    tool: tools.get(reading.toolId) ?? 'unknown tool',
    stands: standing.has(reading.id),
  }));
}
