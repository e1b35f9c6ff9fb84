import { formatLength } from '@/lib/units/format-length';
import { tradeWord } from '@/lib/words/trade';
import { type ElevationSheet, heightAt } from './elevation-frame';
import { bare } from './figure-spans';
import { type Shape, smallTextSizePx, text } from './shape';

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
          `${tradeWord('kick', sheet.rules.region)} ${length(found.height.value)}`,
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
