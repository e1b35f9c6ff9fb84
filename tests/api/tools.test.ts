import { beforeAll, describe, expect, it } from 'vitest';
import { PATCH as changeRoute } from '@/app/api/tools/[toolId]/route';
import { POST as addRoute, GET as listRoute } from '@/app/api/tools/route';
import type { Tool } from '@/lib/contracts/wall-book';
import { callRoute } from '../help/call-route';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';

const fineTape = { kind: 'tape', accuracyClass: 'I', stepMm: 0.5, repeatabilityMm: 0.2 };

describe('the shop’s measuring tools', () => {
  let shop: TestShop;
  let owner: string;
  beforeAll(async () => {
    shop = await makeShop();
    owner = await cookieOf(shop.people.owner);
  });
  const list = async (cookie = owner) =>
    (await callRoute(listRoute, { method: 'GET', cookie })).body as Tool[];
  const add = (body: unknown, cookie = owner) => callRoute(addRoute, { body, cookie });
  const change = (toolId: string, body: unknown, cookie = owner) =>
    callRoute(changeRoute, { method: 'PATCH', params: { toolId }, body, cookie });

  it('gain one, which is then as sure as its maker’s sheet says', async () => {
    const added = await add({ name: 'Tape, class I', spec: fineTape });
    expect(added.status).toBe(200);
    const { id } = added.body as { id: string };
    const coarser = { ...fineTape, repeatabilityMm: 0.5 };
    expect((await change(id, { name: 'Old tape', spec: coarser })).status).toBe(200);
    expect((await list()).find((tool) => tool.id === id)).toEqual({
      id,
      name: 'Old tape',
      spec: coarser,
    });
  });

  it('do not turn into another kind, since readings hang on them, nor lose their names', async () => {
    const { body } = await add({ name: 'Tape, class I', spec: fineTape });
    const { id } = body as { id: string };
    const laser = { kind: 'laser', mpeMm: 1.5, stepMm: 1, repeatabilityMm: 0.3 };
    expect(await change(id, { name: 'Laser', spec: laser })).toMatchObject({
      status: 422,
      body: { code: 'another-kind-of-tool' },
    });
    expect(await change(id, { name: ' ', spec: fineTape })).toMatchObject({
      status: 422,
      body: { errors: { name: expect.any(String) } },
    });
    expect((await list()).find((tool) => tool.id === id)?.spec).toEqual(fineTape);
  });

  it('are the owner’s to change, and no other shop’s', async () => {
    const { body } = await add({ name: 'Tape, class I', spec: fineTape });
    const { id } = body as { id: string };
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      const cookie = await cookieOf(shop.people[role]);
      expect((await add({ name: 'Mine', spec: fineTape }, cookie)).status).toBe(403);
      expect((await change(id, { name: 'Mine', spec: fineTape }, cookie)).status).toBe(403);
      expect((await list(cookie)).map((tool) => tool.id)).toContain(id);
    }
    const other = await cookieOf((await makeShop()).people.owner);
    expect((await change(id, { name: 'Mine', spec: fineTape }, other)).status).toBe(404);
    expect((await list(other)).map((tool) => tool.id)).not.toContain(id);
    expect((await callRoute(listRoute, { method: 'GET' })).status).toBe(401);
  });
});
