import { and, eq } from 'drizzle-orm';
import { jobs, sites } from '@/db/schema';
import type { ForCrewView } from '@/lib/contracts/stops';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { momentWords } from '@/server/walls/moment-words';

/** What the office has told the crew; of the code only that there is one. */
export async function getForCrew(
  ctx: PersonContext,
  { jobId }: { jobId: string },
): Promise<ForCrewView> {
  mustBeAllowed(ctx, 'jobs:read');
  const [found] = await ctx.db
    .select({ parking: sites.parking, finish: jobs.finish, setAt: sites.accessCodeSetAt })
    .from(jobs)
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!found) throw notFound('job');
  const { parking, finish, setAt } = found;
  return { parking, finish, codeSetWords: setAt ? momentWords(ctx, setAt) : null };
}
