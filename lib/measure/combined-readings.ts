/** Repeats of one length or one corner brought together: what each place of the room was read as. */
import type { ReadingOf } from '@/lib/contracts/readings';
import { cornerAngle } from '@/lib/measure/corner';
import type { Figure } from '@/lib/measure/figure';
import { meanOf, type Repeat } from '@/lib/measure/mean-of';
import { cluster, type RoomBook } from '@/lib/measure/room-book';
import {
  angleCommonPart,
  angleOwnPart,
  angleUncertainty,
  type BoundedEnds,
  lengthOwnPart,
  lengthUncertainty,
  toolCommonPart,
} from '@/lib/measure/uncertainty';
import { piecesUncertainty, wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import type { Problem } from '@/lib/problem';

/** Heights or depths no further apart than this are one place; from memory. */
const SAME_PLACE_MM = 40;

export type CombinedLength = {
  wallId: string;
  zMm: number;
  yMm: number;
  length: Figure;
  repeats: LengthRepeat[];
  /** Read in pieces; the whole beside it, where it was read, stands for itself. */
  isInPieces: boolean;
  /** The repeats disagree by more than tool and shop allow. */
  disagree: boolean;
};

export type LengthRepeat = Repeat & { reading: ReadingOf<'length' | 'pieces'> };

export type CombinedCorner = {
  cornerWallId: string;
  zMm: number;
  /** As read, not carried to the straight walls. */
  angle: Figure;
  repeats: CornerRepeat[];
  disagree: boolean;
};
export type CornerRepeat = Repeat & { reading: ReadingOf<'corner'> };

/** A blade of an angle finder; from memory. */
export const FINDER_BLADE_MM = 250;
/** Corners that differ by less are not a disagreement whatever the tool says; from memory. */
const CORNER_AGREEMENT_DEG = 0.2;

/** Lengths by wall, height and depth, in walking order; after the wholes of a wall what its pieces make. */
export function combinedLengths(book: RoomBook): {
  lengths: CombinedLength[];
  problems: Problem[];
} {
  const problems: Problem[] = [];
  const lengths = book.walk.walls.flatMap(({ wall }) => {
    const groups = [...wholesOf(book, wall.id), ...piecesOf(book, wall.id)];
    return groups.flatMap(({ repeats, agreementMm, ...place }): CombinedLength[] => {
      const mean = meanOf(repeats, agreementMm);
      problems.push(...mean.problems);
      if (!mean.value) return [];
      const disagree = mean.problems.length > 0;
      return [{ wallId: wall.id, ...place, length: mean.value, repeats, disagree }];
    });
  });
  return { lengths, problems };
}

type LengthGroup = Pick<CombinedLength, 'zMm' | 'yMm' | 'repeats' | 'isInPieces'> & {
  agreementMm: number;
};

function wholesOf(book: RoomBook, wallId: string): LengthGroup[] {
  const ofWall = book.ofKind('length').filter((reading) => reading.wallId === wallId);
  return cluster(ofWall, ({ yMm }) => yMm, SAME_PLACE_MM).flatMap((atDepth) =>
    cluster(atDepth, ({ zMm }) => zMm, SAME_PLACE_MM).flatMap((readings): LengthGroup[] => {
      const first = readings[0];
      if (!first) return [];
      const repeats = readings.map((reading) => ({
        ...lengthRepeat(book, reading, reading.valueMm, 2),
        reading,
      }));
      const yMm = first.yMm <= SAME_PLACE_MM ? 0 : first.yMm;
      const agreementMm = book.rules.repeatAgreementMm;
      return [{ zMm: first.zMm, yMm, repeats, isInPieces: false, agreementMm }];
    }),
  );
}

function piecesOf(book: RoomBook, wallId: string): LengthGroup[] {
  const ofWall = book.ofKind('pieces').filter((reading) => reading.wallId === wallId);
  return cluster(ofWall, ({ zMm }) => zMm, SAME_PLACE_MM).flatMap((readings): LengthGroup[] => {
    const zMm = readings[0]?.zMm;
    if (zMm === undefined) return [];
    const repeats = readings.map((reading) => ({
      id: reading.id,
      value: wholeOfPieces(reading),
      ...piecesUncertainty(book.toolOf(reading), reading.piecesMm),
      toolId: reading.toolId,
      reading,
    }));
    return [{ zMm, yMm: 0, repeats, isInPieces: true, agreementMm: book.rules.piecesAskMm }];
  });
}

/** One reading of a length with its own and its tool's part of u. */
export function lengthRepeat(
  book: RoomBook,
  reading: { id: string; toolId: string },
  valueMm: number,
  boundedEnds: BoundedEnds,
): Repeat {
  const tool = book.toolOf(reading);
  return {
    id: reading.id,
    value: valueMm,
    uOwn: lengthOwnPart(tool),
    uCommon: toolCommonPart(tool, valueMm, boundedEnds),
    toolId: reading.toolId,
  };
}

/** Corners by height, in walking order. */
export function combinedCorners(book: RoomBook): {
  corners: CombinedCorner[];
  problems: Problem[];
} {
  const problems: Problem[] = [];
  const corners = book.walk.walls.flatMap(({ wall, before }) => {
    if (!before) return [];
    const ofCorner = book.ofKind('corner').filter(({ cornerWallId }) => cornerWallId === wall.id);
    return cluster(ofCorner, ({ zMm }) => zMm, SAME_PLACE_MM).flatMap(
      (readings): CombinedCorner[] => {
        const repeats = readings.flatMap((reading): CornerRepeat[] => {
          const read = cornerRepeat(book, reading);
          problems.push(...read.problems);
          return read.value ? [{ ...read.value, reading }] : [];
        });
        if (repeats.length === 0) return [];
        const mean = meanOf(repeats, CORNER_AGREEMENT_DEG);
        problems.push(...mean.problems);
        const zMm = readings[0]?.zMm ?? 0;
        if (!mean.value) return [];
        return [
          {
            cornerWallId: wall.id,
            zMm,
            angle: mean.value,
            repeats,
            disagree: mean.problems.length > 0,
          },
        ];
      },
    );
  });
  return { corners, problems };
}

function cornerRepeat(
  book: RoomBook,
  reading: ReadingOf<'corner'>,
): { value: Repeat | null; problems: Problem[] } {
  const tool = book.toolOf(reading);
  const { id, toolId, by } = reading;
  if (by.method === 'angle') {
    const angle = cornerAngle({
      method: 'angle',
      angle: { id, value: by.angleDeg, u: angleUncertainty(tool) },
    });
    if (!angle.value) return { value: null, problems: angle.problems };
    const parts = { uOwn: angleOwnPart(tool), uCommon: angleCommonPart(tool) };
    return { value: { id, value: angle.value.value, ...parts, toolId }, problems: angle.problems };
  }
  const uOf = (lengthMm: number, ends: BoundedEnds) => lengthUncertainty(tool, lengthMm, ends);
  const leg = (value: number) => ({ id, value, u: uOf(value, 1) });
  const angle = cornerAngle({
    method: 'legs',
    legLeft: leg(by.legLeftMm),
    legRight: leg(by.legRightMm),
    diagonal: { id, value: by.diagonalMm, u: uOf(by.diagonalMm, 0) },
    carriedPast: by.carriedPast,
    uOfLength: (lengthMm) => uOf(lengthMm, 1),
  });
  if (!angle.value) return { value: null, problems: angle.problems };
  // The tape's own error is in all three sides and mostly cancels: nothing is shared between corners.
  const value = { id, value: angle.value.value, uOwn: angle.value.u, uCommon: 0, toolId };
  return { value, problems: angle.problems };
}

/** Where along its two arms a corner was read. */
export function cornerArms(reading: ReadingOf<'corner'>): { leftMm: number; rightMm: number } {
  const { by } = reading;
  if (by.method === 'angle') return { leftMm: FINDER_BLADE_MM, rightMm: FINDER_BLADE_MM };
  return { leftMm: by.legLeftMm, rightMm: by.legRightMm };
}
