import { and, eq } from 'drizzle-orm';
import { customers } from '@/db/schema';
import type { SetLanguageInput } from '@/lib/contracts/messages';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** What is still to be told is written in it, too: messages are composed when they go. */
export async function setLanguage(ctx: PersonContext, input: SetLanguageInput): Promise<void> {
  mustBeAllowed(ctx, 'messages:send');
  const [customer] = await ctx.db
    .update(customers)
    .set({ language: input.language })
    .where(and(eq(customers.shopId, ctx.shop.id), eq(customers.id, input.customerId)))
    .returning({ id: customers.id });
  if (!customer) throw notFound('customer');
}
