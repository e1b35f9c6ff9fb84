/** Which unknown stands in which column: corners, then leans, twists, bows and tool errors. */
import type { CornerEnd, RoomObservation, RoomShape } from './room-observations';

/** A column below zero is not an unknown: the value is fixed. */
export const FIXED = -1;

export type LaidOutWall = {
  id: string;
  chain: number;
  /** Points at its two ends. */
  left: number;
  right: number;
  nominalLengthMm: number;
  /** Neighbours at the corners; null at a free end. */
  wallBefore: number | null;
  wallAfter: number | null;
  leanColumn: number;
  /** How much more it leans at its right end than at its left. */
  twistColumn: number;
  bowColumn: number;
};
export type LaidOutPoint = {
  chain: number;
  xColumn: number;
  yColumn: number;
  /** Walls that end and begin here. */
  wallBefore: number | null;
  wallAfter: number | null;
};
export type RoomLayout = {
  walls: LaidOutWall[];
  points: LaidOutPoint[];
  wallById: Map<string, number>;
  toolColumns: Map<string, number>;
  unknownCount: number;
  /** For each chain after the first: readings tie it to those before. */
  chainTied: boolean[];
  /** First wall and point of each chain. */
  chainStarts: { wall: number; point: number; wallCount: number; closed: boolean }[];
};

/**
 * Numbers walls, corners and unknowns; fixes the first corner and heading of every chain that stands alone.
 *
 * Edge: a wall has a lean and a twist only if something was read off the plan's height on it or beside it,
 * and a bow only if an angle or a front-depth length leans on its unread face: an unknown nothing touches
 * is left out.
 */
export function layOutRoom(
  room: RoomShape,
  observations: RoomObservation[],
  zRefMm: number,
): RoomLayout {
  const layout: RoomLayout = {
    walls: [],
    points: [],
    wallById: new Map(),
    toolColumns: new Map(),
    unknownCount: 0,
    chainTied: [],
    chainStarts: [],
  };
  placeWalls(layout, room);
  tieChains(layout, observations);
  numberCoordinates(layout);
  numberNuisances(layout, observations, zRefMm);
  return layout;
}

/** The point at an end of a wall, or null when the wall is not in the room. */
export function pointAt(layout: RoomLayout, corner: CornerEnd): number | null {
  const wall = layout.walls[layout.wallById.get(corner.wallId) ?? -1];
  if (!wall) return null;
  return corner.end === 'left' ? wall.left : wall.right;
}

function placeWalls(layout: RoomLayout, room: RoomShape): void {
  room.chains.forEach((chain, chainIndex) => {
    const firstWall = layout.walls.length;
    const firstPoint = layout.points.length;
    const count = chain.walls.length;
    const pointCount = chain.closed ? count : count + 1;
    layout.chainStarts.push({
      wall: firstWall,
      point: firstPoint,
      wallCount: count,
      closed: chain.closed,
    });
    chain.walls.forEach((wall, i) => {
      const hasBefore = chain.closed || i > 0;
      const hasAfter = chain.closed || i < count - 1;
      layout.wallById.set(wall.id, firstWall + i);
      layout.walls.push({
        id: wall.id,
        chain: chainIndex,
        left: firstPoint + i,
        right: firstPoint + ((i + 1) % pointCount),
        nominalLengthMm: wall.nominalLengthMm,
        wallBefore: hasBefore ? firstWall + ((i + count - 1) % count) : null,
        wallAfter: hasAfter ? firstWall + ((i + 1) % count) : null,
        leanColumn: FIXED,
        twistColumn: FIXED,
        bowColumn: FIXED,
      });
    });
    for (let i = 0; i < pointCount; i++) {
      const before = chain.closed || i > 0 ? firstWall + ((i + count - 1) % count) : null;
      const after = chain.closed || i < count ? firstWall + (i % count) : null;
      layout.points.push({
        chain: chainIndex,
        xColumn: FIXED,
        yColumn: FIXED,
        wallBefore: before,
        wallAfter: after,
      });
    }
  });
}

