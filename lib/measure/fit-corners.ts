/** The corners of a fit. */

import type { CombinedCorner } from '@/lib/measure/combined-readings';
import { cornerOffset } from '@/lib/measure/corner';
import { cornerDeviation, cornerTwist } from '@/lib/measure/corner-deviation';
import type { Figure } from '@/lib/measure/figure';
import type { CornerFit } from '@/lib/measure/fit';
import { chordAngleOf } from '@/lib/measure/fit-chains';
import { type FitContext, SURE_ANGLE_U_DEG } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { halfMitre } from '@/lib/measure/mitre';
import { cornerName, frontDepth, type WalkedWall } from '@/lib/measure/room-walk';

/**
 * Every corner that has two walls: angle, deviation, offset over the depth that stands there, saw angle.
 * Edge: an angle is null until it is surer than 1°, by its own reading or by the rest of the room.
 */
export function fitCorners(context: FitContext): CornerFit[] {
  return context.walk.walls.flatMap((walked) => fitCorner(context, walked) ?? []);
}

function fitCorner(context: FitContext, walked: WalkedWall): CornerFit | null {
  const { before, wall, leftCornerDeg } = walked;
  if (!before || leftCornerDeg === null) return null;
  const read = context.corners.filter(({ cornerWallId }) => cornerWallId === wall.id);
  const adjusted = context.frames.get(wall.id)?.left?.angle ?? null;
  const angle =
    adjusted && adjusted.u <= SURE_ANGLE_U_DEG ? adjusted : readAngle(context, read, before.id);
  const deviation = angle ? cornerDeviation(angle, leftCornerDeg) : null;
  const twist = cornerTwist(read.map((corner) => corner.angle));
  const mitre = angle ? halfMitre(angle).value : null;
  const depthMm = deepestAt(context, walked);
  const offset = angle ? cornerOffset(angle, depthMm).value : null;
  return {
    cornerWallId: wall.id,
    leftWallId: before.id,
    name: cornerName(walked),
    nominalDeg: leftCornerDeg,
    angle: angle && fitFigure('corner-angle', angle),
    readAt: read.map((corner) => ({
      zMm: corner.zMm,
      angle: fitFigure('corner-angle', corner.angle),
    })),
    deviation: deviation && fitFigure('corner-deviation', deviation.deviation),
    trueWithinReading: deviation?.lies === 'true-within-the-reading',
    twist: twist && fitFigure('corner-twist', twist),
    offset: offset && { depthMm, figure: fitFigure('corner-offset', offset) },
    saw: mitre && fitFigure('saw-angle', mitre.saw),
    verdicts: [],
  };
}

/** Only read, while the room cannot be laid out yet: the first height, carried to the straight walls. */
function readAngle(
  context: FitContext,
  read: CombinedCorner[],
  beforeWallId: string,
): Figure | null {
  const first = read[0];
  return first ? chordAngleOf(context, first, beforeWallId) : null;
}

/** The deepest run that stands at the corner, or the depth the shop judges corners over. */
function deepestAt(context: FitContext, { wall, before }: WalkedWall): number {
  const depths = context.runs
    .filter(({ wallId }) => wallId === wall.id || wallId === before?.id)
    .map(frontDepth);
  return depths.length > 0 ? Math.max(...depths) : context.rules.cornerFlagOverMm;
}
