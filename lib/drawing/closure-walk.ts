import { standingReadings } from '@/lib/measure/standing-readings';
import { formatLength } from '@/lib/units/format-length';
import type { AskedDiagonal } from './asked-diagonals';
import type { WalkAsRead } from './closure-frame';
import type { ClosureSheet } from './closure-picture';
import { figureAlong } from './dimension';
import { type Point, type Shape, smallTextSizePx, text } from './shape';
import { between, direction, moved } from './vector';

const letterPx = 22;
/** Beside the gap, past what is said along the walls of its corner. */
const gapWordsPx = [14, 42] as const;

/** The walls as evened out, each with its letter outside. */
export function roomWalls(sheet: ClosureSheet): Shape[] {
  return sheet.walls.flatMap(({ from, to, inward, along, name }): Shape[] => {
    const [start, end] = [sheet.at(from), sheet.at(to)];
    const [x, y] = moved(between(start, end, 0.5), along, 0, inward, -letterPx);
    return [
      { kind: 'line', layer: 'wall-face', points: [start, end] },
      text([x, y + 5], name, { tone: 'strong' }),
    ];
  });
}

/** Each closed chain as it was walked, departures enlarged, and the gap at which it ends. */
export function closureWalks(sheet: ClosureSheet): Shape[] {
  return sheet.walks.flatMap((walk) => {
    const points = walk.read.map((point, index) => departed(sheet, point, walk.adjusted[index]));
    return [
      { kind: 'line', layer: 'walk-as-read', points } satisfies Shape,
      ...gap(sheet, walk, points),
    ];
  });
}

function departed(sheet: ClosureSheet, read: Point, adjusted: Point = read): Point {
  const by = sheet.walkFactor;
  return sheet.at([
    adjusted[0] + (read[0] - adjusted[0]) * by,
    adjusted[1] + (read[1] - adjusted[1]) * by,
  ]);
}

/** A thick line from where the walk ends to where it began, its true size beside it. */
function gap(sheet: ClosureSheet, { gapMm }: WalkAsRead, points: readonly Point[]): Shape[] {
  const [start, end] = [points[0], points.at(-1)];
  if (!start || !end) return [];
  const middle = between(start, end, 0.5);
  const [inX, inY] = direction(middle, roomMiddle(sheet)).map((part) => (part < 0 ? -1 : 1));
  const at: Point = [
    middle[0] + (inX ?? 1) * gapWordsPx[0],
    middle[1] + (inY ?? 1) * gapWordsPx[1],
  ];
  return [
    { kind: 'line', layer: 'walk-gap', points: [end, start] },
    { kind: 'circle', layer: 'walk-gap', centre: end, radius: 3 },
    text(at, `gap ${formatLength(gapMm, sheet.rules)}`, {
      tone: 'strong',
      sizePx: smallTextSizePx,
      anchor: inX === -1 ? 'end' : 'start',
    }),
  ];
}

function roomMiddle({ walls, at }: ClosureSheet): Point {
  const xs = walls.map(({ from }) => from[0]);
  const ys = walls.map(({ from }) => from[1]);
  return at([(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2]);
}

/** The diagonals in the book, as thin broken lines. */
export function readDiagonals(sheet: ClosureSheet): Shape[] {
  return standingReadings(sheet.wallBook.readings).flatMap((reading) => {
    if (reading.kind !== 'diagonal') return [];
    const ends = [
      cornerOf(sheet, reading.fromCornerWallId, reading.fromEnd),
      cornerOf(sheet, reading.toCornerWallId, reading.toEnd),
    ];
    const [from, to] = ends;
    return from && to ? [{ kind: 'line', layer: 'diagonal', points: [from, to] } as const] : [];
  });
}

/** The diagonals that would settle it, the first with the words that ask for it. */
export function askedLines(sheet: ClosureSheet, asked: readonly AskedDiagonal[]): Shape[] {
  return asked.flatMap(({ fromCornerWallId, toCornerWallId }, index): Shape[] => {
    const [from, to] = [cornerOf(sheet, fromCornerWallId), cornerOf(sheet, toCornerWallId)];
    if (!from || !to) return [];
    const words = index === 0 ? 'take this' : 'or this';
    const near = (part: number) => between(from, to, (index === 0 ? 0.35 : 0.66) + part);
    return [
      { kind: 'line', layer: 'diagonal-asked', points: [from, to] },
      figureAlong(near(-0.01), near(0.01), {
        spans: [{ words, tone: 'site' }],
        sizePx: smallTextSizePx,
      }),
    ];
  });
}

/** Where a corner stands: the wall's left one, or its far end in an open chain. */
function cornerOf(
  sheet: ClosureSheet,
  id: string,
  end: 'left' | 'right' = 'left',
): Point | undefined {
  const wall = sheet.walls.find(({ wallId }) => wallId === id);
  return wall && sheet.at(end === 'left' ? wall.from : wall.to);
}
