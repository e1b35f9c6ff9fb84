import { eq } from 'drizzle-orm';
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { GET as liveRoute } from '@/app/api/live/route';
import { jobs, visits } from '@/db/schema';
import { openSnagInput, snagMenders } from '@/lib/contracts/snags';
import { handleLive } from '@/server/base/handle-live';
import { openSnag } from '@/server/snags/open-snag';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

const times = { gatherMs: 10, beatMs: 60_000, missedMs: 0, mostMs: 60_000 };

describe('what changes in a shop', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  const open: { end: () => Promise<void> }[] = [];
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
  });
  afterEach(async () => {
    for (const screen of open.splice(0)) await screen.end();
  });

  /** A screen of a shop, and the topics that it has heard so far. */
  async function openScreen(of: TestShop, route = handleLive(times)) {
    const answer = await route(
      new Request('http://localhost:3000/api/live', {
        headers: { cookie: await cookieOf(of.people.scheduler) },
      }),
    );
    const reader = answer.body?.pipeThrough(new TextDecoderStream()).getReader();
    if (answer.status !== 200 || !reader) throw new Error('no stream');
    let text = '';
    const reading = (async () => {
      for (;;) {
        const { value, done } = await reader.read();
        if (done) return;
        text += value;
      }
    })();
    const screen = {
      text: () => text,
      heard: () => [...text.matchAll(/^data: (.*)$/gm)].map(([, topic]) => topic),
      whole: reading,
      end: async () => {
        await reader.cancel().catch(() => {});
        await reading;
      },
    };
    open.push(screen);
    await expect.poll(() => text).toContain('retry: ');
    return screen;
  }

  const freeDays = ['2026-12-10', '2026-12-11', '2026-12-14'].values();

  async function book(of: TestShop) {
    const { jobId } = await startTestJob(of);
    const { crewId } = await makeCrew(of);
    return bookTestVisit(of, { jobId, crewId, date: freeDays.next().value ?? '' });
  }

  it('is told to nobody who is not signed in', async () => {
    expect((await callRoute(liveRoute, { method: 'GET' })).status).toBe(401);
  });

  it('reaches every screen of this shop, and no screen of another', async () => {
    const [mine, alsoMine, others] = [
      await openScreen(shop),
      await openScreen(shop),
      await openScreen(otherShop),
    ];
    await book(shop);
    for (const screen of [mine, alsoMine]) {
      await expect.poll(() => screen.heard()).toContain('messages');
      expect(screen.heard()).toEqual(expect.arrayContaining(['jobs', 'crews', 'visits']));
    }
    // Theirs is heard after ours would have been.
    await startTestJob(otherShop);
    await expect.poll(() => others.heard()).toEqual(['jobs']);
  });

  it('is told as a topic: no name, no number, no id goes along', async () => {
    const screen = await openScreen(shop);
    const visit = await book(shop);
    await expect.poll(() => screen.heard()).toContain('visits');
    for (const secret of [visit.id, visit.jobId, visit.customerName, shop.shop.id]) {
      expect(screen.text()).not.toContain(secret);
    }
  });

  it('is not told when it is taken back, and told once for many rows', async () => {
    const visit = await book(shop);
    const screen = await openScreen(shop);
    const { db } = await contextOf(shop, 'owner');
    await db
      .transaction(async (tx) => {
        await tx.update(jobs).set({ notes: 'x' }).where(eq(jobs.shopId, shop.shop.id));
        throw new Error('no');
      })
      .catch(() => {});
    await db.transaction(async (tx) => {
      await tx.update(visits).set({ customerSays: 'a' }).where(eq(visits.id, visit.id));
      await tx.update(visits).set({ customerSays: 'b' }).where(eq(visits.id, visit.id));
    });
    await expect.poll(() => screen.heard()).toEqual(['visits']);
  });

  it('reaches the office from the site: a snag is heard of as it is found', async () => {
    const { jobId } = await startTestJob(shop);
    const screen = await openScreen(shop);
    await openSnag(
      await contextOf(shop, 'crew'),
      openSnagInput.parse({
        id: crypto.randomUUID(),
        jobId,
        words: 'Door rubs',
        mender: snagMenders[0],
      }),
    );
    await expect.poll(() => screen.heard()).toEqual(['site']);
  });

  it('is told to a screen that was being drawn when it happened', async () => {
    const early = await openScreen(shop);
    await startTestJob(shop);
    await expect.poll(() => early.heard()).toEqual(['jobs']);
    const late = await openScreen(shop, handleLive({ ...times, missedMs: 60_000 }));
    await expect.poll(() => late.heard()).toContain('jobs');
  });

  it('is told beside a beat, and the stream ends by itself so that who listens is asked again', async () => {
    const screen = await openScreen(shop, handleLive({ ...times, beatMs: 20, mostMs: 120 }));
    await screen.whole;
    expect(screen.text()).toMatch(/^: still here$/m);
  });
});
