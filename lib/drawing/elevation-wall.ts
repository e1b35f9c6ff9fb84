import { standingReadings } from '@/lib/measure/standing-readings';
import { type ElevationSheet, heightAt, type WallPlace } from './elevation-frame';
import { type Point, type Shape, smallTextSizePx, text } from './shape';

/** The wall itself: its ends as they lean, the floor as it lies, the ceiling. */
export function elevationWall(sheet: ElevationSheet): Shape[] {
  const { edges, floor, ceiling, at } = sheet;
  const line = (layer: 'wall-face' | 'floor', places: readonly WallPlace[]): Shape => ({
    kind: 'line',
    layer,
    points: places.map(at),
  });
  const reach = 46 / sheet.pxPerMm;
  const floorEnds: WallPlace[] = [
    { xMm: (floor[0]?.xMm ?? 0) - reach, zMm: floor[0]?.zMm ?? 0 },
    ...floor,
    { xMm: (floor.at(-1)?.xMm ?? sheet.lengthMm) + reach, zMm: floor.at(-1)?.zMm ?? 0 },
  ];
  const down = (edge: readonly WallPlace[]): WallPlace[] => {
    const [foot] = edge;
    return foot ? [{ xMm: foot.xMm, zMm: heightAt(floor, foot.xMm) }, ...edge] : [...edge];
  };
  return [
    { kind: 'area', layer: 'wall-surface', points: surface(sheet) },
    line('wall-face', down(edges.left)),
    line('wall-face', down(edges.right)),
    line('floor', floorEnds),
    ...(ceiling ? [line('wall-face', ceiling)] : []),
  ];
}

function surface({ edges, floor, ceiling, at }: ElevationSheet): Point[] {
  const top = ceiling ?? [];
  return [...floor, ...edges.right, ...[...top].reverse(), ...[...edges.left].reverse()].map(at);
}

/** Studs as dash-dot lines from floor to ceiling: as found, or as predicted from their spacing. */
export function elevationStuds(sheet: ElevationSheet): Shape[] {
  const places = new Map<number, boolean>();
  const add = (xMm: number, isPredicted: boolean) => {
    const near = [...places.keys()].find((known) => Math.abs(known - xMm) < 12);
    if (near === undefined) places.set(xMm, isPredicted);
    else if (!isPredicted) places.set(near, false);
  };
  for (const reading of standingReadings(sheet.wallBook.readings)) {
    if (reading.kind === 'stud' && reading.wallId === sheet.wallId) add(reading.xMm, false);
  }
  for (const { runFit } of sheet.ofWall) {
    for (const unit of runFit.units) {
      for (const stud of unit.studs?.studs ?? []) add(stud.xMm, stud.predicted);
    }
  }
  const inOrder = [...places].sort(([one], [other]) => one - other);
  return inOrder.flatMap(([xMm, isPredicted], index) => {
    const foot = sheet.at({ xMm, zMm: heightAt(sheet.floor, xMm) });
    const head = sheet.at({ xMm, zMm: sheet.topMm });
    const isFirst = inOrder.findIndex(([, predicted]) => predicted === isPredicted) === index;
    return [
      {
        kind: 'line',
        layer: isPredicted ? 'stud-predicted' : 'stud',
        points: [foot, [head[0], head[1] - 14]],
      } satisfies Shape,
      ...(isFirst
        ? [
            text([head[0] + 5, head[1] - 6], isPredicted ? 'stud (predicted)' : 'stud', {
              tone: 'site',
              anchor: 'start',
              sizePx: smallTextSizePx,
            }),
          ]
        : []),
    ];
  });
}
