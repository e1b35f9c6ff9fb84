import { and, eq, gt, isNull } from 'drizzle-orm';
import { customers, jobs, visitLinks, visits } from '@/db/schema';
import type { CustomerContext } from '@/server/base/context';
import { database } from '@/server/base/database';
import { countTry } from '@/server/base/limits';
import { hashToken } from '@/server/base/secret';
import { shopContext } from '@/server/base/shop-context';

/** Per address; a customer opens the page a few times, who guesses tokens does not. */
const limit = { most: 240, windowSeconds: 600 };

/**
 * Who holds a link, which is good for one visit and no more; null for a guess, a link that has ended and
 * one that was revoked alike. Throws past the limit of tries.
 */
export async function customerContext(
  token: string,
  from: string,
): Promise<CustomerContext | null> {
  const { db } = await database();
  const now = new Date();
  await countTry(db, `visit-link:${from}`, limit, now);
  const [link] = await db
    .select({
      shopId: visitLinks.shopId,
      visitId: visitLinks.visitId,
      customerId: customers.id,
      name: customers.name,
    })
    .from(visitLinks)
    .innerJoin(visits, eq(visits.id, visitLinks.visitId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(visitLinks.tokenHash, hashToken(token)),
        isNull(visitLinks.revokedAt),
        gt(visitLinks.endsAt, now),
      ),
    );
  if (!link) return null;
  const { shopId, ...customer } = link;
  return shopContext(db, { shopId, actor: { kind: 'customer', ...customer }, now });
}
