import type { Run } from '@/lib/contracts/runs';
import type { PlacedUnit, RunFit } from '@/lib/measure/run-fit';
import { unitKindName } from '@/lib/sheet/unit-words';
import { formatLength } from '@/lib/units/format-length';
import { type ElevationSheet, heightAt, type WallPlace } from './elevation-frame';
import { bare } from './figure-spans';
import { type Point, type Shape, smallTextSizePx, text, textWidthPx } from './shape';

/** Fronts keep this far inside their box. */
const revealMm = 32;
const twoDoorsFromMm = 620;

/** The boxes of a run with their fronts, widths and names; under base and tall boxes the kick. */
export function elevationUnits(sheet: ElevationSheet, run: Run, runFit: RunFit): Shape[] {
  return [
    ...(run.level === 'wall' ? [] : kick(sheet, run, runFit)),
    ...runFit.units.flatMap((unit) => [
      box(sheet, unit, { z0Mm: run.z0Mm, z1Mm: run.z1Mm }),
      ...front(sheet, run, unit),
      ...label(sheet, run, unit),
    ]),
  ];
}

function box(
  sheet: ElevationSheet,
  { leftMm, rightMm, kind }: PlacedUnit,
  { z0Mm, z1Mm }: { z0Mm: number; z1Mm: number },
): Shape {
  const isAppliance = ['dishwasher', 'range', 'refrigerator', 'hood'].includes(kind);
  const places: WallPlace[] = [
    { xMm: leftMm, zMm: z0Mm },
    { xMm: rightMm, zMm: z0Mm },
    { xMm: rightMm, zMm: z1Mm },
    { xMm: leftMm, zMm: z1Mm },
  ];
  return {
    kind: 'area',
    layer: isAppliance ? 'appliance' : 'unit',
    points: places.map(sheet.at),
  };
}

function front(sheet: ElevationSheet, run: Run, unit: PlacedUnit): Shape[] {
  const [left, right] = [unit.leftMm + revealMm, unit.rightMm - revealMm];
  const [foot, head] = [run.z0Mm + revealMm, run.z1Mm - revealMm];
  const line = (...places: WallPlace[]): Shape => ({
    kind: 'line',
    layer: 'unit-front',
    points: places.map(sheet.at),
  });
  const frame = (from: number, to: number, low: number, high: number) =>
    line(
      { xMm: from, zMm: low },
      { xMm: to, zMm: low },
      { xMm: to, zMm: high },
      { xMm: from, zMm: high },
      { xMm: from, zMm: low },
    );
  const middle = (left + right) / 2;
  const doors = (high: number): Shape[] =>
    right - left > twoDoorsFromMm
      ? [frame(left, middle - 8, foot, high), frame(middle + 8, right, foot, high)]
      : [frame(left, right, foot, high)];
  switch (unit.kind) {
    case 'drawers': {
      const parts = [0, 0.36, 0.72, 1].map((part) => foot + (head - foot) * part);
      return parts
        .slice(1)
        .map((high, index) =>
          frame(left, right, (parts[index] ?? foot) + (index > 0 ? 16 : 0), high),
        );
    }
    case 'sink': {
      const rail = head - (head - foot) * 0.2;
      return [frame(left, right, rail + 16, head), ...doors(rail)];
    }
    case 'dishwasher':
    case 'range':
    case 'refrigerator':
    case 'hood':
      return [
        frame(left, right, foot, head),
        line({ xMm: left, zMm: head - 90 }, { xMm: right, zMm: head - 90 }),
      ];
    case 'panel':
    case 'open':
      return [];
    case 'tall': {
      const split = foot + (head - foot) * 0.62;
      return [...doors(split).slice(0, 2), frame(left, right, split + 16, head)];
    }
    default:
      return doors(head);
  }
}

/** Width, and under it what it is where that is no plain box. */
function label(sheet: ElevationSheet, run: Run, unit: PlacedUnit): Shape[] {
  const { unit: lengthUnit, stepMm } = sheet.rules;
  const widthMm = unit.rightMm - unit.leftMm;
  const width = bare(formatLength(widthMm, { unit: lengthUnit, stepMm }));
  const placed = run.units.find(({ id }) => id === unit.unitId);
  const isPlain = !placed || placed.kind === 'base' || placed.kind === 'wall';
  const kind = isPlain ? '' : unitKindName(placed.kind, sheet.rules.region).toLowerCase();
  const names = [[placed?.name, kind].filter(Boolean).join(' '), kind, placed?.name ?? ''];
  const roomPx = widthMm * sheet.pxPerMm - 4;
  const fits = (words: string, size: number) =>
    textWidthPx([{ words, tone: 'plain' }], size) <= roomPx;
  const [x, y] = sheet.at({
    xMm: (unit.leftMm + unit.rightMm) / 2,
    // Clear of what comes out of the wall behind a base box, at half its height.
    zMm: run.z0Mm + (run.z1Mm - run.z0Mm) * (run.level === 'base' ? 0.24 : 0.5),
  });
  if (!fits(width, smallTextSizePx)) return [];
  const name = names.find((words) => words !== '' && fits(words, smallTextSizePx));
  return [
    text([x, y + (name ? -2 : 5)], width),
    ...(name ? [text([x, y + 14], name, { sizePx: smallTextSizePx, tone: 'quiet' })] : []),
  ];
}

/** From the level foot of the boxes down to the floor as it lies. */
function kick(sheet: ElevationSheet, run: Run, runFit: RunFit): Shape[] {
  const [first, last] = [runFit.units[0], runFit.units.at(-1)];
  if (!first || !last) return [];
  const inside = sheet.floor.filter(({ xMm }) => xMm > first.leftMm && xMm < last.rightMm);
  const floor: WallPlace[] = [
    { xMm: first.leftMm, zMm: heightAt(sheet.floor, first.leftMm) },
    ...inside,
    { xMm: last.rightMm, zMm: heightAt(sheet.floor, last.rightMm) },
  ];
  const points: Point[] = [
    ...floor.map(sheet.at),
    sheet.at({ xMm: last.rightMm, zMm: run.z0Mm }),
    sheet.at({ xMm: first.leftMm, zMm: run.z0Mm }),
  ];
  return [{ kind: 'area', layer: 'kick', points }];
}
