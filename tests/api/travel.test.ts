import { eq } from 'drizzle-orm';
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { GET as geocodeRoute } from '@/app/api/geocode/route';
import { PATCH as placeRoute } from '@/app/api/jobs/[jobId]/place/route';
import { POST as travelRouteRoute } from '@/app/api/travel/route';
import { driveTimes } from '@/db/schema';
import { estimateDriveMinutes } from '@/lib/travel/estimate-drive';
import { getJob } from '@/server/jobs/get-job';
import { getPorts } from '@/server/ports/choose-ports';
import type { FakeJsonServer } from '@/server/ports/fakes/fake-json-server';
import { travelMatrix } from '@/server/shops/travel-matrix';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

const juniper = { lat: 41.284, lon: -58.312 };
const quayside = { lat: 41.217, lon: -58.312 };
const gannet = { lat: 41.322, lon: -58.232 };
const elsewhere = { lat: 40.7, lon: -74 };

describe('drive times and addresses of a shop', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let roads: FakeJsonServer;
  let addresses: FakeJsonServer;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    const { fakes } = await getPorts();
    if (!fakes.travel || !fakes.geocode) throw new Error('no fakes');
    roads = fakes.travel;
    addresses = fakes.geocode;
  });
  afterEach(() => {
    roads.faults.clear();
    addresses.faults.clear();
  });

  const matrix = async (of: TestShop, points: Parameters<typeof travelMatrix>[1]) =>
    travelMatrix(await contextOf(of, 'scheduler'), points);

  it('are asked for once and then kept, for this shop alone', async () => {
    const first = await matrix(shop, [juniper, quayside]);
    expect(first.isEstimated).toBe(false);
    const asked = roads.asked().length;
    // Within eleven metres it is the same driveway.
    const near = { ...quayside, lat: quayside.lat + 0.00003 };
    expect(await matrix(shop, [juniper, near])).toEqual(first);
    expect(roads.asked()).toHaveLength(asked);
    await matrix(otherShop, [juniper, quayside]);
    expect(roads.asked()).toHaveLength(asked + 1);
  });

  it('of one new site are asked for without asking again for those known', async () => {
    await matrix(shop, [juniper, quayside, gannet]);
    const last = roads.asked().at(-1) ?? '';
    expect(last).toContain('/table/');
    const { db } = await contextOf(shop, 'owner');
    const kept = await db.select().from(driveTimes).where(eq(driveTimes.shopId, shop.shop.id));
    expect(kept).toHaveLength(6);
  });

  it('are estimated while the service is down, said to be so, and asked for again later', async () => {
    roads.faults.set({ kind: 'refuse', status: 500 });
    const there = { lat: 41.25, lon: -58.4 };
    const down = await matrix(shop, [juniper, there]);
    expect(down).toEqual({
      minutes: [
        [0, estimateDriveMinutes(juniper, there)],
        [estimateDriveMinutes(there, juniper), 0],
      ],
      isEstimated: true,
    });
    roads.faults.clear();
    expect(await matrix(shop, [juniper, there])).toMatchObject({ isEstimated: false });
  });

  it('are estimated for a site that no road reaches, and for no other', async () => {
    const { minutes, isEstimated } = await matrix(shop, [juniper, elsewhere, quayside]);
    expect(isEstimated).toBe(true);
    expect(minutes[0]?.[1]).toBe(estimateDriveMinutes(juniper, elsewhere));
    expect((await matrix(shop, [juniper, quayside])).minutes[0]?.[1]).toBe(minutes[0]?.[2]);
  });

  it('of a year ago are asked for anew', async () => {
    const later = await contextOf(shop, 'scheduler', new Date('2027-12-01T15:00:00Z'));
    const asked = roads.asked().length;
    await travelMatrix(later, [juniper, quayside]);
    expect(roads.asked()).toHaveLength(asked + 1);
  });

  it('tell the line of a day to whoever may see visits', async () => {
    const body = { points: [juniper, quayside, gannet] };
    expect((await callRoute(travelRouteRoute, { body })).status).toBe(401);
    const cookie = await cookieOf(shop.people.crew);
    const answer = await callRoute(travelRouteRoute, { cookie, body });
    expect(answer.body).toMatchObject({
      isEstimated: false,
      legMinutes: [expect.any(Number), expect.any(Number)],
    });
    roads.faults.set({ kind: 'garbage' });
    const straight = await callRoute(travelRouteRoute, { cookie, body });
    expect(straight.body).toMatchObject({ isEstimated: true, line: body.points });
    const one = await callRoute(travelRouteRoute, { cookie, body: { points: [juniper] } });
    expect(one.status).toBe(422);
  });

  it('find an address once, and leave the pin to the hand when nobody answers', async () => {
    const url = '/api/geocode?street=14+Quay+Rise&town=Quayside';
    expect((await callRoute(geocodeRoute, { method: 'GET', url })).status).toBe(401);
    const cookie = await cookieOf(shop.people.scheduler);
    const ask = (of: string) => callRoute(geocodeRoute, { method: 'GET', cookie, url: of });
    addresses.faults.set({ kind: 'garbage' }, { times: 1 });
    expect((await ask(url)).body).toEqual({ places: [], isAnswered: false });
    const found = await ask(url);
    expect(found.body).toMatchObject({ isAnswered: true, places: [{ nearness: 'house' }] });
    const asked = addresses.asked().length;
    expect((await ask('/api/geocode?street=14%20quay%20RISE&town=Quayside')).body).toEqual(
      found.body,
    );
    expect(addresses.asked()).toHaveLength(asked);
    expect((await ask('/api/geocode?street=1')).status).toBe(422);
    const other = await cookieOf(otherShop.people.scheduler);
    await callRoute(geocodeRoute, { method: 'GET', cookie: other, url });
    expect(addresses.asked()).toHaveLength(asked + 1);
  });

  it('need the pin of a site, which the office puts and takes away, and nobody of another shop', async () => {
    const { jobId } = await startTestJob(shop);
    const put = (cookie: string, place: object | null) =>
      callRoute(placeRoute, { method: 'PATCH', cookie, params: { jobId }, body: { place } });
    const scheduler = await cookieOf(shop.people.scheduler);
    expect((await put(await cookieOf(shop.people.crew), gannet)).status).toBe(403);
    expect((await put(await cookieOf(otherShop.people.owner), gannet)).status).toBe(404);
    expect((await put(scheduler, { lat: 91, lon: 0 })).status).toBe(422);
    const kept = async () => {
      const { latitude, longitude } = await getJob(await contextOf(shop, 'owner'), { jobId });
      return [latitude, longitude];
    };
    expect(await kept()).toEqual([null, null]);
    expect((await put(scheduler, gannet)).status).toBe(200);
    expect(await kept()).toEqual([gannet.lat, gannet.lon]);
    await put(scheduler, null);
    expect(await kept()).toEqual([null, null]);
  });
});
