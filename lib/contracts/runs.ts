/** Runs, their ends and their units, on the wire and in the engine; frames and signs as in `wall-book`. */
import { z } from 'zod';
import { heightMm, id, lengthMm, offsetMm, someText, text } from './wall-book-values';

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
