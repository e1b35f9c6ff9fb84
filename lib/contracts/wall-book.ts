/**
 * The wall book on the wire and in the engine: a room's walls, its readings and its runs.
 * Frames and signs are those of DEVELOPERS.md "Frames and signs": x along the wall left to right seen
 * from inside, y out of the wall into the room, z up from the datum. Walls run clockwise seen from above.
 */
import { z } from 'zod';

const id = z.uuid();
/** Text that the database can keep: no NUL and no half of a surrogate pair. */
const text = (most: number) =>
  z
    .string()
    .max(most)
    .refine((words) => !words.includes('\0') && words.isWellFormed(), 'Type it again, in letters.');
const someText = (most: number) => text(most).min(1);
const lengthMm = z.number().finite().min(0).max(100_000);
const offsetMm = z.number().finite().min(-5_000).max(100_000);
const heightMm = z.number().finite().min(-2_000).max(12_000);

/** What the tool touched; decides whether a thickness is still to come. */
export const touches = z.enum([
  'plaster',
  'board',
  'bare-stud',
  'skirting',
  'tile',
  'casing',
  'existing-cabinet',
]);
export type Touches = z.infer<typeof touches>;

const common = {
  /** Made on the phone; sending it twice changes nothing. */
  id,
  roomId: id,
  toolId: id,
  /** Instant, ISO 8601 in UTC, by the phone's clock. */
  takenAt: z.iso.datetime(),
  /** The text as typed, for the record: "95 1/16", "900 / 1200 / 1502". */
  typed: text(80),
  unit: z.enum(['in', 'mm']),
  touches: touches.default('board'),
  /** The reading this one corrects; that one stays, marked. */
  replaces: id.optional(),
};

export const lengthReading = z.object({
  ...common,
  kind: z.literal('length'),
  wallId: id,
  zMm: heightMm,
  /** 0 at the wall; the front depth where it was read at the face line. */
  yMm: offsetMm.default(0),
  valueMm: lengthMm,
});

/** A wall whose whole cannot be reached, or is to be checked: stretches from its left corner to its right one. */
export const piecesReading = z.object({
  ...common,
  kind: z.literal('pieces'),
  wallId: id,
  zMm: heightMm,
  /** Left to right, mark to mark along the wall; together they are its whole length. */
  piecesMm: z.array(lengthMm).min(2).max(12),
});

/** A corner is named by the wall that begins at it: the corner at that wall's LEFT end. */
export const cornerReading = z.object({
  ...common,
  kind: z.literal('corner'),
  cornerWallId: id,
  zMm: heightMm,
  by: z.discriminatedUnion('method', [
    z.object({
      method: z.literal('legs'),
      /** a: along the left arm, that is the end of the wall before. */
      legLeftMm: lengthMm,
      /** b: along the right arm, that is the start of this wall. */
      legRightMm: lengthMm,
      /** c: between the two marks. */
      diagonalMm: lengthMm,
      /** Outside corner: leg a lies on a straightedge carried past the corner. */
      carriedPast: z.boolean().default(false),
    }),
    z.object({ method: z.literal('angle'), angleDeg: z.number().gt(0).lt(360) }),
  ]),
});

export const setUpKind = z.enum(['straightedge', 'plumb-level', 'laser-plane']);

export const faceReading = z.object({
  ...common,
  kind: z.literal('face'),
  wallId: id,
  xMm: offsetMm,
  zMm: heightMm,
  /** Gap from the reference to the wall; larger where the wall falls back. */
  gapMm: z.number().finite().min(-300).max(300),
  /** Gaps are comparable only inside one set-up. */
  setUpId: id,
  setUpKind,
});

export const floorReading = z.object({
  ...common,
  kind: z.literal('floor'),
  wallId: id,
  xMm: offsetMm,
  yMm: offsetMm,
  /** Down from the level line to the floor; the high point has the smallest drop. */
  dropMm: lengthMm,
  setUpId: id,
});

export const ceilingReading = z.object({
  ...common,
  kind: z.literal('ceiling'),
  wallId: id,
  xMm: offsetMm,
  yMm: offsetMm,
  /** Up from the same level line as the floor's drops of this set-up. */
  riseMm: lengthMm,
  setUpId: id,
});

export const diagonalReading = z.object({
  ...common,
  kind: z.literal('diagonal'),
  fromCornerWallId: id,
  toCornerWallId: id,
  /** Left out: the wall's left corner. 'right' names the far end of an open chain, where no wall begins. */
  fromEnd: z.enum(['left', 'right']).optional(),
  toEnd: z.enum(['left', 'right']).optional(),
  zMm: heightMm,
  valueMm: lengthMm,
});

/** Across the room between two facing walls; ties the two chains of a galley. */
export const widthReading = z.object({
  ...common,
  kind: z.literal('width'),
  wallId: id,
  xMm: offsetMm,
  toWallId: id,
  zMm: heightMm,
  valueMm: lengthMm,
});

