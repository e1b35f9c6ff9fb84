import type { Room, WallBook } from '@/lib/contracts/wall-book';
import { type AsRead, asRead } from './as-read';
import { type PlanPoint, walk } from './walk';

export type PlanWall = {
  wallId: string;
  name: string;
  from: PlanPoint;
  to: PlanPoint;
  /** Null until it is read. */
  readMm: number | null;
  drawnMm: number;
};
export type PlanCorner = {
  /** The corner is at this wall's left end. */
  cornerWallId: string;
  at: PlanPoint;
  nominalDeg: number;
  /** Null until it is read. */
  readDeg: number | null;
};
export type RoomPlan = {
  walls: PlanWall[];
  corners: PlanCorner[];
  /** Outline of each chain, and whether it closes. */
  outlines: { closed: boolean; points: PlanPoint[] }[];
};

/** Between the two sides of a galley where nothing was read across. Common practice, no source. */
const ACROSS_MM = 2_400;
/** A wall with no size yet is drawn with this. */
const UNSIZED_MM = 2_000;

/**
 * The room seen from above with what has been read so far, the rest as sketched.
 *
 * Edge: a closed chain that does not close is drawn closed, the gap shared out along the walk; it is a
 * picture to find one's way by, not a result.
 * Example: one wall of 3000 mm: from (0,0) to (3000,0).
 */
export function roomPlan(book: WallBook): RoomPlan {
  const read = asRead(book);
  const plan: RoomPlan = { walls: [], corners: [], outlines: [] };
  let bottom = 0;
  book.room.chains.forEach((chain, chainIndex) => {
    const isFacing = chainIndex % 2 === 1;
    const points = chainPoints(chain, read, isFacing ? 180 : 0);
    const top = Math.min(...points.map(({ yMm }) => yMm));
    const left = Math.min(...points.map(({ xMm }) => xMm));
    const down = chainIndex === 0 ? 0 : bottom + widthAcross(book) - top;
    const placed = points.map(({ xMm, yMm }) => ({ xMm: xMm - left, yMm: yMm + down }));
    bottom = Math.max(...placed.map(({ yMm }) => yMm));
    plan.outlines.push({ closed: chain.closed, points: placed });
    addChain(plan, chain, placed, read);
  });
  return plan;
}

/** Along a wall from its left corner and out of it into the room, as a place of the plan. */
export function placeBy(
  { from, to }: PlanWall,
  { xMm, yMm }: { xMm: number; yMm: number },
): PlanPoint {
  const length = Math.hypot(to.xMm - from.xMm, to.yMm - from.yMm) || 1;
  const [alongX, alongY] = [(to.xMm - from.xMm) / length, (to.yMm - from.yMm) / length];
  return {
    xMm: from.xMm + alongX * xMm - alongY * yMm,
    yMm: from.yMm + alongY * xMm + alongX * yMm,
  };
}

function chainPoints(chain: Room['chains'][number], read: AsRead, headingDeg: number): PlanPoint[] {
  const points = walk(
    chain.walls.map((wall) => ({
      lengthMm: read.lengthMm.get(wall.id)?.value ?? (wall.nominalLengthMm || UNSIZED_MM),
      cornerDeg: read.cornerDeg.get(wall.id)?.value ?? wall.leftCornerDeg ?? 180,
    })),
    headingDeg,
  );
  const last = points.at(-1);
  if (!chain.closed || !last || chain.walls.length < 3) return points;
  const shared = points.map(({ xMm, yMm }, at) => ({
    xMm: xMm - (last.xMm * at) / chain.walls.length,
    yMm: yMm - (last.yMm * at) / chain.walls.length,
  }));
  return shared.slice(0, -1).concat(shared[0] ?? last);
}

function addChain(
  plan: RoomPlan,
  chain: Room['chains'][number],
  points: PlanPoint[],
  read: AsRead,
): void {
  chain.walls.forEach((wall, at) => {
    const [from, to] = [points[at], points[at + 1]];
    if (!from || !to) return;
    const readMm = read.lengthMm.get(wall.id)?.value ?? null;
    plan.walls.push({
      wallId: wall.id,
      name: wall.name,
      from,
      to,
      readMm,
      drawnMm: wall.nominalLengthMm,
    });
    if (wall.leftCornerDeg === null || (at === 0 && !chain.closed)) return;
    plan.corners.push({
      cornerWallId: wall.id,
      at: from,
      nominalDeg: wall.leftCornerDeg,
      readDeg: read.cornerDeg.get(wall.id)?.value ?? null,
    });
  });
}

function widthAcross({ readings }: WallBook): number {
  const widths = readings.flatMap((reading) => (reading.kind === 'width' ? [reading.valueMm] : []));
  return widths.length > 0
    ? widths.reduce((sum, width) => sum + width, 0) / widths.length
    : ACROSS_MM;
}