/** A chain is tied when a diagonal or a width leads, directly or over others, to the first. */
function tieChains(layout: RoomLayout, observations: RoomObservation[]): void {
  const group = layout.chainStarts.map((_, i) => i);
  const chainOf = (wallId: string) => layout.walls[layout.wallById.get(wallId) ?? -1]?.chain;
  for (const observation of observations) {
    const ends =
      observation.kind === 'diagonal'
        ? [observation.from.wallId, observation.to.wallId]
        : observation.kind === 'width'
          ? [observation.wallId, observation.toWallId]
          : [];
    const [one, other] = ends.map(chainOf);
    if (one === undefined || other === undefined) continue;
    const from = group[one];
    const to = group[other];
    group.forEach((value, i) => {
      if (value === Math.max(from ?? 0, to ?? 0)) group[i] = Math.min(from ?? 0, to ?? 0);
    });
  }
  layout.chainTied = group.map((value, i) => value !== i);
}

function numberCoordinates(layout: RoomLayout): void {
  layout.chainStarts.forEach((start, chain) => {
    const pointCount = start.closed ? start.wallCount : start.wallCount + 1;
    const alone = layout.chainTied[chain] === false;
    for (let i = 0; i < pointCount; i++) {
      const point = layout.points[start.point + i];
      if (!point || (alone && i === 0)) continue;
      point.xColumn = layout.unknownCount++;
      if (!(alone && i === 1)) point.yColumn = layout.unknownCount++;
    }
  });
}

function numberNuisances(
  layout: RoomLayout,
  observations: RoomObservation[],
  zRefMm: number,
): void {
  const leaning = new Set<number>();
  const plumbed = new Set<number>();
  const bowed = new Set<number>();
  const add = (set: Set<number>, ...walls: (number | null | undefined)[]) => {
    for (const wall of walls) if (wall !== null && wall !== undefined && wall >= 0) set.add(wall);
  };
  const tools = new Set<string>();
  for (const observation of observations) {
    if (observation.tool) tools.add(observation.tool.toolId);
    const offPlan = observation.kind !== 'plumb' && observation.zMm !== zRefMm;
    switch (observation.kind) {
      case 'length': {
        const index = layout.wallById.get(observation.wallId);
        const wall = layout.walls[index ?? -1];
        if (offPlan) add(leaning, index, wall?.wallBefore, wall?.wallAfter);
        if (observation.yMm > 0) add(bowed, wall?.wallBefore, wall?.wallAfter);
        break;
      }
      case 'corner': {
        const index = layout.wallById.get(observation.cornerWallId);
        if (!observation.proudLeft) add(bowed, layout.walls[index ?? -1]?.wallBefore);
        if (!observation.proudRight) add(bowed, index);
        if (offPlan) add(leaning, index, layout.walls[index ?? -1]?.wallBefore);
        break;
      }
      case 'diagonal':
        if (!offPlan) break;
        for (const corner of [observation.from, observation.to]) {
          const point = layout.points[pointAt(layout, corner) ?? -1];
          add(leaning, point?.wallBefore, point?.wallAfter);
        }
        break;
      case 'width':
        if (!offPlan) break;
        add(leaning, layout.wallById.get(observation.wallId));
        add(leaning, layout.wallById.get(observation.toWallId));
        break;
      case 'plumb':
        add(plumbed, layout.wallById.get(observation.wallId));
    }
  }
  layout.walls.forEach((wall, i) => {
    if (leaning.has(i) || plumbed.has(i)) wall.leanColumn = layout.unknownCount++;
  });
  layout.walls.forEach((wall, i) => {
    if (leaning.has(i)) wall.twistColumn = layout.unknownCount++;
  });
  layout.walls.forEach((wall, i) => {
    if (bowed.has(i)) wall.bowColumn = layout.unknownCount++;
  });
  for (const tool of tools) layout.toolColumns.set(tool, layout.unknownCount++);
}