export const featureKind = z.enum([
  'window',
  'door',
  'opening',
  'outlet',
  'switch',
  'water',
  'waste',
  'gas',
  'vent',
  'radiator',
  'panel',
  'beam',
  'pipe',
  'other',
]);
export type FeatureKind = z.infer<typeof featureKind>;

export const featureReading = z.object({
  ...common,
  kind: z.literal('feature'),
  wallId: id,
  feature: featureKind,
  x0Mm: offsetMm,
  x1Mm: offsetMm,
  z0Mm: heightMm,
  z1Mm: heightMm,
  projectionMm: z.number().finite().min(-500).max(2_000).default(0),
  /** Which way a door or casement opens, seen from inside; none for the rest. */
  swing: z.enum(['none', 'in-left', 'in-right', 'out-left', 'out-right']).default('none'),
  note: text(200).default(''),
});

export const studReading = z.object({
  ...common,
  kind: z.literal('stud'),
  wallId: id,
  xMm: offsetMm,
  at: z.enum(['centre', 'left-edge', 'right-edge']),
});

export const doorwayReading = z.object({
  ...common,
  kind: z.literal('doorway'),
  name: text(60),
  /** Clear width past the leaf and the stop. */
  clearWidthMm: lengthMm,
  clearHeightMm: lengthMm,
  /** Of the passage behind, where the way in turns. */
  passageWidthMm: lengthMm.optional(),
});

/** Takes a reading back; both stay in the book. */
export const withdrawal = z.object({
  ...common,
  kind: z.literal('withdrawal'),
  readingId: id,
  reason: someText(200),
});

/** A reading that was asked for and could not be taken, with the reason. */
export const skip = z.object({
  ...common,
  kind: z.literal('skip'),
  /** The key of the reading asked for, as `whatIsMissing` names it. */
  slot: text(120),
  reason: someText(200),
});

export const reading = z.discriminatedUnion('kind', [
  lengthReading,
  piecesReading,
  cornerReading,
  faceReading,
  floorReading,
  ceilingReading,
  diagonalReading,
  widthReading,
  featureReading,
  studReading,
  doorwayReading,
  withdrawal,
  skip,
]);
export type Reading = z.infer<typeof reading>;
export type ReadingKind = Reading['kind'];
export type ReadingOf<K extends ReadingKind> = Extract<Reading, { kind: K }>;

export const tool = z.object({
  id,
  name: someText(60),
  /** Maximum permissible error; see MEASURE "Tools and uncertainty" in DEVELOPERS.md. */
  spec: z.discriminatedUnion('kind', [
    z.object({
      kind: z.literal('tape'),
      accuracyClass: z.enum(['I', 'II', 'III']),
      stepMm: z.number().positive(),
      repeatabilityMm: z.number().min(0),
    }),
    z.object({
      kind: z.literal('laser'),
      mpeMm: z.number().positive(),
      /** The maker states the error at 95 % (k = 2), not as a limit: u is then half of it. */
      statedAt95: z.boolean().optional(),
      stepMm: z.number().positive(),
      repeatabilityMm: z.number().min(0),
    }),
    z.object({
      kind: z.literal('angle-finder'),
      mpeDeg: z.number().positive(),
      /** The maker states the error at 95 % (k = 2), not as a limit: u is then half of it. */
      statedAt95: z.boolean().optional(),
      stepDeg: z.number().positive(),
      repeatabilityDeg: z.number().min(0),
    }),
    z.object({
      kind: z.literal('level'),
      mpeMmPerM: z.number().positive(),
      /** The maker states the error at 95 % (k = 2), not as a limit: u is then half of it. */
      statedAt95: z.boolean().optional(),
      stepMm: z.number().positive(),
      repeatabilityMm: z.number().min(0),
    }),
  ]),
});
export type Tool = z.infer<typeof tool>;

export const wall = z.object({
  id,
  /** "A", "B" … in walking order. */
  name: someText(12),
  /** As drawn, before it is read. */
  nominalLengthMm: lengthMm,
  /** Nominal interior angle of the corner at this wall's left end; null where a chain begins in the open. */
  leftCornerDeg: z.number().gt(0).lt(360).nullable(),
});
export type Wall = z.infer<typeof wall>;

export const room = z.object({
  id,
  name: someText(60),
  /** Walls clockwise. A closed room is one closed chain; an L is one open chain; a galley is two. */
  chains: z
    .array(z.object({ closed: z.boolean(), walls: z.array(wall).min(1).max(40) }))
    .min(1)
    .max(4),
  /** Faces still to come: thickness to be added to bare studs, floor build-up to be laid. */
  wallThicknessToComeMm: z.number().min(0).max(100).default(0),
  floorToComeMm: z.number().min(0).max(200).default(0),
  /** What the cabinets are set on where a floor is still to come; the finished floor unless said. */
  cabinetsStandOn: z.enum(['finished-floor', 'rough-floor']).optional(),
});
export type Room = z.infer<typeof room>;

