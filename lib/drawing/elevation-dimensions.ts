import { figureText } from '@/lib/sheet/figure-text';
import { formatLength } from '@/lib/units/format-length';
import { dimension, dimensionString } from './dimension';
import { type ElevationSheet, edgeAt } from './elevation-frame';
import { bare } from './figure-spans';
import { type DrawnText, type Point, type Shape, smallTextSizePx, textWidthPx } from './shape';

const stringPx = 30;
const overallPx = 58;
/** A figure wider than its unit stands under the string; the wall's own then goes further down. */
const underStringPx = 12;

/** Strings of widths under the floor and over the ceiling, the wall's length, and the heights at the right. */
export function elevationDimensions(sheet: ElevationSheet): Shape[] {
  const foot = (xMm: number) => footAt(sheet, xMm);
  const head = (xMm: number) => sheet.at({ xMm, zMm: sheet.topMm });
  const standing = sheet.ofWall.filter(({ run }) => run.level !== 'wall');
  const hung = sheet.ofWall.filter(({ run }) => run.level === 'wall');
  return [
    ...standing.flatMap((one) => widths(sheet, one, foot, -stringPx)),
    ...hung.flatMap((one) => widths(sheet, one, head, stringPx)),
    ...wallDimension(sheet),
    ...heights(sheet),
  ];
}

/** The wall's own length, under the string of widths where there is one. */
export function wallDimension(sheet: ElevationSheet): Shape[] {
  const hasString = sheet.ofWall.some(({ run }) => run.level !== 'wall');
  const downPx = hasString ? overallPx + (hasFigureUnder(sheet) ? underStringPx : 0) : stringPx;
  return dimension(footAt(sheet, 0), footAt(sheet, sheet.lengthMm), {
    offsetPx: -downPx,
    spans: wallLength(sheet),
  });
}

function hasFigureUnder(sheet: ElevationSheet): boolean {
  return sheet.ofWall.some(
    ({ run, runFit }) =>
      run.level !== 'wall' &&
      runFit.units.some(({ leftMm, rightMm }) => {
        const [from, to] = [footAt(sheet, leftMm), footAt(sheet, rightMm)];
        const figure = textWidthPx(widthFigure(sheet, rightMm - leftMm), smallTextSizePx);
        return figure > Math.hypot(to[0] - from[0], to[1] - from[1]);
      }),
  );
}

function widthFigure({ rules }: ElevationSheet, widthMm: number): DrawnText['spans'] {
  return [{ words: bare(formatLength(widthMm, rules)), tone: 'plain' }];
}

function footAt(sheet: ElevationSheet, xMm: number): Point {
  return sheet.at({ xMm, zMm: Math.min(...sheet.floor.map(({ zMm }) => zMm), 0) });
}

function widths(
  sheet: ElevationSheet,
  { runFit }: ElevationSheet['ofWall'][number],
  at: (xMm: number) => Point,
  offsetPx: number,
): Shape[] {
  const edges = runFit.units.flatMap((placed, index) =>
    index === 0 ? [placed.leftMm, placed.rightMm] : [placed.rightMm],
  );
  const figures = runFit.units.map(({ leftMm, rightMm }) => widthFigure(sheet, rightMm - leftMm));
  return dimensionString(edges.map(at), figures, offsetPx);
}

function wallLength(sheet: ElevationSheet): DrawnText['spans'] {
  const fitted = sheet.fit.walls.find(({ wallId }) => wallId === sheet.wallId);
  const figure = fitted?.length ?? fitted?.readAt[0]?.length;
  if (!figure) return [{ words: `wall ${sheet.wallName}, not read`, tone: 'quiet' }];
  const { value, surely } = figureText(figure, sheet.rules);
  return [
    { words: `wall ${sheet.wallName}  ${bare(value)}`, tone: 'strong' },
    { words: ` ± ${bare(surely)}`, tone: 'quiet' },
  ];
}

/** From the high point up: foot and head of each level, the counter. */
function heights(sheet: ElevationSheet): Shape[] {
  const { unit, stepMm, counterTopMm, baseTopMm } = sheet.rules;
  const marks = new Set([0]);
  for (const { run } of sheet.ofWall) {
    marks.add(run.z0Mm);
    marks.add(run.z1Mm);
    if (run.level === 'base') marks.add(run.z1Mm + counterTopMm - baseTopMm);
  }
  const levels = [...marks].sort((one, other) => one - other);
  if (levels.length < 2) return [];
  const topOf = Math.max(...sheet.edges.right.map(({ xMm }) => xMm), edgeAt(sheet.edges.right, 0));
  const points = levels.map((zMm): Point => {
    const [x, y] = sheet.at({ xMm: topOf, zMm });
    return [x + 62, y];
  });
  const figures = levels.slice(1).map((zMm, index): DrawnText['spans'] => {
    const words = bare(formatLength(zMm - (levels[index] ?? 0), { unit, stepMm }));
    return [{ words, tone: 'plain' }];
  });
  return dimensionString(points, figures, -26);
}
