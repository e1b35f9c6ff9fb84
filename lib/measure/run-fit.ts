/** What the room means for one run: from the set line behind it to each cut size. */
import type { FitFigure, Verdict } from '@/lib/measure/fit-figure';

export type RunVerdict = 'fits' | 'tight' | 'loose' | 'short';

export type RunFit = {
  runId: string;
  wallId: string;
  name: string;
  level: 'base' | 'wall' | 'tall';
  setLine: RunSetLine | null;
  backGaps: BackGap[];
  /** The largest plumb, square block between the ends. Null where an end or the length is not known. */
  clearOpening: RunOpening | null;
  left: RunEndFit;
  right: RunEndFit;
  fill: RunFill | null;
  units: PlacedUnit[];
  /** Edges that are scribed other than the fillers: finished ends, panels to the ceiling. */
  scribes: EdgeScribe[];
  kicks: RunKicks | null;
  ceiling: RunCeiling | null;
  /** Of hung runs: from the counter below to the underside. */
  upperGap: FitFigure | null;
  /** Walking width to the run or wall opposite, nothing open; the least of them. */
  aisle: { toRunId: string; figure: FitFigure } | null;
  /** Of a run that stands free in the room. */
  island: IslandFit | null;
  verdicts: Verdict[];
};

/** Offsets of the plumb plane behind the cabinets from the line corner to corner, positive into the room. */
export type RunSetLine = {
  offsetAtLeftMm: number;
  offsetAtRightMm: number;
  xLeftMm: number;
  xRightMm: number;
  /** Positive: further out at the right. */
  turnDeg: number;
  /** The turn is shared with the runs it is joined to. */
  turnFixedBy: string[];
  /** No face readings: the straight line corner to corner is assumed. */
  assumed: boolean;
  touches: { xMm: number; zMm: number; readingId: string }[];
  /** It touches one place only: shim the ends. */
  rocks: boolean;
  greatestGap: FitFigure;
  /** Where the wall stands proud of a fixed plane, to be cut. */
  wallToCut: { xMm: number; zMm: number; proud: FitFigure }[];
};

export type BackGap = {
  words: string;
  at: 'reading' | 'unit-edge' | 'finished-end';
  unitId: string | null;
  xMm: number;
  zMm: number;
  gap: FitFigure;
};

/** A place in a run: "left end, front edge, at the floor". */
export type OpeningPlace = {
  end: 'left' | 'right';
  yMm: number;
  zMm: number;
  xMm: number;
  words: string;
  readingId: string | null;
  /** Outside the readings: carried on in a straight line; the reading is asked for. */
  extrapolated: boolean;
};

export type RunOpening = {
  opening: FitFigure;
  governing: { left: OpeningPlace; right: OpeningPlace };
  /** Least over all places of (opening there − U there): verdicts use it. */
  safeMm: number;
  safeRoundedDownMm: number;
};

export type RunEndFit = {
  end: 'left' | 'right';
  meets: 'wall' | 'open' | 'run' | 'casing' | 'existing';
  /** "Wall A", "run Sink wall, which goes through". */
  words: string;
  leastMm: number;
  mostMm: number;
  filler: EndFiller | null;
  /** Free space up to the limit of an open end. */
  freeRoom: FitFigure | null;
};

export type EndFiller = {
  /** Face width at each place along the edge, top first. */
  widths: { zMm: number; width: FitFigure; extrapolated: boolean }[];
  /** Least and greatest face width. */
  least: FitFigure;
  greatest: FitFigure;
  /** Top width less bottom width. */
  taper: FitFigure;
  /** Least face width + scribe allowance, rounded up once. */
  blank: FitFigure;
  scribe: EdgeScribe;
  verdict: 'fits' | 'tight' | 'loose' | 'short';
  words: string;
};

export type EdgeScribe = {
  words: string;
  /** "filler-left", "filler-right", "finished-end", "ceiling", "kick". */
  edge: 'filler-left' | 'filler-right' | 'finished-end' | 'ceiling' | 'kick';
  unitId: string | null;
  outOfTrue: FitFigure;
  allowance: FitFigure;
  allowanceRoundedUpMm: number;
};

