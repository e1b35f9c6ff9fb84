import type { Reading } from '@/lib/contracts/readings';
import type { Room } from '@/lib/contracts/wall-book';
import { wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { formatLength } from '@/lib/units/format-length';
import { featureWord } from '@/lib/words/feature-words';
import type { Region } from '@/lib/words/trade';
import { cornerName, wallName } from './room-names';

export type ReadingWords = {
  /** What was read: "Wall B, length at 36\"". */
  what: string;
  /** What it came to: "95 1/16\"". */
  came: string;
};

/**
 * A reading in words, in the unit in which the shop works, to 1/64 in or 0.1 mm.
 *
 * Edge: a wall that is no longer drawn is called so.
 * Example: a length of 2414.6 mm on wall B at 914.4 mm is "Wall B, length at 36\"" and "95 1/16\"".
 */
export function readingWords(
  reading: Reading,
  room: Room,
  unit: 'in' | 'mm',
  region: Region = 'US',
): ReadingWords {
  const length = (mm: number) => fineLength(mm, unit);
  const wall = (id: string) => wallName(room, id);
  const corner = (id: string) => cornerName(room, id);
  switch (reading.kind) {
    case 'length': {
      const out = reading.yMm > 0 ? `, ${length(reading.yMm)} out` : '';
      return {
        what: `${wall(reading.wallId)}, length at ${length(reading.zMm)}${out}`,
        came: length(reading.valueMm),
      };
    }
    case 'pieces':
      return {
        what: `${wall(reading.wallId)}, in pieces at ${length(reading.zMm)}`,
        came: `${reading.piecesMm.map(length).join(' + ')} = ${length(wholeOfPieces(reading))}`,
      };
    case 'corner':
      return {
        what: `Corner ${corner(reading.cornerWallId)} at ${length(reading.zMm)}`,
        came:
          reading.by.method === 'angle'
            ? `${reading.by.angleDeg}°`
            : `${length(reading.by.legLeftMm)} and ${length(reading.by.legRightMm)}, across ${length(reading.by.diagonalMm)}`,
      };
    case 'face':
      return {
        what: `${wall(reading.wallId)}, face at ${length(reading.xMm)} along, ${length(reading.zMm)} up`,
        came: `gap ${length(reading.gapMm)}`,
      };
    case 'floor':
      return {
        what: `Floor by ${lower(wall(reading.wallId))}, ${length(reading.xMm)} along, ${length(reading.yMm)} out`,
        came: `drop ${length(reading.dropMm)}`,
      };
    case 'ceiling':
      return {
        what: `Ceiling by ${lower(wall(reading.wallId))}, ${length(reading.xMm)} along, ${length(reading.yMm)} out`,
        came: `rise ${length(reading.riseMm)}`,
      };
    case 'diagonal':
      return {
        what: `Diagonal from corner ${corner(reading.fromCornerWallId)} to corner ${corner(reading.toCornerWallId)} at ${length(reading.zMm)}`,
        came: length(reading.valueMm),
      };
    case 'width':
      return {
        what: `Across from ${lower(wall(reading.wallId))} to ${lower(wall(reading.toWallId))} at ${length(reading.zMm)}`,
        came: length(reading.valueMm),
      };
    case 'feature':
      return {
        what: `${wall(reading.wallId)}, ${featureWord(reading.feature, region)}${reading.note ? ` (${reading.note})` : ''}`,
        came: `${length(reading.x0Mm)} to ${length(reading.x1Mm)} along, ${length(reading.z0Mm)} to ${length(reading.z1Mm)} up`,
      };
    case 'stud':
      return {
        what: `${wall(reading.wallId)}, stud`,
        came: `${reading.at.replace('-', ' ')} at ${length(reading.xMm)}`,
      };
    case 'doorway':
      return {
        what: `Way in: ${reading.name}`,
        came: `${length(reading.clearWidthMm)} wide, ${length(reading.clearHeightMm)} high, clear`,
      };
    case 'withdrawal':
      return { what: 'A reading taken back', came: reading.reason };
    case 'skip':
      return { what: 'A reading not taken', came: reading.reason };
  }
}

/** As fine as anything is read, without a nought for show: 876 mm, 876.5 mm, 34 33/64". */
export function fineLength(mm: number, unit: 'in' | 'mm'): string {
  return formatLength(mm, { unit, stepMm: unit === 'in' ? 25.4 / 64 : 0.1 }).replace(
    '.0 mm',
    ' mm',
  );
}

const lower = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
