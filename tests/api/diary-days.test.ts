import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as hoursRoute } from '@/app/api/crews/hours/route';
import { GET as tileRoute } from '@/app/api/tiles/[z]/[x]/[y]/route';
import type { CrewHours } from '@/lib/contracts/crew-hours';
import { apiPaths } from '@/lib/paths';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';

describe('the hours of crews by HTTP', () => {
  let shop: TestShop;
  let crewId: string;
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop));
  });

  const ask = (cookie: string | undefined, from = '2026-12-07', to = '2026-12-14') =>
    callRoute(hoursRoute, { method: 'GET', cookie, url: apiPaths.crewHours(from, to) });

  it('are those of each day worked, to every role of the shop', async () => {
    for (const role of ['scheduler', 'measurer', 'crew'] as const) {
      const answer = await ask(await cookieOf(shop.people[role]));
      expect(answer.status).toBe(200);
      const [crew] = answer.body as CrewHours[];
      expect(crew?.crewId).toBe(crewId);
      expect(crew?.days.map(({ date }) => date)).toEqual([
        '2026-12-07',
        '2026-12-08',
        '2026-12-09',
        '2026-12-10',
        '2026-12-11',
      ]);
      expect(crew?.days.every(({ start, end }) => start < end)).toBe(true);
    }
  });

  it('are nobody else’s: another shop sees its own crews, a stranger none', async () => {
    const other = await makeShop();
    const answer = await ask(await cookieOf(other.people.owner));
    expect(answer).toMatchObject({ status: 200, body: [] });
    expect((await ask(undefined)).status).toBe(401);
  });

  it('are not asked for backwards, nor for a year', async () => {
    const cookie = await cookieOf(shop.people.scheduler);
    expect((await ask(cookie, '2026-12-14', '2026-12-07')).status).toBe(422);
    expect((await ask(cookie, '2026-01-01', '2027-01-01')).status).toBe(422);
  });
});

describe('tiles of the map by HTTP', () => {
  let shop: TestShop;
  let host: Server;
  let asked: string[] = [];
  const picture = Buffer.from('89504e470d0a1a0a', 'hex');
  beforeAll(async () => {
    shop = await makeShop();
    host = createServer((request, response) => {
      asked.push(request.url ?? '');
      if (request.url?.startsWith('/3/')) {
        response.setHeader('content-type', 'text/html').end('<script>1</script>');
      } else response.setHeader('content-type', 'image/png').end(picture);
    });
    await new Promise<void>((done) => host.listen(0, '127.0.0.1', done));
  });
  afterAll(() => {
    delete process.env.TILES_URL;
    return new Promise((done) => host.close(done));
  });

  const setUp = () => {
    const { port } = host.address() as AddressInfo;
    process.env.TILES_URL = `http://127.0.0.1:${port}/{z}/{x}/{y}.png`;
    asked = [];
  };
  const request = (cookie: string | undefined) =>
    new Request('http://localhost:3000/api/tiles/1/0/1', {
      headers: { origin: 'http://localhost:3000', ...(cookie ? { cookie } : {}) },
    });
  const tile = async (place: { z: string; x: string; y: string }, cookie: string | undefined) =>
    tileRoute(request(cookie), { params: Promise.resolve(place) });

  it('are not there where the host has set up none', async () => {
    const cookie = await cookieOf(shop.people.scheduler);
    expect((await tile({ z: '1', x: '0', y: '1' }, cookie)).status).toBe(404);
  });

  it('come through this server, which asks the host that is set up', async () => {
    setUp();
    const answer = await tile({ z: '1', x: '0', y: '1' }, await cookieOf(shop.people.crew));
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toBe('image/png');
    expect(Buffer.from(await answer.arrayBuffer())).toEqual(picture);
    expect(asked).toEqual(['/1/0/1.png']);
  });

  it('are asked of nobody for a stranger, nor for a place outside the grid', async () => {
    setUp();
    const cookie = await cookieOf(shop.people.scheduler);
    expect((await tile({ z: '1', x: '0', y: '1' }, undefined)).status).toBe(401);
    expect((await tile({ z: '1', x: '2', y: '0' }, cookie)).status).toBe(404);
    expect((await tile({ z: '1', x: '-1', y: '0' }, cookie)).status).toBe(422);
    expect((await tile({ z: '../x', x: '0', y: '0' }, cookie)).status).toBe(422);
    expect(asked).toEqual([]);
  });

  it('are pictures or nothing', async () => {
    setUp();
    const cookie = await cookieOf(shop.people.scheduler);
    expect((await tile({ z: '3', x: '0', y: '0' }, cookie)).status).toBe(404);
    expect(asked).toHaveLength(1);
  });
});
