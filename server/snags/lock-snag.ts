import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { snags } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** A snag as it is, held until the change of it is written. */
export async function lockSnag(tx: Transaction, ctx: PersonContext, snagId: string) {
  const [snag] = await tx
    .select({
      id: snags.id,
      jobId: snags.jobId,
      place: snags.place,
      words: snags.words,
      mender: snags.mender,
      dueOn: snags.dueOn,
      closedAt: snags.closedAt,
    })
    .from(snags)
    .where(and(eq(snags.shopId, ctx.shop.id), eq(snags.id, snagId)))
    .for('update');
  if (!snag) throw notFound('snag');
  return snag;
}
