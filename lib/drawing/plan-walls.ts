import type { Reading } from '@/lib/contracts/readings';
import { standingReadings } from '@/lib/measure/standing-readings';
import { figureText } from '@/lib/sheet/figure-text';
import { dimension } from './dimension';
import { bare } from './figure-spans';
import type { PlanSheet } from './plan';
import type { PlanWall } from './room-plan';
import { type DrawnText, type Point, type Shape, text } from './shape';
import { moved } from './vector';

const bodyPx = 15;
const wallDimensionPx = 44;

/** Each wall: its body, its face drawn larger than life, its openings, its name and its length. */
export function planWalls(sheet: PlanSheet): Shape[] {
  return sheet.walls.map((wall) => ({
    kind: 'part',
    part: { kind: 'wall', id: wall.wallId },
    label: `Wall ${wall.name}, ${spokenLength(sheet, wall)}`,
    touch: band(sheet, wall),
    shapes: [
      ...body(sheet, wall),
      ...openings(sheet, wall),
      ...wallDimension(sheet, wall),
      ...nameTag(sheet, wall),
    ],
  }));
}

function wallDimension(sheet: PlanSheet, wall: PlanWall): Shape[] {
  return dimension(sheet.at(wall.from), sheet.at(wall.to), {
    offsetPx: wallDimensionPx,
    spans: lengthSpans(sheet, wall),
  });
}

/** The figure of a wall's dimension, as it is drawn. */
export function wallFigure(sheet: PlanSheet, wall: PlanWall): Shape {
  const figure = wallDimension(sheet, wall).find(({ kind }) => kind === 'text');
  return figure ?? text(sheet.at(wall.from), wall.name);
}

/** From a little inside the room out past the dimension. */
function band(sheet: PlanSheet, wall: PlanWall): Point[] {
  const place = (point: Point, px: number) =>
    moved(sheet.at(point), wall.along, 0, wall.inward, px);
  const [inside, outside] = [14, -(wallDimensionPx + 18)];
  return [
    place(wall.from, inside),
    place(wall.to, inside),
    place(wall.to, outside),
    place(wall.from, outside),
  ];
}

/** A place on the exaggerated face of a wall, in drawing units. */
export function onFace(sheet: PlanSheet, wall: PlanWall, xMm: number, outMm: number): Point {
  return sheet.at(moved(wall.from, wall.along, xMm, wall.inward, outMm * sheet.exaggeration));
}

function body(sheet: PlanSheet, wall: PlanWall): Shape[] {
  const face: Point[] = [
    sheet.at(wall.from),
    ...(sheet.faces.get(wall.wallId) ?? []).map(({ xMm, proudMm }) =>
      onFace(sheet, wall, xMm, proudMm),
    ),
    sheet.at(wall.to),
  ];
  const back = (point: Point): Point => moved(point, wall.along, 0, wall.inward, -bodyPx);
  const outline = [...face, back(sheet.at(wall.to)), back(sheet.at(wall.from))];
  return [
    { kind: 'area', layer: 'wall-body', points: outline },
    { kind: 'line', layer: 'wall-face', points: face },
  ];
}

type Feature = Extract<Reading, { kind: 'feature' }>;

function openingsOf(sheet: PlanSheet, wall: PlanWall): Feature[] {
  return standingReadings(sheet.wallBook.readings).filter(
    (reading): reading is Feature =>
      reading.kind === 'feature' &&
      reading.wallId === wall.wallId &&
      ['window', 'door', 'opening'].includes(reading.feature),
  );
}

function openings(sheet: PlanSheet, wall: PlanWall): Shape[] {
  return openingsOf(sheet, wall).flatMap((feature) => {
    const place = (xMm: number, px: number) =>
      moved(
        sheet.at(moved(wall.from, wall.along, xMm, wall.inward, 0)),
        wall.along,
        0,
        wall.inward,
        px,
      );
    const { x0Mm, x1Mm } = feature;
    const hole: Shape = {
      kind: 'area',
      layer: 'opening',
      points: [place(x0Mm, 0), place(x1Mm, 0), place(x1Mm, -bodyPx), place(x0Mm, -bodyPx)],
    };
    const pane: Shape = {
      kind: 'line',
      layer: 'feature',
      points: [place(x0Mm, -bodyPx / 2), place(x1Mm, -bodyPx / 2)],
    };
    if (feature.feature === 'window') return [hole, pane];
    return feature.feature === 'door' ? [hole, ...leaf(sheet, wall, feature)] : [hole];
  });
}

/** The leaf standing open and the way it sweeps; a door whose swing was not read shows its hole alone. */
function leaf(sheet: PlanSheet, wall: PlanWall, { swing, x0Mm, x1Mm }: Feature): Shape[] {
  if (swing === 'none') return [];
  const isLeft = swing.endsWith('left');
  const [hingeMm, freeMm] = isLeft ? [x0Mm, x1Mm] : [x1Mm, x0Mm];
  const hinge = moved(wall.from, wall.along, hingeMm, wall.inward, 0);
  const inwards = swing.startsWith('in') ? 1 : -1;
  const width = Math.abs(x1Mm - x0Mm);
  const sweep = Array.from({ length: 10 }, (_, step): Point => {
    const angle = ((step / 9) * Math.PI) / 2;
    const along = Math.sign(freeMm - hingeMm) * width * Math.cos(angle);
    return sheet.at(
      moved(hinge, wall.along, along, wall.inward, inwards * width * Math.sin(angle)),
    );
  });
  const open = sweep.at(-1) ?? sheet.at(hinge);
  return [
    { kind: 'line', layer: 'feature', points: sweep },
    { kind: 'line', layer: 'wall-face', points: [sheet.at(hinge), open] },
  ];
}

function lengthSpans(sheet: PlanSheet, wall: PlanWall): DrawnText['spans'] {
  const fitted = sheet.fit.walls.find(({ wallId }) => wallId === wall.wallId);
  const figure = fitted?.length ?? fitted?.readAt[0]?.length ?? null;
  if (!figure) return [{ words: 'not read', tone: 'quiet' }];
  const { value, surely } = figureText(figure, sheet.rules);
  return [
    { words: bare(value), tone: 'strong' },
    { words: ` ± ${bare(surely)}`, tone: 'quiet' },
  ];
}

function spokenLength(sheet: PlanSheet, wall: PlanWall): string {
  return lengthSpans(sheet, wall)
    .map(({ words }) => words)
    .join('');
}

/** Where a wall's letter stands: on its body, beside what opens there. */
export function nameTagPlace(sheet: PlanSheet, wall: PlanWall): Point {
  const holes = openingsOf(sheet, wall);
  const tagMm = 10 / sheet.pxPerMm;
  const part = [0.5, 0.35, 0.65, 0.2, 0.8].find((candidate) => {
    const xMm = candidate * wall.lengthMm;
    return holes.every(({ x0Mm, x1Mm }) => xMm + tagMm < x0Mm || xMm - tagMm > x1Mm);
  });
  const middle = moved(wall.from, wall.along, wall.lengthMm * (part ?? 0.5), wall.inward, 0);
  return moved(sheet.at(middle), wall.along, 0, wall.inward, -bodyPx / 2);
}

function nameTag(sheet: PlanSheet, wall: PlanWall): Shape[] {
  const [x, y] = nameTagPlace(sheet, wall);
  const half = 10;
  return [
    {
      kind: 'area',
      layer: 'name-tag',
      points: [
        [x - half, y - half],
        [x + half, y - half],
        [x + half, y + half],
        [x - half, y + half],
      ],
    },
    text([x, y + 5], wall.name, { tone: 'strong' }),
  ];
}
