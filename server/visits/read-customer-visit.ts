import { and, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, sites, visits } from '@/db/schema';
import type { Context } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** What a visit's customer may know of it: for the page, the messages and the calendar. */
export async function readCustomerVisit(db: Database, ctx: Context, visitId: string) {
  const [visit] = await db
    .select({
      id: visits.id,
      version: visits.version,
      kind: visits.kind,
      status: visits.status,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      windowStartsAt: visits.windowStartsAt,
      windowEndsAt: visits.windowEndsAt,
      expectedAt: visits.expectedAt,
      customerSays: visits.customerSays,
      jobId: visits.jobId,
      customerId: customers.id,
      notReady: jobs.notReady,
      customerName: customers.name,
      email: customers.email,
      language: customers.language,
      street: sites.street,
      town: sites.town,
      zone: sites.zone,
      yearBuilt: sites.yearBuilt,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visitId)));
  if (!visit) throw notFound('visit');
  return visit;
}
export type CustomerVisit = Awaited<ReturnType<typeof readCustomerVisit>>;
