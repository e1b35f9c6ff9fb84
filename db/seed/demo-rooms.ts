/** The demo's rooms: three told in full (nearly true, badly out, one wall misread) and plain ones for the rest. */
import { randomUUID } from 'node:crypto';
import { type Run, run, type Unit } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Room } from '@/lib/contracts/wall-book';
import { nominalAngle } from './measure-room';
import { lengthOf, type TrueRoom, type TrueWall } from './true-room';

export type RoomPlan = 'nearly-true' | 'badly-out' | 'misread' | 'plain';

export type PlannedRoom = {
  room: Room;
  runs: Run[];
  truth: TrueRoom;
  misread?: { wallIndex: number; byMm: number; zMm: number };
};

const inch = 25.4;
/** What the layouts leave at each end of a wall. */
const fillerMm = 1.5 * inch;

/** A plain kitchen differs from the next by its seed; the three told ones are always the same. */
export function planRoom(plan: RoomPlan, rules: FitRules, random: () => number): PlannedRoom {
  const truth = truths[plan](random);
  const room = drawnRoom(truth);
  const runs = plan === 'badly-out' ? cornerRuns(room, truth, rules) : wallRuns(room, truth, rules);
  const misread =
    plan === 'misread'
      ? { wallIndex: 2, byMm: 100, zMm: rules.readingHeightsMm[1] ?? 914 }
      : undefined;
  return { room, runs, truth, misread };
}

const wall = (name: string, x: number, y: number, lean = 0, bowMm = 0): TrueWall => ({
  name,
  from: { x, y },
  lean,
  bowMm,
});

const truths: Record<RoomPlan, (random: () => number) => TrueRoom> = {
  'nearly-true': () => ({
    isClosed: true,
    walls: [
      wall('A', 0, 3050, 0.0005, 0.8),
      wall('B', 3606, 3052, -0.0004, -0.6),
      wall('C', 3604, 0, 0, 0.5),
      wall('D', 0, 0, 0.0006, -0.4),
    ],
    floor: { east: -0.0008, north: 0.0004, humpMm: 0 },
    ceilingMm: 2440,
    studSpacingMm: 16 * inch,
  }),
  'badly-out': () => ({
    isClosed: true,
    walls: [
      wall('A', 0, 3340, 0.0038, 4.5),
      wall('B', 3660, 3300, -0.0056, -5),
      wall('C', 3738, -18, 0.0021, 3),
      wall('D', -22, 0, -0.0034, 2.5),
    ],
    floor: { east: -0.0052, north: 0.0011, humpMm: 3 },
    ceilingMm: 2415,
    studSpacingMm: 16 * inch,
  }),
  misread: () => ({
    isClosed: true,
    walls: [
      wall('A', 0, 3600, 0.0008, 1.2),
      wall('B', 4206, 3602, -0.0006, 0.8),
      wall('C', 4204, 1510, 0.0004, 0.5),
      wall('D', 2410, 1508, 0.0005, -0.5),
      wall('E', 2412, 0, 0, 0.6),
      wall('F', 0, 0, -0.0007, 1),
    ],
    floor: { east: -0.0015, north: 0.0008, humpMm: 1 },
    ceilingMm: 2440,
    studSpacingMm: 16 * inch,
  }),
  plain: (random) => {
    const out = (mm: number) => (random() - 0.5) * 2 * mm;
    const width = 2900 + Math.round(random() * 1400);
    const depth = 2600 + Math.round(random() * 900);
    return {
      isClosed: true,
      walls: [
        wall('A', 0, depth + out(9), out(0.003), out(4)),
        wall('B', width + out(12), depth + out(9), out(0.003), out(4)),
        wall('C', width + out(12), out(9), out(0.003), out(4)),
        wall('D', out(12), 0, out(0.003), out(4)),
      ],
      floor: { east: out(0.003), north: out(0.002), humpMm: out(3) },
      ceilingMm: 2440,
      studSpacingMm: 16 * inch,
    };
  },
};

function drawnRoom(truth: TrueRoom): Room {
  const toTheInch = (mm: number) => Math.round(mm / inch) * inch;
  return {
    id: randomUUID(),
    name: 'Kitchen',
    chains: [
      {
        closed: truth.isClosed,
        walls: truth.walls.map(({ name }, index) => ({
          id: randomUUID(),
          name,
          nominalLengthMm: toTheInch(lengthOf(truth, index)),
          leftCornerDeg: nominalAngle(truth, index),
        })),
      },
    ],
    wallThicknessToComeMm: 0,
    floorToComeMm: 0,
  };
}

