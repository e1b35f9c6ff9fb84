import { and, eq, isNull } from 'drizzle-orm';
import { jobs, snags } from '@/db/schema';
import type { ListSnagsInput, SnagView } from '@/lib/contracts/snags';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readSnags } from './read-snags';

/** Every snag of one job, or all that are open in the shop. */
export async function listSnags(
  ctx: PersonContext,
  { jobId }: ListSnagsInput,
): Promise<SnagView[]> {
  mustBeAllowed(ctx, 'jobs:read');
  if (jobId === undefined) return readSnags(ctx.db, ctx, isNull(snags.closedAt));
  const [job] = await ctx.db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
  return readSnags(ctx.db, ctx, eq(snags.jobId, jobId));
}
