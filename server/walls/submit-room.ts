import { and, count, eq, gt } from 'drizzle-orm';
import { readings, rooms } from '@/db/schema';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';

/** The measurer hands the book in. Told twice with nothing read in between, it changes nothing. */
export async function submitRoom(
  ctx: PersonContext,
  input: { roomId: string },
): Promise<{ submittedAt: string }> {
  mustBeAllowed(ctx, 'walls:measure');
  return ctx.db.transaction(async (tx) => {
    const ofRoom = and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, input.roomId));
    const [room] = await tx
      .select({ jobId: rooms.jobId, name: rooms.name, submittedAt: rooms.submittedAt })
      .from(rooms)
      .where(ofRoom);
    if (!room) throw notFound('room');
    const inBook = and(eq(readings.shopId, ctx.shop.id), eq(readings.roomId, input.roomId));
    const [fresh] = await tx
      .select({ count: count() })
      .from(readings)
      .where(room.submittedAt ? and(inBook, gt(readings.receivedAt, room.submittedAt)) : inBook);
    const freshCount = fresh?.count ?? 0;
    if (freshCount === 0 && room.submittedAt) {
      return { submittedAt: room.submittedAt.toISOString() };
    }
    if (freshCount === 0) {
      throw new Refusal({
        status: 422,
        code: 'book-empty',
        message: 'There is no reading in this book yet. Take the first one, then hand it in.',
      });
    }
    await tx.update(rooms).set({ submittedAt: ctx.now }).where(ofRoom);
    await moveStage(tx, ctx, { jobId: room.jobId, event: 'readings-handed-in' });
    await writeAudit(tx, ctx, {
      verb: 'submit-room',
      subjectKind: 'room',
      subjectId: input.roomId,
      jobId: room.jobId,
      summary: `Handed in the wall book of ${room.name}`,
    });
    return { submittedAt: ctx.now.toISOString() };
  });
}
