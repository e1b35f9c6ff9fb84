import { and, eq, isNull } from 'drizzle-orm';
import { schedulerItems } from '@/db/schema';
import type { TickOffInput } from '@/lib/contracts/messages';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Somebody has seen to it. Ticked off twice, the first stands. */
export async function tickOff(ctx: PersonContext, input: TickOffInput): Promise<void> {
  mustBeAllowed(ctx, 'messages:send');
  const isIt = and(eq(schedulerItems.shopId, ctx.shop.id), eq(schedulerItems.id, input.itemId));
  const [item] = await ctx.db.select({ id: schedulerItems.id }).from(schedulerItems).where(isIt);
  if (!item) throw notFound('line on the list');
  await ctx.db
    .update(schedulerItems)
    .set({ doneAt: ctx.now, doneBy: ctx.actor.name })
    .where(and(isIt, isNull(schedulerItems.doneAt)));
}
