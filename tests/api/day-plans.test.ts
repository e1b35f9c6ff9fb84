import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as acceptRoute } from '@/app/api/days/plan/accept/route';
import { POST as planRoute } from '@/app/api/days/plan/route';
import { crews, jobs, messages, sites, visitPieces, visits } from '@/db/schema';
import type { DayPlanView } from '@/lib/contracts/day-plans';
import type { BookedVisit } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

/** Far ahead of the wall clock by which the routes work; a Monday. */
const date = '2030-03-11';
const base = { lat: 41.28, lon: -58.31 };

describe('the order of a day', () => {
  let shop: TestShop;
  let crewId: string;
  let cookie: string;
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop));
    await putBase(crewId, base);
    cookie = await cookieOf(shop.people.scheduler);
  });

  async function putBase(id: string, { lat, lon }: typeof base) {
    const { db } = await database();
    await db.update(crews).set({ baseLatitude: lat, baseLongitude: lon }).where(eq(crews.id, id));
  }
  /** A stop some kilometres north of the base. */
  async function stop(
    kmNorth: number,
    time: string,
    given: { on?: string; crew?: string } = {},
  ): Promise<BookedVisit> {
    const { jobId } = await startTestJob(shop, { customer: { name: `Stop at ${kmNorth} km` } });
    const { db } = await database();
    const [job] = await db.select({ siteId: jobs.siteId }).from(jobs).where(eq(jobs.id, jobId));
    const place = { latitude: base.lat + kmNorth / 111.2, longitude: base.lon };
    await db
      .update(sites)
      .set(place)
      .where(eq(sites.id, job?.siteId ?? ''));
    const { on = date, crew = crewId } = given;
    return bookTestVisit(shop, { jobId, crewId: crew, date: on, time, workMinutes: 30 });
  }
  const plan = async (body: object, as = cookie) =>
    callRoute(planRoute, { cookie: as, body: { date, ...body } });
  const accept = (view: DayPlanView, as = cookie, key = randomUUID()) =>
    callRoute(acceptRoute, {
      cookie: as,
      body: { idempotencyKey: key, date: view.date, changes: view.changes },
    });
  const stateOf = async (shopId: string) => {
    const { db } = await database();
    const pieces = await db
      .select({ visitId: visitPieces.visitId, startsAt: visitPieces.startsAt })
      .from(visitPieces)
      .where(eq(visitPieces.shopId, shopId))
      .orderBy(visitPieces.startsAt, visitPieces.visitId);
    const versions = await db
      .select({ id: visits.id, version: visits.version })
      .from(visits)
      .where(eq(visits.shopId, shopId))
      .orderBy(visits.id);
    return { pieces, versions };
  };

  it('shows drives, slack and a better order within the promises, and is taken as a whole', async () => {
    const far = await stop(9, '08:00');
    const near = await stop(3, '09:00');
    const farther = await stop(10, '10:00');
    const { body } = await plan({ crewIds: [crewId] });
    const view = body as DayPlanView;
    const [now] = view.now;
    expect(now?.stops.map(({ visitId }) => visitId)).toEqual([far.id, near.id, farther.id]);
    expect(now?.troubles).toEqual([]);
    expect(now?.stops.every(({ slackMinutes, isFixed }) => slackMinutes > 0 && !isFixed)).toBe(
      true,
    );
    expect(view.betterDriveMinutes).toBeLessThan(view.nowDriveMinutes);
    const [better] = view.better;
    // The two far ones are one trip; the near one is before or after it.
    expect(better?.stops[1]?.visitId).not.toBe(near.id);
    for (const planned of better?.stops ?? []) {
      expect(planned.startsAt >= planned.windowStartsAt).toBe(true);
      expect(planned.startsAt <= planned.windowEndsAt).toBe(true);
    }

    const { db } = await database();
    const told = await db.$count(messages, eq(messages.shopId, shop.shop.id));
    const key = randomUUID();
    expect(await accept(view, cookie, key)).toMatchObject({
      status: 200,
      body: { changed: view.changes.length },
    });
    expect((await accept(view, cookie, key)).status).toBe(200);
    expect(await db.$count(messages, eq(messages.shopId, shop.shop.id))).toBe(told);
    const after = (await plan({ crewIds: [crewId] })).body as DayPlanView;
    expect(after.changes).toEqual([]);
    expect(after.nowDriveMinutes).toBe(view.betterDriveMinutes);
  });

  it('changes nothing when one of the visits is different by now', async () => {
    const on = '2030-03-12';
    await stop(9, '08:00', { on });
    await stop(3, '09:00', { on });
    await stop(10, '10:00', { on });
    const view = (await plan({ date: on, crewIds: [crewId] })).body as DayPlanView;
    expect(view.changes.length).toBeGreaterThan(1);
    const before = await stateOf(shop.shop.id);
    const [first, ...rest] = view.changes;
    if (!first) throw new Error('no change');
    const stale = { ...view, changes: [...rest, { ...first, version: first.version + 1 }] };
    expect(await accept(stale)).toMatchObject({ status: 409, body: { code: 'visit-changed' } });
    const outside = { ...first, startsAt: `${on}T21:00:00.000Z` };
    const broken = { ...view, changes: [...rest, outside] };
    expect(await accept(broken)).toMatchObject({ status: 422, body: { code: 'breaks-a-promise' } });
    expect(await stateOf(shop.shop.id)).toEqual(before);
  });

  it('gives the stops of several crews to those who are near', async () => {
    const on = '2030-03-13';
    const north = await makeCrew(shop, 'measure', [shop.people.owner.personId]);
    await putBase(north.crewId, { ...base, lat: base.lat + 20 / 111.2 });
    const nearNorth = await stop(19, '09:00', { on });
    const nearBase = await stop(1, '09:00', { on, crew: north.crewId });
    const crewIds = [crewId, north.crewId];
    const view = (await plan({ date: on, crewIds })).body as DayPlanView;
    const of = (id: string) =>
      view.better.find((day) => day.crewId === id)?.stops.map(({ visitId }) => visitId);
    expect([of(crewId), of(north.crewId)]).toEqual([[nearBase.id], [nearNorth.id]]);
    expect((await accept(view)).status).toBe(200);
    const { db } = await database();
    const [moved] = await db
      .select({ crewId: visits.crewId, version: visits.version })
      .from(visits)
      .where(eq(visits.id, nearNorth.id));
    expect(moved).toEqual({ crewId: north.crewId, version: 2 });
  });

  it('says which drive does not fit, and mends the day where an order does', async () => {
    const on = '2030-03-14';
    await stop(0, '08:00', { on });
    await stop(40, '08:30', { on });
    const view = (await plan({ date: on, crewIds: [crewId] })).body as DayPlanView;
    expect(view.now[0]?.troubles[0]).toMatch(/^The drive to Stop at 40 km takes \d+ min: \d+ more/);
    expect(view.better[0]?.troubles).toEqual([]);
    expect(view.changes).toHaveLength(1);
  });

  it('is refused to a role that does not book, and knows no crew or visit of another shop', async () => {
    const bench = await cookieOf(shop.people.bench);
    const other = await cookieOf((await makeShop()).people.owner);
    const visit = await stop(2, '08:00', { on: '2030-03-15' });
    const change = { visitId: visit.id, version: 1, crewId, startsAt: visit.startsAt };
    const view = { date: '2030-03-15', changes: [change] } as unknown as DayPlanView;
    const answers = [
      await plan({ crewIds: [crewId] }, bench),
      await accept(view, bench),
      await plan({ crewIds: [crewId] }, other),
      await accept(view, other),
    ];
    expect(answers.map(({ status }) => status)).toEqual([403, 403, 404, 404]);
  });
});
