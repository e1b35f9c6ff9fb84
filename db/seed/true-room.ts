/**
 * A room as it really stands, for the demo: where its walls are at any height, how they bow and lean, how
 * the floor falls. Plan in mm, x east and y north, walls clockwise as seen from above.
 */
export type TrueWall = {
  name: string;
  /** Plan corner at the wall's left end, on the plumb plane at the datum. */
  from: Point;
  /** mm per mm of height, positive into the room upward. */
  lean: number;
  /** Greatest stand-off of its middle from the straight line, positive into the room, mm. */
  bowMm: number;
};

export type TrueRoom = {
  /** A closed room; an open chain ends where its last wall ends. */
  isClosed: boolean;
  walls: TrueWall[];
  /** Where an open chain's last wall ends. */
  end?: Point;
  /** Height of the floor over the datum: a plane, mm per mm east and north, and a hump in the middle. */
  floor: { east: number; north: number; humpMm: number };
  ceilingMm: number;
  studSpacingMm: number;
};

export type Point = { x: number; y: number };

export const lengthOf = (room: TrueRoom, index: number, zMm = 0): number => {
  const [a, b] = endsAt(room, index, zMm);
  return Math.hypot(b.x - a.x, b.y - a.y);
};

/** Both ends of a wall at a height: leaning walls meet elsewhere up there. */
export function endsAt(room: TrueRoom, index: number, zMm: number): [Point, Point] {
  return [cornerAt(room, index, zMm), cornerAt(room, index + 1, zMm)];
}

/** The corner at the left end of a wall (or the far end of an open chain) at a height. */
export function cornerAt(room: TrueRoom, index: number, zMm: number): Point {
  const count = room.walls.length;
  const isEnd = !room.isClosed && (index === 0 || index === count);
  const right = line(room, index === count && !room.isClosed ? count - 1 : index % count, zMm);
  if (isEnd) return index === 0 ? right.from : right.to;
  return intersect(line(room, (index - 1 + count) % count, zMm), right);
}

/** A point of the wall's face: `t` along the line corner to corner at the datum, at a height. */
export function facePoint(room: TrueRoom, index: number, t: number, zMm: number): Point {
  const { from, along, into } = line(room, index, 0);
  const s = standsProud(room, index, t, zMm);
  return { x: from.x + along.x * t + into.x * s, y: from.y + along.y * t + into.y * s };
}

/** How far the face stands proud of the plumb plane through its ends at the datum. */
export function standsProud(room: TrueRoom, index: number, t: number, zMm: number): number {
  const { bowMm, lean } = wallOf(room, index);
  const share = t / lengthOf(room, index);
  return bowMm * 4 * share * (1 - share) + lean * zMm;
}

/** Height of the floor over the datum at a plan point. */
export function floorHeight(room: TrueRoom, { x, y }: Point): number {
  const { east, north, humpMm } = room.floor;
  const middle = {
    x: mean(room.walls.map(({ from }) => from.x)),
    y: mean(room.walls.map(({ from }) => from.y)),
  };
  const away = Math.hypot(x - middle.x, y - middle.y) / 1500;
  return east * x + north * y + humpMm * Math.exp(-away * away);
}

/** Interior angle at the left corner of a wall at a height, in degrees; null where a chain begins. */
export function angleAt(room: TrueRoom, index: number, zMm: number): number | null {
  if (!room.isClosed && index === 0) return null;
  const count = room.walls.length;
  const left = line(room, (index - 1 + count) % count, zMm).along;
  const right = line(room, index, zMm).along;
  const turn = Math.atan2(right.y * left.x - right.x * left.y, right.x * left.x + right.y * left.y);
  return 180 + (turn * 180) / Math.PI;
}

/** A wall's straight line at a height, with its direction left to right and the way into the room. */
export function line(room: TrueRoom, index: number, zMm: number) {
  const { from: start, lean } = wallOf(room, index);
  const next = room.walls[index + 1]?.from ?? (room.isClosed ? wallOf(room, 0).from : room.end);
  if (!next) throw new Error('an open room needs its end');
  const length = Math.hypot(next.x - start.x, next.y - start.y);
  const along = { x: (next.x - start.x) / length, y: (next.y - start.y) / length };
  const into = { x: along.y, y: -along.x };
  const out = lean * zMm;
  return {
    from: { x: start.x + into.x * out, y: start.y + into.y * out },
    to: { x: next.x + into.x * out, y: next.y + into.y * out },
    along,
    into,
  };
}

function wallOf(room: TrueRoom, index: number): TrueWall {
  const wall = room.walls[index];
  if (!wall) throw new Error(`no wall ${index}`);
  return wall;
}

type Line = { from: Point; along: Point };

function intersect(a: Line, b: Line): Point {
  const cross = a.along.x * b.along.y - a.along.y * b.along.x;
  const t = ((b.from.x - a.from.x) * b.along.y - (b.from.y - a.from.y) * b.along.x) / cross;
  return { x: a.from.x + a.along.x * t, y: a.from.y + a.along.y * t };
}

const mean = (numbers: number[]) => numbers.reduce((sum, n) => sum + n, 0) / numbers.length;
