import { and, desc, eq } from 'drizzle-orm';
import { consents, customers, jobs, messages, people } from '@/db/schema';
import type { ThreadView } from '@/lib/contracts/messages';
import { phoneWords } from '@/lib/messages/phone-number';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { listItems } from './list-items';
import { messageFields, messageView } from './message-views';
import { readRecipient } from './recipient';

const mostMessages = 200;

/** One customer: what was said both ways, what they allow and how we know, their jobs, what is open. */
export async function getThread(
  ctx: PersonContext,
  { customerId }: { customerId: string },
): Promise<ThreadView> {
  mustBeAllowed(ctx, 'messages:read');
  const [customer] = await ctx.db
    .select({ id: customers.id })
    .from(customers)
    .where(and(eq(customers.shopId, ctx.shop.id), eq(customers.id, customerId)));
  if (!customer) throw notFound('customer');
  const recipient = await readRecipient(ctx.db, ctx.shop.id, customerId);
  const { name, phone, email, language, decision } = recipient;
  return {
    customerId,
    name,
    phone: phoneWords(phone, ctx.shop.region),
    email,
    language,
    channels: decision.channels,
    leftOut: decision.leftOut,
    consents: await readConsents(ctx, customerId),
    jobs: await readJobs(ctx, customerId),
    messages: await readMessages(ctx, customerId),
    items: await listItems(ctx, { customerId }),
  };
}

async function readConsents(ctx: PersonContext, customerId: string) {
  const rows = await ctx.db
    .select({
      id: consents.id,
      channel: consents.channel,
      given: consents.given,
      how: consents.how,
      proof: consents.proof,
      at: consents.at,
      by: people.name,
    })
    .from(consents)
    .leftJoin(people, eq(people.id, consents.byPersonId))
    .where(and(eq(consents.shopId, ctx.shop.id), eq(consents.customerId, customerId)))
    .orderBy(desc(consents.sequence));
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return rows.map(({ at, by, ...row }) => ({
    ...row,
    by: by ?? '',
    atWords: `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`,
  }));
}

function readJobs(ctx: PersonContext, customerId: string) {
  return ctx.db
    .select({ id: jobs.id, number: jobs.number, title: jobs.title })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.customerId, customerId)))
    .orderBy(desc(jobs.number));
}

/** The newest ones, as on a phone: the oldest above. */
async function readMessages(ctx: PersonContext, customerId: string) {
  const rows = await ctx.db
    .select({ ...messageFields, writtenBy: people.name })
    .from(messages)
    .innerJoin(customers, eq(customers.id, messages.customerId))
    .leftJoin(people, eq(people.id, messages.writtenBy))
    .where(and(eq(messages.shopId, ctx.shop.id), eq(messages.customerId, customerId)))
    .orderBy(desc(messages.dueAt), desc(messages.createdAt), desc(messages.id))
    .limit(mostMessages);
  return rows
    .toReversed()
    .map(({ writtenBy, ...row }) => ({ ...messageView(ctx, row), writtenBy: writtenBy ?? '' }));
}
