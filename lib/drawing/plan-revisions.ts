import type { RevisionMark } from '@/lib/sheet/revision-marks';
import type { PlanSheet } from './plan';
import { cornerLabel } from './plan-corners';
import { unitOutline } from './plan-runs';
import { wallFigure } from './plan-walls';
import { revisionPart } from './revision-cloud';
import { type Bounds, boundsOf, type Shape } from './shape';

/** A cloud round every figure of the plan that differs from the revision before, with what stood there. */
export function planRevisions(sheet: PlanSheet): Shape[] {
  const { revised } = sheet;
  if (!revised) return [];
  return revised.marks.flatMap((mark) => {
    const bounds = placeOf(sheet, mark);
    return bounds ? [revisionPart(bounds, { revision: revised.revision, was: mark.was })] : [];
  });
}

/** What hangs on a wall and what is cut stands in its elevation and in the cut list. */
function placeOf(sheet: PlanSheet, mark: RevisionMark): Bounds | null {
  switch (mark.on) {
    case 'wall': {
      const wall = sheet.walls.find(({ wallId }) => wallId === mark.wallId);
      return wall ? boundsOf([wallFigure(sheet, wall)], 4) : null;
    }
    case 'corner': {
      const label = cornerLabel(sheet, mark.cornerWallId);
      return label.length > 0 ? boundsOf(label, 3) : null;
    }
    case 'unit': {
      const outline = unitOutline(sheet, mark);
      return outline ? boundsOf([outline], 3) : null;
    }
    case 'feature':
    case 'cut':
      return null;
  }
}
