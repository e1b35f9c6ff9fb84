import { type ElevationSheet, edgeAt, type WallPlace } from './elevation-frame';
import { type Point, type Shape, text } from './shape';

const suspectPx = 20;
const collisionPx = 15;

/** What is wrong on this wall: suspects ringed, collisions numbered as in the list beside the drawing. */
export function elevationTrouble(sheet: ElevationSheet): Shape[] {
  return [...suspects(sheet), ...collisions(sheet)];
}

function suspects(sheet: ElevationSheet): Shape[] {
  const ids = new Set(
    (sheet.fit.closure.suspect?.readings ?? []).flatMap(({ readingIds }) => readingIds),
  );
  return sheet.wallBook.readings.flatMap((reading) => {
    if (!ids.has(reading.id) || !('wallId' in reading) || reading.wallId !== sheet.wallId) {
      return [];
    }
    const place: WallPlace | null =
      reading.kind === 'length'
        ? { xMm: edgeAt(sheet.edges.right, reading.zMm), zMm: reading.zMm }
        : 'zMm' in reading && 'xMm' in reading
          ? { xMm: reading.xMm, zMm: reading.zMm }
          : null;
    return place
      ? [{ kind: 'circle', layer: 'suspect', centre: sheet.at(place), radius: suspectPx } as const]
      : [];
  });
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
