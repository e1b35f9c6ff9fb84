import { type ElevationSheet, edgeAt, type WallPlace } from './elevation-frame';
import { type Point, type Shape, text } from './shape';
import { suspectMarks } from './suspects';

const suspectPx = 20;
const collisionPx = 15;

/** What is wrong on this wall: suspects ringed, collisions numbered as in the list beside the drawing. */
export function elevationTrouble(sheet: ElevationSheet): Shape[] {
  return [...suspects(sheet), ...collisions(sheet)];
}

function suspects(sheet: ElevationSheet): Shape[] {
  return suspectMarks(sheet, { byHeight: true }).flatMap(({ place, words }) => {
    if (!('wallId' in place) || place.wallId !== sheet.wallId) return [];
    if (place.kind === 'spot') return [ring(sheet, { xMm: place.xMm, zMm: place.zMm })];
    // A height over the drawn wall would put the ring in the air above it.
    const zMm = Math.min(Math.max(place.zMm ?? 0, 0), sheet.topMm);
    const ends = [edgeAt(sheet.edges.left, zMm), edgeAt(sheet.edges.right, zMm)] as const;
    const [from, to] = ends.map((xMm) => sheet.at({ xMm, zMm }));
    if (!from || !to) return [];
    const middle: Point = [(from[0] + to[0]) / 2, from[1] - 6];
    return [
      { kind: 'line', layer: 'suspect', points: [from, to] } satisfies Shape,
      ring(sheet, { xMm: ends[1], zMm }),
      text(middle, words, { tone: 'over' }),
    ];
  });
}

function ring(sheet: ElevationSheet, place: WallPlace): Shape {
  const zMm = Math.min(Math.max(place.zMm, 0), sheet.topMm);
  const centre = sheet.at({ ...place, zMm });
  return { kind: 'circle', layer: 'suspect', centre, radius: suspectPx };
}

function collisions(sheet: ElevationSheet): Shape[] {
  const ofWall = new Set(sheet.ofWall.map(({ run }) => run.id));
  return sheet.fit.collisions.flatMap(({ runId, xMm, zMm }, index) => {
    if (!ofWall.has(runId)) return [];
    const centre = sheet.at({ xMm, zMm });
    const numberAt: Point = [centre[0] - collisionPx - 3, centre[1] + 5];
    return [
      { kind: 'circle', layer: 'collision', centre, radius: collisionPx } satisfies Shape,
      text(numberAt, String(index + 1), { tone: 'over', anchor: 'end' }),
    ];
  });
}
