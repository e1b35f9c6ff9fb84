import { createHash } from 'node:crypto';
import type { TileInput } from '@/lib/contracts/tiles';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { env } from '@/server/base/env';
import type { FileAnswer } from '@/server/base/handle-file';
import { notFound } from '@/server/base/problem-response';
import { fetchTile } from '@/server/ports/tiles/fetch-tile';

/** A tile of the map that the shop's host has set up. */
export async function getTile(ctx: PersonContext, { z, x, y }: TileInput): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'visits:read');
  const { tiles } = env();
  if (!tiles || x >= 2 ** z || y >= 2 ** z) throw notFound('map tile');
  const tile = await fetchTile(tiles.url, { z, x, y });
  if (!tile) throw notFound('map tile');
  return {
    open: async () => new Blob([tile.bytes]).stream(),
    mediaType: tile.mediaType,
    bytes: tile.bytes.byteLength,
    name: `tile-${z}-${x}-${y}`,
    mark: createHash('sha256').update(tile.bytes).digest('base64url').slice(0, 22),
  };
}
