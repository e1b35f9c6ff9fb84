/** What the demo's customers were told before the newcomer came, what they answered, and what the office has to answer. */
import { and, asc, eq, ne } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { customers, jobs, messages, schedulerItems, shops, sites, visits } from '@/db/schema';
import type { SchedulerItemKind } from '@/lib/contracts/messages';
import { phoneWords } from '@/lib/messages/phone-number';
import { renderEmail, renderSms } from '@/lib/messages/render-message';
import { countSegments } from '@/lib/messages/segments';
import { visitInWords } from '@/lib/messages/visit-words';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatDay, formatWindow } from '@/lib/time/format-instant';
import type { SeedShop } from './seed-demo';

const dayMs = 86_400_000;
/** Which of the booked visits, by their order in time, asks something, and whose phone was off. */
const asksAt = 1;
const phoneOffAt = 3;

export async function seedMessages(tx: Transaction, shop: SeedShop): Promise<void> {
  const [from] = await tx
    .select({ name: shops.name, phone: shops.phone })
    .from(shops)
    .where(eq(shops.id, shop.id));
  if (!from) throw new Error('the demo has no shop');
  const told = await readVisits(tx, shop);
  for (const visit of told) await tx.insert(messages).values(bookedRows(shop, from, visit));
  const confirmed = told.filter(({ status }) => status === 'confirmed');
  for (const visit of confirmed) {
    await tx.insert(messages).values(replyRow(shop, visit, 'Yes', 'Confirmed by this text.'));
  }
  for (const visit of told) {
    const { customerSays, status, startsAt } = visit;
    if (customerSays)
      await putItem(tx, shop, visit, { kind: 'asks-other-time', words: customerSays });
    if (status === 'missed' && startsAt.getTime() > shop.now.getTime() - 5 * dayMs) {
      await putItem(tx, shop, visit, { kind: 'nobody-home', words: 'nobody was home' });
    }
  }
  const silent = told.filter(({ status, customerSays }) => status === 'booked' && !customerSays);
  const asking = silent[asksAt];
  if (asking) {
    const body = 'Can the crew take their shoes off? We have a new rug';
    const reason = 'Read it: it is not clear what is meant.';
    await tx.insert(messages).values(replyRow(shop, asking, body, reason));
    await putItem(tx, shop, asking, { kind: 'unclear-reply', words: `${reason} “${body}”` });
  }
  const off = silent[phoneOffAt];
  if (off) await notDelivered(tx, shop, off);
}

async function readVisits(tx: Transaction, shop: SeedShop) {
  return tx
    .select({
      id: visits.id,
      jobId: visits.jobId,
      kind: visits.kind,
      status: visits.status,
      startsAt: visits.startsAt,
      windowEndsAt: visits.windowEndsAt,
      confirmedAt: visits.confirmedAt,
      customerSays: visits.customerSays,
      customerId: customers.id,
      customer: customers.name,
      phone: customers.phone,
      email: customers.email,
      language: customers.language,
      street: sites.street,
      town: sites.town,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(visits.shopId, shop.id), ne(visits.status, 'called-off')))
    .orderBy(asc(visits.startsAt), asc(customers.name));
}
type Told = Awaited<ReturnType<typeof readVisits>>[number];

/** Told by text and by e-mail a week before, or a day ago. */
function toldAt(shop: SeedShop, { startsAt }: Told): Date {
  return new Date(Math.min(startsAt.getTime() - 7 * dayMs, shop.now.getTime() - dayMs));
}

function bookedRows(shop: SeedShop, from: { name: string; phone: string }, visit: Told) {
  const { language } = visit;
  const locale = { language, region: 'US' } as const;
  const values = {
    shop: from.name,
    shopPhone: phoneWords(from.phone, 'US'),
    customer: visit.customer,
    visit: visitInWords(visit.kind, locale),
    day: formatDay(visit.startsAt, shop.zone, locale),
    window: formatWindow({ from: visit.startsAt, until: visit.windowEndsAt }, shop.zone, locale),
    address: `${visit.street}, ${visit.town}`,
    crew: from.name,
    // The token is known to the signing secret alone.
    link: '(link)',
  };
  const at = toldAt(shop, visit);
  const input = { occasion: 'booked', language, values } as const;
  const sms = renderSms(input).value ?? '';
  const common = {
    shopId: shop.id,
    customerId: visit.customerId,
    jobId: visit.jobId,
    visitId: visit.id,
    occasion: 'booked',
    attempts: 1,
    dueAt: at,
    sentAt: at,
    createdAt: at,
  };
  return [
    {
      ...common,
      channel: 'sms' as const,
      key: `${visit.id}:1:booked:sms`,
      state: 'delivered' as const,
      deliveredAt: at,
      toAddress: visit.phone,
      body: sms,
      segments: countSegments(sms).segments,
    },
    {
      ...common,
      channel: 'email' as const,
      key: `${visit.id}:1:booked:email`,
      state: 'sent' as const,
      toAddress: visit.email,
      body: renderEmail(input).value?.text ?? '',
    },
  ];
}

function replyRow(shop: SeedShop, visit: Told, body: string, reason: string) {
  const at = visit.confirmedAt ?? new Date(shop.now.getTime() - dayMs / 4);
  const heardAt = at < shop.now ? at : new Date(shop.now.getTime() - dayMs / 2);
  return {
    shopId: shop.id,
    customerId: visit.customerId,
    jobId: visit.jobId,
    visitId: visit.id,
    occasion: 'reply',
    channel: 'sms' as const,
    key: `in:demo-${visit.id}`,
    state: 'received' as const,
    dueAt: heardAt,
    createdAt: heardAt,
    body,
    reason,
  };
}

async function notDelivered(tx: Transaction, shop: SeedShop, visit: Told): Promise<void> {
  const why = 'The phone is off or out of reach.';
  await tx
    .update(messages)
    .set({ state: 'refused', deliveredAt: null, reason: `Not delivered: call them. ${why}` })
    .where(and(eq(messages.shopId, shop.id), eq(messages.key, `${visit.id}:1:booked:sms`)));
  const words = `the text was not delivered. ${why} The other way went out.`;
  await putItem(tx, shop, visit, { kind: 'not-delivered', words });
}

async function putItem(
  tx: Transaction,
  shop: SeedShop,
  visit: Told,
  { kind, words }: { kind: SchedulerItemKind; words: string },
): Promise<void> {
  await tx.insert(schedulerItems).values({
    shopId: shop.id,
    customerId: visit.customerId,
    jobId: visit.jobId,
    visitId: visit.id,
    kind,
    key: `demo:${kind}:${visit.id}`,
    words: `${visitKindWords[visit.kind]}: ${words}`,
    at: new Date(shop.now.getTime() - dayMs / 8),
  });
}
