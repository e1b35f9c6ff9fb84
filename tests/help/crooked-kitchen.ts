/** A kitchen badly out of true, read as a measurer would: the same for the server, the drawings and the look. */
import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import type { Room, Tool, WallBook } from '@/lib/contracts/wall-book';
import { formatLength } from '@/lib/units/format-length';
import { kitchenRuns } from './kitchen-runs';

const inch = 25.4;
const stepMm = inch / 16;
const zRefMm = 36 * inch;

export type CrookedKitchen = { wallBook: WallBook; runs: Run[] };

type TrueWall = {
  name: string;
  from: [number, number];
  /** mm per mm, positive into the room as z grows. */
  lean: number;
  /** Middle of the wall proud of its chord: positive a bulge. */
  bowMm: number;
};

/** Seen from above, y to the south: clockwise from the corner at the north-west. */
const trueWalls: TrueWall[] = [
  { name: 'A', from: [0, 0], lean: 0.003, bowMm: -6 },
  { name: 'B', from: [3600, 14], lean: -0.004, bowMm: 5 },
  { name: 'C', from: [3648, 2880], lean: 0.001, bowMm: -2 },
  { name: 'D', from: [-38, 2930], lean: 0.005, bowMm: 3 },
];

export function crookedKitchen({
  newId = countedIds(),
  /** 1: as bad as drawn; 0.1: nearly true. */
  crookedness = 1,
  /** Added to the length of wall C at the counter. */
  misreadMm = 0,
} = {}): CrookedKitchen {
  const walls = trueWalls.map((wall) => ({ ...wall, id: newId() }));
  const roomId = newId();
  const tools = makeTools(newId);
  const square: [number, number][] = [
    [0, 0],
    [3600, 0],
    [3600, 2880],
    [0, 2880],
  ];
  const corners = walls.map(({ from }, index): [number, number] => {
    const [x, y] = square[index] ?? [0, 0];
    return [x + (from[0] - x) * crookedness, y + (from[1] - y) * crookedness];
  });
  const shape = walls.map((wall, index) => {
    const here = at(corners, index);
    const next = at(corners, index + 1);
    const before = at(corners, index - 1);
    return {
      ...wall,
      lean: wall.lean * crookedness,
      bowMm: wall.bowMm * crookedness,
      here,
      along: unitVector(here, next),
      lengthMm: Math.hypot(next[0] - here[0], next[1] - here[1]),
      leftDeg: angleBetween(unitVector(here, before), unitVector(here, next)),
    };
  });
  const book: Reading[] = [];
  const [tape, laser, finder] = tools;
  const common = (toolId: string) => ({
    id: newId(),
    roomId,
    toolId,
    takenAt: new Date(Date.UTC(2026, 11, 1, 14, 0, book.length * 20)).toISOString(),
    unit: 'in' as const,
    touches: 'board' as const,
  });
  const onStep = (mm: number) => Math.round(mm / stepMm) * stepMm;
  const typed = (mm: number) => formatLength(mm, { unit: 'in', stepMm }).replace('"', '');

  shape.forEach((wall, index) => {
    const next = at(shape, index + 1);
    const before = at(shape, index - 1);
    for (const zMm of [4, 36, 57, 90].map((height) => height * inch)) {
      const slip = index === 2 && zMm === zRefMm ? misreadMm : 0;
      const read = onStep(
        wall.lengthMm -
          (zMm - zRefMm) *
            (loss(before.lean, wall.lean, wall.leftDeg) +
              loss(next.lean, wall.lean, next.leftDeg)) +
          slip,
      );
      book.push({
        ...common(laser.id),
        kind: 'length',
        wallId: wall.id,
        zMm,
        yMm: 0,
        valueMm: read,
        typed: typed(read),
      });
    }
  });
  for (const wall of shape) {
    const [legLeftMm, legRightMm] = [36 * inch, 48 * inch];
    const diagonalMm = onStep(
      Math.sqrt(
        legLeftMm ** 2 +
          legRightMm ** 2 -
          2 * legLeftMm * legRightMm * Math.cos((wall.leftDeg * Math.PI) / 180),
      ),
    );
    book.push({
      ...common(tape.id),
      kind: 'corner',
      cornerWallId: wall.id,
      zMm: zRefMm,
      by: { method: 'legs', legLeftMm, legRightMm, diagonalMm, carriedPast: false },
      typed: `36 / 48 / ${typed(diagonalMm)}`,
    });
    const angleDeg = Math.round(wall.leftDeg * 10) / 10;
    book.push({
      ...common(finder.id),
      kind: 'corner',
      cornerWallId: wall.id,
      zMm: 4 * inch,
      by: { method: 'angle', angleDeg },
      typed: String(angleDeg),
    });
  }
  for (const [from, to] of [
    [0, 2],
    [1, 3],
  ] as const) {
    const [one, other] = [at(corners, from), at(corners, to)];
    const valueMm = onStep(Math.hypot(other[0] - one[0], other[1] - one[1]));
    book.push({
      ...common(laser.id),
      kind: 'diagonal',
      fromCornerWallId: at(walls, from).id,
      toCornerWallId: at(walls, to).id,
      zMm: zRefMm,
      valueMm,
      typed: typed(valueMm),
    });
  }
  for (const wall of shape) {
    const setUpId = newId();
    for (const zMm of [4, 36, 57, 84].map((height) => height * inch)) {
      for (let xMm = 100; xMm < wall.lengthMm; xMm += 560) {
        const part = xMm / wall.lengthMm;
        const proud = wall.bowMm * 4 * part * (1 - part) + wall.lean * (zMm - zRefMm);
        const gapMm = Math.round((40 - proud) * 2) / 2;
        book.push({
          ...common(laser.id),
          kind: 'face',
          wallId: wall.id,
          xMm,
          zMm,
          gapMm,
          setUpId,
          setUpKind: 'laser-plane',
          unit: 'mm',
          typed: String(gapMm),
        });
      }
    }
  }
  const levelId = newId();
  const floorHeight = (x: number, y: number) => (-19 * x) / 3600 - (9 * y) / 2900;
  const ceilingHeight = (x: number, y: number) => 2438 - (6 * x) / 3600 + (4 * y) / 2900;
  for (const wall of shape) {
    for (const yMm of [25, 560]) {
      for (let xMm = 60; xMm < wall.lengthMm; xMm += 610) {
        const [x, y] = [
          wall.here[0] + wall.along[0] * xMm - wall.along[1] * yMm,
          wall.here[1] + wall.along[1] * xMm + wall.along[0] * yMm,
        ];
        const place = { wallId: wall.id, xMm, yMm, setUpId: levelId };
        const dropMm = onStep(1200 - floorHeight(x, y) * crookedness);
        book.push({ ...common(laser.id), kind: 'floor', ...place, dropMm, typed: typed(dropMm) });
        if (yMm > 100) continue;
        const riseMm = onStep(ceilingHeight(x, y) - 1200);
        book.push({ ...common(laser.id), kind: 'ceiling', ...place, riseMm, typed: typed(riseMm) });
      }
    }
  }
  const wallA = at(walls, 0).id;
  const feature = (
    kind: 'window' | 'outlet' | 'water' | 'waste' | 'switch',
    [x0, x1, z0, z1]: [number, number, number, number],
    projectionMm = 0,
  ): Reading => ({
    ...common(tape.id),
    kind: 'feature',
    wallId: wallA,
    feature: kind,
    x0Mm: x0 * inch,
    x1Mm: x1 * inch,
    z0Mm: z0 * inch,
    z1Mm: z1 * inch,
    projectionMm,
    swing: 'none',
    note: '',
    typed: `${x0} / ${x1}`,
  });
  book.push(
    feature('window', [50, 92, 42, 80]),
    feature('outlet', [30, 33, 43, 47]),
    feature('outlet', [118, 121, 43, 47]),
    feature('water', [40, 42, 20, 22]),
    feature('waste', [46, 48, 15, 18]),
  );
  for (const x of [14.5, 30.5, 46.5, 94.5, 110.5, 126.5]) {
    book.push({
      ...common(tape.id),
      kind: 'stud',
      wallId: wallA,
      xMm: x * inch,
      at: 'centre',
      typed: String(x),
    });
  }
  book.push({
    ...common(tape.id),
    kind: 'doorway',
    name: 'back door',
    clearWidthMm: 31 * inch,
    clearHeightMm: 79 * inch,
    typed: '31 / 79',
  });
  const room: Room = {
    id: roomId,
    name: 'Kitchen',
    chains: [
      {
        closed: true,
        walls: walls.map(({ id, name }, index) => ({
          id,
          name,
          nominalLengthMm: index % 2 === 0 ? 3600 : 2880,
          leftCornerDeg: 90,
        })),
      },
    ],
    wallThicknessToComeMm: 0,
    floorToComeMm: 0,
  };
  const runs = kitchenRuns(
    walls.map(({ id }) => id),
    newId,
  );
  return { wallBook: { room, readings: book, tools }, runs };
}

