/** What the room adjustment gives, and what the blunder search and `settle` work on. */
import type { Figure } from './figure';
import type { Reliability } from './reliability';
import type { AdjustOptions, CornerEnd, RoomObservation, RoomShape } from './room-observations';
import type { RoomState } from './room-state';

export type AdjustedRoom = {
  zRefMm: number;
  corners: AdjustedCornerPoint[];
  walls: AdjustedWall[];
  /** Chord angle at each corner that has two arms. */
  angles: { cornerWallId: string; angleDeg: Figure }[];
  chiSquare: { value: number; degreesOfFreedom: number; limit: number; passes: boolean };
  /** |w| beyond this raises an alarm: three false alarms in a thousand such rooms. */
  alarmW: number;
  /** In the order of the observations given. */
  checks: ObservationCheck[];
  system: SolvedSystem;
};

/** x along the first wall, y into the room: x east and y south seen from above. */
export type AdjustedCornerPoint = {
  chain: number;
  /** The wall that begins here; null at the far end of an open chain. */
  cornerWallId: string | null;
  /** The wall that ends here; null at the start of an open chain. */
  afterWallId: string | null;
  xMm: number;
  yMm: number;
  /** Half axes of the standard ellipse; the angle is of the long axis from x, clockwise from above. */
  ellipse: { aMm: number; bMm: number; angleDeg: number };
};

export type AdjustedWall = {
  wallId: string;
  /** At `zRefMm`. */
  lengthMm: Figure;
  headingDeg: number;
  /** Null where nothing depends on the wall's lean. */
  leanMmPerMm: Figure | null;
};

export type ObservationCheck = {
  observation: RoomObservation;
  read: number;
  adjusted: number;
  /** adjusted − read, in mm, degrees or mm/mm. */
  residual: number;
  /** Standard uncertainty of the reading itself, without what all readings of its tool share. */
  u: number;
  /** v/σᵥ; 0 where nothing checks it. */
  w: number;
  /** 0: nothing checks it; 1: fully checked by the others. */
  redundancy: number;
  /** Smallest slip that would be seen, 4.1·u/√r; null where nothing checks it. */
  smallestSlip: number | null;
  /** r < 0.1: hardly anything checks this reading. */
  hardlyChecked: boolean;
  /** A slip here could be told from one in any other reading. */
  tellable: boolean;
};

/** The linearised system at its solution: all that a further reading or another slip needs. */
export type SolvedSystem = {
  room: RoomShape;
  observations: RoomObservation[];
  options: AdjustOptions;
  /** A sparse row for each observation, then for each prior; mm, radians and mm/mm. */
  rows: SparseRow[];
  /** Inverse of the normal matrix. */
  cofactor: Float64Array[];
  state: RoomState;
  /** Of the observations, without the priors. */
  reliability: Reliability;
};
export type SparseRow = {
  columns: number[];
  partials: number[];
  /** Standard uncertainty in the row's own unit (mm, radians, mm/mm). */
  sigma: number;
};

/** One more reading that could be taken, as `settle` weighs it. */
export type FurtherReading =
  | { kind: 'diagonal'; from: CornerEnd; to: CornerEnd; zMm: number }
  | { kind: 'again'; observation: number };
