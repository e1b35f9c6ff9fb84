import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { audit, jobs, sites } from '@/db/schema';
import { importList } from '@/server/jobs/import-list';
import { listJobs } from '@/server/jobs/list-jobs';
import { placeDueSites } from '@/server/jobs/place-due-sites';
import { placeSite } from '@/server/jobs/place-site';
import { type FakeGeocode, startFakeGeocode } from '@/server/ports/geocode/fake-geocode';
import type { GeocodePort } from '@/server/ports/geocode/geocode-port';
import { nominatimGeocode } from '@/server/ports/geocode/nominatim-geocode';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';

const now = new Date('2026-12-01T15:00:00Z');
const later = (seconds: number) => new Date(now.getTime() + seconds * 1000);

describe('the pins of an imported list', () => {
  let fake: FakeGeocode;
  let geocode: GeocodePort;
  let shop: TestShop;
  beforeAll(async () => {
    fake = await startFakeGeocode();
    geocode = nominatimGeocode({ baseUrl: fake.baseUrl, userAgent: 'test', gapMs: 0 });
  });
  afterAll(() => fake.stop());
  beforeEach(async () => {
    shop = await makeShop();
  });

  async function bringIn(...rows: string[]) {
    const list = ['Customer,Street,Town,Latitude,Longitude', ...rows].join('\r\n');
    await importList(await contextOf(shop, 'scheduler', now), {
      idempotencyKey: randomUUID(),
      columns: ['customer', 'street', 'town', 'latitude', 'longitude'],
      leaveOutProblems: 'no',
      takeDoubles: 'yes',
      bytes: new TextEncoder().encode(list),
    });
  }
  async function lookUp(at: Date, port = geocode) {
    const { db } = await contextOf(shop, 'owner');
    await placeDueSites(db, port, at);
  }
  async function rows() {
    const { db } = await contextOf(shop, 'owner');
    return db
      .select({
        jobId: jobs.id,
        street: sites.street,
        lat: sites.latitude,
        lon: sites.longitude,
        dueAt: sites.placeDueAt,
      })
      .from(jobs)
      .innerJoin(sites, eq(sites.id, jobs.siteId))
      .where(eq(jobs.shopId, shop.shop.id))
      .orderBy(jobs.number);
  }
  async function storyOf(jobId: string) {
    const { db } = await contextOf(shop, 'owner');
    return db
      .select({ summary: audit.summary })
      .from(audit)
      .where(and(eq(audit.jobId, jobId), eq(audit.verb, 'place-due-sites')));
  }

  it('are found by their address, one by one; what is not found stays on the list without one', async () => {
    await bringIn(
      'Ada Fell,31 Quay Rise,Quayside,,',
      'Bo Reed,9 Nowhere Lane,Atlantis,,',
      'Cy Moor,Somewhere Else 4,Quayside,,',
    );
    await lookUp(later(1));
    const [found, unknown, townOnly] = await rows();
    expect(found?.lat).toBeCloseTo(41.3, 0);
    expect([unknown?.lat, townOnly?.lat]).toEqual([null, null]);
    expect((await rows()).map(({ dueAt }) => dueAt)).toEqual([null, null, null]);
    expect(await storyOf(found?.jobId ?? '')).toEqual([
      { summary: expect.stringMatching(/^Site put on the map by its address: 31 Quay Rise/) },
    ]);
    expect(await storyOf(unknown?.jobId ?? '')).toEqual([
      { summary: 'Site not found by its address: put the pin by hand' },
    ]);
    const list = await listJobs(await contextOf(shop, 'scheduler'), { search: '' });
    expect(list.filter(({ isOnMap }) => !isOnMap).map(({ customerName }) => customerName)).toEqual([
      'Cy Moor',
      'Bo Reed',
    ]);
  });

  it('are not looked up where the list gives them', async () => {
    await bringIn('Ada Fell,31 Quay Rise,Quayside,41.25,-58.25');
    await lookUp(later(1));
    expect(await rows()).toMatchObject([{ lat: 41.25, lon: -58.25, dueAt: null }]);
    expect(await storyOf((await rows())[0]?.jobId ?? '')).toEqual([]);
  });

  it('are asked for again later when the service does not answer, and then found', async () => {
    await bringIn('Ada Fell,31 Quay Rise,Quayside,,');
    const silent: GeocodePort = { find: async () => ({ ok: false, reason: 'unreachable' }) };
    await lookUp(later(1), silent);
    expect(await rows()).toMatchObject([{ lat: null, dueAt: later(121) }]);
    await lookUp(later(100));
    expect((await rows())[0]?.lat).toBeNull();
    await lookUp(later(122));
    expect((await rows())[0]?.lat).not.toBeNull();
  });

  it('that somebody puts by hand meanwhile stay where they are', async () => {
    await bringIn('Ada Fell,31 Quay Rise,Quayside,,');
    const [row] = await rows();
    const place = { lat: 41.2, lon: -58.4 };
    await placeSite(await contextOf(shop, 'scheduler'), { jobId: row?.jobId ?? '', place });
    await lookUp(later(1));
    expect(await rows()).toMatchObject([{ ...place, dueAt: null }]);
  });

  it('of a long list come a few at a time, so that a stop of the program waits for none long', async () => {
    await bringIn(
      ...Array.from({ length: 12 }, (_, n) => `Row ${n},${n + 1} Quay Rise,Quayside,,`),
    );
    const placed = async () => (await rows()).filter(({ lat }) => lat !== null).length;
    await lookUp(later(1));
    expect(await placed()).toBe(5);
    await lookUp(later(3));
    await lookUp(later(5));
    expect(await placed()).toBe(12);
  });
});
