import { randomUUID } from 'node:crypto';
import { expect } from 'vitest';
import { apiPaths } from '@/lib/paths';
import { toLocal } from '@/lib/time/local-moment';
import { getAt } from './ask-at';
import { morningZone, moveShopToMorning } from './morning-shop';
import { cookiesOf } from './sign-in-at';

export type ShopOfToday = {
  baseUrl: string;
  cookie: string;
  zone: string;
  shopName: string;
  email: string;
  personName: string;
  customer: string;
  jobId: string;
  visitId: string;
};

const shopPassword = 'a-long-password';

/** A shop of its own where it is morning, with one measure booked for today; its owner is the measurer. */
export async function openShopOfToday(baseUrl: string, personName: string): Promise<ShopOfToday> {
  const mark = randomUUID().slice(0, 8);
  const zone = morningZone(new Date());
  const shopName = `Shop ${mark}`;
  const email = `owner-${mark}@shop.example`;
  const response = await fetch(baseUrl + apiPaths.shops(), {
    method: 'POST',
    headers: { origin: baseUrl, 'content-type': 'application/json' },
    body: JSON.stringify({
      shopName,
      region: 'US',
      zone,
      unit: 'in',
      personName,
      email,
      password: shopPassword,
    }),
  });
  expect(response.status).toBe(200);
  const at = { baseUrl, cookie: cookiesOf(response) };
  await moveShopToMorning(at);
  const customer = `Wilma ${mark}`;
  const { id: jobId } = await getAt<{ id: string }>(at, apiPaths.jobs(), {
    body: {
      customer: { name: customer },
      site: { street: '5 Quay Rise', town: 'Quayside' },
      title: 'Kitchen, one wall',
      wallsReady: 'closed',
    },
  });
  const people = await getAt<{ id: string }[]>(at, apiPaths.people());
  const crew = await getAt<{ id: string }>(at, apiPaths.crews(), {
    body: {
      name: 'Measure',
      does: 'measure',
      colour: '1',
      personIds: people.map(({ id }) => id),
    },
  });
  const soon = toLocal(new Date(Date.now() + 5 * 60_000), zone);
  const visit = await getAt<{ id: string }>(at, apiPaths.visits(), {
    body: {
      idempotencyKey: randomUUID(),
      jobId,
      kind: 'site-measure',
      crewId: crew.id,
      date: soon.date,
      time: soon.time.slice(0, 5),
      workMinutes: 90,
      overrideReason: 'A test of today.',
    },
  });
  return { ...at, zone, shopName, email, personName, customer, jobId, visitId: visit.id };
}

/** One more measurer of the shop, who joins by the link of an invitation; gives the session. */
export async function joinAsMeasurer(shop: ShopOfToday, personName: string): Promise<string> {
  const body = { email: `${randomUUID().slice(0, 8)}@shop.example`, role: 'measurer' };
  const { link } = await getAt<{ link: string }>(shop, apiPaths.invitations(), { body });
  const response = await fetch(shop.baseUrl + apiPaths.joinShop(), {
    method: 'POST',
    headers: { origin: shop.baseUrl, 'content-type': 'application/json' },
    body: JSON.stringify({
      invitationId: new URL(link).pathname.split('/').at(-1),
      personName,
      password: shopPassword,
    }),
  });
  expect(response.status).toBe(200);
  return cookiesOf(response);
}
