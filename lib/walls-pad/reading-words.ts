import type { Reading } from '@/lib/contracts/readings';
import type { Room } from '@/lib/contracts/wall-book';
import { cornerName, walkRoom } from '@/lib/measure/room-walk';
import { wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { featureName } from '@/lib/words/feature-words';
import { type LengthSpeech, sayLength } from './say-length';

export type ReadingLine = { what: string; value: string };

/** One line of the wall's list: what was read where, and what it read. */
export function readingWords(reading: Reading, room: Room, speech: LengthSpeech): ReadingLine {
  const say = (mm: number) => sayLength(mm, speech);
  const walls = walkRoom(room).byId;
  const corner = (wallId: string) => {
    const walked = walls.get(wallId);
    return walked ? cornerName(walked) : '?';
  };
  switch (reading.kind) {
    case 'length': {
      const out = reading.yMm > 1 ? `, ${say(reading.yMm)} out` : '';
      return { what: `Length, ${say(reading.zMm)} up${out}`, value: say(reading.valueMm) };
    }
    case 'pieces': {
      const what = `In ${reading.piecesMm.length} pieces, ${say(reading.zMm)} up`;
      return { what, value: say(wholeOfPieces(reading)) };
    }
    case 'corner': {
      const what = `Corner ${corner(reading.cornerWallId)}, ${say(reading.zMm)} up`;
      const { by } = reading;
      if (by.method === 'angle') return { what, value: `${by.angleDeg}°` };
      const legs = [by.legLeftMm, by.legRightMm, by.diagonalMm].map(say).join(' / ');
      return { what, value: legs };
    }
    case 'face':
      return {
        what: `Gap, ${say(reading.xMm)} along, ${say(reading.zMm)} up`,
        value: say(reading.gapMm),
      };
    case 'floor':
      return { what: `Floor, ${placeWords(reading, say)}`, value: say(reading.dropMm) };
    case 'ceiling':
      return { what: `Ceiling, ${placeWords(reading, say)}`, value: say(reading.riseMm) };
    case 'diagonal': {
      const [from, to] = [corner(reading.fromCornerWallId), corner(reading.toCornerWallId)];
      return { what: `Diagonal, ${from} to ${to}`, value: say(reading.valueMm) };
    }
    case 'width': {
      const to = walls.get(reading.toWallId)?.wall.name ?? '?';
      return { what: `Across to ${to}, ${say(reading.xMm)} along`, value: say(reading.valueMm) };
    }
    case 'feature': {
      const size = `${say(reading.x1Mm - reading.x0Mm)} × ${say(reading.z1Mm - reading.z0Mm)}`;
      const place = `${say(reading.x0Mm)} along, ${say(reading.z0Mm)} up`;
      return { what: `${featureName(reading.feature, speech.region)}, ${place}`, value: size };
    }
    case 'stud':
      return { what: `Stud, ${reading.at.replace('-', ' ')}`, value: say(reading.xMm) };
    case 'doorway':
      return {
        what: `Doorway, ${reading.name || 'on the way in'}`,
        value: `${say(reading.clearWidthMm)} × ${say(reading.clearHeightMm)}`,
      };
    case 'withdrawal':
      return { what: 'Taken back', value: reading.reason };
    case 'skip':
      return { what: 'Not taken', value: reading.reason };
  }
}

function placeWords(
  { xMm, yMm }: { xMm: number; yMm: number },
  say: (mm: number) => string,
): string {
  return `${say(xMm)} along, ${say(yMm)} out`;
}
