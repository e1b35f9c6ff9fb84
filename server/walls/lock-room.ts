import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { rooms } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Until the transaction ends nobody else lays out or releases this room: what is read of it is of one piece. */
export async function lockRoom(tx: Transaction, ctx: PersonContext, roomId: string): Promise<void> {
  const [room] = await tx
    .select({ id: rooms.id })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, roomId)))
    .for('update');
  if (!room) throw notFound('room');
}
