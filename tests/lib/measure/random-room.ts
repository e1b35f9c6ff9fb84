/** Rooms that never were, known exactly: for the blunder study and for tests of the adjustment. */
import type { RoomShape } from '@/lib/measure/room-observations';
import type { seeded } from './seeded';

export type Random = ReturnType<typeof seeded>;
export type Place = { x: number; y: number };

export type TruePlan = {
  /** Corners clockwise seen from above (x east, y south); wall i runs from corner i to the next. */
  corners: Place[];
  /** mm per mm, positive into the room upward. */
  leans: number[];
  /** How much more each wall leans at its right end than at its left, mm per mm. */
  twists: number[];
  /** Middle of each wall proud of its chord, mm; a parabola between. */
  bows: number[];
  /** How much the bow grows with height, mm per mm. */
  bowGrowths: number[];
  /** Height of the plan. */
  zRefMm: number;
};

export type OutOfTrue = {
  leanSd: number;
  twistSd: number;
  bowMm: number;
  bowGrowthSd: number;
  cornerSdMm: number;
};
export const STRAIGHT: OutOfTrue = {
  leanSd: 0,
  twistSd: 0,
  bowMm: 0,
  bowGrowthSd: 0,
  cornerSdMm: 5,
};
/** Leaning 3 mm/m, twisted 1 mm/m from end to end, bowed up to 3 mm and by 1 mm/m more or less higher up. */
export const CROOKED: OutOfTrue = {
  leanSd: 0.003,
  twistSd: 0.001,
  bowMm: 3,
  bowGrowthSd: 0.001,
  cornerSdMm: 5,
};

/**
 * A room of `walls` walls (4 to 10): a rectangle with corners cut square (re-entrant) or at 45° (two
 * corners of 135°) and chimney breasts, its corners pushed about and its walls leaning and bowed.
 */
export function randomPlan(random: Random, walls: number, out: OutOfTrue): TruePlan {
  const width = random.between(2_400, 5_200);
  const depth = random.between(2_200, 4_500);
  let corners: Place[] = [
    { x: 0, y: 0 },
    { x: width, y: 0 },
    { x: width, y: depth },
    { x: 0, y: depth },
  ];
  const whole = [0, 1, 2, 3].map((corner) => corners[corner] ?? { x: 0, y: 0 });
  let toAdd = walls - 4;
  while (toAdd > 0) {
    const ways = [1, 2, 4].filter((n) => n <= toAdd && (n === 4 || whole.length > 0));
    // What is added must leave no odd wall that nothing can add: one more corner at 45° always can.
    const way = ways[Math.floor(random.uniform() * ways.length)] ?? 1;
    if (way === 4 || whole.length === 0) {
      if (toAdd < 4) return randomPlan(random, walls, out);
      corners = withBreast(corners, random);
      toAdd -= 4;
      continue;
    }
    const [corner] = whole.splice(Math.floor(random.uniform() * whole.length), 1);
    if (corner)
      corners = way === 2 ? notched(corners, corner, random) : chamfered(corners, corner, random);
    toAdd -= way;
  }
  const push = () => random.normal() * out.cornerSdMm;
  return {
    corners: corners.map(({ x, y }) => ({ x: x + push(), y: y + push() })),
    leans: corners.map(() => random.normal() * out.leanSd),
    twists: corners.map(() => random.normal() * out.twistSd),
    bows: corners.map(() => random.between(-out.bowMm, out.bowMm)),
    bowGrowths: corners.map(() => random.normal() * out.bowGrowthSd),
    zRefMm: 0,
  };
}

const around = (corners: Place[], i: number): Place =>
  corners[((i % corners.length) + corners.length) % corners.length] ?? { x: 0, y: 0 };

const between = (from: Place, to: Place, share: number): Place => ({
  x: from.x + (to.x - from.x) * share,
  y: from.y + (to.y - from.y) * share,
});

/** A re-entrant corner in the place of a plain one. */
function notched(corners: Place[], corner: Place, random: Random): Place[] {
  const i = corners.indexOf(corner);
  const before = between(corner, around(corners, i - 1), random.between(0.2, 0.45));
  const after = between(corner, around(corners, i + 1), random.between(0.2, 0.45));
  const inner = { x: before.x + after.x - corner.x, y: before.y + after.y - corner.y };
  return corners.toSpliced(i, 1, before, inner, after);
}

/** Two corners of 135° in the place of a plain one. */
function chamfered(corners: Place[], corner: Place, random: Random): Place[] {
  const i = corners.indexOf(corner);
  const cut = random.between(500, 1_000);
  const toward = (other: Place) =>
    between(
      corner,
      other,
      Math.min(0.45, cut / Math.hypot(other.x - corner.x, other.y - corner.y)),
    );
  return corners.toSpliced(i, 1, toward(around(corners, i - 1)), toward(around(corners, i + 1)));
}

