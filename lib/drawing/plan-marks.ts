import type { FloorPoint } from '@/lib/measure/fit';
import { standingReadings } from '@/lib/measure/standing-readings';
import { formatLength } from '@/lib/units/format-length';
import { figureAlong } from './dimension';
import { bare } from './figure-spans';
import type { PlanSheet } from './plan';
import { type Point, type Shape, smallTextSizePx, text } from './shape';
import { between, moved } from './vector';

/** What lies in the room: the diagonals as read, the high point and the low point of the floor. */
export function planMarks(sheet: PlanSheet): Shape[] {
  return [...diagonals(sheet), ...floorMarks(sheet)];
}

/** The two ends of a diagonal, in drawing units; null where a corner is not in the plan. */
export function diagonalEnds(
  sheet: PlanSheet,
  reading: { fromCornerWallId: string; toCornerWallId: string },
): [Point, Point] | null {
  const cornerOf = (id: string) => sheet.walls.find(({ wallId }) => wallId === id)?.from;
  const [from, to] = [cornerOf(reading.fromCornerWallId), cornerOf(reading.toCornerWallId)];
  return from && to ? [sheet.at(from), sheet.at(to)] : null;
}

/** Where the figure of a diagonal stands: off the middle, where two of them cross. */
export const diagonalFigurePart = 0.34;

function diagonals(sheet: PlanSheet): Shape[] {
  const { unit, stepMm } = sheet.rules;
  return standingReadings(sheet.wallBook.readings).flatMap((reading) => {
    if (reading.kind !== 'diagonal') return [];
    const ends = diagonalEnds(sheet, reading);
    if (!ends) return [];
    const [from, to] = ends;
    const figure = bare(formatLength(reading.valueMm, { unit, stepMm }));
    const near = (part: number) => between(from, to, diagonalFigurePart + part);
    return [
      { kind: 'line', layer: 'diagonal', points: [from, to] } satisfies Shape,
      figureAlong(near(-0.01), near(0.01), {
        spans: [{ words: figure, tone: 'quiet' }],
        sizePx: smallTextSizePx,
      }),
    ];
  });
}

function floorMarks(sheet: PlanSheet): Shape[] {
  const { floor } = sheet.fit;
  if (!floor) return [];
  const { unit, stepMm } = sheet.rules;
  const fall = bare(formatLength(floor.lowPoint.heightMm, { unit, stepMm }));
  return [
    ...mark(sheet, floor.highPoint, 'high point', true),
    ...mark(sheet, floor.lowPoint, `floor ${fall}`, false),
  ];
}

function mark(sheet: PlanSheet, point: FloorPoint, words: string, isHigh: boolean): Shape[] {
  const wall = sheet.walls.find(({ wallId }) => wallId === point.wallId);
  if (!wall) return [];
  const [x, y] = sheet.at(moved(wall.from, wall.along, point.xMm, wall.inward, point.yMm));
  const isRight = x > sheet.at(between(wall.from, wall.to, 0.5))[0];
  return [
    {
      kind: 'area',
      layer: isHigh ? 'high-point' : 'low-point',
      points: [
        [x, y],
        [x - 7, y - 11],
        [x + 7, y - 11],
      ],
    },
    text([x + (isRight ? -11 : 11), y - 3], words, {
      tone: 'site',
      anchor: isRight ? 'end' : 'start',
      sizePx: smallTextSizePx,
    }),
  ];
}
