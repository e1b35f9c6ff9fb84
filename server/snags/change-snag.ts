import { and, eq } from 'drizzle-orm';
import { snags } from '@/db/schema';
import type { ChangeSnagInput } from '@/lib/contracts/snags';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { lockSnag } from './lock-snag';
import { snagMenderWords } from './snag-words';

/** Who mends it, and by when; only what is given is changed. */
export async function changeSnag(
  ctx: PersonContext,
  input: ChangeSnagInput,
): Promise<{ snagId: string }> {
  mustBeAllowed(ctx, 'snags:change');
  const { snagId } = input;
  return ctx.db.transaction(async (tx) => {
    const snag = await lockSnag(tx, ctx, snagId);
    if (snag.closedAt) throw closedAlready();
    const { mender = snag.mender, dueOn = snag.dueOn } = input;
    if (mender === snag.mender && dueOn === snag.dueOn) return { snagId };
    await tx
      .update(snags)
      .set({ mender, dueOn })
      .where(and(eq(snags.shopId, ctx.shop.id), eq(snags.id, snagId)));
    await writeAudit(tx, ctx, {
      verb: 'change-snag',
      subjectKind: 'snag',
      subjectId: snagId,
      jobId: snag.jobId,
      summary: `Snag "${snag.words}": the ${snagMenderWords[mender]} mends it${dueOn ? ` by ${dueOn}` : ''}`,
      detail: { mender, dueOn },
    });
    return { snagId };
  });
}

export function closedAlready(): Refusal {
  return new Refusal({
    status: 409,
    code: 'snag-closed',
    message: 'This snag was closed meanwhile. Nothing was changed; open a new one if it is back.',
  });
}
