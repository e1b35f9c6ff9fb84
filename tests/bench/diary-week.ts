/** The diary's week over 100,000 visits, as the program asks it and as the bare query, in one process. */
import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { openInMemory } from '@/db/open-embedded';
import { crews, customers, jobs, shops, sites, visitPieces, visits } from '@/db/schema';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import type { PersonContext } from '@/server/base/context';
import { listVisits } from '@/server/visits/list-visits';

const visitCount = 100_000;
const crewCount = 20;
const firstDay = Date.UTC(2024, 0, 1, 13);

const open = await openInMemory();
const { db } = open;
const shop = {
  id: randomUUID(),
  name: 'Bench',
  phone: '',
  email: '',
  region: 'US' as const,
  zone: 'America/New_York',
  rules: defaultShopRules('US'),
};
await db.insert(shops).values(shop);
const shopId = shop.id;
const [customer] = await db.insert(customers).values({ shopId, name: 'Customer' }).returning();
if (!customer) throw new Error('no customer');
const [site] = await db
  .insert(sites)
  .values({ shopId, customerId: customer.id, street: '1 Street', zone: shop.zone })
  .returning();
if (!site) throw new Error('no site');
const [job] = await db
  .insert(jobs)
  .values({ shopId, number: 1, title: 'Job', customerId: customer.id, siteId: site.id })
  .returning();
if (!job) throw new Error('no job');
const crewIds = Array.from({ length: crewCount }, () => randomUUID());
await db.insert(crews).values(
  crewIds.map((id, index) => ({
    id,
    shopId,
    name: `Crew ${index}`,
    does: 'fit' as const,
    colour: '1' as const,
  })),
);

for (let start = 0; start < visitCount; start += 2000) {
  const rows = Array.from({ length: 2000 }, (_, index) => {
    const number = start + index;
    const slot = Math.floor(number / crewCount);
    const startsAt = new Date(
      firstDay + Math.floor(slot / 4) * 86_400_000 + (slot % 4) * 7_200_000,
    );
    const endsAt = new Date(startsAt.getTime() + 5_400_000);
    return {
      id: randomUUID(),
      shopId,
      jobId: job.id,
      kind: 'install' as const,
      crewId: crewIds[number % crewCount] ?? '',
      startsAt,
      endsAt,
      windowStartsAt: startsAt,
      windowEndsAt: endsAt,
      workMinutes: 90,
    };
  });
  await db.insert(visits).values(rows);
  await db.insert(visitPieces).values(
    rows.map(({ id, crewId, startsAt, endsAt }) => ({
      shopId,
      visitId: id,
      crewId,
      startsAt,
      endsAt,
    })),
  );
}
await db.execute(sql`analyze`);

const ctx: PersonContext = {
  shop,
  actor: { kind: 'person', personId: randomUUID(), userId: 'bench', name: 'Bench', role: 'owner' },
  db,
  now: new Date('2026-12-01T15:00:00Z'),
  log: () => {},
};
const week = { from: '2026-11-30', to: '2026-12-07' };
const found = await listVisits(ctx, week);
console.table({
  [`listVisits, ${found.length} visits of ${visitCount}`]: await times(() => listVisits(ctx, week)),
  'the bare query': await times(() =>
    db.execute(sql`select v.*, j.title, c.name, s.street from visits v
      join jobs j on j.id = v.job_id join customers c on c.id = j.customer_id join sites s on s.id = j.site_id
      where v.shop_id = ${shopId} and v.starts_at < '2026-12-07T05:00Z' and v.ends_at > '2026-11-30T05:00Z'
      order by v.starts_at`),
  ),
});
await open.close();

async function times(run: () => Promise<unknown>) {
  const ms: number[] = [];
  for (let tries = 0; tries < 40; tries += 1) {
    const began = performance.now();
    await run();
    ms.push(performance.now() - began);
  }
  ms.sort((a, b) => a - b);
  const at = (share: number) => `${ms[Math.floor(ms.length * share)]?.toFixed(1)} ms`;
  return { median: at(0.5), p95: at(0.95) };
}
