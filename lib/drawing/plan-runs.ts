import type { Run } from '@/lib/contracts/runs';
import type { PlacedUnit, RunFit } from '@/lib/measure/run-fit';
import { formatLength } from '@/lib/units/format-length';
import { bare } from './figure-spans';
import { hatch } from './hatch';
import type { PlanSheet } from './plan';
import type { PlanWall } from './room-plan';
import { type Point, type Shape, smallTextSizePx, text, textWidthPx } from './shape';
import { between, moved } from './vector';

/** What stands along the walls; uppers dashed over it, as what hangs above the cut is drawn. */
export function planRuns(sheet: PlanSheet): Shape[] {
  const inOrder = [...sheet.fit.runs].sort(
    (one, other) => Number(one.level === 'wall') - Number(other.level === 'wall'),
  );
  return inOrder.flatMap((runFit) => {
    const wall = sheet.walls.find(({ wallId }) => wallId === runFit.wallId);
    const run = sheet.runs.find(({ id }) => id === runFit.runId);
    if (!wall || !run) return [];
    const shapes =
      runFit.level === 'wall'
        ? uppers({ sheet, wall, run, runFit })
        : [...units({ sheet, wall, run, runFit }), ...fillers({ sheet, wall, run, runFit })];
    return [
      { kind: 'part', part: { kind: 'run', id: run.id }, label: run.name, shapes } satisfies Shape,
    ];
  });
}

/** A unit's box in the plan; null where its run is not drawn. */
export function unitOutline(
  sheet: PlanSheet,
  { runId, unitId }: { runId: string; unitId: string },
): Shape | null {
  const runFit = sheet.fit.runs.find((one) => one.runId === runId);
  const run = sheet.runs.find(({ id }) => id === runId);
  const wall = sheet.walls.find(({ wallId }) => wallId === runFit?.wallId);
  const unit = runFit?.units.find((one) => one.unitId === unitId);
  // What hangs is only hinted at in the plan: its elevation has the mark.
  if (!runFit || !run || !wall || !unit || run.level === 'wall') return null;
  const place = placeOf({ sheet, wall, run, runFit });
  return { kind: 'area', layer: 'unit', points: box(place, unit, run.carcassDepthMm) };
}

type Drawn = { sheet: PlanSheet; wall: PlanWall; run: Run; runFit: RunFit };

/** A place of the run: along the set line, and out from it; the stand-off is drawn larger like the face. */
function placeOf({ sheet, wall, runFit }: Drawn): (xMm: number, outMm: number) => Point {
  const line = runFit.setLine;
  const [left = 0, right = 0] = line ? [line.offsetAtLeftMm, line.offsetAtRightMm] : [];
  const span = line ? line.xRightMm - line.xLeftMm : 0;
  // What hangs is only hinted at: its own turn, drawn larger, would cross the boxes under it.
  const standOff = (xMm: number) =>
    !line || span <= 0 || runFit.level === 'wall'
      ? (left + right) / 2
      : left + ((right - left) * (xMm - line.xLeftMm)) / span;
  return (xMm, outMm) =>
    sheet.at(
      moved(wall.from, wall.along, xMm, wall.inward, outMm + standOff(xMm) * sheet.exaggeration),
    );
}

function box(
  place: (xMm: number, outMm: number) => Point,
  unit: PlacedUnit,
  outMm: number,
): Point[] {
  const { leftMm, rightMm } = unit;
  return [place(leftMm, 0), place(rightMm, 0), place(rightMm, outMm), place(leftMm, outMm)];
}

function units(drawn: Drawn): Shape[] {
  const { run, runFit, sheet } = drawn;
  const place = placeOf(drawn);
  const front = run.carcassDepthMm + run.bumperMm + run.doorMm;
  const widthAt = front * WIDTH_SHARE;
  return runFit.units.flatMap((unit) => {
    const corners = box(place, unit, run.carcassDepthMm);
    const [a, b, c, d] = corners;
    const isTall = run.level === 'tall' && unit.kind !== 'panel';
    return [
      { kind: 'area', layer: 'unit', points: corners } satisfies Shape,
      ...(hasDoors(unit)
        ? [
            {
              kind: 'line',
              layer: 'unit-front',
              points: [place(unit.leftMm, front), place(unit.rightMm, front)],
            } satisfies Shape,
          ]
        : []),
      ...(isTall && a && b && c && d
        ? ([
            { kind: 'line', layer: 'unit-front', points: [a, c] },
            { kind: 'line', layer: 'unit-front', points: [b, d] },
          ] satisfies Shape[])
        : []),
      ...widthFigure(
        sheet,
        unit,
        between(place(unit.leftMm, widthAt), place(unit.rightMm, widthAt), 0.5),
      ),
    ];
  });
}

/** Between the fronts of the units above and the kick line, where the floor is read and marked. */
const WIDTH_SHARE = 0.66;

const hasDoors = ({ kind }: PlacedUnit) => kind !== 'panel' && kind !== 'open';

function widthFigure(sheet: PlanSheet, unit: PlacedUnit, [x, y]: Point): Shape[] {
  const { unit: lengthUnit, stepMm } = sheet.rules;
  const widthMm = unit.rightMm - unit.leftMm;
  const words = bare(formatLength(widthMm, { unit: lengthUnit, stepMm }));
  const room = widthMm * sheet.pxPerMm;
  if (textWidthPx([{ words, tone: 'plain' }], smallTextSizePx) > room) return [];
  return [text([x, y + 4], words, { sizePx: smallTextSizePx })];
}

/** Between the outermost unit and what the run meets there: the strip of a filler. */
function fillers(drawn: Drawn): Shape[] {
  const { run, runFit } = drawn;
  const place = placeOf(drawn);
  const [first, last] = [runFit.units[0], runFit.units.at(-1)];
  if (!first || !last) return [];
  const strips: [number, number][] = [];
  const { left, right } = runFit;
  if (left.filler) strips.push([first.leftMm - left.filler.greatest.value, first.leftMm]);
  if (right.filler) strips.push([last.rightMm, last.rightMm + right.filler.greatest.value]);
  return strips.flatMap(([from, to]) => {
    const backMm = run.carcassDepthMm - 60;
    const outline = [
      place(from, backMm),
      place(to, backMm),
      place(to, run.carcassDepthMm),
      place(from, run.carcassDepthMm),
    ];
    return [
      { kind: 'area', layer: 'filler', points: outline } satisfies Shape,
      ...hatch(outline, 4, 45).map(
        (points): Shape => ({ kind: 'line', layer: 'filler-hatch', points }),
      ),
    ];
  });
}

function uppers(drawn: Drawn): Shape[] {
  const { run, runFit } = drawn;
  const place = placeOf(drawn);
  return runFit.units.map((unit) => {
    const corners = box(place, unit, run.carcassDepthMm + run.bumperMm + run.doorMm);
    return { kind: 'line', layer: 'unit-upper', points: [...corners, ...corners.slice(0, 1)] };
  });
}
