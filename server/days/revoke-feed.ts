import { and, eq, isNull } from 'drizzle-orm';
import { calendarFeeds } from '@/db/schema';
import type { RevokeFeedInput } from '@/lib/contracts/feeds';
import { may } from '@/lib/permissions';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** From now on the address answers as if it had never been. */
export async function revokeFeed(ctx: PersonContext, { feedId }: RevokeFeedInput) {
  mustBeAllowed(ctx, 'visits:read');
  return ctx.db.transaction(async (tx) => {
    const [revoked] = await tx
      .update(calendarFeeds)
      .set({ revokedAt: ctx.now })
      .where(
        and(
          eq(calendarFeeds.shopId, ctx.shop.id),
          eq(calendarFeeds.id, feedId),
          isNull(calendarFeeds.revokedAt),
          may(ctx.actor.role, 'crews:change')
            ? undefined
            : eq(calendarFeeds.madeBy, ctx.actor.personId),
        ),
      )
      .returning({ crewId: calendarFeeds.crewId, personId: calendarFeeds.personId });
    if (!revoked) throw notFound('calendar address');
    await writeAudit(tx, ctx, {
      verb: 'revoke-feed',
      subjectKind: revoked.crewId ? 'crew' : 'person',
      subjectId: revoked.crewId ?? revoked.personId ?? feedId,
      summary: 'Calendar address taken back',
    });
    return { feedId };
  });
}
