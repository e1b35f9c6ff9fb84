/** The corners of a fit. */

import type { CombinedCorner } from '@/lib/measure/combined-readings';
import { cornerOffset } from '@/lib/measure/corner';
import { cornerDeviation, cornerTwist } from '@/lib/measure/corner-deviation';
import { type Figure, figure } from '@/lib/measure/figure';
import type { CornerFit } from '@/lib/measure/fit';
import { type FitContext, SURE_ANGLE_U_DEG } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { cornerName, frontDepth, type WalkedWall } from '@/lib/measure/room-walk';

export function fitCorners(context: FitContext): CornerFit[] {
  return context.walk.walls.flatMap((walked) => fitCorner(context, walked) ?? []);
}

function fitCorner(context: FitContext, walked: WalkedWall): CornerFit | null {
  const { before, wall, leftCornerDeg } = walked;
  if (!before || leftCornerDeg === null) return null;
  const read = context.corners.filter(({ cornerWallId }) => cornerWallId === wall.id);
  const adjusted = context.frames.get(wall.id)?.left?.angle ?? null;
  const angle = adjusted && adjusted.u <= SURE_ANGLE_U_DEG ? adjusted : readAngle(read);
  const deviation = angle ? cornerDeviation(angle, leftCornerDeg) : null;
  const twist = cornerTwist(read.map((corner) => corner.angle));
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
    saw: angle && fitFigure('saw-angle', sawAngle(angle)),
    verdicts: [],
  };
}

/** Only read, while the room cannot be laid out yet: the first height. */
function readAngle(read: CombinedCorner[]): Figure | null {
  return read[0]?.angle ?? null;
}

/** Each piece of a kick or panel is cut at θ/2; a saw's scale counts from square. */
function sawAngle(angle: Figure): Figure {
  return figure(Math.abs(90 - angle.value / 2), angle.u / 2, angle.from);
}

/** The deepest run that stands at the corner, or the depth the shop judges corners over. */
function deepestAt(context: FitContext, { wall, before }: WalkedWall): number {
  const depths = context.runs
    .filter(({ wallId }) => wallId === wall.id || wallId === before?.id)
    .map(frontDepth);
  return depths.length > 0 ? Math.max(...depths) : context.rules.cornerFlagOverMm;
}
