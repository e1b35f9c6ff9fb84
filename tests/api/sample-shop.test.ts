import { getTableName, isTable, sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { DELETE as removeRoute, POST as startRoute } from '@/app/api/shops/sample/route';
import * as schema from '@/db/schema';
import { database } from '@/server/base/database';
import { getStart } from '@/server/numbers/get-start';
import { listMyShops } from '@/server/people/switch-shop';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('a sample shop beside one’s own', () => {
  let shop: TestShop;
  let owner: string;
  beforeAll(async () => {
    shop = await makeShop({ region: 'UK', zone: 'Europe/London' });
    owner = await cookieOf(shop.people.owner);
    await startTestJob(shop);
  });

  async function rowsOf(shopId: string): Promise<Record<string, number>> {
    const { db } = await database();
    const counted: Record<string, number> = {};
    for (const table of Object.values(schema)) {
      if (!isTable(table) || !('shopId' in table)) continue;
      const name = getTableName(table);
      const { rows } = (await db.execute(
        sql`select count(*)::int as n from ${sql.identifier(name)} where shop_id = ${shopId}`,
      )) as unknown as { rows: { n: number }[] };
      if (rows[0]?.n) counted[name] = rows[0].n;
    }
    return counted;
  }

  it('is made with jobs at every stage, and removed with every row of it, while one’s own stays', async () => {
    const before = await rowsOf(shop.shop.id);
    const made = await callRoute(startRoute, { cookie: owner });
    expect(made.status).toBe(200);
    const { shopId } = made.body as { shopId: string };
    const sample = await rowsOf(shopId);
    expect(sample.jobs).toBeGreaterThan(30);
    expect(sample.releases).toBeGreaterThan(2);
    expect((await callRoute(startRoute, { cookie: owner })).status).toBe(409);
    const ctx = await contextOf(shop, 'owner');
    expect((await listMyShops(ctx)).map(({ id }) => id)).toContain(shopId);
    expect((await getStart(ctx)).sampleShopId).toBe(shopId);

    const stranger = await cookieOf((await makeShop()).people.owner);
    expect((await callRoute(removeRoute, { method: 'DELETE', cookie: stranger })).status).toBe(404);
    expect((await getStart(ctx)).sampleShopId).toBe(shopId);
    const removed = await callRoute(removeRoute, { method: 'DELETE', cookie: owner });
    expect(removed.status).toBe(200);
    expect(await rowsOf(shopId)).toEqual({});
    const { audit: _told, ...stayed } = await rowsOf(shop.shop.id);
    const { audit: _before, ...own } = before;
    expect(stayed).toEqual(own);
    const again = await callRoute(removeRoute, { method: 'DELETE', cookie: owner });
    expect(again.status).toBe(404);
  }, 90_000);

  it('is the owner’s alone to make and to remove', async () => {
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      const cookie = await cookieOf(shop.people[role]);
      expect((await callRoute(startRoute, { cookie })).status).toBe(403);
      expect((await callRoute(removeRoute, { method: 'DELETE', cookie })).status).toBe(403);
    }
  });

  it('shows a new shop what comes first', async () => {
    const fresh = await makeShop();
    expect((await getStart(await contextOf(fresh, 'owner'))).done).toMatchObject({
      hours: false,
      crew: false,
      job: false,
      visit: false,
      yes: false,
    });
    await startTestJob(fresh);
    expect((await getStart(await contextOf(fresh, 'owner'))).done.job).toBe(true);
  });
});
