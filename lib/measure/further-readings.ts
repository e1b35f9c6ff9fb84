/** The readings that could still be taken in an adjusted room: free diagonals, and each reading again. */
import type { AdjustedRoom, FurtherReading, SparseRow } from './adjusted-room';
import { diagonalEquation } from './room-equations';
import { pointAt, type RoomLayout } from './room-layout';
import type { CornerEnd, RoomObservation } from './room-observations';
import { seesAcross } from './sight-lines';

export type FurtherRow = { reading: FurtherReading; row: SparseRow };

/** Used where neither the caller nor a length read says how sure a tape is. */
const USUAL_U_MM = 1;

export function furtherReadings(
  room: AdjustedRoom,
  options: { kinds?: FurtherReading['kind'][]; uOfLengthMm?: (lengthMm: number) => number },
): FurtherRow[] {
  const kinds = options.kinds ?? ['again', 'diagonal'];
  return [
    ...(kinds.includes('again') ? readAgain(room) : []),
    ...(kinds.includes('diagonal') ? freeDiagonals(room, options.uOfLengthMm) : []),
  ];
}

/** A length, corner, diagonal or width that somebody read; a stand-in has no reading behind it. */
export function isTaped(observation: RoomObservation): boolean {
  return observation.kind !== 'plumb' && observation.readingIds.length > 0;
}

function readAgain(room: AdjustedRoom): FurtherRow[] {
  const { observations, rows } = room.system;
  return observations.flatMap((o, observation) => {
    const row = rows[observation];
    return row && isTaped(o) ? [{ reading: { kind: 'again', observation }, row }] : [];
  });
}

/** At the height of the plan, from each corner to each other that it sees, those not read already. */
function freeDiagonals(
  room: AdjustedRoom,
  uOfLengthMm?: (lengthMm: number) => number,
): FurtherRow[] {
  const { state, observations, room: shape } = room.system;
  const { layout } = state;
  const walls = layout.walls.map((wall) => ({
    left: wall.left,
    right: wall.right,
    closed: shape.chains[wall.chain]?.closed === true,
  }));
  const read = new Set<string>();
  let greatestU = 0;
  for (const o of observations) {
    if (o.kind === 'diagonal') read.add(pair(pointAt(layout, o.from), pointAt(layout, o.to)));
    if (o.kind === 'length') greatestU = Math.max(greatestU, o.uMm);
  }
  const found: FurtherRow[] = [];
  for (let i = 0; i < layout.points.length; i++) {
    for (let j = i + 1; j < layout.points.length; j++) {
      const [from, to] = [cornerAt(layout, i), cornerAt(layout, j)];
      if (!from || !to || read.has(pair(i, j)) || !seesAcross(state, walls, i, j)) continue;
      const equation = diagonalEquation(state, from, to, room.zRefMm);
      if (!equation) continue;
      const sigma = uOfLengthMm?.(equation.predicted) ?? (greatestU || USUAL_U_MM);
      found.push({
        reading: { kind: 'diagonal', from, to, zMm: room.zRefMm },
        row: { columns: equation.columns, partials: equation.partials, sigma },
      });
    }
  }
  return found;
}

const pair = (i: number | null, j: number | null) =>
  `${Math.min(i ?? -1, j ?? -1)} ${Math.max(i ?? -1, j ?? -1)}`;

function cornerAt(layout: RoomLayout, point: number): CornerEnd | null {
  const place = layout.points[point];
  const after = layout.walls[place?.wallAfter ?? -1];
  if (after) return { wallId: after.id, end: 'left' };
  const before = layout.walls[place?.wallBefore ?? -1];
  return before ? { wallId: before.id, end: 'right' } : null;
}
