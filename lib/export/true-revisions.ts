import type { SheetView } from '@/lib/contracts/rooms';
import { roomPlan } from '@/lib/drawing/room-plan';
import type { RevisionMark } from '@/lib/sheet/revision-marks';
import { onPlan, placeOnPlan } from './run-on-plan';
import { trueRevision } from './true-revision';
import type { TruePoint, TrueShape } from './true-shape';

/** What differs from the revision before, clouded on the plan at true size. */
export function planRevisionsAtTrueSize(sheet: SheetView): TrueShape[] {
  return revisedAt(sheet, (mark) => onPlanOf(sheet, mark));
}

/** The same on one wall seen square on. */
export function wallRevisionsAtTrueSize(sheet: SheetView, wallId: string): TrueShape[] {
  return revisedAt(sheet, (mark) => onWallOf(sheet, wallId, mark));
}

function revisedAt(
  { revised }: SheetView,
  placeOf: (mark: RevisionMark) => TruePoint[],
): TrueShape[] {
  if (!revised) return [];
  return revised.marks.flatMap((mark) =>
    trueRevision(placeOf(mark), { revision: revised.revision, was: mark.was }),
  );
}

/** Half of the box round a wall's letter or a corner. */
const halfMm = 110;
const letterOutMm = 235;

function onPlanOf(sheet: SheetView, mark: RevisionMark): TruePoint[] {
  const walls = roomPlan(sheet.wallBook.room, sheet.fit);
  const wallOf = (id: string) => walls.find(({ wallId }) => wallId === id);
  switch (mark.on) {
    case 'wall': {
      const wall = wallOf(mark.wallId);
      return wall ? around(onPlan(wall, wall.lengthMm / 2, -letterOutMm)) : [];
    }
    case 'corner': {
      const wall = wallOf(mark.cornerWallId);
      return wall ? around(onPlan(wall, 0, 0)) : [];
    }
    case 'unit': {
      const runFit = sheet.fit.runs.find(({ runId }) => runId === mark.runId);
      const run = sheet.runs.find(({ id }) => id === mark.runId);
      const unit = runFit?.units.find(({ unitId }) => unitId === mark.unitId);
      const wall = runFit && wallOf(runFit.wallId);
      if (!runFit || !run || !unit || !wall || run.level === 'wall') return [];
      const place = placeOnPlan(wall, runFit.setLine);
      return [
        place(unit.leftMm, 0),
        place(unit.rightMm, 0),
        place(unit.rightMm, run.carcassDepthMm),
        place(unit.leftMm, run.carcassDepthMm),
      ];
    }
    case 'feature':
    case 'cut':
      return [];
  }
}

function onWallOf(sheet: SheetView, wallId: string, mark: RevisionMark): TruePoint[] {
  switch (mark.on) {
    case 'feature': {
      const reading = sheet.wallBook.readings.find(({ id }) => id === mark.readingId);
      if (mark.wallId !== wallId || reading?.kind !== 'feature') return [];
      return [
        [reading.x0Mm, reading.z0Mm],
        [reading.x1Mm, reading.z1Mm],
      ];
    }
    case 'unit':
      return unitOnWall(sheet, wallId, mark);
    case 'cut':
      return mark.wallId === wallId ? cutOnWall(sheet, mark.key) : [];
    case 'wall':
    case 'corner':
      return [];
  }
}

function unitOnWall(
  sheet: SheetView,
  wallId: string,
  { runId, unitId }: { runId: string; unitId: string },
): TruePoint[] {
  const runFit = sheet.fit.runs.find((one) => one.runId === runId && one.wallId === wallId);
  const run = sheet.runs.find(({ id }) => id === runId);
  const unit = runFit?.units.find((one) => one.unitId === unitId);
  return run && unit
    ? [
        [unit.leftMm, run.z0Mm],
        [unit.rightMm, run.z1Mm],
      ]
    : [];
}

/** A filler beside its box, a kick under its run. */
function cutOnWall(sheet: SheetView, key: string): TruePoint[] {
  const runFit = sheet.fit.runs.find(({ runId }) => key.startsWith(`${runId} `));
  const run = sheet.runs.find(({ id }) => id === runFit?.runId);
  const [first, last] = [runFit?.units[0], runFit?.units.at(-1)];
  if (!runFit || !run || !first || !last) return [];
  const widthOf = (side: 'left' | 'right') => runFit[side].filler?.greatest.value ?? 0;
  if (key.endsWith(' filler left')) {
    return [
      [first.leftMm - widthOf('left'), run.z0Mm],
      [first.leftMm, run.z1Mm],
    ];
  }
  if (key.endsWith(' filler right')) {
    return [
      [last.rightMm, run.z0Mm],
      [last.rightMm + widthOf('right'), run.z1Mm],
    ];
  }
  if (!key.endsWith(' kick')) return [];
  return [
    [first.leftMm, 0],
    [last.rightMm, run.z0Mm],
  ];
}

function around([x, y]: TruePoint): TruePoint[] {
  return [
    [x - halfMm, y - halfMm],
    [x + halfMm, y + halfMm],
  ];
}
