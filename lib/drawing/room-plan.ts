import type { Room } from '@/lib/contracts/wall-book';
import { nominalPlan } from '@/lib/measure/nominal-plan';
import type { ProvedRoom } from '@/lib/measure/prove-room';
import { wallsOf } from '@/lib/sheet/room-names';
import type { Point } from './shape';
import { clockwise, direction } from './vector';

/** One wall in the plan, in mm: x to the east, y to the south, walked clockwise. */
export type PlanWall = {
  wallId: string;
  name: string;
  /** The wall before, at the left corner; null where a chain begins in the open. */
  beforeId: string | null;
  nominalDeg: number | null;
  from: Point;
  to: Point;
  /** One long, left to right, and square to it into the room. */
  along: Point;
  inward: Point;
  lengthMm: number;
};

/** Between chains that nothing ties together they are drawn this far apart. */
const apartMm = 2_400;

/**
 * Where the walls stand in the plan: as adjusted where the room could be adjusted, else as read, else as
 * drawn.
 *
 * Edge: a second chain that nothing ties to the first faces it, as in a galley.
 * Example: a room of four walls read true gives corners 0,0 3000,0 3000,2000 0,2000.
 */
export function roomPlan(room: Room, fit: ProvedRoom): PlanWall[] {
  const places = fit.closure.adjustment ? adjustedPlaces(fit) : null;
  const drawn = drawnPlaces(room, fit);
  return wallsOf(room).map(({ wall, before }) => {
    const [from, to] = places?.get(wall.id) ?? drawn.get(wall.id) ?? [nowhere, nowhere];
    const along = direction(from, to);
    return {
      wallId: wall.id,
      name: wall.name,
      beforeId: before?.id ?? null,
      nominalDeg: wall.leftCornerDeg,
      from,
      to,
      along,
      inward: clockwise(along),
      lengthMm: Math.hypot(to[0] - from[0], to[1] - from[1]),
    };
  });
}

type Places = Map<string, readonly [Point, Point]>;
const nowhere: Point = [0, 0];

function adjustedPlaces(fit: ProvedRoom): Places {
  const corners = fit.closure.adjustment?.corners ?? [];
  const ends = new Map(corners.map((corner) => [corner.afterWallId, corner]));
  const places: Places = new Map();
  for (const corner of corners) {
    const end = corner.cornerWallId && ends.get(corner.cornerWallId);
    if (!corner.cornerWallId || !end) continue;
    places.set(corner.cornerWallId, [
      [corner.xMm, corner.yMm],
      [end.xMm, end.yMm],
    ]);
  }
  return places;
}

function drawnPlaces(room: Room, fit: ProvedRoom): Places {
  const lengthOf = (wallId: string) => {
    const wall = fit.walls.find((one) => one.wallId === wallId);
    const read = wall?.length ?? wall?.readAt[0]?.length;
    const nominal = wallsOf(room).find((one) => one.wall.id === wallId)?.wall.nominalLengthMm;
    return read?.value ?? nominal ?? 0;
  };
  const places: Places = new Map();
  room.chains.forEach((chain, index) => {
    const { x, y, lines, wallAt } = nominalPlan({ chains: [chain] }, lengthOf);
    const width = Math.max(0, ...x);
    const at = (place: number): Point => {
      const point: Point = [x[place] ?? 0, y[place] ?? 0];
      return index === 0 ? point : [width - point[0], apartMm * index - point[1]];
    };
    for (const { left, right } of lines) {
      const wallId = wallAt[left];
      if (wallId) places.set(wallId, [at(left), at(right)]);
    }
  });
  return places;
}
