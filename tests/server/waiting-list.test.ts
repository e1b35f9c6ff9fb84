import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { jobs, readings, releases, rooms, runs, visits, walls } from '@/db/schema';
import type { WaitingItem } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { sayReady } from '@/server/jobs/say-ready';
import { getWaitingList } from '@/server/visits/get-waiting-list';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('the waiting list', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  const list = async (of = shop): Promise<WaitingItem[]> =>
    getWaitingList(await contextOf(of, 'scheduler'));
  const itemOf = async (jobId: string) => (await list()).find((item) => item.jobId === jobId);

  /** A room with one wall, one run and a released revision A, released on 2026-11-02. */
  async function released(floorAgreed = true): Promise<{ jobId: string; roomId: string }> {
    const { jobId } = await startTestJob(shop);
    const { db } = await database();
    const shopId = shop.shop.id;
    const takenBy = shop.people.measurer.personId;
    await db.update(jobs).set({ stage: 'released', floorAgreed }).where(eq(jobs.id, jobId));
    const [room] = await db
      .insert(rooms)
      .values({ shopId, jobId, name: 'Kitchen', submittedAt: new Date('2026-10-20T15:00:00Z') })
      .returning({ id: rooms.id });
    if (!room) throw new Error('the room was not made');
    const roomId = room.id;
    const [wall] = await db
      .insert(walls)
      .values({
        shopId,
        roomId,
        chain: 0,
        chainClosed: false,
        position: 0,
        name: 'A',
        nominalLengthMm: 3000,
      })
      .returning({ id: walls.id });
    if (!wall) throw new Error('the wall was not made');
    await db.insert(runs).values({
      shopId,
      roomId,
      wallId: wall.id,
      name: 'Run A',
      body: {} as (typeof runs.$inferInsert)['body'],
    });
    await db.insert(releases).values({
      shopId,
      roomId,
      revision: 'A',
      engineVersion: '1',
      readingIds: [],
      wallBook: {} as (typeof releases.$inferInsert)['wallBook'],
      runs: [],
      rules: {} as (typeof releases.$inferInsert)['rules'],
      fit: {} as (typeof releases.$inferInsert)['fit'],
      changes: [],
      releasedAt: new Date('2026-11-02T15:00:00Z'),
      releasedBy: takenBy,
    });
    return { jobId, roomId };
  }

  it('offers a measure now, and says why not where the walls are open', async () => {
    const ready = await startTestJob(shop);
    const open = await startTestJob(shop, { wallsReady: 'not-yet' });
    const dated = await startTestJob(shop, { wallsReady: 'not-yet', siteReadyOn: '2026-12-14' });
    expect(await itemOf(ready.jobId)).toMatchObject({
      kind: 'site-measure',
      state: 'now',
      from: '2026-12-01',
      workMinutes: 90,
      openGates: [],
    });
    expect(await itemOf(dated.jobId)).toMatchObject({
      state: 'from',
      from: '2026-12-14',
      why: 'from Mon, Dec 14: walls closed by then',
    });
    expect(await itemOf(open.jobId)).toMatchObject({
      state: 'blocked',
      from: null,
      why: 'not yet: walls not closed, and no date for it',
      openGates: [{ gate: 'site-ready' }],
    });
  });

  it('puts what can be booked first, then what can be later, then what waits', async () => {
    const order = { now: 0, from: 1, blocked: 2 };
    const ranks = (await list()).map(({ state }) => order[state]);
    expect(new Set(ranks).size).toBe(3);
    expect(ranks).toEqual([...ranks].sort());
  });

  it('takes a job off while its visit stands, and puts it back when nobody was home', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop);
    const visit = await bookTestVisit(shop, { jobId, crewId });
    expect(await itemOf(jobId)).toBeUndefined();
    const { db } = await database();
    await db.update(visits).set({ status: 'missed' }).where(eq(visits.id, visit.id));
    expect(await itemOf(jobId)).toMatchObject({ kind: 'site-measure' });
  });

  it('offers the install after the lead time, at once when the bench says ready', async () => {
    const { jobId } = await released();
    // 40 working days after 2026-11-02, Monday to Friday.
    expect(await itemOf(jobId)).toMatchObject({
      kind: 'install',
      state: 'from',
      from: '2026-12-28',
      why: 'from Mon, Dec 28: 40 working days after revision A',
    });
    await sayReady(await contextOf(shop, 'bench'), { jobId, readyOn: '2026-12-01' });
    expect(await itemOf(jobId)).toMatchObject({ kind: 'install', state: 'now' });
  });

  it('waits with the install for the floor, and for a revision that knows the newest readings', async () => {
    const { jobId } = await released(false);
    expect(await itemOf(jobId)).toMatchObject({
      state: 'blocked',
      openGates: expect.arrayContaining([expect.objectContaining({ gate: 'floor-agreed' })]),
    });
    const later = await released();
    const { db } = await database();
    await db.insert(readings).values({
      shopId: shop.shop.id,
      roomId: later.roomId,
      kind: 'length',
      body: {} as (typeof readings.$inferInsert)['body'],
      takenAt: new Date('2026-11-20T15:00:00Z'),
      takenBy: shop.people.measurer.personId,
    });
    expect(await itemOf(later.jobId)).toMatchObject({
      state: 'blocked',
      why: 'not yet: readings are newer than revision A: release again',
    });
  });

  it('leaves jobs on hold and called off alone, and counts units and crew into the time', async () => {
    const held = await startTestJob(shop);
    const { db } = await database();
    await db.update(jobs).set({ stage: 'on-hold' }).where(eq(jobs.id, held.jobId));
    expect(await itemOf(held.jobId)).toBeUndefined();
    const { jobId } = await released();
    // (120 + 11 × 60 + 90) person-minutes for two, in quarters of an hour.
    expect(await itemOf(jobId)).toMatchObject({ workMinutes: 435 });
  });

  it('asks the database as often for many jobs as for one', async () => {
    const count = async (of: TestShop) => {
      const ctx = await contextOf(of, 'scheduler');
      let queries = 0;
      const db = new Proxy(ctx.db, {
        get(target, name) {
          if (String(name).startsWith('select')) queries += 1;
          return Reflect.get(target, name);
        },
      });
      expect((await getWaitingList({ ...ctx, db })).length).toBeGreaterThan(0);
      return queries;
    };
    const small = await makeShop();
    await startTestJob(small);
    expect((await list()).length).toBeGreaterThan(5);
    expect(await count(shop)).toBe(await count(small));
  });
});
