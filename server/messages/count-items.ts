import { and, eq, isNull } from 'drizzle-orm';
import { schedulerItems } from '@/db/schema';
import type { ToAnswerView } from '@/lib/contracts/messages';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** How much waits on the scheduler's list: told beside the page's name wherever they are. */
export async function countItems(ctx: PersonContext): Promise<ToAnswerView> {
  mustBeAllowed(ctx, 'messages:read');
  const toAnswer = await ctx.db.$count(
    schedulerItems,
    and(eq(schedulerItems.shopId, ctx.shop.id), isNull(schedulerItems.doneAt)),
  );
  return { toAnswer };
}
