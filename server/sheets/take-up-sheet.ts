import { and, eq } from 'drizzle-orm';
import { releaseReceipts, releases, rooms } from '@/db/schema';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { moveStage } from '@/server/jobs/move-stage';
import { newestReleases } from '@/server/walls/newest-releases';

/** The bench takes the newest revision up; taking it up again changes nothing. */
export async function takeUpSheet(
  ctx: PersonContext,
  { releaseId }: { releaseId: string },
): Promise<{ releaseId: string }> {
  mustBeAllowed(ctx, 'sheets:take-up');
  return ctx.db.transaction(async (tx) => {
    const [release] = await tx
      .select({
        roomId: releases.roomId,
        revision: releases.revision,
        jobId: rooms.jobId,
        roomName: rooms.name,
      })
      .from(releases)
      .innerJoin(rooms, eq(rooms.id, releases.roomId))
      .where(and(eq(releases.shopId, ctx.shop.id), eq(releases.id, releaseId)));
    if (!release) throw notFound('sheet');
    const { roomId, revision, jobId, roomName } = release;
    const newest = (await newestReleases(tx, ctx, [roomId])).get(roomId);
    if (newest && newest.releaseId !== releaseId) {
      throw new Refusal({
        status: 409,
        code: 'sheet-superseded',
        message: `Revision ${newest.revision} is newer than ${revision}. Take that one up.`,
        current: { revision: newest.revision },
      });
    }
    const [taken] = await tx
      .insert(releaseReceipts)
      .values({
        shopId: ctx.shop.id,
        releaseId,
        takenUpAt: ctx.now,
        takenUpBy: ctx.actor.personId,
      })
      .onConflictDoNothing({ target: releaseReceipts.releaseId })
      .returning({ id: releaseReceipts.id });
    if (taken) {
      await moveStage(tx, ctx, { jobId, event: 'sheet-taken-up' });
      await writeAudit(tx, ctx, {
        verb: 'take-up-sheet',
        subjectKind: 'release',
        subjectId: releaseId,
        jobId,
        summary: `The bench took up ${roomName}, revision ${revision}`,
      });
    }
    return { releaseId };
  });
}
