/** Does the room close: misclosures, the adjustment, what checks what, the suspect, what would settle it. */
import type { FitFigure } from '@/lib/measure/fit-figure';

export type RoomClosure = {
  chains: ChainClosure[];
  /** Null where there is too little to adjust; `words` says what is missing. */
  adjustment: RoomAdjustment | null;
  words: string;
  suspect: Suspect | null;
  /** The one further reading that would help most, cheapest first. */
  settle: SettleStep[];
};

export type ChainClosure = {
  wallIds: string[];
  closed: boolean;
  /** Sum of the angles less (n − 2)·180; null where the chain is open or a corner is missing. */
  angle: FitFigure | null;
  /** Straight-line gap between end and start of the walk. */
  linear: FitFigure | null;
  /** n of 1:n. */
  relativePrecision: number | null;
  areaMm2: number | null;
  /** Plan of the walk for the closure picture, in mm, unadjusted; the last point is the end of the walk. */
  walk: { xMm: number; yMm: number }[];
};

export type RoomAdjustment = {
  corners: AdjustedCorner[];
  /** Global test at α = 0.01. */
  chiSquare: { value: number; degreesOfFreedom: number; limit: number; passes: boolean };
  observations: CheckedReading[];
};

/** Plan coordinates: x east, y south seen from above (clockwise), first corner at 0,0, first wall along x. */
export type AdjustedCorner = {
  /** The wall that begins here; null for the far end of an open chain. */
  cornerWallId: string | null;
  afterWallId: string | null;
  xMm: number;
  yMm: number;
  /** Half axes of the standard ellipse; the angle is of the long axis from x. */
  ellipse: { aMm: number; bMm: number; angleDeg: number };
};

/** Beside every reading: how well the others check it. */
export type CheckedReading = {
  readingIds: string[];
  /** "Wall B, length at 910 mm". */
  words: string;
  unit: 'mm' | 'deg' | 'mm/m';
  read: number;
  adjusted: number;
  /** adjusted − read. */
  residual: number;
  /** v / σᵥ. */
  w: number;
  redundancy: number;
  /** Smallest slip that would be seen, 4.1·u/√r; null where hardly anything checks it. */
  smallestSlip: number | null;
  /** The slip could be told from one in its neighbour. */
  tellable: boolean;
};

export type Suspect = {
  /** Most likely first; those that fit equally well are named together. */
  readings: {
    readingIds: string[];
    words: string;
    /** Likely slip, positive: read too long (mm), too open (deg) or leaning in too much (mm/m). */
    slip: number;
    unit: 'mm' | 'deg' | 'mm/m';
    /** "1 in", "100 mm", "digits swapped"; null where none matches. */
    known: string | null;
  }[];
  words: string;
};

export type SettleStep = {
  /** As `MissingReading.slot`; "again:<readingId>" for the same reading again. */
  slot: string;
  words: string;
  /** The least redundancy before and with it. */
  leastRedundancy: number;
  leastRedundancyAfter: number;
};
