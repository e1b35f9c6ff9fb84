import type { FitRules } from '@/lib/contracts/shop-rules';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { ProvedRoom } from '@/lib/measure/prove-room';
import { type PlanWall, roomPlan } from './room-plan';
import type { Point } from './shape';
import { turned } from './vector';

export type ClosureSource = { wallBook: WallBook; fit: ProvedRoom; rules: FitRules };

/** A corner that others are seen from, with the ellipse in which it lies 95 times of 100. */
export type SureCorner = {
  /** In mm of the plan. */
  at: Point;
  /** Half axes in mm; the angle is of the long one from x towards y. */
  aMm: number;
  bMm: number;
  angleDeg: number;
};

/** A closed chain walked as read, laid over the evened-out room; the last point is where it ends. */
export type WalkAsRead = { read: readonly Point[]; adjusted: readonly Point[]; gapMm: number };

/** What the closure picture is drawn from, in mm of the plan. */
export type ClosureFrame = {
  walls: readonly PlanWall[];
  corners: readonly SureCorner[];
  walks: readonly WalkAsRead[];
};

/**
 * Half axes of the 95 % ellipse over those of the standard one: √χ²(0.95; 2) = √(−2 ln 0.05). The standard
 * ellipse holds its corner 39 times of 100 only.
 * Source: the normal distribution of two variables; common surveying practice.
 */
export const sureFactor = Math.sqrt(-2 * Math.log(0.05));

/** Null while too little is read for the room to be evened out, or nothing: then its corners are only drawn. */
export function closureFrame({ wallBook, fit }: ClosureSource): ClosureFrame | null {
  const { adjustment, chains } = fit.closure;
  if (!adjustment || adjustment.observations.length === 0) return null;
  const walls = roomPlan(wallBook.room, fit);
  return {
    walls,
    corners: adjustment.corners.map(({ xMm, yMm, ellipse }) => ({
      at: [xMm, yMm],
      aMm: ellipse.aMm * sureFactor,
      bMm: ellipse.bMm * sureFactor,
      angleDeg: ellipse.angleDeg,
    })),
    walks: chains.flatMap((chain) => {
      if (!chain.closed || !chain.linear) return [];
      const adjusted = chain.wallIds.flatMap((id): Point[] => {
        const wall = walls.find(({ wallId }) => wallId === id);
        return wall ? [wall.from] : [];
      });
      const read = chain.walk.map(({ xMm, yMm }): Point => [xMm, yMm]);
      const [start] = adjusted;
      if (!start || read.length !== adjusted.length + 1) return [];
      return [
        {
          read: laidOver(read, adjusted),
          adjusted: [...adjusted, start],
          gapMm: chain.linear.value,
        },
      ];
    }),
  };
}

/** The walk begins at its own nought: moved to the first corner and turned into the first wall. */
function laidOver(read: readonly Point[], adjusted: readonly Point[]): Point[] {
  const [from, to] = read;
  const [start, next] = adjusted;
  if (!from || !to || !start || !next) return [...read];
  const headingDeg = (one: Point, other: Point) =>
    (Math.atan2(other[1] - one[1], other[0] - one[0]) * 180) / Math.PI;
  const turnDeg = headingDeg(start, next) - headingDeg(from, to);
  return read.map(([x, y]) => {
    const [dx, dy] = turned([x - from[0], y - from[1]], turnDeg);
    return [start[0] + dx, start[1] + dy];
  });
}
