import { and, eq, lte } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/database';
import { visits } from '@/db/schema';
import type { Context } from '@/server/base/context';

/** Lets go the shop's holds whose time is over, so that none stands in the way of what is written next. */
export async function lapseHolds(tx: Transaction, ctx: Context): Promise<void> {
  await tx
    .delete(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.status, 'held'),
        lte(visits.holdEndsAt, ctx.now),
      ),
    );
}

/** The same for all shops, by the worker; the screens hear of each through the database. */
export async function lapseAllHolds(db: Database, now: Date): Promise<void> {
  await db.delete(visits).where(and(eq(visits.status, 'held'), lte(visits.holdEndsAt, now)));
}
