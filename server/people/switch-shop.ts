import { and, asc, eq, isNull } from 'drizzle-orm';
import { people, session, shops } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** The shops that this person works in, for the switch in the shell. */
export async function listMyShops(ctx: PersonContext) {
  return ctx.db
    .select({ id: shops.id, name: shops.name, role: people.role })
    .from(people)
    .innerJoin(shops, eq(shops.id, people.shopId))
    .where(and(eq(people.userId, ctx.actor.userId), isNull(people.leftAt)))
    .orderBy(asc(shops.name), asc(shops.id));
}

/** Every session of this person goes on in the other shop: a phone and a desk stay in step. */
export async function switchShop(ctx: PersonContext, input: { shopId: string }) {
  const mine = await listMyShops(ctx);
  if (!mine.some(({ id }) => id === input.shopId)) throw notFound('shop');
  await ctx.db
    .update(session)
    .set({ activeShopId: input.shopId })
    .where(eq(session.userId, ctx.actor.userId));
  return { shopId: input.shopId };
}
