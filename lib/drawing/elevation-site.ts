import type { Reading } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import { featureWords } from '@/lib/sheet/reading-words';
import { formatLength } from '@/lib/units/format-length';
import { type ElevationSheet, heightAt, type WallPlace } from './elevation-frame';
import { bare } from './figure-spans';
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

type Feature = Extract<Reading, { kind: 'feature' }>;

/** Windows, doors and services where they were read; small things as a mark with their name. */
export function elevationFeatures(sheet: ElevationSheet): Shape[] {
  return standingReadings(sheet.wallBook.readings).flatMap((reading) =>
    reading.kind === 'feature' && reading.wallId === sheet.wallId ? feature(sheet, reading) : [],
  );
}

function feature(sheet: ElevationSheet, reading: Feature): Shape[] {
  const { x0Mm, x1Mm, z0Mm, z1Mm } = reading;
  const corner = (xMm: number, zMm: number) => sheet.at({ xMm, zMm });
  const outline = [corner(x0Mm, z0Mm), corner(x1Mm, z0Mm), corner(x1Mm, z1Mm), corner(x0Mm, z1Mm)];
  const closed: Shape = {
    kind: 'line',
    layer: 'feature',
    points: [...outline, ...outline.slice(0, 1)],
  };
  const words = featureWords[reading.feature];
  const [x, y] = corner((x0Mm + x1Mm) / 2, (z0Mm + z1Mm) / 2);
  if (reading.feature === 'window') {
    const middle = (x0Mm + x1Mm) / 2;
    const sash: Shape = {
      kind: 'line',
      layer: 'feature',
      points: [corner(middle, z0Mm), corner(middle, z1Mm)],
    };
    return [{ kind: 'area', layer: 'opening', points: outline }, closed, sash];
  }
  if (reading.feature === 'door' || reading.feature === 'opening') {
    return [
      { kind: 'area', layer: 'opening', points: outline },
      closed,
      text([x, y], words, { tone: 'site', sizePx: smallTextSizePx }),
    ];
  }
  const right = corner(x1Mm, (z0Mm + z1Mm) / 2)[0];
  return [
    closed,
    text([Math.max(right, x + 5) + 4, y + 4], words, {
      tone: 'site',
      anchor: 'start',
      sizePx: smallTextSizePx,
    }),
  ];
}

/** The level line under the boxes, the high point, and how high the kick is at both ends. */
export function elevationLevels(sheet: ElevationSheet): Shape[] {
  const shapes: Shape[] = [];
  const { unit, stepMm } = sheet.rules;
  const length = (mm: number) => bare(formatLength(mm, { unit, stepMm }));
  const reach = 50 / sheet.pxPerMm;
  const standing = sheet.ofWall.find(({ runFit }) => runFit.kicks);
  if (standing?.runFit.kicks) {
    const { run, runFit } = standing;
    const corners = standing.runFit.kicks.corners;
    const from = sheet.at({ xMm: -reach, zMm: run.z0Mm });
    const to = sheet.at({ xMm: sheet.lengthMm + reach, zMm: run.z0Mm });
    shapes.push({ kind: 'line', layer: 'datum', points: [from, to] });
    shapes.push(
      text([to[0], to[1] + 13], 'datum', {
        tone: 'strong',
        anchor: 'end',
        sizePx: smallTextSizePx,
      }),
    );
    const ends = [
      { unitId: runFit.units[0]?.unitId, corner: 'front-left', anchor: 'start' },
      { unitId: runFit.units.at(-1)?.unitId, corner: 'front-right', anchor: 'end' },
    ] as const;
    for (const end of ends) {
      const found = corners.find((one) => one.unitId === end.unitId && one.corner === end.corner);
      if (!found) continue;
      const [x, y] = sheet.at({ xMm: found.xMm, zMm: run.z0Mm });
      shapes.push(
        text(
          [x + (end.anchor === 'start' ? 24 : -6), y + 15],
          `kick ${length(found.height.value)}`,
          {
            anchor: end.anchor,
            sizePx: smallTextSizePx,
          },
        ),
      );
    }
  }
  const highPoint = sheet.fit.floor?.highPoint;
  if (highPoint?.wallId === sheet.wallId) {
    const [x, y] = sheet.at({ xMm: highPoint.xMm, zMm: heightAt(sheet.floor, highPoint.xMm) });
    shapes.push({
      kind: 'area',
      layer: 'high-point',
      points: [
        [x, y],
        [x - 7, y - 11],
        [x + 7, y - 11],
      ],
    });
    shapes.push(
      text([x + 10, y + 15], 'high point', {
        tone: 'site',
        anchor: 'start',
        sizePx: smallTextSizePx,
      }),
    );
  }
  return shapes;
}
