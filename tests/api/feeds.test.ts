import ICAL from 'ical.js';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as readFeedRoute } from '@/app/api/feeds/[token]/route';
import { GET as listRoute, POST as makeRoute, DELETE as revokeRoute } from '@/app/api/feeds/route';
import type { FeedView } from '@/lib/contracts/feeds';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { moveVisit } from '@/server/visits/move-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('a calendar feed', () => {
  let shop: TestShop;
  let scheduler: string;
  let crewId: string;
  beforeAll(async () => {
    shop = await makeShop();
    scheduler = await cookieOf(shop.people.scheduler);
    crewId = (await makeCrew(shop, 'fit')).crewId;
  });

  const make = async (body: object, cookie = scheduler) => callRoute(makeRoute, { cookie, body });
  const addressOf = async (body: object) => {
    const { body: made } = await make(body);
    return made as { feedId: string; address: string };
  };

  async function fetchFeed(address: string, headers: Record<string, string> = {}) {
    const token = address.split('/').at(-1) ?? '';
    // A calendar program: no cookie, no origin.
    const request = new Request(address, { headers });
    const answer = await readFeedRoute(request, { params: Promise.resolve({ token }) });
    return { status: answer.status, headers: answer.headers, text: await answer.text() };
  }

  function eventsOf(text: string) {
    const calendar = new ICAL.Component(ICAL.parse(text));
    return calendar.getAllSubcomponents('vevent').map((component) => {
      const event = new ICAL.Event(component);
      return {
        uid: event.uid,
        sequence: event.sequence,
        summary: event.summary,
        location: event.location,
        startsAt: event.startDate.toJSDate().toISOString(),
        endsAt: event.endDate.toJSDate().toISOString(),
        isUtc: event.startDate.zone === ICAL.Timezone.utcTimezone,
        status: component.getFirstPropertyValue('status'),
        stamp: component.getFirstPropertyValue('dtstamp'),
      };
    });
  }

  /** Three days of eight hours over a weekend and over no clock change, far ahead. */
  async function bookInstall(of = { jobTitle: 'Kitchen, L, 11 units', name: 'Robin Testwood' }) {
    const { jobId } = await startTestJob(shop, {
      title: of.jobTitle,
      customer: { name: of.name },
      site: { wayIn: 'Side door; ring twice, and mind the step, the dog; the gate' },
    });
    return bookTestVisit(shop, {
      jobId,
      crewId,
      kind: 'install',
      date: '2099-12-11',
      time: '08:00',
      workMinutes: 960,
      overrideReason: 'test',
    });
  }

  it('is read by another library as the diary has it, day by day, in UTC', async () => {
    const { address } = await addressOf({ crewId });
    const visit = await bookInstall();
    const { text, headers } = await fetchFeed(address);
    expect(headers.get('content-type')).toBe('text/calendar; charset=utf-8');
    expect(eventsOf(text)).toMatchObject([
      {
        uid: `diary-${visit.id}@localhost`,
        sequence: 1,
        summary: 'Install: Robin Testwood, Fernhollow (day 1 of 2)',
        location: '12 Alder Row, Fernhollow',
        startsAt: '2099-12-11T13:00:00.000Z',
        endsAt: '2099-12-11T21:00:00.000Z',
        isUtc: true,
        status: 'TENTATIVE',
      },
      { uid: `diary-${visit.id}-day-2@localhost`, startsAt: '2099-12-14T13:00:00.000Z' },
    ]);
    const ctx = await contextOf(shop, 'scheduler');
    const moved = await moveVisit(ctx, {
      visitId: visit.id,
      version: visit.version,
      crewId,
      date: '2099-12-15',
      time: '08:00',
      overrideReason: 'test',
    });
    expect(eventsOf((await fetchFeed(address)).text)).toMatchObject([
      { uid: `diary-${visit.id}@localhost`, sequence: 2, startsAt: '2099-12-15T13:00:00.000Z' },
      { uid: `diary-${visit.id}-day-2@localhost`, sequence: 2 },
    ]);
    await callOffVisit(ctx, {
      visitId: visit.id,
      version: moved.version,
      reason: 'sold the house',
    });
    expect(eventsOf((await fetchFeed(address)).text)).toMatchObject([
      { uid: `diary-${visit.id}@localhost`, sequence: 3, status: 'CANCELLED' },
    ]);
  });

  it('keeps to RFC 5545: lines of 75 octets, CR LF, one UID and DTSTAMP an entry, text escaped', async () => {
    const long = {
      jobTitle: 'Küche, große Insel; 23 units — ñandú 🪚'.repeat(2),
      name: 'Señora Ángeles Núñez de la Peña y Ordóñez',
    };
    const visit = await bookInstall(long);
    const { address } = await addressOf({ crewId });
    const { text } = await fetchFeed(address);
    // 3.1: content lines end with CR LF and are folded at 75 octets, without the line break.
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    const lines = text.split('\r\n');
    for (const line of lines) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
    expect(text).not.toContain('\uFFFD');
    // 3.6: a calendar has one PRODID and VERSION 2.0; 3.6.1: an entry has one UID and one DTSTAMP.
    const unfolded = text.replaceAll('\r\n ', '');
    expect(unfolded.match(/^VERSION:2\.0\r$/gm)).toHaveLength(1);
    expect(unfolded.match(/^PRODID:/gm)).toHaveLength(1);
    for (const entry of unfolded.split('BEGIN:VEVENT').slice(1)) {
      for (const name of ['UID', 'DTSTAMP', 'DTSTART', 'DTEND', 'SEQUENCE', 'STATUS']) {
        expect(entry.match(new RegExp(`^${name}[:;]`, 'gm'))).toHaveLength(1);
      }
      // 3.3.5: form 2, with UTC.
      expect(entry).toMatch(/^DTSTART:\d{8}T\d{6}Z\r$/m);
      expect(entry).toMatch(/^DTSTAMP:\d{8}T\d{6}Z\r$/m);
    }
    expect(unfolded).toContain('ring twice\\, and mind the step\\, the dog\\; the gate');
    const mine = eventsOf(text).filter(({ uid }) => uid.includes(visit.id));
    expect(mine[0]?.summary).toContain(long.name);
    expect(new Set(eventsOf(text).map(({ uid }) => uid)).size).toBe(eventsOf(text).length);
  });

  it('is not sent again when nothing has changed, and is when a visit has', async () => {
    const { address } = await addressOf({ crewId });
    const first = await fetchFeed(address);
    const mark = first.headers.get('etag') ?? '';
    expect(mark).toMatch(/^"[\w-]+"$/);
    const again = await fetchFeed(address, { 'if-none-match': `W/${mark}` });
    expect([again.status, again.text]).toEqual([304, '']);
    const { jobId } = await startTestJob(shop);
    await bookTestVisit(shop, {
      jobId,
      crewId,
      kind: 'install',
      date: '2099-12-21',
      overrideReason: 'x',
      workMinutes: 60,
    });
    expect((await fetchFeed(address, { 'if-none-match': mark })).status).toBe(200);
  });

  it('of a person has the days on which they go, and no others', async () => {
    const person = await addressOf({ personId: shop.people.measurer.personId });
    const measure = (await makeCrew(shop, 'measure')).crewId;
    const { jobId } = await startTestJob(shop);
    const visit = await bookTestVisit(shop, { jobId, crewId: measure, date: '2099-12-22' });
    expect(eventsOf((await fetchFeed(person.address)).text).map(({ uid }) => uid)).toEqual([
      `diary-${visit.id}@localhost`,
    ]);
  });

  it('taken back, guessed or of another shop gives the same answer', async () => {
    const { feedId, address } = await addressOf({ crewId });
    const other = await makeShop();
    const revoke = (cookie: string) =>
      callRoute(revokeRoute, { method: 'DELETE', cookie, body: { feedId } });
    expect((await revoke(await cookieOf(other.people.owner))).status).toBe(404);
    expect((await revoke(await cookieOf(shop.people.bench))).status).toBe(404);
    expect((await fetchFeed(address)).status).toBe(200);
    expect((await revoke(scheduler)).status).toBe(200);
    const gone = await fetchFeed(address);
    const guessed = await fetchFeed('http://localhost:3000/api/feeds/AAAAAAAAAAAAAAAAAAAAAA.ics');
    expect([gone.status, guessed.status]).toEqual([404, 404]);
    expect(gone.text).toBe(guessed.text);
  });

  it('is given by the office, and by each for themselves', async () => {
    const crew = await cookieOf(shop.people.crew);
    const own = { personId: shop.people.crew.personId };
    const others = { personId: shop.people.measurer.personId };
    expect((await make(others, crew)).status).toBe(403);
    expect((await make(own, crew)).status).toBe(200);
    expect((await make({ crewId }, crew)).status).toBe(200);
    expect((await make({ crewId }, await cookieOf(shop.people.bench))).status).toBe(403);
    expect((await make({ crewId, ...own })).status).toBe(422);
    const other = await makeShop();
    const stranger = await cookieOf(other.people.owner);
    expect((await make({ crewId }, stranger)).status).toBe(404);
    const list = async (cookie: string) =>
      (await callRoute(listRoute, { method: 'GET', cookie })).body as FeedView[];
    expect(await list(stranger)).toEqual([]);
    expect((await list(crew)).map((feed) => feed.personId)).toEqual([own.personId, null]);
    expect((await list(scheduler)).length).toBeGreaterThan(2);
    expect((await callRoute(listRoute, { method: 'GET' })).status).toBe(401);
  });
});
