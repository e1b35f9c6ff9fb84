import { askedDiagonals } from './asked-diagonals';
import { closureEllipses } from './closure-ellipses';
import { type ClosureFrame, type ClosureSource, closureFrame } from './closure-frame';
import { closureSuspects } from './closure-suspects';
import { askedLines, closureWalks, readDiagonals, roomWalls } from './closure-walk';
import { largestWithin } from './exaggeration';
import { boundsOf, type Drawing, type Point, type Shape } from './shape';

/** Everything is laid out in this frame; the two factors say how much larger the small things are drawn. */
export type ClosureSheet = ClosureSource &
  ClosureFrame & {
    at: (mm: Point) => Point;
    pxPerMm: number;
    walkFactor: number;
    ellipseFactor: number;
  };

export type ClosureDrawing = Drawing & {
  /** How many times larger than life the walk as read departs, and the ellipses are; 1 where none is drawn. */
  walkFactor: number;
  ellipseFactor: number;
};

const marginPx = 40;
/** Of the room's greater side, what the largest departure and the largest ellipse may take. */
const walkShare = 0.14;
const ellipseShare = 0.09;

/**
 * Does the room close: the walls as evened out, the walk as read with the gap where it fails to meet its
 * start, where each corner lies 95 times of 100, the diagonals read and asked for, the suspect marked.
 *
 * Edge: null while the room cannot be evened out. An open chain has no walk to close, so only its ellipses
 * are drawn. Each factor is the largest of 1, 2, 5, 10 … 500 that keeps what it enlarges in its share.
 * Example: a room of 3600 mm that fails by 14 mm is drawn with the gap ×20.
 */
export function drawClosure(
  source: ClosureSource,
  { widthPx = 346 }: { widthPx?: number } = {},
): ClosureDrawing | null {
  const frame = closureFrame(source);
  if (!frame || frame.walls.length === 0) return null;
  const points = frame.walls.flatMap(({ from, to }) => [from, to]);
  const [left, top] = [Math.min(...points.map(([x]) => x)), Math.min(...points.map(([, y]) => y))];
  const widthMm = Math.max(...points.map(([x]) => x)) - left;
  const heightMm = Math.max(...points.map(([, y]) => y)) - top;
  const sideMm = Math.max(widthMm, heightMm, 1);
  const pxPerMm = (widthPx - 2 * marginPx) / Math.max(widthMm, heightMm * 0.8, 1);
  const departuresMm = frame.walks.flatMap(({ read, adjusted }) =>
    read.map((point, index) => distance(point, adjusted[index] ?? point)),
  );
  const sheet: ClosureSheet = {
    ...source,
    ...frame,
    pxPerMm,
    at: ([x, y]) => [(x - left) * pxPerMm, (y - top) * pxPerMm],
    walkFactor: largestWithin(Math.max(0, ...departuresMm), sideMm * walkShare),
    ellipseFactor: largestWithin(
      Math.max(0, ...frame.corners.map(({ aMm }) => aMm)),
      sideMm * ellipseShare,
    ),
  };
  const shapes: Shape[] = [
    ...readDiagonals(sheet),
    ...roomWalls(sheet),
    ...closureWalks(sheet),
    ...closureEllipses(sheet),
    ...askedLines(sheet, askedDiagonals(source.fit)),
    ...closureSuspects(sheet),
  ];
  const { walkFactor, ellipseFactor } = sheet;
  return {
    shapes,
    bounds: boundsOf(shapes, 8),
    exaggeration: Math.max(walkFactor, ellipseFactor),
    pxPerMm,
    walkFactor,
    ellipseFactor,
  };
}

const distance = (one: Point, other: Point) => Math.hypot(one[0] - other[0], one[1] - other[1]);
