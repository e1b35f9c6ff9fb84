import { apiPaths } from '@/lib/paths';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { env } from '@/server/base/env';

/** What lies under the day's stops: tiles through this server, or nothing, and then the island is drawn. */
export function getMapGround(ctx: PersonContext): { tilesUrl: string; attribution: string } | null {
  mustBeAllowed(ctx, 'visits:read');
  const { tiles } = env();
  return tiles ? { tilesUrl: apiPaths.tiles(), attribution: plainText(tiles.attribution) } : null;
}

/** The map shows it as HTML; whoever sets it up writes words. */
const plainText = (text: string) => text.replace(/[<>&]/g, '');
