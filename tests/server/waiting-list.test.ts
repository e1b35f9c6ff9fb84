import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { jobs, visits } from '@/db/schema';
import type { WaitingItem } from '@/lib/contracts/visits';
import { estimateVisit } from '@/lib/schedule';
import { database } from '@/server/base/database';
import { getFit } from '@/server/sheets/get-fit';
import { releaseSheet } from '@/server/sheets/release-sheet';
import { getWaitingList } from '@/server/visits/get-waiting-list';
import { sayReady } from '@/server/visits/say-ready';
import { recordReadings } from '@/server/walls/record-readings';
import { submitRoom } from '@/server/walls/submit-room';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { putKitchen } from '../help/put-kitchen';
import { startTestJob } from '../help/start-test-job';

describe('the waiting list', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  const list = async (of = shop): Promise<WaitingItem[]> =>
    getWaitingList(await contextOf(of, 'scheduler'));
  const itemOf = async (jobId: string) => (await list()).find((item) => item.jobId === jobId);

  /** A measured kitchen whose revision A was released on 2026-11-02. */
  async function released(of = shop, floorAgreed = true) {
    const kitchen = await putKitchen(of);
    const { jobId, roomId } = kitchen;
    const ctx = await contextOf(of, 'measurer', new Date('2026-11-02T15:00:00Z'));
    await submitRoom(ctx, { roomId });
    const { fit, runsMark } = await getFit(ctx, { roomId });
    await releaseSheet(ctx, {
      roomId,
      seenReadingIds: fit.readingIds,
      seenRunsMark: runsMark,
      overrideReason: 'a test',
    });
    const { db } = await database();
    await db.update(jobs).set({ floorAgreed }).where(eq(jobs.id, jobId));
    return kitchen;
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
    const { jobId } = await released(shop, false);
    expect(await itemOf(jobId)).toMatchObject({
      state: 'blocked',
      openGates: expect.arrayContaining([expect.objectContaining({ gate: 'floor-agreed' })]),
    });
    const later = await released();
    const [again] = later.wallBook.readings;
    await recordReadings(await contextOf(shop, 'measurer', new Date()), {
      roomId: later.roomId,
      readings: [{ ...again, id: randomUUID() }],
    });
    expect(await itemOf(later.jobId)).toMatchObject({
      state: 'blocked',
      why: 'not yet: readings are newer than revision A: release again',
    });
  });

  it('leaves jobs on hold and called off alone, and counts units, crew and crooked walls into the time', async () => {
    const held = await startTestJob(shop);
    const { db } = await database();
    await db.update(jobs).set({ stage: 'on-hold' }).where(eq(jobs.id, held.jobId));
    expect(await itemOf(held.jobId)).toBeUndefined();
    const { jobId, roomId } = await released();
    const { fit, runs } = await getFit(await contextOf(shop, 'measurer'), { roomId });
    const units: Record<string, number> = {};
    for (const { kind } of runs.flatMap((run) => run.units)) units[kind] = (units[kind] ?? 0) + 1;
    const { value } = estimateVisit({
      kind: 'install',
      crewSize: 2,
      units,
      ownMinutes: { anyUnit: 60, base: 60, wall: 60 },
      fitExtraMinutes: fit.extraInstallMinutes.minutes,
    });
    expect(fit.extraInstallMinutes.minutes).toBeGreaterThan(0);
    expect(await itemOf(jobId)).toMatchObject({ workMinutes: value?.minutes });
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
    await released(small);
    expect((await list()).length).toBeGreaterThan(5);
    expect(await count(shop)).toBe(await count(small));
  });
});
