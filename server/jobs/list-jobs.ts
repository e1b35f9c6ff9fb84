import { and, desc, eq } from 'drizzle-orm';
import { customers, jobs, sites } from '@/db/schema';
import type { JobRow, ListJobsInput } from '@/lib/contracts/jobs';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { jobRowFields } from './job-fields';
import { jobMatches } from './job-matches';
import { nextVisitWords } from './next-visits';

/** More than anybody reads; the search narrows it. */
const mostRows = 300;

/** Jobs, newest first, by any part of name, street, town, title, notes, e-mail or phone, or by number. */
export async function listJobs(ctx: PersonContext, input: ListJobsInput): Promise<JobRow[]> {
  mustBeAllowed(ctx, 'jobs:read');
  const rows = await ctx.db
    .select(jobRowFields)
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(jobs.shopId, ctx.shop.id),
        input.stage ? eq(jobs.stage, input.stage) : undefined,
        input.search ? jobMatches(input.search) : undefined,
      ),
    )
    .orderBy(desc(jobs.number))
    .limit(mostRows);
  const next = await nextVisitWords(
    ctx,
    ctx.db,
    rows.map(({ id }) => id),
  );
  return rows.map((row) => ({
    ...row,
    createdAt: row.createdAt.toISOString(),
    nextVisit: next.get(row.id) ?? null,
  }));
}