/** What a wall loses per mm of height at one end: (λ_end + λ_own·cos θ)/sin θ. */
function loss(endLean: number, ownLean: number, cornerDeg: number): number {
  const angle = (cornerDeg * Math.PI) / 180;
  return (endLean + ownLean * Math.cos(angle)) / Math.sin(angle);
}

function makeTools(newId: () => string): [Tool, Tool, Tool] {
  return [
    {
      id: newId(),
      name: 'Tape, class II',
      spec: { kind: 'tape', accuracyClass: 'II', stepMm, repeatabilityMm: 0.3 },
    },
    {
      id: newId(),
      name: 'Laser meter',
      spec: { kind: 'laser', mpeMm: 1.5, stepMm, repeatabilityMm: 0.3 },
    },
    {
      id: newId(),
      name: 'Angle finder',
      spec: { kind: 'angle-finder', mpeDeg: 0.1, stepDeg: 0.1, repeatabilityDeg: 0.05 },
    },
  ];
}

/** Ids in order, so that two makings of the kitchen are equal. */
export function countedIds(start = 1): () => string {
  let next = start;
  return () => `00000000-0000-4000-8000-${(next++).toString(16).padStart(12, '0')}`;
}

function at<T>(list: readonly T[], index: number): T {
  const found = list[(index + list.length) % list.length];
  if (found === undefined) throw new Error('the list is empty');
  return found;
}

function unitVector(from: readonly [number, number], to: readonly [number, number]) {
  const [x, y] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(x, y);
  return [x / length, y / length] as const;
}

function angleBetween(one: readonly [number, number], other: readonly [number, number]): number {
  return (Math.acos(one[0] * other[0] + one[1] * other[1]) * 180) / Math.PI;
}