/** A chimney breast on the longest wall: four corners more. */
function withBreast(corners: Place[], random: Random): Place[] {
  const lengths = corners.map((from, i) => distance(from, around(corners, i + 1)));
  const i = lengths.indexOf(Math.max(...lengths));
  const [from, to] = [around(corners, i), around(corners, i + 1)];
  const length = lengths[i] ?? 1;
  const wide = Math.min(0.45 * length, random.between(900, 1_500));
  const deep = random.between(250, 500);
  const at = (length - wide) * random.between(0.3, 0.7);
  const [tx, ty] = [(to.x - from.x) / length, (to.y - from.y) / length];
  const place = (along: number, out: number): Place => ({
    x: from.x + tx * along - ty * out,
    y: from.y + ty * along + tx * out,
  });
  return corners.toSpliced(
    i + 1,
    0,
    place(at, 0),
    place(at, deep),
    place(at + wide, deep),
    place(at + wide, 0),
  );
}

const distance = (from: Place, to: Place) => Math.hypot(to.x - from.x, to.y - from.y);

export const wallId = (i: number) => `wall-${i}`;

/** The room as it would be drawn: lengths to the nearest 100 mm, corners to the nearest 45°. */
export function drawnShape(plan: TruePlan): RoomShape {
  return {
    chains: [
      {
        closed: true,
        walls: plan.corners.map((_, i) => ({
          id: wallId(i),
          nominalLengthMm: Math.max(100, Math.round(lengthAt(plan, i, plan.zRefMm) / 100) * 100),
          leftCornerDeg: Math.round(angleAt(plan, i) / 45) * 45,
        })),
      },
    ],
  };
}

function headingOf(plan: TruePlan, wall: number): number {
  const [from, to] = [around(plan.corners, wall), around(plan.corners, wall + 1)];
  return Math.atan2(to.y - from.y, to.x - from.x);
}

function headingAt(plan: TruePlan, wall: number, zMm: number): number {
  const [from, to] = [cornerAt(plan, wall, zMm), cornerAt(plan, wall + 1, zMm)];
  return Math.atan2(to.y - from.y, to.x - from.x);
}

/** A corner at a height: where the two walls' lines meet, each moved in by its lean. */
export function cornerAt(plan: TruePlan, at: number, zMm: number): Place {
  const count = plan.corners.length;
  const i = ((at % count) + count) % count;
  const before = (i - 1 + count) % count;
  const moved = [before, i % count].map((wall, end) => {
    const heading = headingOf(plan, wall);
    const twist = ((plan.twists[wall] ?? 0) / 2) * (end === 0 ? 1 : -1);
    const by = ((plan.leans[wall] ?? 0) + twist) * (zMm - plan.zRefMm);
    return { nx: -Math.sin(heading), ny: Math.cos(heading), by };
  });
  const [one, other] = moved;
  const corner = around(plan.corners, i);
  if (!one || !other) return corner;
  const cross = one.nx * other.ny - one.ny * other.nx;
  return {
    x: corner.x + (one.by * other.ny - other.by * one.ny) / cross,
    y: corner.y + (one.nx * other.by - other.nx * one.by) / cross,
  };
}

export function distanceAt(plan: TruePlan, i: number, j: number, zMm: number): number {
  return distance(cornerAt(plan, i, zMm), cornerAt(plan, j, zMm));
}

export function lengthAt(plan: TruePlan, wall: number, zMm: number): number {
  return distanceAt(plan, wall, wall + 1, zMm);
}

/** Interior angle between the chords at a corner, degrees. */
export function angleAt(plan: TruePlan, i: number, zMm = plan.zRefMm): number {
  const turn = headingAt(plan, i, zMm) - headingAt(plan, i - 1, zMm);
  return (((180 - (turn * 180) / Math.PI) % 360) + 360) % 360;
}

/** The angle between marks on the bowed walls at these distances from the corner, degrees. */
export function angleBetweenMarks(
  plan: TruePlan,
  i: number,
  armLeft: number,
  armRight: number,
  zMm: number,
): number {
  const count = plan.corners.length;
  const lost = (wall: number, arm: number) => {
    const length = lengthAt(plan, wall, plan.zRefMm);
    const bow = (plan.bows[wall] ?? 0) + (plan.bowGrowths[wall] ?? 0) * (zMm - plan.zRefMm);
    return ((4 * bow) / length) * (1 - arm / length);
  };
  const both = lost((i - 1 + count) % count, armLeft) + lost(i % count, armRight);
  return angleAt(plan, i, zMm) - (both * 180) / Math.PI;
}
