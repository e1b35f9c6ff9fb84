/** What a run needs of the adjusted room: its wall's length, both corners, and how they hang together. */
import type { AdjustedRoom } from '@/lib/measure/adjusted-room';
import { leanAtEnd } from '@/lib/measure/corner-shift';
import { type Figure, figure } from '@/lib/measure/figure';
import { planAngle, planDistance } from '@/lib/measure/room-equations';
import { FIXED, type LaidOutWall } from '@/lib/measure/room-layout';
import { degrees, type Equation, type RoomState } from '@/lib/measure/room-state';
import { project, spread } from '@/lib/measure/row-products';
import { PARAMETER, PARAMETER_COUNT } from '@/lib/measure/run-frame';
import { USUAL_LEAN, USUAL_TWIST } from '@/lib/measure/solve-room';

export type AdjustedEnd = {
  wallId: string;
  wallLengthMm: number;
  angle: Figure;
  lean: Figure;
  bow: Figure;
};
export type AdjustedFrame = {
  length: Figure;
  zRefMm: number;
  left: AdjustedEnd | null;
  right: AdjustedEnd | null;
  /** In the order of `PARAMETER`; parameters of a free end are zero. */
  covariance: number[][];
};

type Parameter = {
  row: Equation | null /** Of its own where no unknown stands for it. */;
  variance: number;
};

/**
 * A wall's frame from the adjusted room; null when the wall is not in it.
 * Edge rule: a wall nobody plumbed leans 0 ± 6 mm/m, one nobody looked along bows 0 ± the usual bow.
 * Units: mm, degrees, mm/mm.
 */
export function adjustedFrame(
  room: AdjustedRoom,
  wallId: string,
  usualBowMm: number,
): AdjustedFrame | null {
  const { state, cofactor } = room.system;
  const { layout } = state;
  const wall = layout.walls[layout.wallById.get(wallId) ?? -1];
  if (!wall) return null;
  const before = layout.walls[wall.wallBefore ?? -1] ?? null;
  const after = layout.walls[wall.wallAfter ?? -1] ?? null;
  const parameters: Parameter[] = new Array(PARAMETER_COUNT).fill({ row: null, variance: 0 });
  parameters[PARAMETER.length] = { row: planDistance(state, wall.left, wall.right), variance: 0 };
  const ends = { left: before, right: after };
  for (const end of ['left', 'right'] as const) {
    const neighbour = ends[end];
    if (!neighbour) continue;
    const angle =
      end === 'left' ? planAngle(state, neighbour, wall) : planAngle(state, wall, neighbour);
    parameters[PARAMETER[end].angle] = { row: inDegrees(angle), variance: 0 };
    // λ is taken at the corner: the right end of the wall before, the left end of the wall after.
    parameters[PARAMETER[end].lean] = leanAtCorner(state, neighbour, end);
    parameters[PARAMETER[end].bow] = unknown(state, neighbour.bowColumn, usualBowMm / Math.sqrt(3));
  }
  const covariance = covarianceOf(parameters, cofactor);
  const u = (at: number) => Math.sqrt(Math.max(0, covariance[at]?.[at] ?? 0));
  const value = (at: number) => parameters[at]?.row?.predicted ?? 0;
  const adjustedWall = (id: string) => room.walls.find((one) => one.wallId === id);
  const adjustedEnd = (end: 'left' | 'right'): AdjustedEnd | null => {
    const neighbour = ends[end];
    if (!neighbour) return null;
    const at = PARAMETER[end];
    const cornerWallId = end === 'left' ? wallId : neighbour.id;
    const angle = room.angles.find((one) => one.cornerWallId === cornerWallId);
    const found = adjustedWall(neighbour.id);
    return {
      wallId: neighbour.id,
      wallLengthMm: found?.lengthMm.value ?? neighbour.nominalLengthMm,
      angle: figure(value(at.angle), u(at.angle), angle?.angleDeg.from ?? []),
      lean: figure(value(at.lean), u(at.lean), found?.leanMmPerMm?.from ?? []),
      bow: figure(value(at.bow), u(at.bow), []),
    };
  };
  return {
    length: figure(
      value(PARAMETER.length),
      u(PARAMETER.length),
      adjustedWall(wallId)?.lengthMm.from ?? [],
    ),
    zRefMm: room.zRefMm,
    left: adjustedEnd('left'),
    right: adjustedEnd('right'),
    covariance,
  };
}

function leanAtCorner(state: RoomState, neighbour: LaidOutWall, end: 'left' | 'right'): Parameter {
  const free = (column: number, u: number) => (column === FIXED ? u * u : 0);
  return {
    row: leanAtEnd(state, neighbour, end === 'left' ? 'right' : 'left'),
    variance: free(neighbour.leanColumn, USUAL_LEAN) + free(neighbour.twistColumn, USUAL_TWIST / 2),
  };
}

function unknown(state: RoomState, column: number, uFree: number): Parameter {
  if (column === FIXED) return { row: null, variance: uFree * uFree };
  const predicted = state.nuisance[column] ?? 0;
  return { row: { columns: [column], partials: [1], predicted }, variance: 0 };
}

/** A whole turn less is the same angle: the figure wanted lies between 0 and 360. */
function inDegrees({ columns, partials, predicted }: Equation): Equation {
  return { columns, partials: partials.map(degrees), predicted: degrees(predicted) };
}

function covarianceOf(parameters: Parameter[], cofactor: Float64Array[]): number[][] {
  const spreads = parameters.map(({ row }) => (row ? spread(cofactor, row) : null));
  return parameters.map((one, i) =>
    parameters.map((other, j) => {
      const spreadRow = spreads[i];
      const shared = spreadRow && other.row ? project(other.row, spreadRow) : 0;
      return shared + (i === j ? one.variance : 0);
    }),
  );
}
