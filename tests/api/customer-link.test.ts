import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as answerRoute } from '@/app/v/[token]/answer/route';
import { GET as calendarRoute } from '@/app/v/[token]/calendar/route';
import { POST as holdRoute } from '@/app/v/[token]/hold/route';
import { GET as copyRoute } from '@/app/v/[token]/sign-off/route';
import { POST as takeRoute } from '@/app/v/[token]/take/route';
import { visits } from '@/db/schema';
import { database } from '@/server/base/database';
import type { RouteHandler } from '@/server/base/handle';
import { newLinkToken } from '@/server/base/secret';
import { getCustomerTimes } from '@/server/visits/get-customer-times';
import { getCustomerVisit } from '@/server/visits/get-customer-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { changeLink, tokenOfVisit } from '../help/link-of';
import { makeCrew } from '../help/make-crew';
import { makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('what a customer’s link opens', () => {
  const tokens: Record<string, string> = { guessed: newLinkToken() };
  let shop: TestShop;
  let otherShop: TestShop;
  let crewId: string;
  let otherCrewId: string;
  let mine: { id: string; token: string };
  let theirs: { id: string; token: string };

  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    ({ crewId } = await makeCrew(shop));
    ({ crewId: otherCrewId } = await makeCrew(otherShop));
    mine = await booked(shop, crewId, '2030-01-03');
    theirs = await booked(otherShop, otherCrewId, '2030-01-03');
    const ended = await booked(shop, crewId, '2030-01-04');
    const revoked = await booked(shop, crewId, '2030-01-07');
    await changeLink(ended.id, { endsAt: new Date('2026-01-01T00:00:00Z') });
    await changeLink(revoked.id, { revokedAt: new Date() });
    Object.assign(tokens, { ended: ended.token, revoked: revoked.token });
    tokens.cut = mine.token.slice(0, -1);
    tokens.path = '../../api/health';
  });

  async function booked(of: TestShop, crew: string, date: string) {
    const { jobId } = await startTestJob(of);
    const visit = await bookTestVisit(of, { jobId, crewId: crew, date });
    return { id: visit.id, token: await tokenOfVisit(of, visit.id) };
  }

  async function ask(
    route: RouteHandler,
    token: string,
    form?: Record<string, string>,
  ): Promise<{ status: number; location: string | null; body: string }> {
    const request = new Request(`http://localhost:3000/v/${encodeURIComponent(token)}/door`, {
      method: form ? 'POST' : 'GET',
      headers: {
        origin: 'http://localhost:3000',
        'content-type': 'application/x-www-form-urlencoded',
      },
      ...(form ? { body: new URLSearchParams(form).toString() } : {}),
    });
    const response = await route(request, { params: Promise.resolve({ token }) });
    return {
      status: response.status,
      location: response.headers.get('location'),
      body: await response.text(),
    };
  }

  const time = { date: '2030-01-10', time: '09:00' };
  const doors = (): [string, RouteHandler, Record<string, string> | undefined][] => [
    ['answer', answerRoute, { answer: 'confirm' }],
    ['hold', holdRoute, time],
    ['take', takeRoute, { heldVisitId: mine.id }],
    ['calendar', calendarRoute, undefined],
    ['copy', copyRoute, undefined],
  ];

  it('is one and the same nothing for a guess, and for a link that has ended, was revoked or cut', async () => {
    for (const [name, route, form] of doors()) {
      const answers = await Promise.all(
        Object.values(tokens).map(async (token) => {
          const answer = await ask(route, token, form);
          return JSON.stringify(answer).replaceAll(encodeURIComponent(token), '…');
        }),
      );
      expect(new Set(answers).size, name).toBe(1);
      expect(answers[0], name).not.toContain('"status":200');
    }
    for (const token of Object.values(tokens)) {
      expect(await getCustomerVisit(token, 'here')).toBeNull();
      expect(await getCustomerTimes(token, 'here')).toBeNull();
    }
  });

  it('touches no visit of another shop, whatever the form names', async () => {
    await ask(answerRoute, theirs.token, { answer: 'confirm', visitId: mine.id, shopId: 'x' });
    await ask(takeRoute, theirs.token, { heldVisitId: mine.id });
    const { db } = await database();
    const [untouched] = await db.select().from(visits).where(eq(visits.id, mine.id));
    expect(untouched).toMatchObject({ status: 'booked', version: 1 });
    const [confirmed] = await db.select().from(visits).where(eq(visits.id, theirs.id));
    expect(confirmed).toMatchObject({ status: 'confirmed' });
  });

  it('keeps a time with a crew of its own shop, whatever crew the form names', async () => {
    const times = await getCustomerTimes(theirs.token, 'here');
    const [offered] = times?.times ?? [];
    if (!offered) throw new Error('nothing was offered');
    const { date, time: at } = offered;
    const answer = await ask(holdRoute, theirs.token, { crewId, date, time: at });
    expect(answer.location).not.toContain('taken=1');
    const { db } = await database();
    const held = await db.select().from(visits).where(eq(visits.heldForVisitId, theirs.id));
    expect(held).toMatchObject([{ crewId: otherCrewId, shopId: otherShop.shop.id }]);
  });

  it('offers each time once, though two crews are free, and takes the one that still is', async () => {
    const two = await makeShop();
    const first = await makeCrew(two);
    const second = await makeCrew(two, 'measure', [two.people.crew.personId]);
    const visit = await booked(two, first.crewId, '2030-01-03');
    const words = (await getCustomerTimes(visit.token, 'here'))?.times.map(
      ({ dayWords, windowWords }) => `${dayWords} ${windowWords}`,
    );
    expect(words?.length).toBe(6);
    expect(new Set(words).size).toBe(6);
    const [offered] = (await getCustomerTimes(visit.token, 'here'))?.times ?? [];
    if (!offered) throw new Error('nothing was offered');
    const { jobId } = await startTestJob(two);
    await bookTestVisit(two, { jobId, crewId: first.crewId, ...offered });
    await ask(holdRoute, visit.token, { date: offered.date, time: offered.time });
    const { db } = await database();
    const held = await db.select().from(visits).where(eq(visits.heldForVisitId, visit.id));
    expect(held).toMatchObject([{ crewId: second.crewId }]);
    const after = await getCustomerTimes(visit.token, 'here');
    expect(after?.hold?.dayWords).toBe(offered.dayWords);
    expect(
      after?.times.map(({ dayWords, windowWords }) => [dayWords, windowWords]),
    ).not.toContainEqual([offered.dayWords, offered.windowWords]);
  });
});
