import type { SheetView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import type { PlacedUnit, RunFit } from '@/lib/measure/run-fit';
import type { TruePoint, TrueShape } from './true-shape';
import { unitLabel } from './unit-label';

/** A run seen square on at true size: boxes, fillers with their taper, kick down to the floor, counter. */
export function trueRun(sheet: SheetView, run: Run, runFit: RunFit): TrueShape[] {
  const layer = run.level === 'wall' ? 'Units above' : 'Units';
  return [
    ...runFit.units.flatMap((unit): TrueShape[] => [
      { kind: 'outline', layer, points: box(unit, run.z0Mm, run.z1Mm) },
      ...unitLabel(sheet, run, {
        unit,
        at: [(unit.leftMm + unit.rightMm) / 2, (run.z0Mm + run.z1Mm) / 2],
        layer,
      }),
    ]),
    ...filler(run, runFit, 'left'),
    ...filler(run, runFit, 'right'),
    ...kick(run, runFit),
    ...counter(sheet, run, runFit),
  ];
}

const box = ({ leftMm, rightMm }: PlacedUnit, z0Mm: number, z1Mm: number): TruePoint[] => [
  [leftMm, z0Mm],
  [rightMm, z0Mm],
  [rightMm, z1Mm],
  [leftMm, z1Mm],
];

/** As the opening is: inside straight, outside along the face widths at the heights where they hold. */
function filler(run: Run, runFit: RunFit, end: 'left' | 'right'): TrueShape[] {
  const widths = runFit[end].filler?.widths ?? [];
  const unit = end === 'left' ? runFit.units[0] : runFit.units.at(-1);
  if (!unit || widths.length === 0) return [];
  const insideMm = end === 'left' ? unit.leftMm : unit.rightMm;
  const away = end === 'left' ? -1 : 1;
  const outside = widths.map(({ zMm, width }): TruePoint => [insideMm + away * width.value, zMm]);
  const upright = outside.length === 1 ? standUp(outside, run) : outside;
  const [top, bottom] = [upright[0], upright.at(-1)];
  if (!top || !bottom) return [];
  const points: TruePoint[] = [[insideMm, bottom[1]], [insideMm, top[1]], ...upright];
  return [{ kind: 'outline', layer: 'Fillers', points }];
}

/** One width for the whole height: beside a casing, or where only one was read. */
function standUp([place]: TruePoint[], run: Run): TruePoint[] {
  const xMm = place?.[0] ?? 0;
  return [
    [xMm, run.z1Mm],
    [xMm, run.z0Mm],
  ];
}

/** From the level foot of the boxes to the floor under their fronts. */
function kick(run: Run, runFit: RunFit): TrueShape[] {
  const fronts = (runFit.kicks?.corners ?? [])
    .filter(({ corner }) => corner.startsWith('front'))
    .sort((one, other) => one.xMm - other.xMm);
  const [first, last] = [fronts[0], fronts.at(-1)];
  if (!first || !last) return [];
  const floor = fronts.map(({ xMm, height }): TruePoint => [xMm, run.z0Mm - height.value]);
  const points: TruePoint[] = [[last.xMm, run.z0Mm], [first.xMm, run.z0Mm], ...floor];
  return [{ kind: 'outline', layer: 'Kicks', points }];
}

function counter({ rules }: SheetView, run: Run, runFit: RunFit): TrueShape[] {
  const thickMm = rules.counterTopMm - rules.baseTopMm;
  const [first, last] = [runFit.units[0], runFit.units.at(-1)];
  if (run.level !== 'base' || thickMm <= 0 || !first || !last) return [];
  const whole = {
    ...first,
    leftMm: first.leftMm - (runFit.left.filler?.least.value ?? 0),
    rightMm: last.rightMm + (runFit.right.filler?.least.value ?? 0),
  };
  return [{ kind: 'outline', layer: 'Counters', points: box(whole, run.z1Mm, run.z1Mm + thickMm) }];
}
