/** A made-up room that is known exactly, and the readings a measurer would take in it. */
import type { Reading } from '@/lib/contracts/readings';
import type { Tool, WallBook } from '@/lib/contracts/wall-book';
import { seeded } from './seeded';

export type TrueWall = {
  name: string;
  lengthMm: number;
  /** Interior angle at its left end; null where an open chain begins. */
  cornerDeg: number | null;
  /** mm per mm, positive into the room upward. */
  lean?: number;
  /** Middle of the wall proud of the straight line, mm. */
  bowMm?: number;
};

export type TrueRoom = {
  walls: TrueWall[];
  closed: boolean;
  zRefMm: number;
  /** Height of the floor over the datum at a place in the plan. */
  floor?: (xMm: number, yMm: number) => number;
  ceilingMm?: number;
};

/** Four straight, plumb walls of 3000 and 2400 mm, every corner at 90°. */
export const squareRoom: TrueRoom = {
  closed: true,
  zRefMm: 910,
  walls: ['A', 'B', 'C', 'D'].map((name, i) => ({
    name,
    lengthMm: i % 2 === 0 ? 3_000 : 2_400,
    cornerDeg: 90,
  })),
};

/** A uuid that counts. */
export function countedId(n: number): string {
  return `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;
}

export const tape: Tool = {
  id: countedId(900_001),
  name: 'Tape II',
  spec: { kind: 'tape', accuracyClass: 'II', stepMm: 0.5, repeatabilityMm: 0.3 },
};
export const level: Tool = {
  id: countedId(900_002),
  name: 'Level',
  spec: { kind: 'level', mpeMmPerM: 0.5, stepMm: 0.5, repeatabilityMm: 0.2 },
};

type Point = { x: number; y: number };

/** Places of the corners in the plan at a height: each wall's line moved by its lean. */
export function cornersAt(room: TrueRoom, zMm: number): Point[] {
  const plan = planCorners(room);
  const count = room.walls.length;
  const pointCount = room.closed ? count : count + 1;
  return Array.from({ length: pointCount }, (_, i) => {
    const before = room.closed || i > 0 ? (i + count - 1) % count : null;
    const after = room.closed || i < count ? i % count : null;
    const corner = plan[i] ?? { x: 0, y: 0 };
    const move = (wall: number | null) => {
      if (wall === null) return null;
      const heading = headingOf(room, wall);
      const out = (room.walls[wall]?.lean ?? 0) * (zMm - room.zRefMm);
      return { nx: -Math.sin(heading), ny: Math.cos(heading), out };
    };
    const one = move(before);
    const other = move(after);
    if (!one || !other) {
      const only = one ?? other ?? { nx: 0, ny: 0, out: 0 };
      return { x: corner.x + only.nx * only.out, y: corner.y + only.ny * only.out };
    }
    const cross = one.nx * other.ny - one.ny * other.nx;
    return {
      x: corner.x + (one.out * other.ny - other.out * one.ny) / cross,
      y: corner.y + (other.out * one.nx - one.out * other.nx) / cross,
    };
  });
}

function headingOf(room: TrueRoom, index: number): number {
  if (room.closed) {
    const plan = planCorners(room);
    const from = plan[index] ?? { x: 0, y: 0 };
    const to = plan[(index + 1) % plan.length] ?? { x: 0, y: 0 };
    return Math.atan2(to.y - from.y, to.x - from.x);
  }
  let heading = 0;
  for (let i = 1; i <= index; i++) {
    heading += Math.PI - ((room.walls[i]?.cornerDeg ?? 90) * Math.PI) / 180;
  }
  return heading;
}

/** A closed room is walked by all its lengths and angles but the last two: those follow. */
function planCorners(room: TrueRoom): Point[] {
  const points: Point[] = [{ x: 0, y: 0 }];
  let heading = 0;
  room.walls.forEach((wall, i) => {
    if (i > 0) heading += Math.PI - ((wall.cornerDeg ?? 90) * Math.PI) / 180;
    const last = points[points.length - 1] ?? { x: 0, y: 0 };
    points.push({
      x: last.x + wall.lengthMm * Math.cos(heading),
      y: last.y + wall.lengthMm * Math.sin(heading),
    });
  });
  if (room.closed) points.pop();
  return points;
}

/** The true length of a wall at a height, corner to corner. */
export function trueLength(room: TrueRoom, index: number, zMm: number): number {
  const corners = cornersAt(room, zMm);
  const from = corners[index] ?? { x: 0, y: 0 };
  const to = corners[(index + 1) % corners.length] ?? { x: 0, y: 0 };
  return Math.hypot(to.x - from.x, to.y - from.y);
}

/** The true interior angle at a wall's left end, between the straight lines. */
export function trueAngle(room: TrueRoom, index: number): number {
  const count = room.walls.length;
  const turn = headingOf(room, index) - headingOf(room, (index + count - 1) % count);
  const angle = 180 - (turn * 180) / Math.PI;
  return ((angle % 360) + 360) % 360;
}

export type BookOptions = {
  heightsMm?: number[];
  diagonals?: [number, number][];
  legMm?: number;
  faces?: boolean;
  floors?: boolean;
  /** Standard noise of lengths in mm; 0: exact. */
  noiseMm?: number;
  seed?: number;
};

/** The wall book of a room, as it would be read. */
export function bookOf(room: TrueRoom, options: BookOptions = {}): WallBook {
  const { heightsMm = [100, 910, 1_450], legMm = 900, faces = true, floors = true } = options;
  const gauss = seeded(options.seed ?? 1).normal;
  const noise = () => (options.noiseMm ? options.noiseMm * gauss() : 0);
  const readings: Reading[] = [];
  const roomId = countedId(1);
  const count = room.walls.length;
  const wallId = (index: number) => countedId(100 + ((index + count) % count));
  const common = () => ({
    id: countedId(10_000 + readings.length),
    roomId,
    toolId: tape.id,
    takenAt: '2026-01-05T09:00:00Z',
    typed: '',
    unit: 'mm' as const,
    touches: 'board' as const,
  });
  room.walls.forEach((wall, i) => {
    if (room.closed || i > 0)
      readings.push(cornerReading(room, i, wallId(i), legMm, common(), noise));
    for (const zMm of heightsMm) {
      const valueMm = trueLength(room, i, zMm) + noise();
      readings.push({ ...common(), kind: 'length', wallId: wallId(i), zMm, yMm: 0, valueMm });
    }
    if (!faces) return;
    const setUpId = countedId(5_000 + i);
    for (const part of [0.03, 0.2, 0.4, 0.6, 0.8, 0.97]) {
      for (const zMm of heightsMm) {
        const xMm = part * wall.lengthMm;
        const s =
          (wall.bowMm ?? 0) * 4 * part * (1 - part) + (wall.lean ?? 0) * (zMm - room.zRefMm);
        readings.push({
          ...common(),
          toolId: level.id,
          kind: 'face',
          wallId: wallId(i),
          xMm,
          zMm,
          gapMm: 40 + 0.003 * xMm - s + noise() / 3,
          setUpId,
          setUpKind: 'laser-plane',
        });
      }
    }
  });
  const corners = cornersAt(room, room.zRefMm);
  for (const [from, to] of options.diagonals ?? []) {
    const a = corners[from] ?? { x: 0, y: 0 };
    const b = corners[to] ?? { x: 0, y: 0 };
    readings.push({
      ...common(),
      kind: 'diagonal',
      fromCornerWallId: wallId(from),
      toCornerWallId: wallId(to),
      zMm: room.zRefMm,
      valueMm: Math.hypot(b.x - a.x, b.y - a.y) + noise(),
    });
  }
  if (floors) readings.push(...levelReadings(room, wallId, common, readings.length));
  return {
    room: {
      id: roomId,
      name: 'Kitchen',
      chains: [
        {
          closed: room.closed,
          walls: room.walls.map((wall, i) => ({
            id: wallId(i),
            name: wall.name,
            nominalLengthMm: Math.round(wall.lengthMm / 10) * 10,
            leftCornerDeg:
              room.closed || i > 0 ? Math.round((wall.cornerDeg ?? 90) / 45) * 45 : null,
          })),
        },
      ],
      wallThicknessToComeMm: 0,
      floorToComeMm: 0,
    },
    readings: readings.map((reading, i) => ({ ...reading, id: countedId(10_000 + i) })),
    tools: [tape, level],
  };
}

type Common = Omit<
  Extract<Reading, { kind: 'length' }>,
  'kind' | 'wallId' | 'zMm' | 'yMm' | 'valueMm'
>;

function cornerReading(
  room: TrueRoom,
  index: number,
  wallId: string,
  longestLegMm: number,
  common: Common,
  noise: () => number,
): Reading {
  const count = room.walls.length;
  const arms = [room.walls[index], room.walls[(index + count - 1) % count]];
  const legMm = Math.min(longestLegMm, ...arms.map((wall) => 0.8 * (wall?.lengthMm ?? 1_000)));
  const corners = cornersAt(room, room.zRefMm);
  const corner = corners[index] ?? { x: 0, y: 0 };
  const before = room.walls[(index + count - 1) % count];
  const after = room.walls[index];
  const angle = trueAngle(room, index);
  const outside = angle > 180;
  const mark = (wall: TrueWall | undefined, heading: number, direction: 1 | -1) => {
    const part = legMm / (wall?.lengthMm ?? 1);
    const proud = outside ? 0 : (wall?.bowMm ?? 0) * 4 * part * (1 - part);
    return {
      x: corner.x + direction * legMm * Math.cos(heading) - proud * Math.sin(heading),
      y: corner.y + direction * legMm * Math.sin(heading) + proud * Math.cos(heading),
    };
  };
  const beforeHeading = headingOf(room, (index + count - 1) % count);
  // Outside: the left leg lies on a straightedge carried past the corner.
  const left = mark(before, beforeHeading, outside ? 1 : -1);
  const right = mark(after, headingOf(room, index), 1);
  const distance = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);
  return {
    ...common,
    kind: 'corner',
    cornerWallId: wallId,
    zMm: room.zRefMm,
    by: {
      method: 'legs',
      legLeftMm: distance(corner, left) + noise() / 2,
      legRightMm: distance(corner, right) + noise() / 2,
      diagonalMm: distance(left, right) + noise() / 2,
      carriedPast: outside,
    },
  };
}

function levelReadings(
  room: TrueRoom,
  wallId: (index: number) => string,
  common: () => Common,
  from: number,
): Reading[] {
  const corners = cornersAt(room, room.zRefMm);
  const setUpId = countedId(6_000);
  const levelMm = 1_300;
  return room.walls.flatMap((wall, i) =>
    [0.02, 0.25, 0.5, 0.75, 0.98].flatMap((part, j) =>
      [40, 500].flatMap((yMm, k): Reading[] => {
        const heading = headingOf(room, i);
        const corner = corners[i] ?? { x: 0, y: 0 };
        const xMm = part * wall.lengthMm;
        const x = corner.x + xMm * Math.cos(heading) - yMm * Math.sin(heading);
        const y = corner.y + xMm * Math.sin(heading) + yMm * Math.cos(heading);
        const base = {
          ...common(),
          id: countedId(20_000 + from + i * 100 + j * 10 + k),
          toolId: tape.id,
          wallId: wallId(i),
          xMm,
          yMm,
          setUpId,
        };
        const floor: Reading = {
          ...base,
          kind: 'floor',
          dropMm: levelMm - (room.floor?.(x, y) ?? 0),
        };
        if (k === 0) return [floor];
        const riseMm = (room.ceilingMm ?? 2_440) - levelMm;
        return [floor, { ...base, kind: 'ceiling', riseMm }];
      }),
    ),
  );
}
