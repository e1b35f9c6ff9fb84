import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { POST as holdRoute } from '@/app/api/openings/hold/route';
import { POST as letGoRoute } from '@/app/api/openings/let-go/route';
import { POST as openingsRoute } from '@/app/api/openings/route';
import { POST as takeRoute } from '@/app/api/openings/take/route';
import { jobs, sites, visits } from '@/db/schema';
import {
  findOpeningsInput,
  type HeldVisit,
  holdOpeningInput,
  type OpeningsView,
} from '@/lib/contracts/openings';
import type { VisitView } from '@/lib/contracts/visits';
import type { CustomerContext } from '@/server/base/context';
import { database } from '@/server/base/database';
import { findOpenings } from '@/server/visits/find-openings';
import { holdForCustomer } from '@/server/visits/hold-for-customer';
import { holdOpening } from '@/server/visits/hold-opening';
import { moveVisit } from '@/server/visits/move-visit';
import { offerTimes } from '@/server/visits/offer-times';
import { takeHeldTime } from '@/server/visits/take-held-time';
import { takeTimeAsCustomer } from '@/server/visits/take-time-as-customer';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

/** Tuesday 2026-12-01, ten in the morning in New York. */
const now = new Date('2026-12-01T15:00:00Z');
const later = (minutes: number) => new Date(now.getTime() + minutes * 60_000);

