import { and, eq } from 'drizzle-orm';
import { jobs, signOffs } from '@/db/schema';
import type { SignOffView } from '@/lib/contracts/sign-offs';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readSignOffs } from './read-sign-offs';

/** What the customer of a job signed, oldest first. */
export async function listSignOffs(
  ctx: PersonContext,
  { jobId }: { jobId: string },
): Promise<SignOffView[]> {
  mustBeAllowed(ctx, 'jobs:read');
  const [job] = await ctx.db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
  return readSignOffs(ctx.db, ctx, eq(signOffs.jobId, jobId));
}
