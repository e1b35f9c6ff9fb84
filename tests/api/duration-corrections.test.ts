import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as correctionsRoute } from '@/app/api/visits/duration-corrections/route';
import { jobs, visitPauses, visits } from '@/db/schema';
import { addDays } from '@/lib/time/civil';
import { database } from '@/server/base/database';
import { getDurationCorrections } from '@/server/days/get-duration-corrections';
import { estimateTakenApart } from '@/server/visits/job-facts';
import { type JobRecord, readJobRecords } from '@/server/visits/job-records';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('what real times say', () => {
  let shop: TestShop;
  let waitingJobId = '';
  beforeAll(async () => {
    shop = await makeShop();
    waitingJobId = (await startTestJob(shop)).jobId;
    const { crewId } = await makeCrew(shop);
    const { db } = await database();
    for (const [index, minutes] of [100, 110, 120, 130, 140].entries()) {
      const { jobId } = await startTestJob(shop);
      const date = addDays('2026-12-07', index);
      const { id, startsAt } = await bookTestVisit(shop, { jobId, crewId, date, time: '09:00' });
      const arrivedAt = new Date(startsAt);
      const minutesIn = (gone: number) => new Date(arrivedAt.getTime() + gone * 60_000);
      // Half an hour of each is a pause.
      const ofVisit = {
        shopId: shop.shop.id,
        visitId: id,
        byPersonId: shop.people.measurer.personId,
      };
      await db.insert(visitPauses).values([
        { ...ofVisit, what: 'pause', why: 'break', at: minutesIn(20) },
        { ...ofVisit, what: 'go-on', at: minutesIn(50) },
      ]);
      await db
        .update(visits)
        .set({ status: 'done', arrivedAt, leftAt: minutesIn(minutes + 30) })
        .where(eq(visits.id, id));
    }
  });

  it('is offered against the rule, pauses taken off, with what it would do to those who wait', async () => {
    const ctx = await contextOf(shop, 'owner', new Date('2026-12-20T15:00:00Z'));
    const { corrections, tooFew } = await getDurationCorrections(ctx);
    expect(corrections).toEqual([
      {
        rule: 'measureMinutesPerRoom',
        nowMinutes: 90,
        offeredMinutes: 120,
        lowQuartileMinutes: 110,
        highQuartileMinutes: 130,
        visitCount: 5,
        setAsideCount: 0,
        words: 'A room takes 120 min by 5 measures; the rule says 90.',
        waiting: [
          {
            jobId: waitingJobId,
            jobNumber: expect.any(Number),
            customerName: expect.any(String),
            fromMinutes: 90,
            toMinutes: 120,
          },
        ],
      },
    ]);
    expect(tooFew).toEqual(['0 installs were timed; from 5 on they tell.']);
  });

  it('takes what the walls add to an install off no measure', async () => {
    const ctx = await contextOf(shop, 'owner');
    const [job] = await readJobRecords(ctx.db, ctx, eq(jobs.id, waitingJobId));
    if (!job) throw new Error('the job is gone');
    const released: JobRecord = {
      ...job,
      rooms: [
        {
          jobId: job.id,
          id: job.id,
          submittedAt: new Date(),
          hasRuns: true,
          release: {
            releaseId: job.id,
            revision: 'A',
            releasedAt: new Date(),
            isSuperseded: false,
            extraInstallMinutes: 400,
          },
        },
      ],
    };
    const fixed = (of: JobRecord, kind: 'site-measure' | 'install') =>
      estimateTakenApart(of, { kind, crewSize: 2 }).fixedPersonMinutes;
    expect(fixed(released, 'site-measure')).toBe(0);
    expect(fixed(released, 'install')).toBe(fixed(job, 'install') + 400);
  });

  it('is refused to a role without the numbers, and tells another shop nothing', async () => {
    const get = async (of: TestShop, role: 'crew' | 'owner') =>
      callRoute(correctionsRoute, { method: 'GET', cookie: await cookieOf(of.people[role]) });
    expect((await get(shop, 'crew')).status).toBe(403);
    const other = await get(await makeShop(), 'owner');
    expect(other).toMatchObject({ status: 200, body: { corrections: [] } });
  });
});