describe('times that work', () => {
  let shop: TestShop;
  let crew: { crewId: string; name: string };
  let jobId: string;
  beforeEach(async () => {
    shop = await makeShop();
    crew = await makeCrew(shop);
    ({ jobId } = await startTestJob(shop));
  });

  const ask = async (given: object = {}, at = now) =>
    findOpenings(
      await contextOf(shop, 'scheduler', at),
      findOpeningsInput.parse({ jobId, kind: 'site-measure', ...given }),
    );
  const hold = async (given: object = {}, at = now) =>
    holdOpening(
      await contextOf(shop, 'scheduler', at),
      holdOpeningInput.parse({
        idempotencyKey: randomUUID(),
        jobId,
        kind: 'site-measure',
        crewId: crew.crewId,
        date: '2026-12-10',
        time: '09:00',
        ...given,
      }),
    );
  const take = async (visitId: string, at = now) =>
    takeHeldTime(await contextOf(shop, 'scheduler', at), { visitId });
  const rowsOfJob = async () => {
    const { db } = await database();
    return db
      .select({ id: visits.id, status: visits.status })
      .from(visits)
      .where(eq(visits.jobId, jobId));
  };

  it('are offered with their reason, and booked as they are offered', async () => {
    const { openings, state, found } = await ask({ from: '2026-12-02', limit: 3 });
    const [first] = openings;
    expect(state).toBe('now');
    expect(found).toBeGreaterThan(60);
    expect(first).toMatchObject({
      crewName: crew.name,
      date: '2026-12-02',
      time: '08:00',
      dayWords: 'Wed, Dec 2',
      windowWords: '8:00-10:00 AM',
      workMinutes: 90,
      isDriveEstimated: true,
    });
    expect(first?.why).toMatch(
      /^An empty day for Measure \d+: 40 min of driving, .* still free\.$/,
    );
    const { date, time, workMinutes } = first ?? openings[0] ?? raise();
    const booked = await bookTestVisit(shop, {
      jobId,
      crewId: crew.crewId,
      date,
      time,
      workMinutes,
    });
    expect(booked.pieces.map(({ startsAt, endsAt }) => ({ startsAt, endsAt }))).toEqual(
      first?.pieces,
    );
  });

  it('leave out what is taken, by the crew or by one of its people in another crew', async () => {
    const pair = await makeCrew(shop, 'measure', [
      shop.people.measurer.personId,
      shop.people.owner.personId,
    ]);
    const other = await startTestJob(shop);
    await bookTestVisit(shop, {
      jobId: other.jobId,
      crewId: pair.crewId,
      date: '2026-12-10',
      workMinutes: 420,
    });
    const days = { from: '2026-12-10', until: '2026-12-10' };
    const { openings, whyNone } = await ask({ ...days, crewIds: [crew.crewId] });
    expect(openings).toEqual([]);
    expect(whyNone).toMatch(/Nothing is free until Thu, Dec 10/);
    const two = await ask({ from: '2026-12-11', peopleNeeded: 2 });
    expect(new Set(two.openings.map(({ crewId }) => crewId))).toEqual(new Set([pair.crewId]));
  });

  it('count the visit’s own time as free when another time is looked for it', async () => {
    const visit = await bookTestVisit(shop, { jobId, crewId: crew.crewId, workMinutes: 420 });
    const day = { from: '2026-12-10', until: '2026-12-10' };
    expect((await ask(day)).openings).toEqual([]);
    const { openings } = await ask({ ...day, visitId: visit.id });
    expect(openings.map(({ workMinutes }) => workMinutes)).toEqual([420]);
  });

  it('say the gate that stands against all of them, and are offered under an override', async () => {
    const { db } = await database();
    await db.update(jobs).set({ wallsReady: 'not-yet' }).where(eq(jobs.id, jobId));
    const blocked = await ask();
    expect(blocked).toMatchObject({ state: 'blocked', openings: [], from: null });
    expect(blocked.whyNone).toMatch(/walls not closed/);
    expect((await ask({ isGateOverridden: true })).openings.length).toBeGreaterThan(0);
    await db.update(jobs).set({ siteReadyOn: '2026-12-15' }).where(eq(jobs.id, jobId));
    const from = await ask();
    expect([from.state, from.openings[0]?.date]).toEqual(['from', '2026-12-15']);
  });

  it('say that no crew goes out for the kind', async () => {
    const { whyNone } = await ask({ kind: 'install', isGateOverridden: true });
    expect(whyNone).toBe('No crew goes out for this: install. Make one in Crews.');
  });

  it('put the visit beside a stop on the same road', async () => {
    const { db } = await database();
    const neighbour = await startTestJob(shop);
    const place = { latitude: 41.28, longitude: -58.31 };
    await db.update(sites).set(place).where(eq(sites.shopId, shop.shop.id));
    await bookTestVisit(shop, { jobId: neighbour.jobId, crewId: crew.crewId, date: '2026-12-04' });
    const [first] = (await ask()).openings;
    expect([first?.date, first?.driveAddedMinutes]).toEqual(['2026-12-04', 0]);
    expect(first?.why).toMatch(/^(Before|After) Robin Testwood in Fernhollow: no more driving/);
  });

  it('are kept by a hold that blocks everybody else, and taken within the quarter', async () => {
    const held = await hold();
    expect(held).toMatchObject({ status: 'held', holdEndsAt: later(15).toISOString() });
    const other = await startTestJob(shop);
    const taken = bookTestVisit(shop, { jobId: other.jobId, crewId: crew.crewId }, later(14));
    expect(await refusalOf(taken)).toMatchObject({ code: 'crew-already-booked' });
    const booked = await take(held.id, later(14));
    expect(booked).toMatchObject({ id: held.id, status: 'booked', version: 2 });
    expect(await refusalOf(take(held.id, later(14)))).toMatchObject({ code: 'hold-over' });
  });

  it('are free again when the hold is over, without anybody tidying up', async () => {
    const held = await hold();
    const other = await startTestJob(shop);
    const booked = await bookTestVisit(
      shop,
      { jobId: other.jobId, crewId: crew.crewId },
      later(15),
    );
    expect(booked.status).toBe('booked');
    expect(await refusalOf(take(held.id, later(16)))).toMatchObject({ code: 'hold-over' });
    expect(await rowsOfJob()).toEqual([]);
  });

  it('keep one hold for one need: another choice frees the first, and a repeat is the first', async () => {
    const key = randomUUID();
    const first = await hold({ idempotencyKey: key });
    expect((await hold({ idempotencyKey: key })).id).toBe(first.id);
    const second = await hold({ time: '13:00' });
    expect(await rowsOfJob()).toEqual([{ id: second.id, status: 'held' }]);
  });

  it('are not moved while they are only held', async () => {
    const held = await hold();
    const move = moveVisit(await contextOf(shop, 'scheduler', now), {
      visitId: held.id,
      version: held.version,
      crewId: crew.crewId,
      date: '2026-12-11',
      time: '09:00',
      overrideReason: '',
    });
    expect(await refusalOf(move)).toMatchObject({ code: 'visit-only-held' });
  });

  it('move a booked visit when the time held for it is taken', async () => {
    const visit = await bookTestVisit(shop, { jobId, crewId: crew.crewId });
    const held = await hold({ forVisitId: visit.id, date: '2026-12-14' });
    expect(held.workMinutes).toBe(visit.workMinutes);
    const moved = await take(held.id);
    expect(moved).toMatchObject({ id: visit.id, version: 2, dayWords: 'Mon, Dec 14' });
    expect(await rowsOfJob()).toEqual([{ id: visit.id, status: 'booked' }]);
  });

  describe('for the customer', () => {
    let visit: VisitView;
    let ctx: CustomerContext;
    const at = (minutes: number): CustomerContext => ({ ...ctx, now: later(minutes) });
    beforeEach(async () => {
      visit = await bookTestVisit(shop, { jobId, crewId: crew.crewId });
      const { db, shop: context, log } = await contextOf(shop, 'owner', now);
      const [job] = await db
        .select({ customerId: jobs.customerId })
        .from(jobs)
        .where(eq(jobs.id, jobId));
      const actor = {
        kind: 'customer',
        name: 'Robin',
        customerId: job?.customerId ?? '',
        visitId: visit.id,
      } as const;
      ctx = { shop: context, actor, db, now, log };
    });

    it('are a few other times in their words, none of them the booked one', async () => {
      const { times, hold: held } = await offerTimes(ctx);
      expect(held).toBeNull();
      expect(times).toHaveLength(6);
      expect(times[0]?.dayWords).toBe('Thursday, December 3');
      expect(times[0]?.windowWords).toBe('between 8:00 and 10:00 AM');
      // Who works in the mornings finds as many afternoons.
      expect(times.filter(({ time }) => time >= '12:00')).toHaveLength(3);
      expect(times.some(({ date, time }) => date === '2026-12-10' && time === '09:00')).toBe(false);
    });

    it('can be kept and taken: the visit moves, is confirmed, and the hold is gone', async () => {
      const { times } = await offerTimes(ctx);
      const chosen = times[1] ?? raise();
      await holdForCustomer(ctx, chosen);
      const { hold: held } = await offerTimes(at(10));
      expect(held).toMatchObject({ dayWords: chosen.dayWords, windowWords: chosen.windowWords });
      await takeTimeAsCustomer(at(14), held?.heldVisitId ?? '');
      expect(await rowsOfJob()).toEqual([{ id: visit.id, status: 'confirmed' }]);
      expect((await offerTimes(at(14))).hold).toBeNull();
    });

    it('are refused when they were never offered, or the quarter of an hour is over', async () => {
      const madeUp = { crewId: crew.crewId, date: '2026-12-02', time: '08:00' };
      expect(await refusalOf(holdForCustomer(ctx, madeUp))).toMatchObject({
        code: 'time-just-taken',
      });
      const { times } = await offerTimes(ctx);
      await holdForCustomer(ctx, times[0] ?? raise());
      const { hold: held } = await offerTimes(ctx);
      const late = takeTimeAsCustomer(at(15), held?.heldVisitId ?? '');
      expect(await refusalOf(late)).toMatchObject({ code: 'hold-over' });
      expect((await offerTimes(at(15))).hold).toBeNull();
    });

    it('do not let one customer take the time that is held for another', async () => {
      const other = await startTestJob(shop);
      const theirs = await hold({ jobId: other.jobId, date: '2026-12-16' });
      expect(await refusalOf(takeTimeAsCustomer(ctx, theirs.id))).toMatchObject({
        code: 'hold-over',
      });
    });
  });
});

