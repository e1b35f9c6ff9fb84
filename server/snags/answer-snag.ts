import { and, eq } from 'drizzle-orm';
import { snags } from '@/db/schema';
import type { AnswerSnagInput } from '@/lib/contracts/snags';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { closedAlready } from './change-snag';
import { lockSnag } from './lock-snag';

/** The bench says what it does about a note from site. The snag stays open until it is mended there. */
export async function answerSnag(
  ctx: PersonContext,
  { snagId, words, readyOn }: AnswerSnagInput,
): Promise<{ snagId: string }> {
  mustBeAllowed(ctx, 'sheets:say-ready');
  return ctx.db.transaction(async (tx) => {
    const snag = await lockSnag(tx, ctx, snagId);
    if (snag.closedAt) throw closedAlready();
    await tx
      .update(snags)
      .set({ benchSays: words, benchReadyOn: readyOn, benchSaidAt: ctx.now })
      .where(and(eq(snags.shopId, ctx.shop.id), eq(snags.id, snagId)));
    await writeAudit(tx, ctx, {
      verb: 'answer-snag',
      subjectKind: 'snag',
      subjectId: snagId,
      jobId: snag.jobId,
      summary: `The bench on "${snag.words}": ${words}${readyOn ? `, ready ${readyOn}` : ''}`,
    });
    return { snagId };
  });
}
