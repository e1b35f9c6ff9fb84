import { and, eq, inArray, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { jobs, visits } from '@/db/schema';

/** Visits of a customer that somebody still drives to. */
export async function countOpenVisits(
  db: Database,
  shopId: string,
  customerId: string,
): Promise<number> {
  const [row] = await db
    .select({ n: sql<number>`count(*)::int` })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .where(
      and(
        eq(visits.shopId, shopId),
        eq(jobs.customerId, customerId),
        inArray(visits.status, ['held', 'booked', 'confirmed', 'on-the-way', 'on-site']),
      ),
    );
  return row?.n ?? 0;
}
