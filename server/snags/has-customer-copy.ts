import { and, eq } from 'drizzle-orm';
import { signOffs } from '@/db/schema';
import { openLink } from '@/server/visits/open-link';

/** Whether the customer's visit was signed for, so that the page offers the copy. */
export async function hasCustomerCopy(token: string, from: string): Promise<boolean> {
  const ctx = await openLink(token, from);
  if (!ctx) return false;
  const [signed] = await ctx.db
    .select({ id: signOffs.id })
    .from(signOffs)
    .where(and(eq(signOffs.shopId, ctx.shop.id), eq(signOffs.visitId, ctx.actor.visitId)))
    .limit(1);
  return signed !== undefined;
}
