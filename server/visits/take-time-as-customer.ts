import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import type { CustomerContext } from '@/server/base/context';
import { putItem } from '@/server/messages/scheduler-items';
import { kickWorker } from '@/server/messages/worker';
import { changeVisit, lockVisit } from './lock-visit';
import { holdIsOver, lockHeld, moveToHeld } from './take-held-time';

/** The customer takes the time that is kept for them: the visit moves there, and is confirmed by it. */
export async function takeTimeAsCustomer(ctx: CustomerContext, heldVisitId: string): Promise<void> {
  await ctx.db.transaction(async (tx) => {
    const held = await lockHeld(tx, ctx, heldVisitId);
    if (held.heldForVisitId !== ctx.actor.visitId) throw holdIsOver();
    const view = await moveToHeld(tx, ctx, held, ctx.actor.visitId);
    const moved = await lockVisit(tx, ctx, ctx.actor.visitId);
    await changeVisit(tx, ctx, moved, { status: 'confirmed', confirmedAt: ctx.now });
    const words = `The customer chose ${view.dayWords}, ${view.windowWords}, and confirms it`;
    await putItem(tx, {
      shopId: ctx.shop.id,
      customerId: moved.customerId,
      jobId: moved.jobId,
      visitId: moved.id,
      kind: 'time-taken',
      key: `time-taken:${moved.id}:${moved.version}`,
      words: `${visitKindWords[moved.kind]}: ${words}`,
      at: ctx.now,
    });
    await writeAudit(tx, ctx, {
      verb: 'take-held-time',
      subjectKind: 'visit',
      subjectId: moved.id,
      jobId: moved.jobId,
      summary: words,
    });
  });
  kickWorker();
}
