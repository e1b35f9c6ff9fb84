import { and, asc, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm';
import { audit, crews, invitations, jobs, people, shops, visits } from '@/db/schema';
import type { StartView } from '@/lib/contracts/start';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { visitLinkAddress } from '@/server/visits/visit-link';

/** What a new shop has done and has still to do, read from what is there. */
export async function getStart(ctx: PersonContext): Promise<StartView> {
  mustBeAllowed(ctx, 'shop:change');
  const { db, shop, actor } = ctx;
  const has = async (query: Promise<{ n: number }[]>, more = 0) =>
    ((await query)[0]?.n ?? 0) > more;
  const n = sql<number>`count(*)::int`;
  const [sample] = await db
    .select({ id: shops.id })
    .from(shops)
    .innerJoin(people, eq(people.shopId, shops.id))
    .where(and(eq(shops.isSample, true), eq(people.userId, actor.userId), isNull(people.leftAt)));
  const isInvited = await has(
    db.select({ n }).from(invitations).where(eq(invitations.shopId, shop.id)),
  );
  const isNotAlone = await has(db.select({ n }).from(people).where(eq(people.shopId, shop.id)), 1);
  return {
    done: {
      hours: await has(
        db
          .select({ n })
          .from(audit)
          .where(and(eq(audit.shopId, shop.id), eq(audit.verb, 'change-shop-rules'))),
      ),
      crew: await has(db.select({ n }).from(crews).where(eq(crews.shopId, shop.id))),
      people: isInvited || isNotAlone,
      job: await has(db.select({ n }).from(jobs).where(eq(jobs.shopId, shop.id))),
      visit: await has(db.select({ n }).from(visits).where(eq(visits.shopId, shop.id))),
      yes: await has(
        db
          .select({ n })
          .from(visits)
          .where(and(eq(visits.shopId, shop.id), isNotNull(visits.confirmedAt))),
      ),
    },
    customerPage: await firstCustomerPage(ctx),
    isSample: shop.isSample ?? false,
    sampleShopId: sample?.id ?? null,
  };
}

async function firstCustomerPage(ctx: PersonContext): Promise<string | null> {
  const [visit] = await ctx.db
    .select({ id: visits.id })
    .from(visits)
    .where(and(eq(visits.shopId, ctx.shop.id), inArray(visits.status, ['booked'])))
    .orderBy(asc(visits.createdAt))
    .limit(1);
  return visit ? visitLinkAddress(ctx.db, ctx, visit.id) : null;
}
