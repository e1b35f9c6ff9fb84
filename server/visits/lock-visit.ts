import { and, eq, gt, ne, or, sql } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { customers, jobs, sites, visits } from '@/db/schema';
import type { StaleVisit } from '@/lib/contracts/visit-changes';
import type { Context } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';
import { lastChangeWords } from './last-change';
import { readVisit } from './read-visits';

const fields = {
  id: visits.id,
  jobId: visits.jobId,
  kind: visits.kind,
  crewId: visits.crewId,
  status: visits.status,
  startsAt: visits.startsAt,
  endsAt: visits.endsAt,
  windowStartsAt: visits.windowStartsAt,
  windowEndsAt: visits.windowEndsAt,
  workMinutes: visits.workMinutes,
  version: visits.version,
  customerSays: visits.customerSays,
  expectedAt: visits.expectedAt,
  confirmedAt: visits.confirmedAt,
  arrivedAt: visits.arrivedAt,
  holdEndsAt: visits.holdEndsAt,
  heldForVisitId: visits.heldForVisitId,
  customerId: customers.id,
  customerName: customers.name,
  zone: sites.zone,
};

/** A visit as it is, a hold that is over being no visit any more, with what telling its customer needs. */
export async function lockVisit(tx: Transaction, ctx: Context, visitId: string) {
  const [visit] = await tx
    .select(fields)
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.id, visitId),
        or(ne(visits.status, 'held'), gt(visits.holdEndsAt, ctx.now)),
      ),
    )
    .for('update', { of: visits });
  if (!visit) throw notFound('visit');
  return visit;
}
export type LockedVisit = Awaited<ReturnType<typeof lockVisit>>;

/** Every change of a visit raises its version, which is how a stale one is known. */
export async function changeVisit(
  tx: Transaction,
  ctx: Context,
  visit: LockedVisit,
  change: Partial<typeof visits.$inferInsert>,
): Promise<LockedVisit> {
  const [changed] = await tx
    .update(visits)
    .set({ ...change, version: sql`${visits.version} + 1` })
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visit.id)))
    .returning();
  if (!changed) throw notFound('visit');
  const { customerId, customerName, zone } = visit;
  return { ...changed, customerId, customerName, zone };
}

/** Refused with the visit as it is now, when the caller saw an older one. */
export async function mustBeCurrent(
  tx: Transaction,
  ctx: Context,
  visit: LockedVisit,
  version: number,
): Promise<void> {
  if (visit.version === version) return;
  const current: StaleVisit = {
    ...(await readVisit(tx, ctx, visit.id)),
    lastChange: await lastChangeWords(tx, ctx, visit.id),
  };
  throw new Refusal({
    status: 409,
    code: 'visit-changed',
    message: `Nothing was changed: this visit is different by now. ${current.dayWords}, ${current.windowWords}, ${current.crewName}, ${current.status}.`,
    current,
  });
}
