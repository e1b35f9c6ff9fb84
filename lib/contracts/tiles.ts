/** A tile of the map by its place in the usual grid: zoom, column from the west, row from the north. */
import { z } from 'zod';

const index = z.coerce.number().int().min(0).max(4_194_303);

export const tileInput = z.object({
  z: z.coerce.number().int().min(0).max(22),
  x: index,
  y: index,
});
export type TileInput = z.infer<typeof tileInput>;
