import type { CornerFit } from '@/lib/measure/fit';
import type { PlanSheet } from './plan';
import type { PlanWall } from './room-plan';
import {
  type Bounds,
  boundsOf,
  type Point,
  type Shape,
  smallTextSizePx,
  type Tone,
  text,
} from './shape';
import { direction, moved, turned } from './vector';
import { worstTone } from './worst-tone';

const squareReachMm = 620;

/** Each corner: its angle, how far it is open or closed, and where square would be, drawn larger. */
export function planCorners(sheet: PlanSheet): Shape[] {
  return sheet.fit.corners.flatMap((corner) => {
    const wall = sheet.walls.find(({ wallId }) => wallId === corner.cornerWallId);
    const before = sheet.walls.find(({ wallId }) => wallId === corner.leftWallId);
    if (!wall || !before || !corner.angle) return [];
    const { angle, saysOut } = cornerWords(corner);
    return [
      {
        kind: 'part',
        part: { kind: 'corner', id: corner.cornerWallId },
        label: `Corner ${corner.name}, ${angle}, ${saysOut.join(' ')}`,
        touch: cornersOf(boundsOf(label(sheet, { corner, wall, before }), 6)),
        shapes: [
          ...squareLine(sheet, { corner, wall, before }),
          ...label(sheet, { corner, wall, before }),
        ],
      } satisfies Shape,
    ];
  });
}

/** The words at a corner, as they are drawn; none where it is not read. */
export function cornerLabel(sheet: PlanSheet, cornerWallId: string): Shape[] {
  const corner = sheet.fit.corners.find((one) => one.cornerWallId === cornerWallId);
  const wall = sheet.walls.find(({ wallId }) => wallId === cornerWallId);
  const before = sheet.walls.find(({ wallId }) => wallId === corner?.leftWallId);
  return corner?.angle && wall && before ? label(sheet, { corner, wall, before }) : [];
}

type Corner = { corner: CornerFit; wall: PlanWall; before: PlanWall };

/** Where the left arm would stand if the corner were true, turned away from where it does stand. */
function squareLine(sheet: PlanSheet, { corner, wall, before }: Corner): Shape[] {
  const deviationDeg = corner.deviation?.value ?? 0;
  if (corner.trueWithinReading || deviationDeg === 0) return [];
  const arm: Point = [-before.along[0], -before.along[1]];
  const reachMm = Math.min(squareReachMm, before.lengthMm * 0.6);
  const square = turned(arm, deviationDeg * sheet.exaggeration);
  const tip = moved(wall.from, square, reachMm, wall.inward, 0);
  const armTip = moved(wall.from, arm, reachMm, wall.inward, 0);
  return [
    { kind: 'line', layer: 'square', points: [sheet.at(wall.from), sheet.at(tip)] },
    { kind: 'line', layer: 'square', points: arc(sheet, wall.from, tip, armTip) },
  ];
}

function arc(sheet: PlanSheet, centre: Point, from: Point, to: Point): Point[] {
  const angleOf = (point: Point) => Math.atan2(point[1] - centre[1], point[0] - centre[0]);
  const radius = Math.hypot(from[0] - centre[0], from[1] - centre[1]) * 0.92;
  const start = angleOf(from);
  const full = angleOf(to) - start;
  const sweep = Math.atan2(Math.sin(full), Math.cos(full));
  return Array.from({ length: 9 }, (_, step) => {
    const angle = start + (sweep * step) / 8;
    return sheet.at([centre[0] + radius * Math.cos(angle), centre[1] + radius * Math.sin(angle)]);
  });
}

/** Outside the room in the square between two dimensions; at an outside corner inside, where it is free. */
function label(sheet: PlanSheet, { corner, wall, before }: Corner): Shape[] {
  const { angle, saysOut, tone } = cornerWords(corner);
  const into = direction(
    [0, 0],
    [wall.inward[0] + before.inward[0], wall.inward[1] + before.inward[1]],
  );
  const sign = corner.nominalDeg > 180 ? 1 : -1;
  const [x, y] = moved(sheet.at(wall.from), into, sign * 38, wall.inward, 0);
  const anchor = into[0] * sign > 0.2 ? 'start' : into[0] * sign < -0.2 ? 'end' : 'middle';
  const lines = [angle, ...saysOut];
  const top = into[1] * sign > 0 ? y + 4 : y - (lines.length - 1) * 15 + 4;
  return lines.map((words, index) =>
    text([x, top + index * 15], words, {
      anchor,
      tone: index === 0 ? 'strong' : tone,
      sizePx: index === 0 ? undefined : smallTextSizePx,
    }),
  );
}

function cornersOf({ left, top, width, height }: Bounds): Point[] {
  return [
    [left, top],
    [left + width, top],
    [left + width, top + height],
    [left, top + height],
  ];
}

/** How a corner is told: its angle, and under it how far out it is. */
export function cornerWords(corner: CornerFit): { angle: string; saysOut: string[]; tone: Tone } {
  const { angle, deviation, trueWithinReading } = corner;
  const degrees = (value: number) => `${value.toFixed(1)}°`;
  const tone = worstTone(corner.verdicts);
  if (!angle || !deviation) return { angle: 'not read', saysOut: [], tone: 'quiet' };
  if (trueWithinReading) {
    return { angle: degrees(angle.value), saysOut: ['true within', 'the reading'], tone };
  }
  const side = deviation.value > 0 ? 'open' : 'closed';
  // A tenth of a degree would say 0.0 of a corner that is proved to be out.
  const places = Math.abs(deviation.value) < 0.1 ? 2 : 1;
  const out = Math.abs(deviation.value).toFixed(places);
  return {
    angle: degrees(angle.value),
    saysOut: [`${side} ${out}°`, `± ${upDegrees(deviation.U, places)}`],
    tone,
  };
}

/** U is never shown smaller than it is. */
function upDegrees(U: number, places: number): string {
  const marks = 10 ** places;
  return `${(Math.ceil(U * marks - 1e-9) / marks).toFixed(places)}°`;
}
