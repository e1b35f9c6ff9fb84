import type { ClosureSheet } from './closure-picture';
import { figureAlong } from './dimension';
import { type Point, type Shape, smallTextSizePx, text } from './shape';
import { type SuspectPlace, suspectMarks } from './suspects';
import { between, moved } from './vector';

const ringPx = 12;
const wordsPx = 22;

/** The suspect drawn thick with a question in a ring on it, so that it shows without its colour. */
export function closureSuspects(sheet: ClosureSheet): Shape[] {
  return suspectMarks(sheet).flatMap(({ place, words }): Shape[] => {
    if (place.kind === 'corner') return cornerMark(sheet, place.cornerWallId, words);
    const line = lineOf(sheet, place);
    if (!line) return [];
    const { from, to, inward } = line;
    const along = (point: Point) => moved(point, [1, 0], inward[0], [0, 1], inward[1]);
    return [
      { kind: 'line', layer: 'suspect-line', points: [from, to] },
      ...question(between(from, to, line.ringPart)),
      figureAlong(along(from), along(to), {
        spans: [{ words, tone: 'over' }],
        sizePx: smallTextSizePx,
      }),
    ];
  });
}

type SuspectLine = { from: Point; to: Point; inward: Point; ringPart: number };

/** A wall or a diagonal in the picture, and how far inward its words stand. */
function lineOf(
  sheet: ClosureSheet,
  place: Exclude<SuspectPlace, { kind: 'corner' }>,
): SuspectLine | null {
  if (place.kind === 'diagonal') {
    const corner = (id: string) => sheet.walls.find(({ wallId }) => wallId === id)?.from;
    const [from, to] = [corner(place.fromCornerWallId), corner(place.toCornerWallId)];
    return from && to
      ? { from: sheet.at(from), to: sheet.at(to), inward: [0, 0], ringPart: 0.2 }
      : null;
  }
  const wall = sheet.walls.find(({ wallId }) => wallId === place.wallId);
  if (!wall) return null;
  const inward: Point = [wall.inward[0] * wordsPx, wall.inward[1] * wordsPx];
  return { from: sheet.at(wall.from), to: sheet.at(wall.to), inward, ringPart: 0.5 };
}

function cornerMark(sheet: ClosureSheet, cornerWallId: string, words: string): Shape[] {
  const wall = sheet.walls.find(({ wallId }) => wallId === cornerWallId);
  const before = sheet.walls.find(({ wallId }) => wallId === wall?.beforeId);
  if (!wall) return [];
  const centre = sheet.at(wall.from);
  const side = before ?? wall;
  const [x, y] = moved(centre, wall.inward, ringPx + 10, side.inward, ringPx + 10);
  const isRight = x < centre[0];
  return [
    { kind: 'circle', layer: 'suspect', centre, radius: ringPx + 6 },
    text([x, y + 4], words, {
      tone: 'over',
      sizePx: smallTextSizePx,
      anchor: isRight ? 'end' : 'start',
    }),
  ];
}

function question([x, y]: Point): Shape[] {
  return [
    { kind: 'circle', layer: 'suspect-ring', centre: [x, y], radius: ringPx },
    text([x, y + 5], '?', { tone: 'over' }),
  ];
}