/** What a run meets at one end. */
export const runEnd = z.discriminatedUnion('kind', [
  /** The next wall, at the corner. */
  z.object({ kind: z.literal('wall') }),
  /** Free: a finished end, up to a limit measured along the wall from its left corner. */
  z.object({ kind: z.literal('open'), limitMm: lengthMm }),
  /** Another run that stands on the next wall: its front is in the way. `through` runs into the corner. */
  z.object({
    kind: z.literal('run'),
    runId: id,
    through: z.enum(['this', 'other', 'both-stop', 'corner-unit']),
  }),
  /** A door or window casing at xMm. */
  z.object({ kind: z.literal('casing'), xMm: lengthMm }),
  /** A cabinet set in an earlier phase, its end face at xMm. */
  z.object({
    kind: z.literal('existing'),
    xMm: lengthMm,
    /** Its back from the wall's straight line, at xMm: the new run takes it up as its set line. */
    standOffMm: offsetMm.optional(),
    /** Its front against that line, positive further out at the right. */
    turnDeg: z.number().min(-10).max(10).optional(),
    /** Drop from the level line to the underside of its box: its kick line is the datum. */
    undersideDropMm: lengthMm.optional(),
    /** Drops from the level line to its counter, at the end that meets this run and at its far end. */
    counterDropsMm: z.tuple([lengthMm, lengthMm]).optional(),
  }),
]);
export type RunEnd = z.infer<typeof runEnd>;

export const unitKind = z.enum([
  'base',
  'drawers',
  'sink',
  'corner',
  'wall',
  'tall',
  'panel',
  'dishwasher',
  'range',
  'refrigerator',
  'hood',
  'open',
]);
export type UnitKind = z.infer<typeof unitKind>;

export const unit = z.object({
  id,
  name: text(40).default(''),
  kind: unitKind,
  widthMm: z.number().positive().max(5_000),
  /** Null: fixed. Else it may be built between min and max in steps from its present width, or to stock widths. */
  alterable: z
    .object({
      minMm: z.number().positive(),
      maxMm: z.number().positive(),
      stepMm: z.number().positive(),
      stockMm: z.array(z.number().positive()).optional(),
    })
    .nullable()
    .default(null),
  /** A corner unit's arm along the other wall; left out: as its width. */
  armMm: z.number().positive().max(5_000).optional(),
  /** Nominal sheet thicknesses that its width stacks (an applied panel is one); left out: built to its width. */
  sheets: z.number().int().min(1).max(6).optional(),
  /** Clear height an appliance needs under the counter, from the maker's sheet. */
  needHeightMm: z.number().positive().max(3_000).optional(),
});
export type Unit = z.infer<typeof unit>;

export const run = z.object({
  id,
  wallId: id,
  name: someText(40),
  level: z.enum(['base', 'wall', 'tall']),
  left: runEnd,
  right: runEnd,
  /** Carcass depth without the door. */
  carcassDepthMm: z.number().positive().max(2_000),
  bumperMm: z.number().min(0).max(20).default(2),
  doorMm: z.number().min(0).max(60).default(19),
  /** Height band of the boxes above the finished floor at the high point. */
  z0Mm: heightMm,
  z1Mm: heightMm,
  units: z.array(unit).max(60),
  /** Where the slack goes. `centred` puts the middle of a unit on a mark along the wall. */
  share: z
    .discriminatedUnion('how', [
      z.object({ how: z.literal('equal') }),
      z.object({ how: z.literal('left') }),
      z.object({ how: z.literal('right') }),
      z.object({ how: z.literal('centred'), unitId: id, markMm: lengthMm }),
    ])
    .default({ how: 'equal' }),
  /** Runs that share a counter (and so one datum) carry the same mark; null stands alone. */
  counterGroup: text(20).nullable().default(null),
  /** What closes the gap over the boxes; left out: a filler, where they end near the ceiling. */
  overBoxes: z.enum(['open', 'filler', 'crown']).optional(),
  /** A finished end that shows: the set line leaves the least gap there first. */
  leastGapAt: z.enum(['left', 'right']).optional(),
  /** Stands free in the room, parallel to a set line: its two ends are open, and its back. */
  island: z
    .object({
      /** The run whose set line it is parallel to; left out: the straight line of its wall. */
      setLineRunId: id.optional(),
      /** From that line to its back, into the room. */
      offsetMm: lengthMm,
      /** From the wall's left corner to its left end, along that line. */
      alongMm: lengthMm,
      /** A peninsula: the side that is built on to something. */
      joined: z.enum(['back', 'right', 'front', 'left']).optional(),
    })
    .optional(),
});
export type Run = z.infer<typeof run>;

export const wallBook = z.object({
  room,
  readings: z.array(reading),
  tools: z.array(tool),
});
export type WallBook = z.infer<typeof wallBook>;
