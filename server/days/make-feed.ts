import { randomUUID } from 'node:crypto';
import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { calendarFeeds, crews, people } from '@/db/schema';
import type { MakeFeedInput } from '@/lib/contracts/feeds';
import { may } from '@/lib/permissions';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, refused } from '@/server/base/problem-response';
import { hashToken } from '@/server/base/secret';
import { feedAddress, feedToken } from './feed-token';
import { isOfOwnCrew } from './own-crews';

/** An address at which a calendar reads a crew's or a person's visits: the office's to give, and one's own. */
export async function makeFeed(ctx: PersonContext, input: MakeFeedInput) {
  mustBeAllowed(ctx, 'visits:read');
  const { crewId = null, personId = null } = input;
  const feedId = randomUUID();
  await ctx.db.transaction(async (tx) => {
    const name = crewId ? await crewName(tx, ctx, crewId) : await personName(tx, ctx, personId);
    const isOwn = crewId ? await isOfOwnCrew(tx, ctx, crewId) : personId === ctx.actor.personId;
    if (!isOwn && !may(ctx.actor.role, 'crews:change')) throw refused();
    await tx.insert(calendarFeeds).values({
      shopId: ctx.shop.id,
      id: feedId,
      crewId,
      personId,
      tokenHash: hashToken(feedToken(feedId)),
      madeBy: ctx.actor.personId,
      createdAt: ctx.now,
    });
    await writeAudit(tx, ctx, {
      verb: 'make-feed',
      subjectKind: crewId ? 'crew' : 'person',
      subjectId: crewId ?? personId ?? feedId,
      summary: `Calendar address made for ${name}`,
    });
  });
  return { feedId, address: feedAddress(feedId) };
}

async function crewName(tx: Transaction, ctx: PersonContext, crewId: string): Promise<string> {
  const [found] = await tx
    .select({ name: crews.name })
    .from(crews)
    .where(and(eq(crews.shopId, ctx.shop.id), eq(crews.id, crewId)));
  if (!found) throw notFound('crew');
  return found.name;
}

async function personName(
  tx: Transaction,
  ctx: PersonContext,
  personId: string | null,
): Promise<string> {
  const [found] = await tx
    .select({ name: people.name })
    .from(people)
    .where(
      and(eq(people.shopId, ctx.shop.id), eq(people.id, personId ?? ''), isNull(people.leftAt)),
    );
  if (!found) throw notFound('person');
  return found.name;
}
