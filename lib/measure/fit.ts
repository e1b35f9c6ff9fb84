/** What the readings of a room mean for its runs: one plain JSON value, the same on phone and server. */
import type { FitFigure, Verdict } from '@/lib/measure/fit-figure';
import type { RoomClosure } from '@/lib/measure/room-closure';
import type { RunFit } from '@/lib/measure/run-fit';
import type { Problem } from '@/lib/problem';

export type Fit = {
  /** Changes whenever the same readings could give another figure. */
  engineVersion: string;
  roomId: string;
  corners: CornerFit[];
  walls: WallFit[];
  floor: FloorFit | null;
  runs: RunFit[];
  collisions: Collision[];
  wayIn: WayInFit[];
  closure: RoomClosure;
  /** Every verdict of the fit, worst first; each also stands beside its figure. */
  verdicts: Verdict[];
  problems: Problem[];
  /** The readings that stand (not withdrawn, not replaced), in the order given. A release freezes them. */
  readingIds: string[];
  /** What out-of-true walls, fillers and scribes add to the install, over boxes and set-up. */
  extraInstallMinutes: InstallEstimate;
};

/** The corner at the LEFT end of `cornerWallId`; the wall before is its left arm. */
export type CornerFit = {
  cornerWallId: string;
  leftWallId: string;
  /** "A–B". */
  name: string;
  nominalDeg: number;
  /** Chord angle, all heights together, adjusted with the room where the room could be adjusted. */
  angle: FitFigure | null;
  /** As read, one per height, not carried to the chords. */
  readAt: { zMm: number; angle: FitFigure }[];
  /** angle − nominal: positive open, negative closed. */
  deviation: FitFigure | null;
  /** The deviation is smaller than its U: "true within the reading". */
  trueWithinReading: boolean;
  /** Greatest less least angle over the heights; null with one height. */
  twist: FitFigure | null;
  /** Where the left arm stands at `depthMm` from this wall, past square; positive: in the way at the front. */
  offset: { depthMm: number; figure: FitFigure } | null;
  /** What the saw reads for a kick or panel mitred round this corner, |90 − θ/2|. */
  saw: FitFigure | null;
  verdicts: Verdict[];
};

export type WallFit = {
  wallId: string;
  name: string;
  /** As read and combined, one per height. */
  readAt: { zMm: number; yMm: number; length: FitFigure }[];
  /** Adjusted with the room, at `zRefMm`. */
  length: FitFigure | null;
  zRefMm: number;
  rows: WallRow[];
  columns: WallColumn[];
  /** Minimum-zone flatness over all its face readings of one set-up; null with too few. */
  flatness: FitFigure | null;
  verdicts: Verdict[];
};

/** One row of face readings at a height: straightness. */
export type WallRow = {
  zMm: number;
  setUpId: string;
  outOfStraight: FitFigure;
  shape: 'straight' | 'hollow' | 'bulge' | 'wavy';
  /** Under a straightedge laid where it shows most. */
  straightedge: { lengthMm: number; atMm: number; gap: FitFigure } | null;
  /** Face offset: positive stands proud into the room. */
  points: { xMm: number; sMm: number; readingId: string }[];
};

/** One column of face readings: plumb. */
export type WallColumn = {
  xMm: number;
  setUpId: string;
  /** mm per metre; positive leans into the room upward. */
  lean: FitFigure;
  /** The lean over `heightMm`, in mm. */
  over: FitFigure;
  heightMm: number;
  leans: 'in' | 'out' | 'plumb';
  points: { zMm: number; sMm: number; readingId: string }[];
};

export type FloorFit = {
  /** Where the finished floor is highest: the least drop. */
  highPoint: FloorPoint;
  lowPoint: FloorPoint;
  fall: FitFigure;
  /** Heights above the high point (never positive), for the drawing. */
  points: FloorPoint[];
  clearHeightLeast: { figure: FitFigure; wallId: string; xMm: number; yMm: number } | null;
  verdicts: Verdict[];
};
export type FloorPoint = {
  wallId: string;
  xMm: number;
  yMm: number;
  heightMm: number;
  readingId: string;
};

export type Collision = {
  words: string;
  runId: string;
  unitId: string | null;
  /** The feature's reading. */
  readingId: string;
  what: string;
  overlapMm: number;
  xMm: number;
  zMm: number;
};

export type WayInFit = {
  readingId: string;
  name: string;
  unitId: string;
  runId: string;
  passes: boolean;
  /** Room to spare (negative: by how much it fails). */
  margin: FitFigure;
  words: string;
};

export type InstallEstimate = {
  minutes: number;
  lines: { words: string; count: number; minutes: number }[];
  /** "common practice, no source": our estimates until the shop's own hours say better. */
  basis: string;
};
