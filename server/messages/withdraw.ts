import { and, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { Occasion } from '@/lib/messages/occasions';
import type { Context } from '@/server/base/context';

/**
 * Takes back what still waits about a visit (all of it, or some occasions), in the transaction of its
 * cause, and says what that was.
 */
export async function withdrawWaiting(
  tx: Transaction,
  ctx: Context,
  of: { visitId: string; occasions?: Occasion[]; reason: string },
) {
  return tx
    .update(messages)
    .set({ state: 'withdrawn', reason: of.reason })
    .where(
      and(
        eq(messages.shopId, ctx.shop.id),
        eq(messages.visitId, of.visitId),
        eq(messages.state, 'waiting'),
        of.occasions ? inArray(messages.occasion, of.occasions) : undefined,
      ),
    )
    .returning({
      occasion: messages.occasion,
      channel: messages.channel,
      cause: messages.cause,
    });
}
