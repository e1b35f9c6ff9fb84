import { and, eq } from 'drizzle-orm';
import { jobs } from '@/db/schema';
import type { OpenSnagInput } from '@/lib/contracts/snags';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { writeSnag } from './write-snag';

/** A snag that the office heard of. */
export async function openSnag(ctx: PersonContext, input: OpenSnagInput): Promise<{ id: string }> {
  mustBeAllowed(ctx, 'snags:change');
  return ctx.db.transaction(async (tx) => {
    const [job] = await tx
      .select({ id: jobs.id })
      .from(jobs)
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, input.jobId)));
    if (!job) throw notFound('job');
    await writeSnag(tx, ctx, { ...input, visitId: null, foundAt: ctx.now });
    return { id: input.id };
  });
}
