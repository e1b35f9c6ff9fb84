import { and, eq, lt, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { walls } from '@/db/schema';
import type { Room } from '@/lib/contracts/wall-book';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Puts the walls as drawn in place of those on file; a wall that stays keeps its id, and so its readings. */
export async function writeWalls(tx: Transaction, ctx: PersonContext, room: Room): Promise<void> {
  const ofRoom = and(eq(walls.shopId, ctx.shop.id), eq(walls.roomId, room.id));
  // Walls that change places would meet on one place half way: all step aside first.
  await tx
    .update(walls)
    .set({ position: sql`-1 - ${walls.position}` })
    .where(ofRoom);
  const rows = room.chains.flatMap((chain, chainIndex) =>
    chain.walls.map((wall, position) => ({
      shopId: ctx.shop.id,
      roomId: room.id,
      chain: chainIndex,
      chainClosed: chain.closed,
      position,
      ...wall,
    })),
  );
  const written = await tx
    .insert(walls)
    .values(rows)
    .onConflictDoUpdate({
      target: walls.id,
      set: {
        chain: sql`excluded.chain`,
        chainClosed: sql`excluded.chain_closed`,
        position: sql`excluded.position`,
        name: sql`excluded.name`,
        nominalLengthMm: sql`excluded.nominal_length_mm`,
        leftCornerDeg: sql`excluded.left_corner_deg`,
      },
      setWhere: ofRoom,
    })
    .returning({ id: walls.id });
  // An id on file in another room is not this room's to draw.
  if (written.length < rows.length) throw notFound('wall');
  await tx.delete(walls).where(and(ofRoom, lt(walls.position, 0)));
}
