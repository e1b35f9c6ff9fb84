/** Readings on the wire and in the engine; frames and signs as in `wall-book`. */
import { z } from 'zod';
import { heightMm, id, lengthMm, offsetMm, someText, text } from './wall-book-values';

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
