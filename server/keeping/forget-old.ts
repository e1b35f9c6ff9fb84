import { and, eq, isNull, notExists, notInArray, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { audit, customers, jobs, shops, visits } from '@/db/schema';
import { forgetCustomer } from './forget-customer';
import { removeBytes } from './remove-bytes';

/** So many at a time: the embedded database answers nobody else meanwhile. */
const atOnce = 20;

/** Forgets customers as each shop's rule has it; gives how many. A shop without a rule forgets nobody by itself. */
export async function forgetOld(db: Database, now: Date): Promise<number> {
  const asking = await db.select({ id: shops.id, rules: shops.rules }).from(shops);
  let forgotten = 0;
  for (const { id: shopId, rules } of asking) {
    const years = rules.keeping?.customerYears;
    if (!years) continue;
    const before = new Date(now);
    before.setUTCFullYear(now.getUTCFullYear() - years);
    for (const customerId of await readOld(db, shopId, before)) {
      await forgetOne(db, { shopId, customerId, now });
      forgotten += 1;
    }
  }
  return forgotten;
}

/** Customers with nothing open and nothing that happened since. */
async function readOld(db: Database, shopId: string, before: Date): Promise<string[]> {
  const ofCustomer = and(eq(jobs.shopId, customers.shopId), eq(jobs.customerId, customers.id));
  const openJob = db
    .select({ one: sql`1` })
    .from(jobs)
    .where(and(ofCustomer, notInArray(jobs.stage, ['signed-off', 'called-off'])));
  const laterVisit = db
    .select({ one: sql`1` })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .where(and(ofCustomer, sql`${visits.endsAt} >= ${before.toISOString()}`));
  const rows = await db
    .select({ id: customers.id })
    .from(customers)
    .where(
      and(
        eq(customers.shopId, shopId),
        isNull(customers.erasedAt),
        sql`${customers.createdAt} < ${before.toISOString()}`,
        notExists(openJob),
        notExists(laterVisit),
      ),
    )
    .limit(atOnce);
  return rows.map(({ id }) => id);
}

async function forgetOne(
  db: Database,
  of: { shopId: string; customerId: string; now: Date },
): Promise<void> {
  const { storageKeys } = await db.transaction(async (tx) => {
    const forgotten = await forgetCustomer(tx, of);
    await tx.insert(audit).values({
      shopId: of.shopId,
      at: of.now,
      actorKind: 'system',
      actorName: 'Setwell',
      verb: 'erase-customer',
      subjectKind: 'customer',
      subjectId: of.customerId,
      jobId: forgotten.jobIds[0] ?? null,
      summary: 'This customer was forgotten by the shop’s rule; sizes and times stay',
    });
    return forgotten;
  });
  await removeBytes(storageKeys);
}
