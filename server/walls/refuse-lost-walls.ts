import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { readings, runs, walls } from '@/db/schema';
import type { Room } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wallIdsOf } from '@/lib/measure/wall-ids';
import type { PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';

/** A reading that stands, or a run, would hang in the air without its wall. */
export async function refuseLostWalls(
  tx: Transaction,
  ctx: PersonContext,
  room: Room,
): Promise<void> {
  const kept = new Set(room.chains.flatMap((chain) => chain.walls.map(({ id }) => id)));
  const had = await tx
    .select({ id: walls.id, name: walls.name })
    .from(walls)
    .where(and(eq(walls.shopId, ctx.shop.id), eq(walls.roomId, room.id)));
  const lost = had.filter(({ id }) => !kept.has(id));
  if (lost.length === 0) return;
  const named = await namedWalls(tx, ctx, room.id);
  const held = lost.filter(({ id }) => named.has(id)).map(({ name }) => name);
  if (held.length === 0) return;
  throw new Refusal({
    status: 409,
    code: 'wall-in-use',
    message:
      `Wall ${held.join(', ')} has readings or a run. Withdraw the readings and take the run away first; ` +
      'the walls were left as they are.',
  });
}

async function namedWalls(
  tx: Transaction,
  ctx: PersonContext,
  roomId: string,
): Promise<Set<string>> {
  const lines = await tx
    .select({ body: readings.body })
    .from(readings)
    .where(and(eq(readings.shopId, ctx.shop.id), eq(readings.roomId, roomId)));
  const stoodOn = await tx
    .select({ wallId: runs.wallId })
    .from(runs)
    .where(and(eq(runs.shopId, ctx.shop.id), eq(runs.roomId, roomId)));
  return new Set([
    ...standingReadings(lines.map(({ body }) => body)).flatMap(wallIdsOf),
    ...stoodOn.map(({ wallId }) => wallId),
  ]);
}
