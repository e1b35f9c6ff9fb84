import { and, eq, inArray, sql } from 'drizzle-orm';
import { people, session, shops } from '@/db/schema';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Takes the sample away whole, with all that was done in it; one's own shop is not touched. */
export async function removeSample(ctx: PersonContext): Promise<null> {
  mustBeAllowed(ctx, 'shop:change');
  await ctx.db.transaction(async (tx) => {
    const samples = await tx
      .select({ id: shops.id })
      .from(shops)
      .innerJoin(people, eq(people.shopId, shops.id))
      .where(
        and(
          eq(shops.isSample, true),
          eq(people.userId, ctx.actor.userId),
          eq(people.role, 'owner'),
        ),
      );
    const shopIds = samples.map(({ id }) => id);
    if (shopIds.length === 0) throw notFound('sample');
    await tx
      .update(session)
      .set({ activeShopId: null })
      .where(and(eq(session.userId, ctx.actor.userId), inArray(session.activeShopId, shopIds)));
    await tx.execute(sql`select set_config('setwell.erasing', 'sample', true)`);
    await tx.delete(shops).where(and(inArray(shops.id, shopIds), eq(shops.isSample, true)));
    await tx.execute(sql`select set_config('setwell.erasing', '', true)`);
  });
  return null;
}
