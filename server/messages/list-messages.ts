import { and, desc, eq } from 'drizzle-orm';
import { customers, messages } from '@/db/schema';
import type { ListMessagesInput, MessageView } from '@/lib/contracts/messages';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

const mostRows = 300;

/** What customers were told, will be told and wrote, the latest first; of one job or of all. */
export async function listMessages(
  ctx: PersonContext,
  input: ListMessagesInput,
): Promise<MessageView[]> {
  mustBeAllowed(ctx, 'messages:read');
  const rows = await ctx.db
    .select({
      id: messages.id,
      jobId: messages.jobId,
      customerName: customers.name,
      occasion: messages.occasion,
      channel: messages.channel,
      state: messages.state,
      reason: messages.reason,
      body: messages.body,
      dueAt: messages.dueAt,
      sentAt: messages.sentAt,
    })
    .from(messages)
    .innerJoin(customers, eq(customers.id, messages.customerId))
    .where(
      and(
        eq(messages.shopId, ctx.shop.id),
        input.jobId ? eq(messages.jobId, input.jobId) : undefined,
      ),
    )
    .orderBy(desc(messages.createdAt), desc(messages.dueAt), desc(messages.id))
    .limit(mostRows);
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return rows.map(({ dueAt, sentAt, ...row }) => {
    const at = sentAt ?? dueAt;
    const dueAtWords = `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`;
    return { ...row, dueAtWords };
  });
}
