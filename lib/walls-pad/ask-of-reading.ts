import type { Reading } from '@/lib/contracts/readings';
import type { Room } from '@/lib/contracts/wall-book';
import { walkRoom } from '@/lib/measure/room-walk';
import { wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import type { LengthUnit } from '@/lib/units/brands';
import { entryOfAngle, entryOfLength, type PadEntry } from './pad-entry';
import { type PadAsk, pieceName } from './pad-fields';

/** The question that a reading answered; null for those that have a screen of their own. */
export function askOfReading(reading: Reading, room: Room): PadAsk | null {
  switch (reading.kind) {
    case 'length': {
      const { wallId, zMm, yMm, valueMm } = reading;
      return { kind: 'length', wallId, zMm, yMm, nominalMm: valueMm };
    }
    case 'pieces': {
      const { wallId, zMm, piecesMm } = reading;
      const stretches = piecesMm.map((_, i) => `piece ${i + 1}`);
      return { kind: 'pieces', wallId, zMm, nominalMm: wholeOfPieces(reading), stretches };
    }
    case 'corner': {
      const { cornerWallId, zMm, by } = reading;
      const isByLegs = by.method === 'legs';
      return {
        kind: 'corner',
        cornerWallId,
        zMm,
        nominalDeg: walkRoom(room).byId.get(cornerWallId)?.leftCornerDeg ?? 90,
        legMm: isByLegs ? by.legRightMm : 0,
        carriedPast: isByLegs && by.carriedPast,
      };
    }
    case 'face': {
      const { wallId, xMm, zMm, setUpKind, setUpId } = reading;
      const setUpGroup = `face:${wallId}`;
      return { kind: 'face', wallId, xMm, zMm, setUpKind, setUpGroup, setUpId };
    }
    case 'floor':
    case 'ceiling': {
      const { kind, wallId, xMm, yMm, setUpId } = reading;
      return { kind, wallId, xMm, yMm, setUpGroup: 'floor', setUpId };
    }
    case 'diagonal': {
      const { fromCornerWallId, toCornerWallId, zMm } = reading;
      return { kind: 'diagonal', fromCornerWallId, toCornerWallId, zMm };
    }
    case 'width': {
      const { wallId, xMm, toWallId, zMm } = reading;
      return { kind: 'width', wallId, xMm, toWallId, zMm };
    }
    case 'stud':
      return { kind: 'stud', wallId: reading.wallId, nth: 1 };
    case 'doorway':
      return { kind: 'doorway' };
    case 'feature':
    case 'withdrawal':
    case 'skip':
      return null;
  }
}

/** The values of a reading as entries of the pad, to be corrected. */
export function entriesOfReading(reading: Reading, unit: LengthUnit): Record<string, PadEntry> {
  const length = (mm: number) => entryOfLength(mm, unit);
  switch (reading.kind) {
    case 'length':
    case 'diagonal':
    case 'width':
      return { value: length(reading.valueMm) };
    case 'pieces':
      return Object.fromEntries(
        reading.piecesMm.map((piece, i) => [pieceName(i + 1), length(piece)]),
      );
    case 'corner':
      if (reading.by.method === 'angle') return { angle: entryOfAngle(reading.by.angleDeg) };
      return {
        legLeft: length(reading.by.legLeftMm),
        legRight: length(reading.by.legRightMm),
        diagonal: length(reading.by.diagonalMm),
      };
    case 'face':
      return { gap: length(reading.gapMm) };
    case 'floor':
      return { drop: length(reading.dropMm) };
    case 'ceiling':
      return { rise: length(reading.riseMm) };
    case 'stud':
      return { x: length(reading.xMm) };
    case 'doorway':
      return {
        clearWidth: length(reading.clearWidthMm),
        clearHeight: length(reading.clearHeightMm),
        ...(reading.passageWidthMm === undefined
          ? {}
          : { passageWidth: length(reading.passageWidthMm) }),
      };
    case 'feature':
      return {
        x0: length(reading.x0Mm),
        width: length(reading.x1Mm - reading.x0Mm),
        z0: length(reading.z0Mm),
        height: length(reading.z1Mm - reading.z0Mm),
        projection: length(reading.projectionMm),
      };
    case 'withdrawal':
    case 'skip':
      return {};
  }
}
