import { and, eq, isNotNull } from 'drizzle-orm';
import { visits } from '@/db/schema';
import { may } from '@/lib/permissions';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** Whether this person is still on the way to the shop's first confirmed visit. */
export async function isStarting(ctx: PersonContext): Promise<boolean> {
  mustBeAllowed(ctx, 'shop:read');
  if (!may(ctx.actor.role, 'shop:change')) return false;
  const [confirmed] = await ctx.db
    .select({ id: visits.id })
    .from(visits)
    .where(and(eq(visits.shopId, ctx.shop.id), isNotNull(visits.confirmedAt)))
    .limit(1);
  return confirmed === undefined;
}
