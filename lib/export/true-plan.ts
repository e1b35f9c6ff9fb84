import type { SheetView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import { type PlanWall, roomPlan } from '@/lib/drawing/room-plan';
import { faceProfile } from '@/lib/drawing/wall-faces';
import type { RunFit } from '@/lib/measure/run-fit';
import { standingReadings } from '@/lib/measure/standing-readings';
import { featureWord } from '@/lib/words/feature-words';
import { onPlan, placeOnPlan } from './run-on-plan';
import { planRevisionsAtTrueSize } from './true-revisions';
import { type TrueShape, trueWords } from './true-shape';
import { unitLabel } from './unit-label';

/** Behind the face a stud shows as a tick so long. */
const studTickMm = 60;
const fillerThickMm = 19;

/**
 * The room seen from above at true size: walls corner to corner as adjusted, their faces as read, what is
 * on them, and every box of every run where it will stand.
 *
 * Edge: before the room could be adjusted, as read; walls nobody read, as drawn.
 */
export function truePlan(sheet: SheetView): TrueShape[] {
  const walls = roomPlan(sheet.wallBook.room, sheet.fit);
  return [
    ...walls.flatMap((wall) => wallShapes(sheet, wall)),
    ...sheet.fit.runs.flatMap((runFit) => {
      const wall = walls.find(({ wallId }) => wallId === runFit.wallId);
      const run = sheet.runs.find(({ id }) => id === runFit.runId);
      return wall && run ? runShapes(sheet, { wall, run, runFit }) : [];
    }),
    ...planRevisionsAtTrueSize(sheet),
  ];
}

function wallShapes(sheet: SheetView, wall: PlanWall): TrueShape[] {
  const fitted = sheet.fit.walls.find(({ wallId }) => wallId === wall.wallId);
  const face = fitted ? faceProfile(fitted, sheet.rules.counterTopMm) : [];
  const [from, to] = [onPlan(wall, 0, 0), onPlan(wall, wall.lengthMm, 0)];
  return [
    { kind: 'line', layer: 'Walls', points: [from, to] },
    ...(face.length > 0
      ? [
          {
            kind: 'line',
            layer: 'Wall faces as read',
            points: [from, ...face.map(({ xMm, proudMm }) => onPlan(wall, xMm, proudMm)), to],
          } satisfies TrueShape,
        ]
      : []),
    trueWords(onPlan(wall, wall.lengthMm / 2, -280), wall.name, { heightMm: 90, anchor: 'middle' }),
    ...onWall(sheet, wall),
  ];
}

/** Openings as the part of the wall that they take, services as far as they stand out, studs as ticks. */
function onWall(sheet: SheetView, wall: PlanWall): TrueShape[] {
  return standingReadings(sheet.wallBook.readings).flatMap((reading): TrueShape[] => {
    if (reading.kind === 'stud' && reading.wallId === wall.wallId) {
      const points = [onPlan(wall, reading.xMm, 0), onPlan(wall, reading.xMm, -studTickMm)];
      return [{ kind: 'line', layer: 'Studs', points }];
    }
    if (reading.kind !== 'feature' || reading.wallId !== wall.wallId) return [];
    const { x0Mm, x1Mm, projectionMm, feature } = reading;
    const isOpening = ['window', 'door', 'opening'].includes(feature);
    const layer = isOpening ? 'Windows and doors' : 'Services';
    const face = [onPlan(wall, x0Mm, 0), onPlan(wall, x1Mm, 0)];
    const at = onPlan(wall, (x0Mm + x1Mm) / 2, isOpening ? -150 : -90);
    const words = trueWords(at, featureWord(feature, sheet.rules.region), {
      layer,
      anchor: 'middle',
      heightMm: 35,
    });
    if (projectionMm <= 0) return [{ kind: 'line', layer, points: face }, words];
    const front = [onPlan(wall, x1Mm, projectionMm), onPlan(wall, x0Mm, projectionMm)];
    return [{ kind: 'outline', layer, points: [...face, ...front] }, words];
  });
}

function runShapes(
  sheet: SheetView,
  { wall, run, runFit }: { wall: PlanWall; run: Run; runFit: RunFit },
): TrueShape[] {
  const place = placeOnPlan(wall, runFit.setLine);
  const box = (left: number, right: number, back: number, front: number) => [
    place(left, back),
    place(right, back),
    place(right, front),
    place(left, front),
  ];
  const layer = run.level === 'wall' ? 'Units above' : 'Units';
  const depth = run.carcassDepthMm;
  // What hangs stands over the back of what is below it: its words keep clear of those.
  const labelOut = run.level === 'wall' ? depth * 0.5 : depth * 0.8;
  const doorBack = depth + run.bumperMm;
  const doorFront = doorBack + run.doorMm;
  const facePlane = sheet.rules.fillerPlane === 'door-front' ? doorFront : depth;
  const fillers = (['left', 'right'] as const).flatMap((end): TrueShape[] => {
    const unit = end === 'left' ? runFit.units[0] : runFit.units.at(-1);
    const widthMm = runFit[end].filler?.least.value;
    if (!unit || widthMm === undefined) return [];
    const [from, to] =
      end === 'left'
        ? [unit.leftMm - widthMm, unit.leftMm]
        : [unit.rightMm, unit.rightMm + widthMm];
    const points = box(from, to, facePlane - fillerThickMm, facePlane);
    return [{ kind: 'outline', layer: 'Fillers', points }];
  });
  return [
    ...runFit.units.flatMap((unit): TrueShape[] => {
      const { leftMm, rightMm, kind } = unit;
      const hasFront = run.doorMm > 0 && kind !== 'panel' && kind !== 'open';
      return [
        { kind: 'outline', layer, points: box(leftMm, rightMm, 0, depth) },
        ...(hasFront
          ? [
              {
                kind: 'outline',
                layer: 'Fronts',
                points: box(leftMm, rightMm, doorBack, doorFront),
              } satisfies TrueShape,
            ]
          : []),
        ...unitLabel(sheet, run, { unit, at: place((leftMm + rightMm) / 2, labelOut), layer }),
      ];
    }),
    ...fillers,
  ];
}
