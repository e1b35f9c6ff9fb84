import { and, asc, eq, isNull } from 'drizzle-orm';
import { calendarFeeds } from '@/db/schema';
import type { FeedView } from '@/lib/contracts/feeds';
import { may } from '@/lib/permissions';
import { formatDayAndTime, formatDayShort } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { feedAddress } from './feed-token';

/** The calendar addresses in use: all of them for the office, those one made oneself for others. */
export async function listFeeds(ctx: PersonContext): Promise<FeedView[]> {
  mustBeAllowed(ctx, 'visits:read');
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const rows = await ctx.db
    .select()
    .from(calendarFeeds)
    .where(
      and(
        eq(calendarFeeds.shopId, ctx.shop.id),
        isNull(calendarFeeds.revokedAt),
        may(ctx.actor.role, 'crews:change')
          ? undefined
          : eq(calendarFeeds.madeBy, ctx.actor.personId),
      ),
    )
    .orderBy(asc(calendarFeeds.createdAt), asc(calendarFeeds.id));
  return rows.map(({ id, crewId, personId, createdAt, lastReadAt }) => ({
    id,
    crewId,
    personId,
    address: feedAddress(id),
    madeWords: formatDayShort(createdAt, zone, locale),
    readWords: lastReadAt ? formatDayAndTime(lastReadAt, zone, locale) : '',
  }));
}
