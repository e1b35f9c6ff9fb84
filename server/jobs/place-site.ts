import { and, eq } from 'drizzle-orm';
import { jobs, sites } from '@/db/schema';
import type { PlaceSiteInput } from '@/lib/contracts/travel';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** The pin of a job's site, by which its drives are reckoned; looked up, or put by hand. */
export async function placeSite(ctx: PersonContext, { jobId, place }: PlaceSiteInput) {
  mustBeAllowed(ctx, 'jobs:change');
  return ctx.db.transaction(async (tx) => {
    const [job] = await tx
      .select({ siteId: jobs.siteId })
      .from(jobs)
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
    if (!job) throw notFound('job');
    await tx
      .update(sites)
      .set({ latitude: place?.lat ?? null, longitude: place?.lon ?? null })
      .where(and(eq(sites.shopId, ctx.shop.id), eq(sites.id, job.siteId)));
    await writeAudit(tx, ctx, {
      verb: 'place-site',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary: place ? 'Site put on the map' : 'Site taken off the map',
    });
    return { jobId, place };
  });
}
