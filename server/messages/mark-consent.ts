import { and, eq } from 'drizzle-orm';
import { customers } from '@/db/schema';
import type { MarkConsentInput } from '@/lib/contracts/messages';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { changeConsent } from './change-consent';

/** What a customer told somebody of the shop, by any reasonable means, with its proof; never changed, only added to. */
export async function markConsent(ctx: PersonContext, input: MarkConsentInput): Promise<void> {
  mustBeAllowed(ctx, 'messages:send');
  const { customerId, channel, given, way, proof } = input;
  await ctx.db.transaction(async (tx) => {
    const [customer] = await tx
      .select({ id: customers.id })
      .from(customers)
      .where(and(eq(customers.shopId, ctx.shop.id), eq(customers.id, customerId)))
      .for('update');
    if (!customer) throw notFound('customer');
    await changeConsent(tx, {
      shopId: ctx.shop.id,
      customerId,
      channel,
      given,
      how: given ? `agreed ${way}` : `said no ${way}`,
      proof,
      at: ctx.now,
      byPersonId: ctx.actor.personId,
    });
  });
}
