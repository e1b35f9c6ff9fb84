import { and, asc, eq, isNull } from 'drizzle-orm';
import { customers, schedulerItems } from '@/db/schema';
import type { SchedulerItemView } from '@/lib/contracts/messages';
import { phoneWords } from '@/lib/messages/phone-number';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

const mostItems = 200;

/** The scheduler's list, the longest waiting first; of one customer or of all. */
export async function listItems(
  ctx: PersonContext,
  input: { customerId?: string | undefined } = {},
): Promise<SchedulerItemView[]> {
  mustBeAllowed(ctx, 'messages:read');
  const rows = await ctx.db
    .select({
      id: schedulerItems.id,
      kind: schedulerItems.kind,
      words: schedulerItems.words,
      at: schedulerItems.at,
      customerId: schedulerItems.customerId,
      customerName: customers.name,
      phone: customers.phone,
      jobId: schedulerItems.jobId,
    })
    .from(schedulerItems)
    .innerJoin(customers, eq(customers.id, schedulerItems.customerId))
    .where(
      and(
        eq(schedulerItems.shopId, ctx.shop.id),
        isNull(schedulerItems.doneAt),
        input.customerId ? eq(schedulerItems.customerId, input.customerId) : undefined,
      ),
    )
    .orderBy(asc(schedulerItems.at), asc(schedulerItems.id))
    .limit(mostItems);
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return rows.map(({ at, ...row }) => ({
    ...row,
    phone: phoneWords(row.phone, region),
    atWords: `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`,
  }));
}
