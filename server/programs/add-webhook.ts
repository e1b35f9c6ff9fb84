import { webhooks } from '@/db/schema';
import type { AddedWebhook, AddWebhookInput } from '@/lib/contracts/programs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { refusedAddress } from './public-address';
import { webhookSecret } from './webhook-secret';

/** From now on, what is asked for is told to this address, signed. */
export async function addWebhook(
  ctx: PersonContext,
  input: AddWebhookInput,
): Promise<AddedWebhook> {
  mustBeAllowed(ctx, 'programs:change');
  const why = refusedAddress(input.url);
  if (why) {
    throw new Refusal({
      status: 422,
      code: 'address-not-public',
      message: `${why} Nothing was added.`,
      errors: { url: why },
    });
  }
  return ctx.db.transaction(async (tx) => {
    const [made] = await tx
      .insert(webhooks)
      .values({
        shopId: ctx.shop.id,
        url: input.url,
        events: input.events,
        madeBy: ctx.actor.personId,
      })
      .returning({ id: webhooks.id });
    if (!made) throw new Error('the webhook was not written');
    await writeAudit(tx, ctx, {
      verb: 'add-webhook',
      subjectKind: 'webhook',
      subjectId: made.id,
      summary: `Tells ${new URL(input.url).host} of ${input.events.join(', ')}`,
    });
    return { id: made.id, secret: webhookSecret(made.id) };
  });
}
