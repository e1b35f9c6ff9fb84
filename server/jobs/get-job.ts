import { and, eq, sql } from 'drizzle-orm';
import { customers, jobs, sites } from '@/db/schema';
import type { JobView } from '@/lib/contracts/jobs';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { consentOf } from './consent-of';
import { jobRowFields } from './job-fields';
import { nextVisitWords } from './next-visits';
import { readStory } from './read-story';

/** A job with its customer, its site and its story. */
export async function getJob(ctx: PersonContext, input: { jobId: string }): Promise<JobView> {
  mustBeAllowed(ctx, 'jobs:read');
  const [job] = await ctx.db
    .select({
      ...jobRowFields,
      customerId: customers.id,
      isErased: sql<boolean>`${customers.erasedAt} is not null`,
      email: customers.email,
      language: customers.language,
      siteId: sites.id,
      postcode: sites.postcode,
      latitude: sites.latitude,
      longitude: sites.longitude,
      wayIn: sites.wayIn,
      floorsUp: sites.floorsUp,
      hasLift: sites.hasLift,
      yearBuilt: sites.yearBuilt,
      wallsReady: jobs.wallsReady,
      siteReadyOn: jobs.siteReadyOn,
      floorAgreed: jobs.floorAgreed,
      notReady: jobs.notReady,
      roomCount: jobs.roomCount,
      notes: jobs.notes,
    })
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, input.jobId)));
  if (!job) throw notFound('job');
  const next = await nextVisitWords(ctx, ctx.db, [job.id]);
  const consent = (await consentOf(ctx.db, ctx.shop.id, [job.customerId])).get(job.customerId);
  return {
    ...job,
    createdAt: job.createdAt.toISOString(),
    nextVisit: next.get(job.id) ?? null,
    mayText: consent?.sms ?? false,
    mayEmail: consent?.email ?? false,
    story: await readStory(ctx, ctx.db, job.id),
  };
}
