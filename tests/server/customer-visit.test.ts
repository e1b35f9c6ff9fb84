import { eq } from 'drizzle-orm';
import ICAL from 'ical.js';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as answerRoute } from '@/app/v/[token]/answer/route';
import { GET as calendarRoute } from '@/app/v/[token]/calendar/route';
import { POST as holdRoute } from '@/app/v/[token]/hold/route';
import { POST as takeRoute } from '@/app/v/[token]/take/route';
import { jobs, messages, schedulerItems, visitLinks, visits } from '@/db/schema';
import type { BookedVisit } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import type { RouteHandler } from '@/server/base/handle';
import { newLinkToken } from '@/server/base/secret';
import { getCustomerTimes } from '@/server/visits/get-customer-times';
import { getCustomerVisit } from '@/server/visits/get-customer-visit';
import { reportVisit } from '@/server/visits/report-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { changeLink, tokenOfVisit } from '../help/link-of';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('the customer’s page', () => {
  let shop: TestShop;
  let crewId: string;
  beforeAll(async () => {
    shop = await makeShop({ name: 'Juniper Bend' });
    ({ crewId } = await makeCrew(shop));
  });

  let week = 0;
  async function booked(
    given: Parameters<typeof startTestJob>[1] = {},
  ): Promise<{ visit: BookedVisit; token: string }> {
    const { jobId } = await startTestJob(shop, given);
    week += 1;
    const date = new Date(Date.UTC(2030, 0, 3 + 7 * week)).toISOString().slice(0, 10);
    const visit = await bookTestVisit(shop, { jobId, crewId, date });
    return { visit, token: await tokenOfVisit(shop, visit.id) };
  }

  /** A plain form, as a browser without JavaScript posts it. */
  async function post(token: string, form: Record<string, string>, headers = {}) {
    const request = new Request(`http://localhost:3000/v/${token}/answer`, {
      method: 'POST',
      headers: {
        origin: 'http://localhost:3000',
        'content-type': 'application/x-www-form-urlencoded',
        ...headers,
      },
      body: new URLSearchParams(form).toString(),
    });
    return answerRoute(request, { params: Promise.resolve({ token }) });
  }

  /** The forms of the page of other times. */
  async function choose(route: RouteHandler, token: string, form: Record<string, string>) {
    const request = new Request(`http://localhost:3000/v/${token}/hold`, {
      method: 'POST',
      headers: {
        origin: 'http://localhost:3000',
        'content-type': 'application/x-www-form-urlencoded',
      },
      body: new URLSearchParams(form).toString(),
    });
    return route(request, { params: Promise.resolve({ token }) });
  }

  async function itemsOf({ id }: BookedVisit) {
    const { db } = await database();
    return db.select().from(schedulerItems).where(eq(schedulerItems.visitId, id));
  }

  async function stateOf({ id }: BookedVisit) {
    const { db } = await database();
    const [row] = await db
      .select({ status: visits.status, says: visits.customerSays, version: visits.version })
      .from(visits)
      .where(eq(visits.id, id));
    return row;
  }

  it('shows this visit in words and nothing else of the shop', async () => {
    const { token } = await booked({ site: { yearBuilt: 1931 } });
    expect(await getCustomerVisit(token, 'here')).toEqual({
      language: 'en',
      region: 'US',
      shopName: 'Juniper Bend',
      shopPhone: '(212) 555-0142',
      kind: 'site-measure',
      status: 'booked',
      weekdayWords: 'Thursday',
      dateWords: 'January 10',
      windowWords: 'between 9:00 and 11:00 AM',
      untilWords: '',
      whoComes: ['Measurer'],
      street: '12 Alder Row',
      town: 'Fernhollow',
      customerSays: '',
      saysNotReady: false,
      arrivalWords: '',
      isOldHouse: true,
    });
  });

  it('speaks the customer’s language', async () => {
    const { token } = await booked({ customer: { language: 'es' } });
    expect(await getCustomerVisit(token, 'here')).toMatchObject({
      language: 'es',
      weekdayWords: 'jueves',
      dateWords: '17 de enero',
      windowWords: 'entre las 9:00 y las 11:00 a.m.',
    });
  });

  it('confirms by a plain form and sends the browser back to the page', async () => {
    const { visit, token } = await booked();
    const answer = await post(token, { answer: 'confirm' });
    expect(answer.status).toBe(303);
    expect(answer.headers.get('location')).toBe(`/v/${token}`);
    expect(await stateOf(visit)).toMatchObject({ status: 'confirmed', version: 2 });
    expect(await getCustomerVisit(token, 'here')).toMatchObject({ status: 'confirmed' });
    await post(token, { answer: 'confirm' });
    expect(await stateOf(visit)).toMatchObject({ status: 'confirmed', version: 2 });
  });

  it('confirms nothing when the page is read, however often', async () => {
    const { visit, token } = await booked();
    for (let count = 0; count < 5; count += 1) await getCustomerVisit(token, 'a scanner');
    expect(await stateOf(visit)).toMatchObject({ status: 'booked', version: 1 });
  });

  it('takes no answer from a foreign page', async () => {
    const { visit, token } = await booked();
    const answer = await post(token, { answer: 'confirm' }, { origin: 'https://evil.example' });
    expect(answer.status).toBe(403);
    const hidden = await post(token, { answer: 'confirm' }, { origin: 'null' });
    expect(hidden.status).toBe(403);
    expect(await stateOf(visit)).toMatchObject({ status: 'booked' });
  });

  it('keeps what the customer asks for, and un-confirms the visit', async () => {
    const { visit, token } = await booked();
    await post(token, { answer: 'confirm' });
    await post(token, { answer: 'another-time', words: 'Fridays after ten' });
    expect(await stateOf(visit)).toMatchObject({ status: 'booked', says: 'Fridays after ten' });
  });

  it('closes the gate of the job when the customer is not ready', async () => {
    const { visit, token } = await booked();
    await post(token, { answer: 'not-ready', power: 'yes', away: 'yes', words: 'Two weeks' });
    const { db } = await database();
    const notReady = async () => {
      const [job] = await db
        .select({ notReady: jobs.notReady })
        .from(jobs)
        .where(eq(jobs.id, visit.jobId));
      return job?.notReady;
    };
    expect(await notReady()).toBe('the power; nobody at home that day; Two weeks');
    const told = await db.select().from(messages).where(eq(messages.visitId, visit.id));
    expect(told.filter(({ occasion }) => occasion === 'not-ready')).toMatchObject([
      { cause: { reason: 'the power; nobody at home that day; Two weeks' } },
      { channel: 'email' },
    ]);
    expect(await itemsOf(visit)).toMatchObject([{ kind: 'not-ready', doneAt: null }]);
    expect(await getCustomerVisit(token, 'here')).toMatchObject({ saysNotReady: true });

    await post(token, { answer: 'ready-now' });
    expect(await notReady()).toBe('');
    expect(await itemsOf(visit)).toMatchObject([{ doneBy: 'The customer says that it is ready.' }]);
    expect(await getCustomerVisit(token, 'here')).toMatchObject({ saysNotReady: false });
  });

  it('asks for a call, which comes to the scheduler’s list once', async () => {
    const { visit, token } = await booked();
    for (let count = 0; count < 2; count += 1) await post(token, { answer: 'call-me', words: '' });
    expect(await itemsOf(visit)).toMatchObject([
      { kind: 'call-me', words: 'Measure: Call me, please' },
    ]);
  });

  it('keeps another time for a quarter of an hour and moves the visit there, by plain forms', async () => {
    const { visit, token } = await booked();
    const before = await getCustomerTimes(token, 'here');
    const [first, second] = before?.times ?? [];
    if (!first || !second) throw new Error('nothing was offered');
    const { date, time } = first;
    const kept = await choose(holdRoute, token, { date, time });
    expect(kept.headers.get('location')).toBe(`/v/${token}/times`);
    const held = await getCustomerTimes(token, 'here');
    expect(held?.hold).toMatchObject({ dayWords: first.dayWords, windowWords: first.windowWords });
    expect(await stateOf(visit)).toMatchObject({ status: 'booked', version: 1 });
    const heldVisitId = held?.hold?.heldVisitId ?? '';
    const taken = await choose(takeRoute, token, { heldVisitId });
    expect(taken.headers.get('location')).toBe(`/v/${token}`);
    expect(await stateOf(visit)).toMatchObject({ status: 'confirmed' });
    expect(await getCustomerVisit(token, 'here')).toMatchObject({
      windowWords: first.windowWords,
    });
    expect(await itemsOf(visit)).toMatchObject([{ kind: 'time-taken', doneAt: null }]);
    const again = await choose(takeRoute, token, { heldVisitId });
    expect(again.headers.get('location')).toBe(`/v/${token}/times?taken=1`);
  });

  it('keeps nothing that was not offered, and takes nothing that was kept for somebody else', async () => {
    const mine = await booked();
    const theirs = await booked();
    const times = await getCustomerTimes(theirs.token, 'here');
    const [offered] = times?.times ?? [];
    if (!offered) throw new Error('nothing was offered');
    const { date, time } = offered;
    const made = await choose(holdRoute, mine.token, { date, time: '03:17' });
    expect(made.headers.get('location')).toContain('taken=1');
    await choose(holdRoute, theirs.token, { date, time });
    const hold = (await getCustomerTimes(theirs.token, 'here'))?.hold;
    if (!hold) throw new Error('nothing was kept');
    const stolen = await choose(takeRoute, mine.token, { heldVisitId: hold.heldVisitId });
    expect(stolen.headers.get('location')).toContain('taken=1');
    expect(await stateOf(mine.visit)).toMatchObject({ status: 'booked', version: 1 });
    const guessed = await choose(holdRoute, newLinkToken(), { date, time });
    expect([guessed.status, guessed.headers.get('location')?.startsWith('/v/')]).toEqual([
      303,
      true,
    ]);
    expect(await getCustomerTimes(newLinkToken(), 'here')).toBeNull();
  });

  it('says when a late crew now arrives, that they are on the way, and that they are there', async () => {
    const { visit, token } = await booked();
    const ctx = await contextOf(shop, 'measurer', new Date(visit.startsAt));
    const at = visit.startsAt;
    await reportVisit(ctx, { visitId: visit.id, what: 'running-late', lateMinutes: 45, at });
    expect(await getCustomerVisit(token, 'here')).toMatchObject({
      arrivalWords: 'about 11:45 AM',
    });
    await reportVisit(ctx, { visitId: visit.id, what: 'arrived', at });
    expect(await getCustomerVisit(token, 'here')).toMatchObject({
      status: 'on-site',
      arrivalWords: '',
    });
  });

  it('answers a guess, an ended and a revoked link alike, and changes nothing by them', async () => {
    const ended = await booked();
    const revoked = await booked();
    await changeLink(ended.visit.id, { endsAt: new Date('2026-01-01T00:00:00Z') });
    await changeLink(revoked.visit.id, { revokedAt: new Date() });
    const guess = newLinkToken();
    for (const token of [guess, ended.token, revoked.token]) {
      expect(await getCustomerVisit(token, 'here')).toBeNull();
      const answer = await post(token, { answer: 'confirm' });
      expect([answer.status, answer.headers.get('location')]).toEqual([303, `/v/${token}`]);
      const request = new Request(`http://localhost:3000/v/${token}/calendar`);
      const calendar = await calendarRoute(request, { params: Promise.resolve({ token }) });
      expect(calendar.status).toBe(404);
    }
    expect(await stateOf(ended.visit)).toMatchObject({ status: 'booked', version: 1 });
    expect(await stateOf(revoked.visit)).toMatchObject({ status: 'booked', version: 1 });
  });

  it('answers only for its own visit, whatever the form names', async () => {
    const mine = await booked();
    const neighbour = await booked();
    await post(mine.token, {
      answer: 'confirm',
      token: neighbour.token,
      visitId: neighbour.visit.id,
    });
    expect(await stateOf(mine.visit)).toMatchObject({ status: 'confirmed' });
    expect(await stateOf(neighbour.visit)).toMatchObject({ status: 'booked' });
  });

  it('takes no answer once the crew is there, and no answer that it does not know', async () => {
    const { visit, token } = await booked();
    const { db } = await database();
    await db.update(visits).set({ status: 'on-site' }).where(eq(visits.id, visit.id));
    expect((await post(token, { answer: 'another-time', words: 'Later' })).status).toBe(303);
    expect(await stateOf(visit)).toMatchObject({ status: 'on-site', version: 1 });
    expect((await post(token, { answer: 'call-off' })).status).toBe(422);
  });

  it('keeps no token in the database', async () => {
    const { visit, token } = await booked();
    const { db } = await database();
    const [link] = await db.select().from(visitLinks).where(eq(visitLinks.visitId, visit.id));
    expect(JSON.stringify(link)).not.toContain(token);
    expect(token).toMatch(/^[\w-]{22}$/);
  });

  it('opens nothing any more after too many tries from one address', async () => {
    const { token } = await booked();
    for (let count = 0; count < 240; count += 1) await getCustomerVisit(newLinkToken(), 'guesser');
    expect(await getCustomerVisit(token, 'guesser')).toBeNull();
    expect(await getCustomerVisit(token, 'elsewhere')).not.toBeNull();
  });

  it('gives the visit as a calendar entry that another library reads', async () => {
    const { visit, token } = await booked();
    const request = new Request(`http://localhost:3000/v/${token}/calendar`);
    const answer = await calendarRoute(request, { params: Promise.resolve({ token }) });
    expect(answer.headers.get('content-type')).toContain('text/calendar');
    const calendar = new ICAL.Component(ICAL.parse(await answer.text()));
    expect(calendar.getFirstPropertyValue('method')).toBe('PUBLISH');
    const component = calendar.getFirstSubcomponent('vevent');
    const event = new ICAL.Event(component ?? undefined);
    expect(event.uid).toBe(`visit-${visit.id}@localhost`);
    expect(event.startDate.toJSDate().toISOString()).toBe(visit.startsAt);
    expect(event.endDate.toJSDate().toISOString()).toBe(visit.endsAt);
    expect(component?.getAllProperties('attendee')).toEqual([]);
    expect(event.location).toBe('12 Alder Row, Fernhollow');
  });
});