/** Base and wall units along wall A, between the walls beside it. */
function wallRuns(room: Room, truth: TrueRoom, rules: FitRules): Run[] {
  const wallA = room.chains[0]?.walls[0];
  if (!wallA) return [];
  const space = lengthOf(truth, 0) - 2 * fillerMm;
  return [
    baseRun(wallA.id, 'Sink wall', baseUnits(space), rules),
    upperRun(wallA.id, 'Sink wall, uppers', upperUnits(space), rules),
  ];
}

/** An L: the run on wall A goes through into the corner, the one on wall B dies against its front. */
function cornerRuns(room: Room, truth: TrueRoom, rules: FitRules): Run[] {
  const [wallA, wallB] = room.chains[0]?.walls ?? [];
  if (!wallA || !wallB) return [];
  const depth = baseDepthMm + 21;
  const long = baseRun(wallA.id, 'Long wall', baseUnits(lengthOf(truth, 0) - 2 * fillerMm), rules);
  const spaceB = 2200 - depth - rules.cornerFillerDrawersMm;
  const short = baseRun(wallB.id, 'Range wall', baseUnits(spaceB), rules);
  return [
    { ...long, right: { kind: 'run', runId: short.id, through: 'this' } },
    {
      ...short,
      left: { kind: 'run', runId: long.id, through: 'other' },
      right: { kind: 'open', limitMm: 2400 },
    },
    upperRun(wallA.id, 'Long wall, uppers', upperUnits(lengthOf(truth, 0) - 2 * fillerMm), rules),
  ];
}

const baseDepthMm = 24 * inch - (3 / 4) * inch;

function baseRun(wallId: string, name: string, units: Unit[], rules: FitRules): Run {
  return run.parse({
    id: randomUUID(),
    wallId,
    name,
    level: 'base',
    left: { kind: 'wall' },
    right: { kind: 'wall' },
    carcassDepthMm: baseDepthMm,
    z0Mm: rules.kickHeightMm,
    z1Mm: rules.baseTopMm,
    units,
    counterGroup: 'counter',
  });
}

function upperRun(wallId: string, name: string, units: Unit[], rules: FitRules): Run {
  const z0Mm = rules.counterTopMm + rules.counterToWallUnitMm;
  return run.parse({
    id: randomUUID(),
    wallId,
    name,
    level: 'wall',
    left: { kind: 'wall' },
    right: { kind: 'wall' },
    carcassDepthMm: 12 * inch,
    z0Mm,
    z1Mm: z0Mm + 30 * inch,
    units,
  });
}

/** Whole-inch boxes that leave about the aimed fillers; the last can be built to any half inch. */
function baseUnits(spaceMm: number): Unit[] {
  return fill(spaceMm, [
    { kind: 'drawers', widthIn: 18 },
    { kind: 'sink', widthIn: 33 },
    { kind: 'dishwasher', widthIn: 24 },
    { kind: 'base', widthIn: 30 },
    { kind: 'base', widthIn: 24 },
    { kind: 'drawers', widthIn: 30 },
    { kind: 'base', widthIn: 36 },
  ]);
}

function upperUnits(spaceMm: number): Unit[] {
  return fill(spaceMm, [
    { kind: 'wall', widthIn: 30 },
    { kind: 'wall', widthIn: 36 },
    { kind: 'wall', widthIn: 30 },
    { kind: 'wall', widthIn: 24 },
    { kind: 'wall', widthIn: 30 },
    { kind: 'wall', widthIn: 36 },
  ]);
}

function fill(spaceMm: number, wanted: { kind: Unit['kind']; widthIn: number }[]): Unit[] {
  const units: Unit[] = [];
  let left = spaceMm / inch;
  for (const { kind, widthIn } of wanted) {
    const isLast = left - widthIn < 12;
    const width = isLast ? Math.floor(left * 2) / 2 : widthIn;
    if (width < 9) break;
    units.push({
      id: randomUUID(),
      name: `${kind === 'wall' ? 'W' : 'B'}${units.length + 1}`,
      kind,
      widthMm: width * inch,
      alterable:
        kind === 'dishwasher' || kind === 'sink'
          ? null
          : { minMm: 9 * inch, maxMm: 42 * inch, stepMm: 0.5 * inch },
    });
    left -= width;
    if (isLast) break;
  }
  return units;
}
