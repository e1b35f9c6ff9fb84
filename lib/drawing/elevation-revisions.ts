import type { RevisionMark } from '@/lib/sheet/revision-marks';
import { wallDimension } from './elevation-dimensions';
import { fillerFigures } from './elevation-fillers';
import type { ElevationSheet, WallPlace } from './elevation-frame';
import { revisionPart } from './revision-cloud';
import { type Bounds, boundsOf, type Shape } from './shape';

/** A cloud round everything on this wall that differs from the revision before, with what stood there. */
export function elevationRevisions(sheet: ElevationSheet): Shape[] {
  const { revised } = sheet;
  if (!revised) return [];
  return revised.marks.flatMap((mark) => {
    const bounds = placeOf(sheet, mark);
    return bounds ? [revisionPart(bounds, { revision: revised.revision, was: mark.was })] : [];
  });
}

function placeOf(sheet: ElevationSheet, mark: RevisionMark): Bounds | null {
  switch (mark.on) {
    case 'wall': {
      if (mark.wallId !== sheet.wallId) return null;
      const figure = wallDimension(sheet).find(({ kind }) => kind === 'text');
      return figure ? boundsOf([figure], 3) : null;
    }
    case 'unit':
      return unitBounds(sheet, mark);
    case 'feature':
      return featureBounds(sheet, mark);
    case 'cut':
      return cutBounds(sheet, mark.key);
    case 'corner':
      return null;
  }
}

function unitBounds(sheet: ElevationSheet, { runId, unitId }: { runId: string; unitId: string }) {
  const found = sheet.ofWall.find(({ run }) => run.id === runId);
  const unit = found?.runFit.units.find((one) => one.unitId === unitId);
  if (!found || !unit) return null;
  const { z0Mm, z1Mm } = found.run;
  return inset(sheet, [
    { xMm: unit.leftMm, zMm: z0Mm },
    { xMm: unit.rightMm, zMm: z1Mm },
  ]);
}

function featureBounds(
  sheet: ElevationSheet,
  { wallId, readingId }: { wallId: string; readingId: string },
) {
  if (wallId !== sheet.wallId) return null;
  const reading = sheet.wallBook.readings.find(({ id }) => id === readingId);
  if (reading?.kind !== 'feature') return null;
  return inset(sheet, [
    { xMm: reading.x0Mm, zMm: reading.z0Mm },
    { xMm: reading.x1Mm, zMm: reading.z1Mm },
  ]);
}

const marginPx = 4;

function inset(sheet: ElevationSheet, places: [WallPlace, WallPlace]): Bounds {
  const [a, b] = [sheet.at(places[0]), sheet.at(places[1])];
  const left = Math.min(a[0], b[0]) - marginPx;
  const top = Math.min(a[1], b[1]) - marginPx;
  const width = Math.abs(a[0] - b[0]) + 2 * marginPx;
  return { left, top, width, height: Math.abs(a[1] - b[1]) + 2 * marginPx };
}

/** The blank of a filler stands between its two face widths; a kick's along the foot of the run. */
function cutBounds(sheet: ElevationSheet, key: string): Bounds | null {
  for (const { run, runFit } of sheet.ofWall) {
    for (const side of ['left', 'right'] as const) {
      if (key !== `${run.id} filler ${side}`) continue;
      const figures = fillerFigures(sheet, run, runFit, [side]);
      const blank = figures.find(
        (shape) => shape.kind === 'text' && shape.spans[0]?.words.startsWith('blank'),
      );
      return blank ? boundsOf([blank], 3) : null;
    }
    const [first, last] = [runFit.units[0], runFit.units.at(-1)];
    if (key !== `${run.id} kick` || !first || !last) continue;
    return inset(sheet, [
      { xMm: first.leftMm, zMm: 0 },
      { xMm: first.leftMm + (last.rightMm - first.leftMm) * 0.2, zMm: run.z0Mm },
    ]);
  }
  return null;
}
