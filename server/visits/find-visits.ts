import { and, asc, eq, gt, inArray, ne, sql } from 'drizzle-orm';
import { customers, jobs, sites, visits } from '@/db/schema';
import type { FindVisitsInput, VisitView } from '@/lib/contracts/visits';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { jobMatches } from '@/server/jobs/job-matches';
import { readVisits } from './read-visits';

/** Whoever rings about a visit rings soon after it. */
const daysBack = 14;
const mostVisits = 8;

/** Booked visits by any part of name, street, phone, title or number: those to come first, the next one on top. */
export async function findVisits(
  ctx: PersonContext,
  { search }: FindVisitsInput,
): Promise<VisitView[]> {
  mustBeAllowed(ctx, 'visits:read');
  const isOver = sql<boolean>`${visits.endsAt} <= ${ctx.now.toISOString()}::timestamptz`;
  const found = await ctx.db
    .select({ id: visits.id })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        gt(visits.endsAt, new Date(ctx.now.getTime() - daysBack * 86_400_000)),
        ne(visits.status, 'called-off'),
        jobMatches(search),
      ),
    )
    .orderBy(isOver, asc(visits.startsAt), asc(visits.id))
    .limit(mostVisits);
  const order = new Map(found.map(({ id }, index) => [id, index]));
  const read = await readVisits(ctx.db, ctx, inArray(visits.id, [...order.keys()]));
  return read.sort((a, b) => (order.get(a.id) ?? 0) - (order.get(b.id) ?? 0));
}
