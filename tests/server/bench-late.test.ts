import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { jobs, schedulerItems } from '@/db/schema';
import { addDays } from '@/lib/time/civil';
import { database } from '@/server/base/database';
import { sayReady } from '@/server/visits/say-ready';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { putStop } from '../help/put-stop';

describe('what the bench says of cabinets', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  const lateItems = async (jobId: string) => {
    const { db } = await database();
    const items = await db.select().from(schedulerItems).where(eq(schedulerItems.jobId, jobId));
    return items.filter(({ kind }) => kind === 'cabinets-late');
  };

  it('stands before the scheduler once when they will be later than the booked install', async () => {
    const { jobId, visit } = await putStop(shop);
    const bench = await contextOf(shop, 'bench');
    const day = visit.startsAt.slice(0, 10);
    await sayReady(bench, { jobId, readyOn: day });
    expect(await lateItems(jobId)).toEqual([]);
    const late = { jobId, readyOn: addDays(day, 3), why: 'veneer is short' };
    await sayReady(bench, late);
    await sayReady(bench, late);
    const items = await lateItems(jobId);
    expect(items).toHaveLength(1);
    expect(items[0]?.words).toContain('veneer is short');
    expect(items[0]).toMatchObject({ visitId: visit.id, doneAt: null });
  });

  it('keeps where they stand, and forgets it when they are not ready after all', async () => {
    const { jobId } = await putStop(shop);
    const bench = await contextOf(shop, 'bench');
    const { db } = await database();
    const kept = async () => (await db.select().from(jobs).where(eq(jobs.id, jobId)))[0];
    await sayReady(bench, { jobId, readyOn: '2026-12-01', where: 'rack 3' });
    expect(await kept()).toMatchObject({ readyOn: '2026-12-01', readyWhere: 'rack 3' });
    await sayReady(bench, { jobId, readyOn: null });
    expect(await kept()).toMatchObject({ readyOn: null, readyWhere: '', readySaidAt: null });
  });
});
