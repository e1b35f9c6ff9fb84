import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { gateOverrides, jobs, messages, visitPiecePeople, visitPieces, visits } from '@/db/schema';
import { database } from '@/server/base/database';
import { Refusal } from '@/server/base/problem-response';
import { changeJob } from '@/server/jobs/change-job';
import { getJob } from '@/server/jobs/get-job';
import { bookVisit } from '@/server/visits/book-visit';
import { bookingOf, bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('booking a visit', () => {
  let shop: TestShop;
  beforeAll(async () => {
    shop = await makeShop();
  });

  it('keeps the pieces, moves the stage, and tells the customer on both channels', async () => {
    const { jobId, number } = await startTestJob(shop);
    const { crewId, name } = await makeCrew(shop);
    const visit = await bookTestVisit(shop, { jobId, crewId });
    expect(visit).toMatchObject({
      status: 'booked',
      version: 1,
      jobNumber: number,
      crewName: name,
      startsAt: '2026-12-10T14:00:00.000Z',
      windowEndsAt: '2026-12-10T16:00:00.000Z',
      workMinutes: 90,
      dayWords: 'Thu, Dec 10',
      warnings: [],
    });
    expect(visit.pieces).toHaveLength(1);
    const { db } = await database();
    const [job] = await db.select({ stage: jobs.stage }).from(jobs).where(eq(jobs.id, jobId));
    expect(job?.stage).toBe('to-measure');
    const told = await db
      .select({ occasion: messages.occasion, channel: messages.channel, dueAt: messages.dueAt })
      .from(messages)
      .where(eq(messages.visitId, visit.id))
      .orderBy(messages.dueAt, messages.channel);
    const at = (occasion: string, channel: string, iso: string) => ({
      occasion,
      channel,
      dueAt: new Date(iso),
    });
    expect(told).toEqual([
      at('booked', 'email', '2026-12-01T15:00:12Z'),
      at('booked', 'sms', '2026-12-01T15:00:12Z'),
      at('please-confirm', 'email', '2026-12-08T15:00:00Z'),
      at('please-confirm', 'sms', '2026-12-08T15:00:00Z'),
      at('asked-again', 'email', '2026-12-09T15:00:00Z'),
      at('asked-again', 'sms', '2026-12-09T15:00:00Z'),
      at('day-before', 'email', '2026-12-09T21:00:00Z'),
      at('day-before', 'sms', '2026-12-09T21:00:00Z'),
    ]);
  });

  it('lets one of fifty bookings of the same hour win, and tells the others who has it', {
    timeout: 120_000,
  }, async () => {
    const { crewId, name } = await makeCrew(shop, 'measure', []);
    const started = [];
    for (let count = 0; count < 50; count += 1) started.push(await startTestJob(shop));
    const ctx = await contextOf(shop, 'scheduler');
    const outcomes = await Promise.allSettled(
      started.map(({ jobId }) => bookVisit(ctx, bookingOf({ jobId, crewId }))),
    );
    const won = outcomes.filter(({ status }) => status === 'fulfilled');
    expect(won).toHaveLength(1);
    const [winner] = won as PromiseFulfilledResult<{ id: string; jobNumber: number }>[];
    const lost = outcomes.filter((outcome) => outcome.status === 'rejected');
    expect(lost).toHaveLength(49);
    for (const { reason } of lost) {
      expect(reason).toBeInstanceOf(Refusal);
      expect((reason as Refusal).refusal).toMatchObject({
        status: 409,
        code: 'crew-already-booked',
        current: { visitId: winner?.value.id, startsAt: '2026-12-10T14:00:00.000Z' },
      });
      expect((reason as Refusal).message).toContain(
        `${name} is taken Thu, Dec 10, 9:00-10:30 AM: Measure for Robin Testwood, job ${winner?.value.jobNumber}.`,
      );
    }
    const { db } = await database();
    expect(await db.$count(visitPieces, eq(visitPieces.crewId, crewId))).toBe(1);
    expect(await db.$count(visits, eq(visits.crewId, crewId))).toBe(1);
  });

  it('books one of two touching visits after the other, for a visit ends where the next begins', async () => {
    const { crewId } = await makeCrew(shop, 'measure', []);
    const first = await startTestJob(shop);
    const second = await startTestJob(shop);
    await bookTestVisit(shop, { jobId: first.jobId, crewId });
    await expect(
      bookTestVisit(shop, { jobId: second.jobId, crewId, time: '10:29' }),
    ).rejects.toThrow('is taken');
    await bookTestVisit(shop, { jobId: second.jobId, crewId, time: '10:30' });
  });

  it('does not send a person of two crews to two places at once', async () => {
    const own = await makeShop();
    const person = own.people.measurer.personId;
    const one = await makeCrew(own, 'measure', [person]);
    const other = await makeCrew(own, 'measure', [person, own.people.owner.personId]);
    const first = await startTestJob(own);
    const second = await startTestJob(own);
    await bookTestVisit(own, { jobId: first.jobId, crewId: one.crewId });
    const refusal = await refusalOf(
      bookTestVisit(own, { jobId: second.jobId, crewId: other.crewId, time: '10:00' }),
    );
    expect(refusal).toMatchObject({ status: 409, code: 'crew-already-booked' });
    expect(refusal.message).toContain(`Measurer Test is taken Thu, Dec 10, 9:00-10:30 AM with`);
    const { db } = await database();
    expect(await db.$count(visitPiecePeople, eq(visitPiecePeople.personId, person))).toBe(1);
  });

  it('books once when the same booking is sent ten times at once, and answers all alike', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    const ctx = await contextOf(shop, 'scheduler');
    const input = bookingOf({ jobId, crewId, idempotencyKey: randomUUID() });
    const answers = await Promise.all(Array.from({ length: 10 }, () => bookVisit(ctx, input)));
    for (const answer of answers) expect(answer).toEqual(answers[0]);
    const { db } = await database();
    expect(await db.$count(visits, eq(visits.jobId, jobId))).toBe(1);
    expect(await db.$count(messages, eq(messages.jobId, jobId))).toBe(8);
  });

  it('refuses a gate that is not passed with its words, and keeps why it was overridden', async () => {
    const { jobId } = await startTestJob(shop, { wallsReady: 'not-yet' });
    const { crewId } = await makeCrew(shop, 'measure', []);
    const refusal = await refusalOf(bookTestVisit(shop, { jobId, crewId }));
    expect(refusal).toMatchObject({
      status: 409,
      code: 'gate-not-passed',
      current: {
        gates: [{ gate: 'site-ready', words: 'Walls not closed, and no date for it.' }],
      },
    });
    const { db } = await database();
    expect(await db.$count(visits, eq(visits.jobId, jobId))).toBe(0);
    const overrideReason = 'Builder closes them on the morning';
    const { id } = await bookTestVisit(shop, { jobId, crewId, overrideReason });
    const kept = await db
      .select({ gate: gateOverrides.gate, reason: gateOverrides.reason })
      .from(gateOverrides)
      .where(eq(gateOverrides.visitId, id));
    expect(kept).toEqual([{ gate: 'site-ready', reason: overrideReason }]);
  });

  it('asks why when fitters are sent to measure', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'fit', []);
    expect(await refusalOf(bookTestVisit(shop, { jobId, crewId }))).toMatchObject({
      code: 'gate-not-passed',
      current: { gates: [{ gate: 'crew-skill' }] },
    });
  });

  it('keeps the hours of work over a night in which the clocks go back', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'fit', []);
    const visit = await bookTestVisit(
      shop,
      {
        jobId,
        crewId,
        kind: 'install',
        date: '2027-11-05',
        time: '08:00',
        workMinutes: 16 * 60,
        overrideReason: 'tested without a release',
      },
      new Date('2027-10-01T15:00:00Z'),
    );
    // Friday 08:00–16:00 in summer time, Monday 08:00–16:00 in winter time.
    expect(visit.pieces.map(({ startsAt, endsAt }) => [startsAt, endsAt])).toEqual([
      ['2027-11-05T12:00:00.000Z', '2027-11-05T20:00:00.000Z'],
      ['2027-11-08T13:00:00.000Z', '2027-11-08T21:00:00.000Z'],
    ]);
  });

  it('says so and does as asked when the day is not worked, and refuses the past', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    const sunday = await bookTestVisit(shop, { jobId, crewId, date: '2026-12-13' });
    expect(sunday.warnings).toEqual(['2026-12-13 is not a working day of this crew.']);
    const past = await refusalOf(bookTestVisit(shop, { jobId, crewId, date: '2026-11-30' }));
    expect(past).toMatchObject({ status: 422, errors: { date: expect.any(String) } });
    const late = await refusalOf(bookTestVisit(shop, { jobId, crewId, time: '16:00' }));
    expect(late).toMatchObject({ status: 422, errors: { time: expect.any(String) } });
  });

  it('books nothing for a job on hold, which goes on where its history left it', async () => {
    const { jobId } = await startTestJob(shop);
    const { crewId } = await makeCrew(shop, 'measure', []);
    await bookTestVisit(shop, { jobId, crewId });
    const ctx = await contextOf(shop, 'scheduler');
    await changeJob(ctx, { jobId, onHold: true });
    const again = bookTestVisit(shop, { jobId, crewId, date: '2026-12-11' });
    expect(await refusalOf(again)).toMatchObject({ status: 409, code: 'job-not-open' });
    expect(await changeJob(ctx, { jobId, onHold: false })).toMatchObject({ stage: 'to-measure' });
    await bookTestVisit(shop, { jobId, crewId, date: '2026-12-11' });
  });

  it('tells nobody who agreed to nothing, and says so in the story', async () => {
    const { jobId } = await startTestJob(shop, {
      customer: { mayText: false, mayEmail: false },
    });
    const { crewId } = await makeCrew(shop, 'measure', []);
    await bookTestVisit(shop, { jobId, crewId });
    const { db } = await database();
    expect(await db.$count(messages, eq(messages.jobId, jobId))).toBe(0);
    const { story } = await getJob(await contextOf(shop, 'bench'), { jobId });
    expect(story[0]?.summary).toContain('the customer is not told: call them');
  });
});
