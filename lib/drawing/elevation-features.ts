import type { Reading } from '@/lib/contracts/readings';
import { standingReadings } from '@/lib/measure/standing-readings';
import { featureWord } from '@/lib/words/feature-words';
import type { ElevationSheet } from './elevation-frame';
import {
  type DrawnText,
  type Point,
  type Shape,
  smallTextSizePx,
  text,
  textWidthPx,
} from './shape';

type Feature = Extract<Reading, { kind: 'feature' }>;

/** Windows, doors and services where they were read; small things as a mark with their name. */
export function elevationFeatures(sheet: ElevationSheet): Shape[] {
  const features = standingReadings(sheet.wallBook.readings).filter(
    (reading): reading is Feature => reading.kind === 'feature' && reading.wallId === sheet.wallId,
  );
  const names: DrawnText[] = [];
  const marks = features.flatMap((feature) => {
    const name = nameOf(sheet, feature);
    if (name) names.push(clearOf(names, name));
    return mark(sheet, feature);
  });
  return [...marks, ...names];
}

function mark(sheet: ElevationSheet, { x0Mm, x1Mm, z0Mm, z1Mm, feature }: Feature): Shape[] {
  const corner = (xMm: number, zMm: number) => sheet.at({ xMm, zMm });
  const outline = [corner(x0Mm, z0Mm), corner(x1Mm, z0Mm), corner(x1Mm, z1Mm), corner(x0Mm, z1Mm)];
  const closed: Shape = {
    kind: 'line',
    layer: 'feature',
    points: [...outline, ...outline.slice(0, 1)],
  };
  if (!isHole(feature)) return [closed];
  const hole: Shape = { kind: 'area', layer: 'opening', points: outline };
  if (feature !== 'window') return [hole, closed];
  const middle = (x0Mm + x1Mm) / 2;
  const sash: Shape = {
    kind: 'line',
    layer: 'feature',
    points: [corner(middle, z0Mm), corner(middle, z1Mm)],
  };
  return [hole, closed, sash];
}

const isHole = (feature: Feature['feature']) => ['window', 'door', 'opening'].includes(feature);

/** In the hole itself, or at the right of a small thing; a window shows what it is. */
function nameOf(sheet: ElevationSheet, reading: Feature): DrawnText | null {
  const { x0Mm, x1Mm, z0Mm, z1Mm, feature } = reading;
  if (feature === 'window') return null;
  const zMm = (z0Mm + z1Mm) / 2;
  const look = { tone: 'site', sizePx: smallTextSizePx } as const;
  const words = featureWord(feature, sheet.rules.region);
  if (isHole(feature)) return text(sheet.at({ xMm: (x0Mm + x1Mm) / 2, zMm }), words, look);
  const [x, y] = sheet.at({ xMm: x1Mm, zMm });
  return text([x + 4, y + 4], words, { ...look, anchor: 'start' });
}

/** A name moved down past those that stand where it would stand. */
function clearOf(others: readonly DrawnText[], name: DrawnText): DrawnText {
  const width = (one: DrawnText) => textWidthPx(one.spans, one.sizePx);
  const meets = (at: Point) =>
    others.some(
      (other) =>
        Math.abs(other.at[1] - at[1]) < smallTextSizePx &&
        at[0] < other.at[0] + width(other) &&
        other.at[0] < at[0] + width(name),
    );
  let at = name.at;
  for (let tries = 0; tries < others.length && meets(at); tries += 1) {
    at = [at[0], at[1] + smallTextSizePx + 1];
  }
  return { ...name, at };
}
