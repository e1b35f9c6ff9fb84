import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as todayRoute } from '@/app/api/days/today/route';
import { GET as messagesRoute } from '@/app/api/messages/route';
import { POST as callOffRoute } from '@/app/api/visits/[visitId]/call-off/route';
import { POST as reportRoute } from '@/app/api/visits/[visitId]/report/route';
import { PATCH as moveRoute, GET as visitRoute } from '@/app/api/visits/[visitId]/route';
import { POST as undoRoute } from '@/app/api/visits/[visitId]/undo/route';
import { POST as yesRoute } from '@/app/api/visits/[visitId]/yes/route';
import { POST as bookRoute, GET as visitsRoute } from '@/app/api/visits/route';
import { GET as waitingRoute } from '@/app/api/waiting/route';
import { jobs } from '@/db/schema';
import type { MessageView } from '@/lib/contracts/messages';
import type { BookedVisit, TodayView, VisitView, WaitingItem } from '@/lib/contracts/visits';
import type { Role } from '@/lib/permissions';
import { addDays } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import { database } from '@/server/base/database';
import type { RouteHandler } from '@/server/base/handle';
import { getTodayVisit } from '@/server/days/get-today-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('visits by HTTP', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let crewId: string;
  const cookies = {} as Record<Role | 'other', string>;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    ({ crewId } = await makeCrew(shop));
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      cookies[role] = await cookieOf(shop.people[role]);
    }
    cookies.other = await cookieOf(otherShop.people.owner);
  });

  const today = () => localDate(new Date(), 'America/New_York');
  let ahead = 3;

  /** On a day of its own, from next week on. */
  async function book(cookie = cookies.scheduler, given: object = {}) {
    const { jobId } = await startTestJob(shop);
    ahead += 1;
    const body = {
      idempotencyKey: randomUUID(),
      jobId,
      crewId,
      kind: 'site-measure',
      date: addDays(today(), ahead),
      time: '09:00',
      ...given,
    };
    return callRoute(bookRoute, { cookie, body });
  }
  async function booked(given: object = {}): Promise<BookedVisit> {
    const answer = await book(cookies.scheduler, given);
    if (answer.status !== 200) throw new Error(JSON.stringify(answer.body));
    return answer.body as BookedVisit;
  }
  const get = (route: RouteHandler, cookie: string | undefined, url = '/api', params = {}) =>
    callRoute(route, { method: 'GET', cookie, url, params });

  it('books, shows in the diary, moves with the version, and calls off', async () => {
    const visit = await booked();
    const date = localDate(new Date(visit.startsAt), 'America/New_York');
    const url = `/api/visits?from=${date}&to=${addDays(date, 1)}`;
    const listed = (await get(visitsRoute, cookies.bench, url)).body as VisitView[];
    expect(listed.map(({ id }) => id)).toEqual([visit.id]);
    const moved = await callRoute(moveRoute, {
      method: 'PATCH',
      params: { visitId: visit.id },
      cookie: cookies.scheduler,
      body: { version: 1, crewId, date, time: '13:00' },
    });
    expect(moved).toMatchObject({ status: 200, body: { version: 2 } });
    const stale = await callRoute(callOffRoute, {
      params: { visitId: visit.id },
      cookie: cookies.scheduler,
      body: { version: 1, reason: 'No' },
    });
    expect(stale).toMatchObject({ status: 409, body: { code: 'visit-changed' } });
    const off = await callRoute(callOffRoute, {
      params: { visitId: visit.id },
      cookie: cookies.scheduler,
      body: { version: 2, reason: 'No' },
    });
    expect(off).toMatchObject({ status: 200, body: { status: 'called-off' } });
    expect((await get(visitsRoute, cookies.bench, url)).body).toEqual([]);
  });

  it('notes the yes that a customer said on the phone: once, and of the visit that was seen', async () => {
    const visit = await booked();
    const yes = (version: number) =>
      callRoute(yesRoute, {
        params: { visitId: visit.id },
        cookie: cookies.scheduler,
        body: { version },
      });
    expect(await yes(7)).toMatchObject({ status: 409, body: { code: 'visit-changed' } });
    expect(await yes(1)).toMatchObject({
      status: 200,
      body: { status: 'confirmed', confirmedAt: expect.any(String) },
    });
    expect(await yes(2)).toMatchObject({ status: 409, body: { code: 'not-waiting-for-yes' } });
  });

  it('answers a taken time with 409, the words and the visit that has it', async () => {
    const visit = await booked();
    const date = localDate(new Date(visit.startsAt), 'America/New_York');
    const answer = await book(cookies.scheduler, { date });
    expect(answer).toMatchObject({
      status: 409,
      body: {
        code: 'crew-already-booked',
        detail: expect.stringContaining('is taken'),
        current: { visitId: visit.id },
      },
    });
  });

  it('lets only the office book, move, call off and see the waiting list and the messages', async () => {
    const visit = await booked();
    const params = { visitId: visit.id };
    const date = localDate(new Date(visit.startsAt), 'America/New_York');
    for (const role of ['measurer', 'bench', 'crew'] as const) {
      const cookie = cookies[role];
      expect((await book(cookie)).status, role).toBe(403);
      const move = { version: 1, crewId, date, time: '10:00' };
      const moved = await callRoute(moveRoute, { method: 'PATCH', params, cookie, body: move });
      expect(moved.status, role).toBe(403);
      const off = { params, cookie, body: { version: 1, reason: 'No' } };
      expect((await callRoute(callOffRoute, off)).status, role).toBe(403);
      expect((await callRoute(undoRoute, off)).status, role).toBe(403);
      expect((await callRoute(yesRoute, off)).status, role).toBe(403);
      expect((await get(waitingRoute, cookie)).status, role).toBe(403);
      expect((await get(messagesRoute, cookie)).status, role).toBe(403);
    }
    const tap = { what: 'arrived', at: new Date().toISOString() };
    const benchTap = await callRoute(reportRoute, { params, cookie: cookies.bench, body: tap });
    expect(benchTap.status).toBe(403);
    for (const role of ['measurer', 'bench', 'crew'] as const) {
      expect((await get(visitRoute, cookies[role], '/api', params)).status, role).toBe(200);
    }
  });

  it('knows no visit, job or crew of another shop', async () => {
    const visit = await booked();
    const params = { visitId: visit.id };
    const cookie = cookies.other;
    const date = addDays(today(), 2);
    expect((await get(visitRoute, cookie, '/api', params)).status).toBe(404);
    const move = { version: 1, crewId, date, time: '10:00' };
    const moved = await callRoute(moveRoute, { method: 'PATCH', params, cookie, body: move });
    expect(moved.status).toBe(404);
    const off = { params, cookie, body: { version: 1, reason: 'No' } };
    expect((await callRoute(callOffRoute, off)).status).toBe(404);
    expect((await callRoute(undoRoute, off)).status).toBe(404);
    expect((await callRoute(yesRoute, off)).status).toBe(404);
    const tap = { what: 'arrived', at: new Date().toISOString() };
    expect((await callRoute(reportRoute, { params, cookie, body: tap })).status).toBe(404);
    expect((await book(cookie)).status).toBe(404);
    const own = await startTestJob(otherShop);
    expect((await book(cookie, { jobId: own.jobId })).status).toBe(404);
    const url = `/api/visits?from=${today()}&to=${addDays(today(), 90)}`;
    expect((await get(visitsRoute, cookie, url)).body).toEqual([]);
    expect((await get(messagesRoute, cookie)).body).toEqual([]);
    const waiting = (await get(waitingRoute, cookie)).body as WaitingItem[];
    expect(waiting.map(({ jobId }) => jobId)).toEqual([own.jobId]);
    expect(((await get(todayRoute, cookie)).body as TodayView).visits).toEqual([]);
  });

  it('asks a stranger to sign in', async () => {
    const params = { visitId: randomUUID() };
    for (const route of [visitsRoute, waitingRoute, messagesRoute, todayRoute]) {
      expect((await get(route, undefined)).status).toBe(401);
    }
    for (const route of [bookRoute, callOffRoute, undoRoute, reportRoute, moveRoute]) {
      expect((await callRoute(route, { params, body: {} })).status).toBe(401);
    }
  });

  it('shows the measurer the day of their own crew, the fitter theirs, and the office all', async () => {
    const visit = await booked();
    const date = localDate(new Date(visit.startsAt), 'America/New_York');
    const { db } = await database();
    await db.update(jobs).set({ notes: 'Dog in the yard' }).where(eq(jobs.id, visit.jobId));
    const url = `/api/days/today?date=${date}`;
    const dayOf = async (cookie: string) => (await get(todayRoute, cookie, url)).body as TodayView;
    const mine = await dayOf(cookies.measurer);
    expect(mine).toMatchObject({ date, visits: [{ id: visit.id, notes: 'Dog in the yard' }] });
    expect((await dayOf(cookies.crew)).visits).toEqual([]);
    expect((await dayOf(cookies.scheduler)).visits).toHaveLength(1);
    const fitter = await contextOf(shop, 'crew');
    expect(await refusalOf(getTodayVisit(fitter, { visitId: visit.id }))).toMatchObject({
      status: 404,
    });
    const measurer = await contextOf(shop, 'measurer');
    expect(await getTodayVisit(measurer, { visitId: visit.id })).toMatchObject({ rooms: [] });
  });

  it('lists what a customer was and will be told, of one job', async () => {
    const visit = await booked();
    const url = `/api/messages?jobId=${visit.jobId}`;
    const listed = (await get(messagesRoute, cookies.scheduler, url)).body as MessageView[];
    expect(new Set(listed.map(({ jobId }) => jobId))).toEqual(new Set([visit.jobId]));
    expect(listed.map(({ occasion }) => occasion)).toContain('booked');
  });
});
