import { eq } from 'drizzle-orm';
import { visitLinks } from '@/db/schema';
import { database } from '@/server/base/database';
import { visitLinkAddress } from '@/server/visits/visit-link';
import { contextOf, type TestShop } from './make-shop';

/** The token of a visit's link, as the customer gets it in a message. */
export async function tokenOfVisit(shop: TestShop, visitId: string): Promise<string> {
  const ctx = await contextOf(shop, 'owner');
  const address = await visitLinkAddress(ctx.db, ctx, visitId);
  const token = address?.split('/v/')[1];
  if (!token) throw new Error('the visit has no link');
  return token;
}

export async function changeLink(
  visitId: string,
  change: Partial<typeof visitLinks.$inferInsert>,
): Promise<void> {
  const { db } = await database();
  await db.update(visitLinks).set(change).where(eq(visitLinks.visitId, visitId));
}
