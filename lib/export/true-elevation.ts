import type { SheetView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import type { Wall } from '@/lib/contracts/wall-book';
import { ceilingLine } from '@/lib/drawing/ceiling-line';
import { floorLine } from '@/lib/drawing/floor-line';
import type { RunFit } from '@/lib/measure/run-fit';
import { standingReadings } from '@/lib/measure/standing-readings';
import { featureWord } from '@/lib/words/feature-words';
import { wallRevisionsAtTrueSize } from './true-revisions';
import { trueRun } from './true-run';
import { type TrueShape, trueWords } from './true-shape';

/** Above the highest box where no ceiling was read. */
const openTopMm = 250;

/**
 * A wall seen square on at true size, x from its left corner and y up from the floor's high point: the
 * wall, floor and ceiling as read, studs, what is on the wall, and its runs, each along its own set line.
 */
export function trueElevation(
  sheet: SheetView,
  { wall, runs }: { wall: Wall; runs: readonly RunFit[] },
): TrueShape[] {
  const { fit, wallBook } = sheet;
  const fitted = fit.walls.find(({ wallId }) => wallId === wall.id);
  const lengthMm = (fitted?.length ?? fitted?.readAt[0]?.length)?.value ?? wall.nominalLengthMm;
  const laidOut = runs.flatMap((runFit): { run: Run; runFit: RunFit }[] => {
    const run = sheet.runs.find(({ id }) => id === runFit.runId);
    return run ? [{ run, runFit }] : [];
  });
  const ceiling = ceilingLine(wallBook, fit, wall.id);
  const topMm = Math.max(
    ...ceiling.map(({ zMm }) => zMm),
    ...(ceiling.length === 0 ? laidOut.map(({ run }) => run.z1Mm + openTopMm) : []),
    0,
  );
  const read = (
    layer: 'Floor as read' | 'Ceiling as read',
    places: { xMm: number; zMm: number }[],
  ): TrueShape[] =>
    places.length > 1
      ? [{ kind: 'line', layer, points: places.map(({ xMm, zMm }) => [xMm, zMm] as const) }]
      : [];
  return [
    {
      kind: 'outline',
      layer: 'Walls',
      points: [
        [0, 0],
        [lengthMm, 0],
        [lengthMm, topMm],
        [0, topMm],
      ],
    },
    ...read('Floor as read', floorLine(fit, wall.id)),
    ...read('Ceiling as read', ceiling),
    ...studs(sheet, { wall, runs, topMm }),
    ...features(sheet, wall),
    ...laidOut.flatMap(({ run, runFit }) => trueRun(sheet, run, runFit)),
    ...wallRevisionsAtTrueSize(sheet, wall.id),
  ];
}

function studs(
  sheet: SheetView,
  { wall, runs, topMm }: { wall: Wall; runs: readonly RunFit[]; topMm: number },
): TrueShape[] {
  const found = standingReadings(sheet.wallBook.readings).flatMap((reading) =>
    reading.kind === 'stud' && reading.wallId === wall.id ? [reading.xMm] : [],
  );
  const predicted = runs.flatMap(({ units }) =>
    units.flatMap((unit) =>
      (unit.studs?.studs ?? []).flatMap((stud) => (stud.predicted ? [stud.xMm] : [])),
    ),
  );
  const upright =
    (layer: 'Studs' | 'Studs predicted') =>
    (xMm: number): TrueShape => ({
      kind: 'line',
      layer,
      points: [
        [xMm, 0],
        [xMm, topMm],
      ],
    });
  return [
    ...found.map(upright('Studs')),
    ...[...new Set(predicted)].map(upright('Studs predicted')),
  ];
}

function features(sheet: SheetView, wall: Wall): TrueShape[] {
  return standingReadings(sheet.wallBook.readings).flatMap((reading): TrueShape[] => {
    if (reading.kind !== 'feature' || reading.wallId !== wall.id) return [];
    const { x0Mm, x1Mm, z0Mm, z1Mm, feature } = reading;
    const isOpening = ['window', 'door', 'opening'].includes(feature);
    const layer = isOpening ? 'Windows and doors' : 'Services';
    const points = [
      [x0Mm, z0Mm],
      [x1Mm, z0Mm],
      [x1Mm, z1Mm],
      [x0Mm, z1Mm],
    ] as const;
    return [
      { kind: 'outline', layer, points },
      trueWords([x0Mm, z1Mm + 15], featureWord(feature, sheet.rules.region), {
        layer,
        heightMm: 35,
      }),
    ];
  });
}
