import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { messages, schedulerItems, visits } from '@/db/schema';
import { type BookedVisit, moveVisitInput } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { type Sending, sendDue } from '@/server/messages/send-due';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { composeVisitMessage } from '@/server/visits/compose-message';
import { moveVisit } from '@/server/visits/move-visit';
import { noticeSilence } from '@/server/visits/notice-silence';
import { reportVisit } from '@/server/visits/report-visit';
import { undoMs } from '@/server/visits/tell-customer';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';
import { openTestPorts } from '../help/test-ports';

const minute = 60_000;

describe('the clock', () => {
  let test: Awaited<ReturnType<typeof openTestPorts>>;
  let shop: TestShop;
  let crewId: string;
  let clock: Date;
  let person = 0;
  beforeAll(async () => {
    test = await openTestPorts();
    shop = await makeShop({ name: 'Juniper Bend' });
    ({ crewId } = await makeCrew(shop));
  });
  afterAll(() => test.stop());
  beforeEach(async () => {
    const { db } = await database();
    await db.delete(messages);
    await db.delete(schedulerItems);
  });
  const pass = (ms: number) => {
    clock = new Date(clock.getTime() + ms);
  };

  async function booked(now: string, date: string, time = '09:00') {
    clock = new Date(now);
    person += 1;
    const phone = `+1646555${String(100 + person).padStart(4, '0')}`;
    const { jobId } = await startTestJob(shop, { customer: { phone, email: '' } }, clock);
    const visit = await bookTestVisit(shop, { jobId, crewId, date, time }, clock);
    pass(undoMs);
    return { visit, texts: () => test.fakeSms.messagesFor(phone).map(({ body }) => body) };
  }
  async function send(ports: Sending['ports'] = test.ports) {
    const { db } = await database();
    await sendDue({ db, ports, compose: composeVisitMessage, now: () => clock });
  }
  async function rowOf(visit: BookedVisit, occasion: string, state?: 'waiting' | 'withdrawn') {
    const { db } = await database();
    const [row] = await db
      .select()
      .from(messages)
      .where(
        and(
          eq(messages.visitId, visit.id),
          eq(messages.occasion, occasion),
          state ? eq(messages.state, state) : undefined,
        ),
      );
    return row;
  }
  async function move(visit: BookedVisit, version: number, date: string, time: string) {
    const ctx = await contextOf(shop, 'scheduler', clock);
    const to = { visitId: visit.id, version, crewId, date, time };
    return moveVisit(ctx, moveVisitInput.parse(to));
  }

  it('reminds at the hour of the clock on the wall, on both sides of the night that it changes', async () => {
    const spring = await booked('2027-03-01T15:00:00Z', '2027-03-15');
    expect((await rowOf(spring.visit, 'please-confirm'))?.dueAt.toISOString()).toBe(
      '2027-03-13T15:00:00.000Z',
    );
    expect((await rowOf(spring.visit, 'day-before'))?.dueAt.toISOString()).toBe(
      '2027-03-14T20:00:00.000Z',
    );
    const autumn = await booked('2027-10-25T15:00:00Z', '2027-11-08');
    expect((await rowOf(autumn.visit, 'please-confirm'))?.dueAt.toISOString()).toBe(
      '2027-11-06T14:00:00.000Z',
    );
    expect((await rowOf(autumn.visit, 'day-before'))?.dueAt.toISOString()).toBe(
      '2027-11-07T21:00:00.000Z',
    );
  });

  it('does not remind of the old time when it moves ten minutes before', async () => {
    const { visit, texts } = await booked('2027-04-01T15:00:00Z', '2027-04-15');
    await send();
    const { db } = await database();
    await db.update(visits).set({ status: 'confirmed' }).where(eq(visits.id, visit.id));
    const reminder = await rowOf(visit, 'day-before');
    if (!reminder) throw new Error('no reminder waits');
    clock = new Date(reminder.dueAt.getTime() - 10 * minute);
    await move(visit, 1, '2027-04-22', '14:00');
    clock = reminder.dueAt;
    await send();
    expect(texts()).toHaveLength(2);
    expect(texts()[1]).toContain('moves from Thursday, April 15');
    expect((await rowOf(visit, 'day-before', 'withdrawn'))?.reason).toBe('The visit was moved.');
    expect((await rowOf(visit, 'day-before', 'waiting'))?.dueAt.toISOString()).toBe(
      '2027-04-21T20:00:00.000Z',
    );
  });

  it('calls off after what was on its way when it was called off, so that the last word is the true one', async () => {
    const { visit, texts } = await booked('2027-05-03T15:00:00Z', '2027-05-20');
    const slow: Sending['ports'] = {
      ...test.ports,
      sms: {
        ...test.ports.sms,
        send: async (sms) => {
          const ctx = await contextOf(shop, 'scheduler', clock);
          const call = { visitId: visit.id, version: 1, reason: 'Flooded' };
          if (texts().length === 0) await callOffVisit(ctx, call);
          return test.ports.sms.send(sms);
        },
      },
    };
    await send(slow);
    pass(undoMs);
    await send();
    expect(texts()).toHaveLength(2);
    expect(texts()[0]).toContain('is booked for');
    expect(texts()[1]).toContain('is called off');
    expect(await rowOf(visit, 'booked')).toMatchObject({ state: 'sent' });
  });

  it('tells nothing of a move that is taken back before anybody heard of it', async () => {
    const { visit, texts } = await booked('2027-06-01T15:00:00Z', '2027-06-17');
    await send();
    const moved = await move(visit, 1, '2027-06-18', '14:00');
    pass(undoMs / 2);
    await send();
    await move(visit, moved.version, '2027-06-17', '09:00');
    pass(undoMs);
    await send();
    expect(texts()).toHaveLength(1);
    expect((await rowOf(visit, 'moved'))?.state).toBe('withdrawn');
  });

  it('asks again who is silent, and then puts them on the scheduler’s list; who answers is left alone', async () => {
    const silent = await booked('2027-07-01T15:00:00Z', '2027-07-15');
    const { db } = await database();
    const asking = async (visit: BookedVisit) => {
      for (const occasion of ['please-confirm', 'asked-again']) {
        clock = (await rowOf(visit, occasion))?.dueAt ?? clock;
        await send();
      }
      pass(5 * 60 * minute);
      await noticeSilence(db, clock);
      await noticeSilence(db, clock);
    };
    await asking(silent.visit);
    expect(silent.texts().filter((text) => text.includes('Reply YES'))).toHaveLength(2);
    expect(await db.select().from(schedulerItems)).toMatchObject([
      { kind: 'no-answer', visitId: silent.visit.id },
    ]);
    const answered = await booked('2027-07-02T15:00:00Z', '2027-07-22');
    await db
      .update(visits)
      .set({ customerSays: 'Fridays only' })
      .where(eq(visits.id, answered.visit.id));
    await asking(answered.visit);
    expect(answered.texts().filter((text) => text.includes('Reply YES'))).toEqual([]);
    expect((await rowOf(answered.visit, 'asked-again'))?.reason).toBe(
      'They have answered already.',
    );
    expect(await db.$count(schedulerItems)).toBe(1);
  });

  it('says how late a crew is while that is still to come, once for each word of theirs', async () => {
    const { visit, texts } = await booked('2027-08-02T15:00:00Z', '2027-08-12');
    const late = async (lateMinutes: number) => {
      const ctx = await contextOf(shop, 'measurer', clock);
      const at = clock.toISOString();
      await reportVisit(ctx, { visitId: visit.id, what: 'running-late', at, lateMinutes });
      await send();
    };
    clock = new Date('2027-08-12T14:50:00Z');
    await send();
    const before = texts().length;
    await late(30);
    await late(30);
    expect(texts().slice(before)).toEqual([
      expect.stringContaining('about 30 minutes late and now arrive about 11:30 AM'),
    ]);
    clock = new Date('2027-08-12T15:40:00Z');
    await late(30);
    expect(texts()).toHaveLength(before + 1);
    await late(90);
    expect(texts().at(-1)).toContain('about 90 minutes late and now arrive about 12:30 PM');
  });
});
