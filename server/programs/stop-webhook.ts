import { and, eq, isNull } from 'drizzle-orm';
import { webhookDeliveries, webhooks } from '@/db/schema';
import type { WebhookIdInput } from '@/lib/contracts/programs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Nothing more is told there; what still waited is given up. */
export async function stopWebhook(
  ctx: PersonContext,
  { webhookId }: WebhookIdInput,
): Promise<null> {
  mustBeAllowed(ctx, 'programs:change');
  await ctx.db.transaction(async (tx) => {
    const [stopped] = await tx
      .update(webhooks)
      .set({ stoppedAt: ctx.now })
      .where(
        and(
          eq(webhooks.shopId, ctx.shop.id),
          eq(webhooks.id, webhookId),
          isNull(webhooks.stoppedAt),
        ),
      )
      .returning({ url: webhooks.url });
    if (!stopped) throw notFound('webhook');
    await tx
      .update(webhookDeliveries)
      .set({ state: 'given-up', lastAnswer: 'The webhook was stopped.' })
      .where(
        and(
          eq(webhookDeliveries.shopId, ctx.shop.id),
          eq(webhookDeliveries.webhookId, webhookId),
          eq(webhookDeliveries.state, 'waiting'),
        ),
      );
    await writeAudit(tx, ctx, {
      verb: 'stop-webhook',
      subjectKind: 'webhook',
      subjectId: webhookId,
      summary: `Tells ${new URL(stopped.url).host} nothing more`,
    });
  });
  return null;
}
