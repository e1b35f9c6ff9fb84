import { and, count, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs, rooms } from '@/db/schema';
import type { SaveRoomInput } from '@/lib/contracts/rooms';
import type { Room } from '@/lib/contracts/wall-book';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { refuseLostWalls } from './refuse-lost-walls';
import { writeWalls } from './write-walls';

/** Makes a room or changes its walls. A wall goes only when no reading that stands and no run names it. */
export async function saveRoom(
  ctx: PersonContext,
  input: SaveRoomInput,
): Promise<{ roomId: string }> {
  mustBeAllowed(ctx, 'walls:measure');
  const { jobId, room } = input;
  refuseTwins(room);
  return ctx.db.transaction(async (tx) => {
    const [job] = await tx
      .select({ id: jobs.id })
      .from(jobs)
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
    if (!job) throw notFound('job');
    const isNew = await writeRoom(tx, ctx, input);
    if (!isNew) await refuseLostWalls(tx, ctx, room);
    await writeWalls(tx, ctx, room);
    await writeAudit(tx, ctx, {
      verb: 'save-room',
      subjectKind: 'room',
      subjectId: room.id,
      jobId,
      summary: `${isNew ? 'Drew' : 'Redrew'} ${room.name}: ${wallsInWords(room)}`,
    });
    return { roomId: room.id };
  });
}

/** True when the room is new. A room of another job or shop is no room here. */
async function writeRoom(
  tx: Transaction,
  ctx: PersonContext,
  { jobId, room }: SaveRoomInput,
): Promise<boolean> {
  const { id, name, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn = null } = room;
  const change = { name, wallThicknessToComeMm, floorToComeMm, cabinetsStandOn };
  const ofJob = and(eq(rooms.shopId, ctx.shop.id), eq(rooms.jobId, jobId));
  const [changed] = await tx
    .update(rooms)
    .set(change)
    .where(and(ofJob, eq(rooms.id, id)))
    .returning({ id: rooms.id });
  if (changed) return false;
  const [others] = await tx.select({ count: count() }).from(rooms).where(ofJob);
  const [made] = await tx
    .insert(rooms)
    .values({ shopId: ctx.shop.id, id, jobId, position: others?.count ?? 0, ...change })
    .onConflictDoNothing({ target: rooms.id })
    .returning({ id: rooms.id });
  if (!made) throw notFound('room');
  return true;
}

function refuseTwins(room: Room): void {
  const walls = room.chains.flatMap((chain) => chain.walls);
  const twins = (values: string[]) => new Set(values).size < values.length;
  if (!twins(walls.map(({ id }) => id)) && !twins(walls.map(({ name }) => name))) return;
  throw new Refusal({
    status: 422,
    code: 'walls-alike',
    message: 'Two walls have the same name or id. Nothing was changed.',
    errors: { 'room.chains': 'Give each wall a name of its own.' },
  });
}

function wallsInWords(room: Room): string {
  const wallCount = room.chains.reduce((sum, chain) => sum + chain.walls.length, 0);
  return `${wallCount} wall${wallCount === 1 ? '' : 's'}`;
}
