import { eq } from 'drizzle-orm';
import ICAL from 'ical.js';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as answerRoute } from '@/app/v/[token]/answer/route';
import { GET as calendarRoute } from '@/app/v/[token]/calendar/route';
import { jobs, visitLinks, visits } from '@/db/schema';
import type { BookedVisit } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { newLinkToken } from '@/server/base/secret';
import { getCustomerVisit } from '@/server/visits/get-customer-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { changeLink, tokenOfVisit } from '../help/link-of';
import { makeCrew } from '../help/make-crew';
import { makeShop, type TestShop } from '../help/make-shop';
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
    await post(token, { answer: 'not-ready', words: 'No power yet' });
    const { db } = await database();
    const [job] = await db
      .select({ notReady: jobs.notReady })
      .from(jobs)
      .where(eq(jobs.id, visit.jobId));
    expect(job?.notReady).toBe('No power yet');
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
