import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { walls } from '@/db/schema';
import type { Room } from '@/lib/contracts/wall-book';
import type { Context } from '@/server/base/context';

/** The walls of these rooms in walking order, chain by chain. */
export async function readChains(
  db: Database,
  ctx: Context,
  roomIds: string[],
): Promise<Map<string, Room['chains']>> {
  const rows = await db
    .select({
      roomId: walls.roomId,
      chain: walls.chain,
      closed: walls.chainClosed,
      id: walls.id,
      name: walls.name,
      nominalLengthMm: walls.nominalLengthMm,
      leftCornerDeg: walls.leftCornerDeg,
    })
    .from(walls)
    .where(and(eq(walls.shopId, ctx.shop.id), inArray(walls.roomId, roomIds)))
    .orderBy(asc(walls.roomId), asc(walls.chain), asc(walls.position));
  const ofRoom = new Map<string, Room['chains']>();
  for (const { roomId, chain, closed, ...wall } of rows) {
    const chains = ofRoom.get(roomId) ?? [];
    ofRoom.set(roomId, chains);
    chains[chain] ??= { closed, walls: [] };
    chains[chain].walls.push(wall);
  }
  return ofRoom;
}
