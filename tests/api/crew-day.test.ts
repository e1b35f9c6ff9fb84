import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as eventsRoute } from '@/app/api/days/events/route';
import { POST as codeRoute } from '@/app/api/days/stops/[visitId]/code/route';
import { GET as stopRoute } from '@/app/api/days/stops/[visitId]/route';
import {
  GET as forCrewRoute,
  PATCH as setForCrewRoute,
} from '@/app/api/jobs/[jobId]/for-crew/route';
import { GET as copyRoute } from '@/app/api/sign-offs/[signOffId]/copy/route';
import { POST as answerRoute } from '@/app/api/snags/[snagId]/answer/route';
import { POST as closeRoute } from '@/app/api/snags/[snagId]/close/route';
import { PATCH as changeRoute } from '@/app/api/snags/[snagId]/route';
import { GET as listRoute, POST as openRoute } from '@/app/api/snags/route';
import { GET as customerCopyRoute } from '@/app/v/[token]/sign-off/route';
import type { SnagView } from '@/lib/contracts/snags';
import type { RouteHandler } from '@/server/base/handle';
import { callRoute } from '../help/call-route';
import { tokenOfVisit } from '../help/link-of';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { type PutStop, putStop, signing, tap } from '../help/put-stop';

describe('addresses of the crew’s day, of snags and of what was signed', () => {
  let shop: TestShop;
  let stop: PutStop;
  const cookies: Record<
    'owner' | 'scheduler' | 'measurer' | 'bench' | 'crew' | 'stranger',
    string
  > = { owner: '', scheduler: '', measurer: '', bench: '', crew: '', stranger: '' };
  beforeAll(async () => {
    shop = await makeShop();
    stop = await putStop(shop);
    for (const role of ['owner', 'scheduler', 'measurer', 'bench', 'crew'] as const) {
      cookies[role] = await cookieOf(shop.people[role]);
    }
    cookies.stranger = await cookieOf((await makeShop()).people.owner);
  });

  type Who = keyof typeof cookies;
  const ask = (
    route: RouteHandler,
    who: Who,
    call: Omit<Parameters<typeof callRoute>[1], 'cookie'>,
  ) => callRoute(route, { ...call, cookie: cookies[who] });
  const events = (who: Who, ...list: unknown[]) =>
    ask(eventsRoute, who, { body: { events: list } });
  const snagInput = () => ({
    id: randomUUID(),
    jobId: stop.jobId,
    words: 'Scratch on the end panel',
    mender: 'bench',
  });

  it('take taps from the crew; from the bench and from another shop none', async () => {
    const pause = tap(stop, 'pause', { why: 'break' });
    expect(await events('crew', pause)).toMatchObject({
      status: 200,
      body: { accepted: [pause.id], parked: [] },
    });
    expect((await events('bench', pause)).status).toBe(403);
    expect((await callRoute(eventsRoute, { body: { events: [pause] } })).status).toBe(401);
    const strange = tap(stop, 'go-on', {});
    expect(await events('stranger', strange)).toMatchObject({
      body: { accepted: [], parked: [{ id: strange.id }] },
    });
    // A crew that it is not booked for knows nothing of the visit either.
    expect(await events('measurer', strange)).toMatchObject({ body: { accepted: [] } });
    expect((await events('crew')).status).toBe(422);
  });

  it('show a stop to its crew and the office, and to nobody of another shop', async () => {
    const params = { visitId: stop.visit.id };
    const read = (who: Who) => ask(stopRoute, who, { method: 'GET', params });
    expect((await read('crew')).status).toBe(200);
    expect((await read('scheduler')).status).toBe(200);
    expect((await read('measurer')).status).toBe(404);
    expect((await read('stranger')).status).toBe(404);
  });

  it('keep what the crew must know, show the office no code, and give it to nobody else', async () => {
    const params = { jobId: stop.jobId };
    const set = (who: Who, body: object) =>
      ask(setForCrewRoute, who, { method: 'PATCH', params, body });
    expect((await set('scheduler', { accessCode: '9013', finish: 'White oak' })).status).toBe(200);
    expect((await set('crew', { accessCode: '1' })).status).toBe(403);
    expect((await set('stranger', { parking: 'x' })).status).toBe(404);
    const shown = await ask(forCrewRoute, 'owner', { method: 'GET', params });
    expect(shown.body).toMatchObject({ finish: 'White oak', codeSetWords: expect.any(String) });
    expect(JSON.stringify(shown.body)).not.toContain('9013');
    expect((await ask(forCrewRoute, 'stranger', { method: 'GET', params })).status).toBe(404);
    const code = { params: { visitId: stop.visit.id } };
    expect((await ask(codeRoute, 'bench', code)).status).toBe(403);
    expect((await ask(codeRoute, 'scheduler', code)).status).toBe(404);
    expect((await ask(codeRoute, 'stranger', code)).status).toBe(404);
    // The visit is on another day than today.
    expect(await ask(codeRoute, 'crew', code)).toMatchObject({
      status: 403,
      body: { code: 'not-today' },
    });
  });

  it('open, change, answer and close snags, each by who may, and of one’s own shop alone', async () => {
    const input = snagInput();
    const params = { snagId: input.id };
    expect((await ask(openRoute, 'scheduler', { body: input })).status).toBe(200);
    expect((await ask(openRoute, 'bench', { body: snagInput() })).status).toBe(403);
    expect((await ask(openRoute, 'stranger', { body: snagInput() })).status).toBe(404);

    const change = (who: Who) =>
      ask(changeRoute, who, { method: 'PATCH', params, body: { dueOn: '2027-03-12' } });
    expect((await change('owner')).status).toBe(200);
    expect((await change('bench')).status).toBe(403);
    expect((await change('stranger')).status).toBe(404);

    const answer = (who: Who) =>
      ask(answerRoute, who, { params, body: { words: 'made, on rack 3', readyOn: '2027-03-10' } });
    expect((await answer('bench')).status).toBe(200);
    expect((await answer('crew')).status).toBe(403);
    expect((await answer('stranger')).status).toBe(404);

    const list = async (who: Who) =>
      ask(listRoute, who, { method: 'GET', url: `/api/snags?jobId=${stop.jobId}` });
    const [snag] = (await list('crew')).body as SnagView[];
    expect(snag).toMatchObject({
      benchSays: 'made, on rack 3',
      dueOn: '2027-03-12',
      closedAt: null,
    });
    expect((await list('stranger')).status).toBe(404);
    expect((await ask(listRoute, 'stranger', { method: 'GET', url: '/api/snags' })).body).toEqual(
      [],
    );

    const close = (who: Who, body: object) => ask(closeRoute, who, { params, body });
    expect((await close('crew', {})).status).toBe(422);
    expect((await close('bench', { words: 'x' })).status).toBe(403);
    expect((await close('stranger', { words: 'x' })).status).toBe(404);
    expect((await close('crew', { words: 'changed the panel' })).status).toBe(200);
    expect((await change('owner')).body).toMatchObject({ code: 'snag-closed' });
  });

  it('give a copy of what was signed to the shop and to who holds the link of that visit', async () => {
    const signed = tap(stop, 'sign-off', signing);
    expect((await events('crew', signed)).body).toMatchObject({ accepted: [signed.id] });
    const read = async (who: Who) => {
      const request = new Request('http://localhost:3000/copy', {
        headers: { cookie: cookies[who] },
      });
      return copyRoute(request, { params: Promise.resolve({ signOffId: signed.id }) });
    };
    const copy = await read('owner');
    expect(copy.status).toBe(200);
    expect(
      Buffer.from(await copy.arrayBuffer())
        .subarray(0, 5)
        .toString(),
    ).toBe('%PDF-');
    expect((await read('stranger')).status).toBe(404);

    const byLink = async (token: string) =>
      customerCopyRoute(new Request('http://localhost:3000/v'), {
        params: Promise.resolve({ token }),
      });
    const token = await tokenOfVisit(shop, stop.visit.id);
    expect((await byLink(token)).headers.get('content-type')).toBe('application/pdf');
    expect((await byLink('a-guess-of-a-token')).status).toBe(404);
    const other = await putStop(shop);
    expect((await byLink(await tokenOfVisit(shop, other.visit.id))).status).toBe(404);
  });
});
