/** What the room adjustment is given: every reading of the plan, and stand-ins for what is not read yet. */
import {
  type CombinedCorner,
  type CombinedLength,
  type CornerRepeat,
  cornerArms,
  type LengthRepeat,
  lengthRepeat,
} from '@/lib/measure/combined-readings';
import type { Figure } from '@/lib/measure/figure';
import type { Repeat } from '@/lib/measure/mean-of';
import type { RoomBook } from '@/lib/measure/room-book';
import type {
  CornerObservation,
  LengthObservation,
  Proud,
  RoomObservation,
  RoomShape,
  ToolShare,
} from '@/lib/measure/room-observations';
import { proudAt, type WallFaces } from '@/lib/measure/wall-faces';

export type ObservedRoom = {
  shape: RoomShape;
  observations: RoomObservation[];
};

/** What is not read is held this loosely to the drawing, so that the rest can be reckoned. */
const DRAWN_LENGTH_U_MM = 200;
const DRAWN_ANGLE_U_DEG = 5;

export type ObserveInput = {
  book: RoomBook;
  lengths: CombinedLength[];
  corners: CombinedCorner[];
  faces: ReadonlyMap<string, WallFaces>;
  leans: ReadonlyMap<string, Figure>;
};

/** Observations in a fixed order: lengths, corners, diagonals, widths, leans, then what is only drawn. */
export function observeRoom(input: ObserveInput): ObservedRoom {
  const shape = roomShape(input.book);
  const observations: RoomObservation[] = [
    ...input.lengths.flatMap(lengthObservations),
    ...input.corners.flatMap((corner) => cornerObservations(input, corner)),
    ...diagonalObservations(input.book),
    ...widthObservations(input.book),
    ...[...input.leans].map(
      ([wallId, lean]): RoomObservation => ({
        kind: 'plumb',
        wallId,
        leanMmPerMm: lean.value,
        u: lean.u,
        readingIds: lean.from,
        unit: input.book.rules.unit,
      }),
    ),
  ];
  return { shape, observations: [...observations, ...drawnOnly(input, shape)] };
}

function roomShape(book: RoomBook): RoomShape {
  return {
    chains: book.room.chains.map((chain) => ({
      // Two walls close nothing: while a room is being drawn its chain is open.
      closed: chain.closed && chain.walls.length > 2,
      walls: chain.walls,
    })),
  };
}

/** What repeats by one tool share of their u, and what is left to each. */
export function shareOf(repeats: Repeat[]): { own: (u: number) => number; tool: ToolShare | null } {
  const tools = new Set(repeats.map(({ toolId }) => toolId));
  const uCommon = Math.max(...repeats.map((repeat) => repeat.uCommon));
  const [toolId] = tools;
  if (tools.size !== 1 || toolId === undefined || uCommon === 0) {
    return { own: (u) => u, tool: null };
  }
  return {
    own: (u) => Math.sqrt(Math.max(u * u - uCommon * uCommon, 1e-6)),
    tool: { toolId, uCommon },
  };
}

/** Repeats that disagree go in singly, so that the search can say which one is wrong. */
function lengthObservations(combined: CombinedLength): LengthObservation[] {
  const { wallId, zMm, yMm, length, repeats, disagree } = combined;
  const base = { kind: 'length' as const, wallId, zMm, yMm };
  if (disagree) {
    return repeats.map((repeat) => ({
      ...base,
      ...inPieces(repeat),
      valueMm: repeat.value,
      uMm: repeat.uOwn,
      tool: { toolId: repeat.toolId, uCommon: repeat.uCommon },
      readingIds: [repeat.id],
      unit: repeat.reading.unit,
    }));
  }
  const { own, tool } = shareOf(repeats);
  const unit = repeats[0]?.reading.unit ?? 'mm';
  const readingIds = repeats.map(({ id }) => id);
  const valueMm = length.value;
  return [
    { ...base, ...inPieces(repeats[0]), valueMm, uMm: own(length.u), tool, readingIds, unit },
  ];
}

function inPieces(repeat: LengthRepeat | undefined): Pick<LengthObservation, 'piecesMm'> {
  return repeat?.reading.kind === 'pieces' ? { piecesMm: repeat.reading.piecesMm } : {};
}

function cornerObservations(input: ObserveInput, combined: CombinedCorner): CornerObservation[] {
  const { repeats, angle, disagree } = combined;
  if (disagree || repeats.length === 1) {
    return repeats.flatMap((repeat) =>
      oneCorner(input, combined, [repeat], repeat.value, Math.hypot(repeat.uOwn, repeat.uCommon)),
    );
  }
  return oneCorner(input, combined, repeats, angle.value, angle.u);
}