export type RunFill = {
  /** Length less both ends: what boxes, joints and the fillers' excess may take. */
  room: FitFigure;
  unitsMm: number;
  jointGrowthMm: number;
  slack: FitFigure;
  verdict: RunVerdict;
  words: string;
  /** Total to lose when short; 0 else. */
  toLoseMm: number;
  /** Smallest shift of a centring mark that would make it fit; null where none is asked. */
  shiftOfMarkMm: number | null;
  suggestion: WidthSuggestion | null;
};

export type WidthSuggestion = {
  /** Null list: no change of these units can do it. */
  changes: { unitId: string; fromMm: number; toMm: number }[];
  /** "Sink 36 to 33: fillers 38 and 38." */
  words: string;
  possible: boolean;
  leftFillerMm: number | null;
  rightFillerMm: number | null;
};

export type PlacedUnit = {
  unitId: string;
  name: string;
  kind: string;
  /** Along the set line from the wall's left corner. */
  leftMm: number;
  rightMm: number;
  /** Behind its two edges, greatest over the height. */
  backGapLeft: FitFigure | null;
  backGapRight: FitFigure | null;
  /** Null where the unit is not hung or no stud is known. */
  studs: UnitStuds | null;
  /** Of tall units. */
  tilt: TiltCheck | null;
  /** Of appliances: clear height under the counter from the finished floor. */
  applianceHeight: FitFigure | null;
};

export type UnitStuds = {
  studs: { xMm: number; predicted: boolean }[];
  needed: number;
  enough: boolean;
  words: string;
};

export type TiltCheck = {
  standsUp: boolean;
  /** Clear height less what it takes; negative by how much it fails. */
  margin: FitFigure;
  words: string;
};

export type RunKicks = {
  nominalMm: number;
  /** Height of the kick base over the finished floor's high point. */
  datumMm: number;
  sharedWithRunIds: string[];
  /** Null where what is already set fixes the datum, or it lies under another run of the group. */
  highPoint: { xMm: number; yMm: number; readingId: string } | null;
  corners: KickCorner[];
  faceBlank: { blank: FitFigure; scribe: EdgeScribe } | null;
  /** Kick faces that show at an open end, and at the back of an island. */
  returns: { side: 'left' | 'right' | 'back'; blank: FitFigure; scribe: EdgeScribe }[];
  least: FitFigure;
  greatest: FitFigure;
  /** "Stands on the finished floor." */
  words: string;
};
export type KickCorner = {
  unitId: string;
  corner: 'back-left' | 'back-right' | 'front-left' | 'front-right';
  xMm: number;
  yMm: number;
  height: FitFigure;
  extrapolated: boolean;
  legs: 'within' | 'too-low' | 'too-high';
  /** Its U reaches past an end of the legs' range. */
  inDoubt: boolean;
};

export type RunCeiling = {
  /** From the top of the boxes to the ceiling. */
  left: FitFigure;
  right: FitFigure;
  least: FitFigure;
  /** Crown or filler to scribe: least gap + allowance, rounded up once. */
  blank: FitFigure | null;
  scribe: EdgeScribe | null;
  /** Where a crown turns a corner, flat on the saw; sheets from before crowns were asked for have none. */
  crown?: CrownCut[];
  words: string;
};

export type CrownCut = {
  end: 'left' | 'right';
  mitre: FitFigure;
  bevel: FitFigure;
  /** Outside corners are cut the other way. */
  corner: 'inside' | 'outside';
};

export type IslandFit = {
  /** Clockwise from the back left, in the plan of the closure picture. */
  corners: { xMm: number; yMm: number }[];
  /** Exposed corners of the kick, each piece cut so. */
  saw: FitFigure;
  exposedCorners: number;
  aisles: {
    toId: string;
    side: 'back' | 'right' | 'front' | 'left';
    clear: FitFigure;
    /** Doors of both sides open. */
    clearOpen: FitFigure;
    words: string;
  }[];
  /** From the sink's middle to each pipe. */
  services: { readingId: string; kind: 'water' | 'waste'; along: FitFigure; across: FitFigure }[];
};