describe('openings by HTTP', () => {
  let shop: TestShop;
  let crewId: string;
  let jobId: string;
  const cookies = { scheduler: '', bench: '', other: '' };
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop));
    ({ jobId } = await startTestJob(shop));
    cookies.scheduler = await cookieOf(shop.people.scheduler);
    cookies.bench = await cookieOf(shop.people.bench);
    cookies.other = await cookieOf((await makeShop()).people.owner);
  });
  const asked = () => ({ jobId, kind: 'site-measure' });

  it('offers, holds, lets go, holds again and takes', async () => {
    const { scheduler: cookie } = cookies;
    const offered = await callRoute(openingsRoute, { cookie, body: asked() });
    const [opening] = (offered.body as OpeningsView).openings;
    const body = { ...asked(), crewId, date: opening?.date, time: opening?.time };
    const holdOnce = () =>
      callRoute(holdRoute, { cookie, body: { ...body, idempotencyKey: randomUUID() } });
    const held = (await holdOnce()).body as HeldVisit;
    const letGo = { cookie, body: { visitId: held.id } };
    expect((await callRoute(letGoRoute, letGo)).status).toBe(200);
    expect((await callRoute(letGoRoute, letGo)).status).toBe(409);
    const again = (await holdOnce()).body as HeldVisit;
    const taken = await callRoute(takeRoute, { cookie, body: { visitId: again.id } });
    expect(taken).toMatchObject({ status: 200, body: { status: 'booked' } });
  });

  it('is refused to a role that does not book', async () => {
    const { bench: cookie } = cookies;
    const hold = {
      ...asked(),
      idempotencyKey: randomUUID(),
      crewId,
      date: '2030-01-07',
      time: '09:00',
    };
    const answers = [
      await callRoute(openingsRoute, { cookie, body: asked() }),
      await callRoute(holdRoute, { cookie, body: hold }),
      await callRoute(takeRoute, { cookie, body: { visitId: randomUUID() } }),
      await callRoute(letGoRoute, { cookie, body: { visitId: randomUUID() } }),
    ];
    expect(answers.map(({ status }) => status)).toEqual([403, 403, 403, 403]);
  });

  it('knows no job, crew or held time of another shop', async () => {
    const { other: cookie } = cookies;
    const hold = {
      ...asked(),
      idempotencyKey: randomUUID(),
      crewId,
      date: '2030-01-07',
      time: '09:00',
    };
    const held = (await callRoute(holdRoute, { cookie: cookies.scheduler, body: hold }))
      .body as HeldVisit;
    const answers = [
      await callRoute(openingsRoute, { cookie, body: asked() }),
      await callRoute(holdRoute, { cookie, body: { ...hold, idempotencyKey: randomUUID() } }),
      await callRoute(takeRoute, { cookie, body: { visitId: held.id } }),
      await callRoute(letGoRoute, { cookie, body: { visitId: held.id } }),
    ];
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 409, 409]);
  });

  it('says what is wrong with a question', async () => {
    const body = { ...asked(), from: '2030-01-07', until: '2030-01-01' };
    const { status } = await callRoute(openingsRoute, { cookie: cookies.scheduler, body });
    expect(status).toBe(422);
  });
});

function raise(): never {
  throw new Error('nothing was offered');
}
