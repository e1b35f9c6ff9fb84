/** Each chain of walls walked as read: the picture of how it closes, before any adjustment. */
import { chordAngle } from '@/lib/measure/chord-angle';
import {
  closeTraverse,
  type TraverseLeg,
  type TraverseReading,
} from '@/lib/measure/close-traverse';
import { type CombinedCorner, cornerArms } from '@/lib/measure/combined-readings';
import type { Figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { shareOf } from '@/lib/measure/observe-room';
import { planHeight } from '@/lib/measure/plan-context';
import type { Read } from '@/lib/measure/read';
import type { ChainClosure } from '@/lib/measure/room-closure';
import type { WalkedWall } from '@/lib/measure/room-walk';
import { proudAt, type WallFaces } from '@/lib/measure/wall-faces';

/**
 * Misclosures and the walk of every chain, angles carried to the straight walls.
 * Edge: what is not read is walked as drawn, and then nothing is said of how the chain closes.
 */
export function fitChains(context: FitContext): ChainClosure[] {
  return context.book.room.chains.map((_, index) =>
    fitChain(
      context,
      context.walk.walls.filter(({ chain }) => chain === index),
    ),
  );
}

/** What is not read is walked as drawn, for the picture; then nothing is said of how it closes. */
function fitChain(context: FitContext, walls: WalkedWall[]): ChainClosure {
  const closed = walls.length > 2 && (walls[0]?.closed ?? false);
  const legs = walls.map((walled): TraverseLeg & { isRead: boolean } => {
    const length = lengthAtPlan(context, walled.wall.id);
    const angle = angleAtPlan(context, walled);
    const drawn = { value: Math.max(1, walled.wall.nominalLengthMm), u: 0, from: [] };
    const drawnAngle = { value: walled.leftCornerDeg ?? 90, u: 0, from: [] };
    return {
      length: length ?? drawn,
      leftAngle: walled.before ? (angle ?? drawnAngle) : null,
      isRead: length !== null && (angle !== null || !walled.before),
    };
  });
  const traverse = closeTraverse({ closed, legs }).value;
  const isRead = legs.every((leg) => leg.isRead);
  const anglesRead = walls.every((walled) => !walled.before || angleAtPlan(context, walled));
  return {
    wallIds: walls.map(({ wall }) => wall.id),
    closed,
    angle:
      anglesRead && traverse?.angleMisclosure
        ? fitFigure('room-angle-misclosure', traverse.angleMisclosure)
        : null,
    linear:
      isRead && traverse?.linearMisclosure
        ? fitFigure('room-linear-misclosure', traverse.linearMisclosure)
        : null,
    relativePrecision: isRead ? (traverse?.relativePrecision ?? null) : null,
    areaMm2: isRead && traverse?.areaMm2 ? Math.abs(traverse.areaMm2) : null,
    walk: traverse?.walk ?? [],
  };
}

/** The height of the plan, or the nearest to it that was read at the wall. */
function lengthAtPlan(context: FitContext, wallId: string): Figure | null {
  const zMm = planHeight(context.rules);
  const read = context.lengths.filter((one) => one.wallId === wallId && one.yMm === 0);
  const sorted = [...read].sort((a, b) => Math.abs(a.zMm - zMm) - Math.abs(b.zMm - zMm));
  return sorted[0]?.length ?? null;
}

/** The first height read, carried from the leg marks to the straight walls. */
function angleAtPlan(context: FitContext, { wall, before }: WalkedWall): TraverseReading | null {
  const corner = context.corners.find(({ cornerWallId }) => cornerWallId === wall.id);
  if (!corner || !before) return null;
  return { ...chordAngleOf(context, corner, before.id), tool: shareOf(corner.repeats).tool };
}

/** A corner as read, carried to the straight lines corner to corner. */
export function chordAngleOf(
  context: FitContext,
  corner: CombinedCorner,
  beforeWallId: string,
): Figure {
  const reading = corner.repeats[0]?.reading;
  const left = context.faces.get(beforeWallId);
  const right = context.faces.get(corner.cornerWallId);
  if (!reading || !left || !right) return corner.angle;
  const arms = cornerArms(reading);
  const { usualBowMm } = context.rules;
  const isCarried = reading.by.method === 'legs' && reading.by.carriedPast;
  const arm = (faces: WallFaces, armMm: number, proud: Read | null) => ({
    armMm,
    proud,
    wallLengthMm: faces.lengthMm,
    usualBowMm,
  });
  return chordAngle(corner.angle, {
    left: arm(left, arms.leftMm, isCarried ? null : proudRead(left, left.lengthMm - arms.leftMm)),
    right: arm(right, arms.rightMm, proudRead(right, arms.rightMm)),
  });
}

function proudRead(faces: WallFaces, xMm: number): Read | null {
  const proud = proudAt(faces, xMm);
  return proud && { id: proud.id, value: proud.valueMm, u: proud.uMm };
}
