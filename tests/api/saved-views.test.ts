import { beforeAll, describe, expect, it } from 'vitest';
import { DELETE as forgetRoute } from '@/app/api/views/[viewId]/route';
import { GET as listRoute, POST as saveRoute } from '@/app/api/views/route';
import type { SavedView } from '@/lib/contracts/saved-views';
import { callRoute } from '../help/call-route';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';

describe('views of a table under names of one’s own', () => {
  let shop: TestShop;
  let scheduler: string;
  beforeAll(async () => {
    shop = await makeShop();
    scheduler = await cookieOf(shop.people.scheduler);
  });
  const view = { order: null, typed: 'alder', choices: { stage: 'Ready' } };
  const save = (name: string, typed = 'alder', cookie = scheduler) =>
    callRoute(saveRoute, { body: { table: 'jobs', name, view: { ...view, typed } }, cookie });
  const list = async (cookie = scheduler) =>
    (await callRoute(listRoute, { method: 'GET', url: '/api/views?table=jobs', cookie }))
      .body as SavedView[];

  it('come back by name, and are replaced under the same one', async () => {
    expect((await save('Ready to go')).status).toBe(200);
    expect((await save('Ready to go', 'stonebeck')).status).toBe(200);
    expect(await list()).toMatchObject([
      { name: 'Ready to go', view: { ...view, typed: 'stonebeck' } },
    ]);
  });

  it('are nobody else’s, in the shop or outside it', async () => {
    const owner = await cookieOf(shop.people.owner);
    const other = await cookieOf((await makeShop()).people.owner);
    const [kept] = await list();
    const params = { viewId: kept?.id ?? '' };
    for (const cookie of [owner, other]) {
      expect(await list(cookie)).toEqual([]);
      expect((await callRoute(forgetRoute, { method: 'DELETE', params, cookie })).status).toBe(404);
    }
    const forget = { method: 'DELETE', params, cookie: scheduler } as const;
    expect((await callRoute(forgetRoute, forget)).status).toBe(200);
    expect(await list()).toEqual([]);
    expect(
      (await callRoute(listRoute, { method: 'GET', url: '/api/views?table=jobs' })).status,
    ).toBe(401);
  });
});
