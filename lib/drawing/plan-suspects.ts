import type { Reading } from '@/lib/contracts/wall-book';
import type { Suspect } from '@/lib/measure/room-closure';
import { formatLength } from '@/lib/units/format-length';
import { figureAlong } from './dimension';
import type { PlanSheet } from './plan';
import { diagonalEnds, diagonalFigurePart } from './plan-marks';
import { wallDimensionPx } from './plan-walls';
import { type Point, type Shape, smallTextSizePx, text, textSizePx } from './shape';
import { between, moved } from './vector';

const radiusPx = 30;

/** A ring round the figure of each reading that is most likely wrong, and by how much it may be. */
export function planSuspects(sheet: PlanSheet): Shape[] {
  const suspects = sheet.fit.closure.suspect?.readings ?? [];
  const byId = new Map(sheet.wallBook.readings.map((reading) => [reading.id, reading]));
  return suspects.flatMap(({ readingIds, slip, unit, known }) => {
    const reading = readingIds.map((id) => byId.get(id)).find((found) => found !== undefined);
    const centre = reading ? placeOf(sheet, reading) : null;
    if (!centre) return [];
    const words = slipWords({ slip, unit, known }, sheet.rules);
    const under: Point = [centre[0], centre[1] + radiusPx + 14];
    return [
      { kind: 'circle', layer: 'suspect', centre, radius: radiusPx } satisfies Shape,
      text(under, words, { tone: 'over', sizePx: smallTextSizePx }),
    ];
  });
}

type Slip = Pick<Suspect['readings'][number], 'slip' | 'unit' | 'known'>;

/** "100 mm too long?": as it is known from slips of the hand, else as it was found. */
function slipWords({ slip, unit, known }: Slip, rules: PlanSheet['rules']): string {
  if (unit === 'deg') return `${Math.abs(slip).toFixed(1)}° too ${slip > 0 ? 'wide' : 'narrow'}?`;
  if (unit === 'mm/m') {
    return `leans ${Math.abs(slip).toFixed(1)} mm/m too far ${slip > 0 ? 'in' : 'out'}?`;
  }
  return `${known ?? formatLength(Math.abs(slip), rules)} too ${slip > 0 ? 'long' : 'short'}?`;
}

function placeOf(sheet: PlanSheet, reading: Reading): Point | null {
  const wallOf = (id: string) => sheet.walls.find(({ wallId }) => wallId === id);
  if (reading.kind === 'diagonal') {
    const ends = diagonalEnds(sheet, reading);
    return ends && between(ends[0], ends[1], diagonalFigurePart);
  }
  if (reading.kind === 'corner') {
    const wall = wallOf(reading.cornerWallId);
    return wall ? sheet.at(wall.from) : null;
  }
  if (!('wallId' in reading)) return null;
  const wall = wallOf(reading.wallId);
  if (!wall) return null;
  if (reading.kind === 'length') {
    const end = (point: Point) =>
      moved(sheet.at(point), wall.along, 0, wall.inward, -wallDimensionPx);
    const figure = figureAlong(end(wall.from), end(wall.to), { spans: [], sizePx: textSizePx });
    return [figure.at[0], figure.at[1]];
  }
  return 'xMm' in reading
    ? sheet.at(moved(wall.from, wall.along, reading.xMm, wall.inward, 0))
    : null;
}
