import { and, asc, desc, eq, gte, isNull, sql } from 'drizzle-orm';
import { apiTokens, people, webhookDeliveries, webhooks } from '@/db/schema';
import type { KeyView, ProgramsView, WebhookView } from '@/lib/contracts/programs';
import { formatDayShort } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

const shownMs = 30 * 86_400_000;

/** The keys that open the door, and where what is told. */
export async function listPrograms(ctx: PersonContext): Promise<ProgramsView> {
  mustBeAllowed(ctx, 'programs:change');
  return { keys: await readKeys(ctx), webhooks: await readWebhooks(ctx) };
}

async function readKeys(ctx: PersonContext): Promise<KeyView[]> {
  const rows = await ctx.db
    .select({
      id: apiTokens.id,
      name: apiTokens.name,
      scopes: apiTokens.scopes,
      madeByName: people.name,
      createdAt: apiTokens.createdAt,
      lastUsedAt: apiTokens.lastUsedAt,
    })
    .from(apiTokens)
    .innerJoin(people, eq(people.id, apiTokens.madeBy))
    .where(and(eq(apiTokens.shopId, ctx.shop.id), isNull(apiTokens.revokedAt)))
    .orderBy(desc(apiTokens.createdAt));
  const { zone, region } = ctx.shop;
  const dayOf = (at: Date) => formatDayShort(at, zone, { language: 'en', region });
  return rows.map(({ createdAt, lastUsedAt, ...row }) => ({
    ...row,
    madeAtWords: dayOf(createdAt),
    lastUsedWords: lastUsedAt ? dayOf(lastUsedAt) : null,
  }));
}

async function readWebhooks(ctx: PersonContext): Promise<WebhookView[]> {
  const counted = (state: 'taken' | 'waiting' | 'given-up') =>
    sql<number>`count(*) filter (where ${webhookDeliveries.state} = ${state})::int`;
  return ctx.db
    .select({
      id: webhooks.id,
      url: webhooks.url,
      events: webhooks.events,
      taken: counted('taken'),
      waiting: counted('waiting'),
      givenUp: counted('given-up'),
      lastAnswer: sql<string>`coalesce((array_agg(${webhookDeliveries.lastAnswer} order by ${webhookDeliveries.createdAt} desc)
        filter (where ${webhookDeliveries.lastAnswer} <> ''))[1], '')`,
    })
    .from(webhooks)
    .leftJoin(
      webhookDeliveries,
      and(
        eq(webhookDeliveries.webhookId, webhooks.id),
        gte(webhookDeliveries.createdAt, new Date(ctx.now.getTime() - shownMs)),
      ),
    )
    .where(and(eq(webhooks.shopId, ctx.shop.id), isNull(webhooks.stoppedAt)))
    .groupBy(webhooks.id)
    .orderBy(asc(webhooks.createdAt));
}
