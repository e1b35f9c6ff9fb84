/**
 * What the room adjustment is given: the walls as drawn and each thing read, with its own uncertainty.
 * Repeats of one thing that agree are combined before they come here; those that disagree come singly.
 */
import type { LengthUnit } from '@/lib/units/brands';

export type RoomShape = { chains: ChainShape[] };
export type ChainShape = { closed: boolean; walls: WallShape[] };
/** A subset of the contract's wall, so that a wall book's chains can be passed as they are. */
export type WallShape = {
  id: string;
  nominalLengthMm: number;
  /** Nominal interior angle at the wall's left end; null where a chain begins in the open. */
  leftCornerDeg: number | null;
};

/** A corner, or the free end of an open chain: the end of a wall. */
export type CornerEnd = { wallId: string; end: 'left' | 'right' };

/** The part of a reading's uncertainty that all readings of one tool share (GUM F.1.2.3). */
export type ToolShare = { toolId: string; uCommon: number };

type Common = {
  readingIds: string[];
  /** Unit it was typed in; decides which digits can have been swapped. */
  unit: LengthUnit;
  /** Null or left out: the whole of u belongs to this reading alone. */
  tool?: ToolShare | null;
};

export type LengthObservation = Common & {
  kind: 'length';
  wallId: string;
  zMm: number;
  /** Distance from the wall at which it was read: 0 at the wall. */
  yMm: number;
  valueMm: number;
  /** Standard uncertainty without the tool's share. */
  uMm: number;
  /** Read in pieces that make up the value: a slip may lie in any of them. */
  piecesMm?: readonly number[];
};

/** How far the leg mark stands proud of the straight line corner to corner, from a face row. */
export type Proud = { valueMm: number; uMm: number };

export type CornerObservation = Common & {
  kind: 'corner';
  /** The corner at this wall's left end. */
  cornerWallId: string;
  zMm: number;
  angleDeg: number;
  uDeg: number;
  /** Where the angle was read: length of the line from the corner along each arm. */
  armLeftMm: number;
  armRightMm: number;
  /** Null: no face row, the shop's usual bow is allowed for. */
  proudLeft: Proud | null;
  proudRight: Proud | null;
  /** The three lengths it was worked out from; null when an angle finder gave it. */
  legs: { leftMm: number; rightMm: number; diagonalMm: number; carriedPast: boolean } | null;
};

export type DiagonalObservation = Common & {
  kind: 'diagonal';
  from: CornerEnd;
  to: CornerEnd;
  zMm: number;
  valueMm: number;
  uMm: number;
};

/** Least distance from a place on a wall to the line of a wall that faces it. */
export type WidthObservation = Common & {
  kind: 'width';
  wallId: string;
  xMm: number;
  toWallId: string;
  zMm: number;
  valueMm: number;
  uMm: number;
};

export type PlumbObservation = Common & {
  kind: 'plumb';
  wallId: string;
  /** Positive: leans into the room as z grows. */
  leanMmPerMm: number;
  u: number;
};

export type RoomObservation =
  | LengthObservation
  | CornerObservation
  | DiagonalObservation
  | WidthObservation
  | PlumbObservation;

export type AdjustOptions = {
  /** Height of the plan and of the adjusted lengths; left out: the middle of the heights read. */
  zRefMm?: number;
  /** Greatest bow of a wall whose face was not read, the shop's rule. */
  usualBowMm: number;
  /** Standard uncertainty of the lean of a wall that was not plumbed, mm/mm. */
  leanPrior?: number;
};
