/** The walls of a room in walking order, each with its neighbours at the corners. */
import type { Run } from '@/lib/contracts/runs';
import type { Room, Wall } from '@/lib/contracts/wall-book';

export type WalkedWall = {
  wall: Wall;
  chain: number;
  closed: boolean;
  /** The wall whose right end meets this one's left; null where a chain begins in the open. */
  before: Wall | null;
  /** Null where a chain ends in the open. */
  after: Wall | null;
  /** Nominal interior angles at its two ends; null at a free end. */
  leftCornerDeg: number | null;
  rightCornerDeg: number | null;
};

export type RoomWalk = {
  walls: WalkedWall[];
  byId: ReadonlyMap<string, WalkedWall>;
};

/**
 * Walls with their neighbours, in walking order.
 * Edge rule: a chain of one wall has no corners, even where it is called closed.
 * Example: an L of A, B: A has no wall before and B after; the corner A–B is at B's left end.
 */
export function walkRoom(room: Room): RoomWalk {
  const walls = room.chains.flatMap((chain, index) => {
    const count = chain.walls.length;
    const closed = chain.closed && count > 1;
    return chain.walls.map((wall, i): WalkedWall => {
      const before = closed || i > 0 ? (chain.walls[(i + count - 1) % count] ?? null) : null;
      const after = closed || i < count - 1 ? (chain.walls[(i + 1) % count] ?? null) : null;
      return {
        wall,
        chain: index,
        closed,
        before,
        after,
        leftCornerDeg: before ? (wall.leftCornerDeg ?? 90) : null,
        rightCornerDeg: after ? (after.leftCornerDeg ?? 90) : null,
      };
    });
  });
  return { walls, byId: new Map(walls.map((walked) => [walked.wall.id, walked])) };
}

/** "A–B": the corner at this wall's left end. */
export function cornerName(walked: WalkedWall): string {
  return `${walked.before?.name ?? ''}–${walked.wall.name}`;
}

/** Carcass + bumper + door. */
export function frontDepth(run: Pick<Run, 'carcassDepthMm' | 'bumperMm' | 'doorMm'>): number {
  return run.carcassDepthMm + run.bumperMm + run.doorMm;
}

/** The wall a run's end meets at the corner, and at which of that wall's ends; null at a free end. */
export function endWallOf(
  walk: RoomWalk,
  run: Run,
  end: 'left' | 'right',
): { walked: WalkedWall; corner: WalkedWall } | null {
  const own = walk.byId.get(run.wallId);
  const neighbour = end === 'left' ? own?.before : own?.after;
  const walked = neighbour ? walk.byId.get(neighbour.id) : undefined;
  if (!own || !walked) return null;
  return { walked, corner: end === 'left' ? own : walked };
}
