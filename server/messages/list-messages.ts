import { and, desc, eq } from 'drizzle-orm';
import { customers, messages } from '@/db/schema';
import type { ListMessagesInput, MessageView } from '@/lib/contracts/messages';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { messageFields, messageView } from './message-views';

const mostRows = 300;

/** What customers were told, will be told and wrote, the latest first; of one job or of all. */
export async function listMessages(
  ctx: PersonContext,
  input: ListMessagesInput,
): Promise<MessageView[]> {
  mustBeAllowed(ctx, 'messages:read');
  const rows = await ctx.db
    .select(messageFields)
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
  return rows.map((row) => messageView(ctx, row));
}
