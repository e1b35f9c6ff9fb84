import { and, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { jobs, sites } from '@/db/schema';
import type { Context } from '@/server/base/context';

/** The zone of a job's site; the shop's where there is no job. */
export async function zoneOfJob(
  ctx: Context,
  jobId: string | null,
  db: Database = ctx.db,
): Promise<string> {
  if (!jobId) return ctx.shop.zone;
  const [site] = await db
    .select({ zone: sites.zone })
    .from(jobs)
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  return site?.zone ?? ctx.shop.zone;
}
