/**
 * The wall book on the wire and in the engine: a room and its walls, the tools, and what was read.
 * Frames and signs are those of DEVELOPERS.md "Frames and signs": x along the wall left to right seen
 * from inside, y out of the wall into the room, z up from the datum. Walls run clockwise seen from above.
 */
import { z } from 'zod';
import { reading } from './readings';
import { id, lengthMm, someText } from './wall-book-values';

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

export const wallBook = z.object({
  room,
  readings: z.array(reading),
  tools: z.array(tool),
});
export type WallBook = z.infer<typeof wallBook>;
