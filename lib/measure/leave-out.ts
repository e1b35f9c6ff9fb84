/** The room adjusted again without one reading: what the others say that reading should have been. */
import type { AdjustedRoom } from './adjusted-room';
import { equationOf, observedValue } from './room-equations';
import { startingPoints } from './room-start';
import { degrees, type RoomState } from './room-state';
import { varianceOf } from './row-products';
import { solveRoom, weightedSquares } from './solve-room';

export type LeftOut = {
  /** The room as the other readings have it. */
  state: RoomState;
  chiSquare: number;
  /** Read less what the others say, in mm, degrees or mm/mm. */
  slip: number;
  uSlip: number;
};

/**
 * Null when the room cannot be laid out without the reading. Begins from a room near by that the slip did
 * not bend, where one is known (`near`), else from the readings that remain.
 */
export function leaveOut(
  room: AdjustedRoom,
  observation: number,
  near: RoomState | null = null,
): LeftOut | null {
  const { observations, options, state } = room.system;
  const left = observations[observation];
  if (!left) return null;
  const others = observations.filter((_, i) => i !== observation);
  const start = near
    ? { x: near.x.slice(), y: near.y.slice(), nuisance: near.nuisance.slice() }
    : {
        ...startingPoints(room.system.room, state.layout, others),
        nuisance: new Float64Array(state.layout.unknownCount),
      };
  const solution = solveRoom({ ...state, ...start }, others, options);
  const equation = solution && equationOf(solution.state, left);
  if (!equation) return null;
  const read = observedValue(left);
  const turns = left.kind === 'corner' ? turnsBetween(read.value, equation.predicted) : 0;
  const scale = left.kind === 'corner' ? degrees(1) : 1;
  return {
    state: solution.state,
    chiSquare: weightedSquares(solution),
    slip: (read.value - equation.predicted - turns) * scale,
    uSlip:
      Math.sqrt(
        read.sigma ** 2 + (equation.leftOut ?? 0) + varianceOf(solution.cofactor, equation),
      ) * scale,
  };
}

/** Whole turns between two angles that mean the same direction. */
function turnsBetween(read: number, predicted: number): number {
  return 2 * Math.PI * Math.round((read - predicted) / (2 * Math.PI));
}