function oneCorner(
  input: ObserveInput,
  { cornerWallId, zMm }: CombinedCorner,
  repeats: CornerRepeat[],
  angleDeg: number,
  uDeg: number,
): CornerObservation[] {
  const first = repeats[0];
  const walked = input.book.walk.byId.get(cornerWallId);
  if (!first || !walked?.before) return [];
  const { own, tool } = shareOf(repeats);
  const { by } = first.reading;
  const arms = cornerArms(first.reading);
  const leftFaces = input.faces.get(walked.before.id);
  const rightFaces = input.faces.get(cornerWallId);
  const isCarried = by.method === 'legs' && by.carriedPast;
  return [
    {
      kind: 'corner',
      cornerWallId,
      zMm,
      angleDeg,
      uDeg: own(uDeg),
      tool,
      armLeftMm: arms.leftMm,
      armRightMm: arms.rightMm,
      // A straightedge carried past the corner lies on the wall's last part: the bow there stays unread.
      proudLeft: isCarried ? null : proudOf(leftFaces, (length) => length - arms.leftMm),
      proudRight: proudOf(rightFaces, () => arms.rightMm),
      legs:
        by.method === 'legs' && repeats.length === 1
          ? {
              leftMm: by.legLeftMm,
              rightMm: by.legRightMm,
              diagonalMm: by.diagonalMm,
              carriedPast: by.carriedPast,
            }
          : null,
      readingIds: repeats.map(({ id }) => id),
      unit: first.reading.unit,
    },
  ];
}

function proudOf(faces: WallFaces | undefined, at: (lengthMm: number) => number): Proud | null {
  const proud = faces ? proudAt(faces, at(faces.lengthMm)) : null;
  return proud ? { valueMm: proud.valueMm, uMm: proud.uMm } : null;
}

function diagonalObservations(book: RoomBook): RoomObservation[] {
  return book.ofKind('diagonal').map((reading) => {
    const repeat = lengthRepeat(book, reading, reading.valueMm, 2);
    return {
      kind: 'diagonal',
      from: { wallId: reading.fromCornerWallId, end: reading.fromEnd ?? 'left' },
      to: { wallId: reading.toCornerWallId, end: reading.toEnd ?? 'left' },
      zMm: reading.zMm,
      valueMm: reading.valueMm,
      uMm: repeat.uOwn,
      tool: { toolId: reading.toolId, uCommon: repeat.uCommon },
      readingIds: [reading.id],
      unit: reading.unit,
    };
  });
}

function widthObservations(book: RoomBook): RoomObservation[] {
  return book.ofKind('width').map((reading) => {
    const repeat = lengthRepeat(book, reading, reading.valueMm, 2);
    return {
      kind: 'width',
      wallId: reading.wallId,
      xMm: reading.xMm,
      toWallId: reading.toWallId,
      zMm: reading.zMm,
      valueMm: reading.valueMm,
      uMm: repeat.uOwn,
      tool: { toolId: reading.toolId, uCommon: repeat.uCommon },
      readingIds: [reading.id],
      unit: reading.unit,
    };
  });
}

/** No reading behind it: held to the drawing, loosely. */
export function isDrawnOnly(observation: RoomObservation): boolean {
  return observation.readingIds.length === 0;
}

function drawnOnly(input: ObserveInput, shape: RoomShape): RoomObservation[] {
  const { unit } = input.book.rules;
  const zMm = input.lengths[0]?.zMm ?? 0;
  const read = new Set(input.lengths.map(({ wallId }) => wallId));
  const turned = new Set(input.corners.map(({ cornerWallId }) => cornerWallId));
  return shape.chains.flatMap((chain) =>
    chain.walls.flatMap((wall, i): RoomObservation[] => {
      const stand: RoomObservation[] = [];
      if (!read.has(wall.id)) {
        stand.push({
          kind: 'length',
          wallId: wall.id,
          zMm,
          yMm: 0,
          valueMm: Math.max(1, wall.nominalLengthMm),
          uMm: DRAWN_LENGTH_U_MM,
          readingIds: [],
          unit,
        });
      }
      if ((chain.closed || i > 0) && !turned.has(wall.id)) {
        stand.push({
          kind: 'corner',
          cornerWallId: wall.id,
          zMm,
          angleDeg: wall.leftCornerDeg ?? 90,
          uDeg: DRAWN_ANGLE_U_DEG,
          armLeftMm: 1,
          armRightMm: 1,
          proudLeft: { valueMm: 0, uMm: 0 },
          proudRight: { valueMm: 0, uMm: 0 },
          legs: null,
          readingIds: [],
          unit,
        });
      }
      return stand;
    }),
  );
}

/** Ids of the readings named by problems of the adjustment, to be left out of the next try. */
export function withoutReadings(
  observations: RoomObservation[],
  ids: ReadonlySet<string>,
): RoomObservation[] {
  return observations.filter(({ readingIds }) => !readingIds.some((id) => ids.has(id)));
}
