import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { jobs, messages } from '@/db/schema';
import type { BookedVisit, ReportVisitInput } from '@/lib/contracts/visits';
import type { Role } from '@/lib/permissions';
import { addDays } from '@/lib/time/civil';
import { database } from '@/server/base/database';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { reportVisit } from '@/server/visits/report-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('reporting from site', () => {
  let shop: TestShop;
  let crewId: string;
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop, 'fit'));
  });

  const install = {
    kind: 'install',
    time: '08:00',
    workMinutes: 16 * 60,
    overrideReason: 'tested without a release',
  } as const;
  let week = 0;

  /** Two days' work from a Monday on, each time another week. */
  async function bookInstall(): Promise<BookedVisit> {
    const { jobId } = await startTestJob(shop);
    const date = addDays('2027-01-04', 7 * week);
    week += 1;
    return bookTestVisit(shop, { jobId, crewId, date, ...install });
  }

  async function report(
    visit: BookedVisit,
    what: ReportVisitInput['what'],
    options: { at?: string; now?: string; role?: Role } = {},
  ) {
    const date = visit.startsAt.slice(0, 10);
    const now = options.now ?? `${date}T13:00:00Z`;
    const ctx = await contextOf(shop, options.role ?? 'crew', new Date(now));
    return reportVisit(ctx, { visitId: visit.id, what, at: options.at ?? now });
  }

  it('moves the job to installing when the crew arrives, and keeps the times', async () => {
    const visit = await bookInstall();
    const { db } = await database();
    await db.update(jobs).set({ stage: 'ready' }).where(eq(jobs.id, visit.jobId));
    expect(await report(visit, 'on-the-way')).toMatchObject({ status: 'on-the-way' });
    const arrived = await report(visit, 'arrived');
    expect(arrived).toMatchObject({ status: 'on-site', arrivedAt: expect.any(String) });
    const [job] = await db.select({ stage: jobs.stage }).from(jobs).where(eq(jobs.id, visit.jobId));
    expect(job?.stage).toBe('installing');
  });

  it('changes nothing when a tap comes twice, or late after the next one', async () => {
    const visit = await bookInstall();
    const first = await report(visit, 'arrived');
    expect(await report(visit, 'arrived')).toEqual(first);
    expect(await report(visit, 'on-the-way')).toEqual(first);
  });

  it('gives back the days that are not needed when they are done early', async () => {
    const visit = await bookInstall();
    expect(visit.pieces).toHaveLength(2);
    const date = visit.startsAt.slice(0, 10);
    const done = await report(visit, 'done', { now: `${date}T20:00:00Z` });
    expect(done).toMatchObject({ status: 'done', leftAt: `${date}T20:00:00.000Z` });
    expect(done.pieces.map(({ endsAt }) => endsAt)).toEqual([`${date}T20:00:00.000Z`]);
  });

  it('takes the time of a phone whose clock is ahead as now', async () => {
    const visit = await bookInstall();
    const date = visit.startsAt.slice(0, 10);
    const at = `${date}T23:59:00Z`;
    const arrived = await report(visit, 'arrived', { at, now: `${date}T13:00:00Z` });
    expect(arrived.arrivedAt).toBe(`${date}T13:00:00.000Z`);
  });

  it('tells the customer that the crew is on the way, and not when the tap is old', async () => {
    const { db } = await database();
    const told = (visitId: string) =>
      db
        .select({ channel: messages.channel })
        .from(messages)
        .where(eq(messages.visitId, visitId))
        .then((rows) => rows.length);
    const visit = await bookInstall();
    const before = await told(visit.id);
    await report(visit, 'on-the-way');
    expect((await told(visit.id)) - before).toBe(2);
    const stale = await bookInstall();
    const date = stale.startsAt.slice(0, 10);
    const staleBefore = await told(stale.id);
    await report(stale, 'on-the-way', { at: `${date}T12:00:00Z`, now: `${date}T15:00:00Z` });
    expect((await told(stale.id)) - staleBefore).toBe(0);
  });

  it('frees the rest of the day when nobody is home, and the job waits for a visit again', async () => {
    const visit = await bookInstall();
    const date = visit.startsAt.slice(0, 10);
    const missed = await report(visit, 'nobody-home', { now: `${date}T13:30:00Z` });
    expect(missed).toMatchObject({ status: 'missed' });
    const { jobId } = await startTestJob(shop);
    await bookTestVisit(shop, { jobId, crewId, ...install, date, time: '10:00' });
  });

  it('knows only the visits of one’s own crews, and all of them in the office', async () => {
    const visit = await bookInstall();
    expect(await refusalOf(report(visit, 'arrived', { role: 'measurer' }))).toMatchObject({
      status: 404,
    });
    expect(await refusalOf(report(visit, 'arrived', { role: 'bench' }))).toMatchObject({
      status: 403,
    });
    expect(await report(visit, 'arrived', { role: 'scheduler' })).toMatchObject({
      status: 'on-site',
    });
  });

  it('sends the crew to the office when the visit was called off', async () => {
    const visit = await bookInstall();
    const office = await contextOf(shop, 'scheduler');
    await callOffVisit(office, { visitId: visit.id, version: 1, reason: 'Flooded' });
    expect(await refusalOf(report(visit, 'arrived'))).toMatchObject({
      status: 409,
      code: 'visit-called-off',
    });
  });
});
