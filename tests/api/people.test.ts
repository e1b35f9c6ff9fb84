import { beforeAll, describe, expect, it } from 'vitest';
import { POST as inviteRoute } from '@/app/api/people/invitations/route';
import { POST as joinRoute } from '@/app/api/people/join/route';
import { GET as listPeopleRoute } from '@/app/api/people/route';
import { POST as switchRoute } from '@/app/api/people/switch-shop/route';
import { POST as createShopRoute } from '@/app/api/shops/route';
import { callRoute } from '../help/call-route';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';

describe('people and shops', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  beforeAll(async () => {
    shop = await makeShop({ name: 'First shop' });
    otherShop = await makeShop({ name: 'Second shop' });
  });

  const newShop = {
    shopName: 'Third shop',
    region: 'US',
    zone: 'America/New_York',
    unit: 'in',
    personName: 'Ada Third',
    email: 'ada@third.example',
    password: 'a-long-password',
  };

  it('starts a shop and signs its owner in at once', async () => {
    const answer = await callRoute(createShopRoute, { body: newShop });
    expect(answer.status).toBe(200);
    const cookie = answer.headers
      .getSetCookie()
      .map((text) => text.split(';')[0])
      .join('; ');
    const people = await callRoute(listPeopleRoute, { method: 'GET', cookie });
    expect(people.body).toMatchObject([{ name: 'Ada Third', role: 'owner' }]);
  });

  it('says which field is wrong and writes nothing', async () => {
    const answer = await callRoute(createShopRoute, {
      body: { ...newShop, email: 'fresh@third.example', zone: 'Atlantis/Centre' },
    });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ errors: { zone: 'Pick a zone from the list.' } });
    const again = await callRoute(createShopRoute, {
      body: { ...newShop, email: 'fresh@third.example' },
    });
    expect(again.status).toBe(200);
  });

  it('refuses a second shop on a taken e-mail', async () => {
    const answer = await callRoute(createShopRoute, {
      body: { ...newShop, email: shop.people.owner.email },
    });
    expect(answer.status).toBe(409);
  });

  it('asks a stranger to sign in', async () => {
    expect((await callRoute(listPeopleRoute, { method: 'GET' })).status).toBe(401);
  });

  it('refuses a write from a foreign page', async () => {
    const cookie = await cookieOf(shop.people.owner);
    const answer = await callRoute(inviteRoute, {
      cookie,
      headers: { origin: 'https://evil.example' },
      body: { email: 'new@first.example', role: 'bench' },
    });
    expect(answer.status).toBe(403);
  });

  it('shows nobody of another shop', async () => {
    const cookie = await cookieOf(otherShop.people.bench);
    const { body } = await callRoute(listPeopleRoute, { method: 'GET', cookie });
    const ids = (body as { id: string }[]).map(({ id }) => id);
    expect(ids).toContain(otherShop.people.owner.personId);
    expect(ids).not.toContain(shop.people.owner.personId);
  });

  it('lets only the owner invite', async () => {
    const cookie = await cookieOf(shop.people.scheduler);
    const answer = await callRoute(inviteRoute, {
      cookie,
      body: { email: 'new@first.example', role: 'bench' },
    });
    expect(answer.status).toBe(403);
  });

  it('joins by the invitation once, and a person of two shops switches between them', async () => {
    const owner = await cookieOf(shop.people.owner);
    const invited = await callRoute(inviteRoute, {
      cookie: owner,
      body: { email: otherShop.people.crew.email, role: 'measurer' },
    });
    expect(invited.status).toBe(200);
    const { link, emailed } = invited.body as { link: string; emailed: boolean };
    expect(emailed).toBe(true);
    const invitationId = link.split('/').at(-1);
    const wrong = await callRoute(joinRoute, {
      body: { invitationId, personName: 'Two Shops', password: 'not-the-password' },
    });
    expect(wrong.status).toBe(422);
    const join = { invitationId, personName: 'Two Shops', password: 'test-password' };
    const joined = await callRoute(joinRoute, { body: join });
    expect(joined.status).toBe(200);
    expect((await callRoute(joinRoute, { body: join })).status).toBe(410);

    const cookie = await cookieOf(otherShop.people.crew);
    expect((await callRoute(switchRoute, { cookie, body: { shopId: shop.shop.id } })).status).toBe(
      200,
    );
    const { body } = await callRoute(listPeopleRoute, { method: 'GET', cookie });
    expect((body as { id: string }[]).map(({ id }) => id)).toContain(shop.people.owner.personId);
  });

  it('does not switch to a shop that one does not belong to', async () => {
    const cookie = await cookieOf(shop.people.bench);
    const answer = await callRoute(switchRoute, { cookie, body: { shopId: otherShop.shop.id } });
    expect(answer.status).toBe(404);
  });
});
