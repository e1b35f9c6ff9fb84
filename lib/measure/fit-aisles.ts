/** Walking width between the fronts of runs that face each other. */
import type { Run } from '@/lib/contracts/runs';
import { type Figure, figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import type { WorkedRun } from '@/lib/measure/fit-runs';
import { equationOf } from '@/lib/measure/room-equations';
import { frontDepth } from '@/lib/measure/room-walk';
import { varianceOf } from '@/lib/measure/row-products';

export type FoundAisle = { fromRunId: string; toRunId: string; aisle: Figure };

/** Walls whose directions differ from facing by no more than this face each other. */
const FACING_DEG = 20;
/** An aisle less sure than this was not read across the room. */
const SURE_AISLE_U_MM = 25;

/**
 * The least aisle between every two runs on the floor that face each other, doors shut.
 * Edge rule: taken at both ends of the part where they face; runs that do not face are left out.
 * Units: mm. Example: walls 3000 apart, fronts 581 and 625 out: 1794.
 * Source: geometry of the adjusted plan; u by its cofactor matrix.
 */
export function fitAisles(context: FitContext, worked: WorkedRun[]): FoundAisle[] {
  const standing = worked.filter(({ run, plane }) => run.level !== 'wall' && plane);
  return standing.flatMap((one, i) =>
    standing.slice(i + 1).flatMap((other) => aisleBetween(context, one, other) ?? []),
  );
}

function aisleBetween(context: FitContext, one: WorkedRun, other: WorkedRun): FoundAisle | null {
  const { room } = context;
  if (!room || one.run.wallId === other.run.wallId) return null;
  const headings = [one, other].map(
    ({ run }) => room.walls.find(({ wallId }) => wallId === run.wallId)?.headingDeg ?? 0,
  );
  const apart = Math.abs((((headings[0] ?? 0) - (headings[1] ?? 0)) % 360) + 360) % 360;
  if (Math.abs(apart - 180) > FACING_DEG) return null;
  const takenMm = outOf(one) + outOf(other);
  const found = facingPlaces(context, one, other).flatMap((xMm): Figure[] => {
    const across = widthAt(context, one.run, other.run, xMm);
    if (!across || across.u > SURE_AISLE_U_MM || across.value <= takenMm) return [];
    return [figure(across.value - takenMm, across.u, across.from)];
  });
  const [first, ...rest] = found;
  if (!first) return null;
  const aisle = rest.reduce((least, next) => (next.value < least.value ? next : least), first);
  return { fromRunId: one.run.id, toRunId: other.run.id, aisle };
}

/** Door fronts out of the straight line of the wall. */
function outOf({ run, plane, bandMm }: WorkedRun): number {
  const at = Math.max(...bandMm.map((xMm) => (plane?.standOffMm ?? 0) + (plane?.slope ?? 0) * xMm));
  return at + frontDepth(run);
}

/** Both ends of the part of a run's wall that the other run faces, from the plan's corners. */
function facingPlaces(context: FitContext, one: WorkedRun, other: WorkedRun): number[] {
  const from = cornerOf(context, one.run.wallId);
  const to = cornerOf(context, other.run.wallId);
  if (!from || !to) return [];
  const along = (xMm: number) => {
    const px = to.x + xMm * to.cos - from.x;
    const py = to.y + xMm * to.sin - from.y;
    return px * from.cos + py * from.sin;
  };
  const faced = other.bandMm.map(along);
  const low = Math.max(one.bandMm[0], Math.min(...faced));
  const high = Math.min(one.bandMm[1], Math.max(...faced));
  return high > low ? [low, high] : [];
}

function cornerOf(context: FitContext, wallId: string) {
  const corner = context.room?.corners.find(({ cornerWallId }) => cornerWallId === wallId);
  const wall = context.room?.walls.find((one) => one.wallId === wallId);
  if (!corner || !wall) return null;
  const heading = (wall.headingDeg * Math.PI) / 180;
  return { x: corner.xMm, y: corner.yMm, cos: Math.cos(heading), sin: Math.sin(heading) };
}

function widthAt(context: FitContext, run: Run, facing: Run, xMm: number): Figure | null {
  const { room } = context;
  if (!room) return null;
  const equation = equationOf(room.system.state, {
    kind: 'width',
    wallId: run.wallId,
    xMm,
    toWallId: facing.wallId,
    zMm: room.zRefMm,
    valueMm: 1,
    uMm: 1,
    readingIds: [],
    unit: context.rules.unit,
  });
  if (!equation) return null;
  const u = Math.sqrt(Math.max(0, varianceOf(room.system.cofactor, equation)));
  const widths = context.book
    .ofKind('width')
    .filter(
      ({ wallId, toWallId }) =>
        [wallId, toWallId].includes(run.wallId) && [wallId, toWallId].includes(facing.wallId),
    );
  const lengths = room.walls.flatMap(({ lengthMm }) => lengthMm.from);
  const from = widths.length > 0 ? widths.map(({ id }) => id) : [...new Set(lengths)].slice(0, 4);
  return figure(equation.predicted, u, from);
}
