import { beforeAll, describe, expect, it } from 'vitest';
import { GET as findRoute } from '@/app/api/visits/find/route';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('a visit looked for by whoever rings', () => {
  let shop: TestShop;
  let crewId: string;
  /** The route goes by the wall clock. */
  const day = (ahead: number) => addDays(localDate(new Date(), 'America/New_York'), ahead);
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop));
  });

  const ask = async (search: string, as: keyof TestShop['people'] = 'scheduler', of = shop) => {
    const cookie = await cookieOf(of.people[as]);
    return callRoute(findRoute, { method: 'GET', cookie, url: apiPaths.findVisits(search) });
  };
  const book = async (name: string, ahead: number, phone = '(212) 555-0119') => {
    const { jobId } = await startTestJob(shop, { customer: { name, phone } });
    const booking = { jobId, crewId, date: day(ahead), workMinutes: 60 };
    return bookTestVisit(shop, booking, new Date());
  };

  it('is found by a part of the name, the next one on top, and by the number rung from', async () => {
    const later = await book('Greta Sallow', 30);
    const next = await book('Hugo Sallow', 9, '(212) 555-0123');
    await book('Ann Other', 12);
    const ids = ((await ask('sallow')).body as VisitView[]).map(({ id }) => id);
    expect(ids).toEqual([next.id, later.id]);
    const byPhone = (await ask('555-0123')).body as VisitView[];
    expect(byPhone.map(({ customerName }) => customerName)).toEqual(['Hugo Sallow']);
  });

  it('is shown to all of the shop, and to no other shop or stranger', async () => {
    expect((await ask('sallow', 'crew')).body).toHaveLength(2);
    const other = await makeShop();
    expect(await ask('sallow', 'owner', other)).toMatchObject({ status: 200, body: [] });
    const stranger = await callRoute(findRoute, {
      method: 'GET',
      url: apiPaths.findVisits('sallow'),
    });
    expect(stranger.status).toBe(401);
  });

  it('needs two letters', async () => {
    expect((await ask('s')).status).toBe(422);
  });
});
