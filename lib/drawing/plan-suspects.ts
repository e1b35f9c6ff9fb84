import type { PlanSheet } from './plan';
import { diagonalEnds, diagonalFigurePart } from './plan-marks';
import { nameTagPlace } from './plan-walls';
import { type Point, type Shape, smallTextSizePx, text } from './shape';
import { type SuspectPlace, suspectMarks } from './suspects';
import { between, moved } from './vector';

const radiusPx = 20;

/** A ring on the wall, the corner or the diagonal that is most likely misread, and by how much it may be. */
export function planSuspects(sheet: PlanSheet): Shape[] {
  return suspectMarks(sheet).flatMap(({ place, words }) => {
    const ring = ringOf(sheet, place);
    if (!ring) return [];
    const [x, y] = ring.wordsAt;
    return [
      { kind: 'circle', layer: 'suspect', centre: ring.centre, radius: radiusPx } satisfies Shape,
      text([x, y + 4], words, { tone: 'over', sizePx: smallTextSizePx, anchor: ring.anchor }),
    ];
  });
}

type Ring = { centre: Point; wordsAt: Point; anchor: 'start' | 'middle' | 'end' };

/** On the thing itself, its words beside it inside the room, where no dimension stands. */
function ringOf(sheet: PlanSheet, place: SuspectPlace): Ring | null {
  if (place.kind === 'diagonal') {
    const ends = diagonalEnds(sheet, place);
    return ends && below(between(ends[0], ends[1], diagonalFigurePart));
  }
  if (place.kind === 'corner') {
    const wall = sheet.walls.find(({ wallId }) => wallId === place.cornerWallId);
    return wall ? below(sheet.at(wall.from)) : null;
  }
  const wall = sheet.walls.find(({ wallId }) => wallId === place.wallId);
  if (!wall) return null;
  const centre =
    place.kind === 'spot'
      ? sheet.at(moved(wall.from, wall.along, place.xMm, wall.inward, 0))
      : nameTagPlace(sheet, wall);
  const wordsAt = moved(centre, wall.along, 0, wall.inward, radiusPx + 14);
  const [acrossX] = wall.inward;
  const anchor = acrossX > 0.5 ? 'start' : acrossX < -0.5 ? 'end' : 'middle';
  return { centre, wordsAt, anchor };
}

const below = (centre: Point): Ring => ({
  centre,
  wordsAt: [centre[0], centre[1] + radiusPx + 12],
  anchor: 'middle',
});
