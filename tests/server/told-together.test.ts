import { eq } from 'drizzle-orm';
import ICAL from 'ical.js';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { messages, schedulerItems, shops } from '@/db/schema';
import { type BookedVisit, moveVisitInput } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { leaseMs } from '@/server/messages/claim-due';
import { hearReport } from '@/server/messages/hear-report';
import { sendDue } from '@/server/messages/send-due';
import { settle } from '@/server/messages/settle';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { composeVisitMessage } from '@/server/visits/compose-message';
import { moveVisit } from '@/server/visits/move-visit';
import { undoMs } from '@/server/visits/tell-customer';
import { bookTestVisit } from '../help/book-test-visit';
import { tokenOfVisit } from '../help/link-of';
import { makeCrew } from '../help/make-crew';
import { contextOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';
import { openTestPorts } from '../help/test-ports';

describe('several visits of one customer that move at once', () => {
  let test: Awaited<ReturnType<typeof openTestPorts>>;
  let shop: TestShop;
  let crewIds: string[];
  let clock: Date;
  let phone: string;
  let email: string;
  let measure: BookedVisit;
  let delivery: BookedVisit;
  let person = 0;
  beforeAll(async () => {
    test = await openTestPorts();
    shop = await makeShop({ name: 'Juniper Bend' });
    const { rules } = shop.shop;
    rules.booking = { ...rules.booking, quietFrom: '00:00', quietUntil: '00:00' };
    const { db } = await database();
    await db.update(shops).set({ rules }).where(eq(shops.id, shop.shop.id));
    crewIds = [(await makeCrew(shop)).crewId, (await makeCrew(shop, 'fit')).crewId];
  });
  afterAll(() => test.stop());

  /** A measure on a Thursday and a delivery on the Friday, both told already. */
  beforeEach(async () => {
    clock = new Date();
    person += 1;
    phone = `+1212555${String(100 + person).padStart(4, '0')}`;
    email = `together-${person}@customer.example`;
    test.fakeSms.faults.clear();
    const { db } = await database();
    await db.delete(messages);
    const { jobId } = await startTestJob(shop, { customer: { phone, email } }, clock);
    const week = new Date(Date.parse('2031-05-15') + person * 7 * 86_400_000);
    const [date, next] = [week, new Date(week.getTime() + 86_400_000)].map((day) =>
      day.toISOString().slice(0, 10),
    );
    const [measureCrew = '', fitCrew = ''] = crewIds;
    const of = { jobId, overrideReason: 'a test' };
    measure = await bookTestVisit(shop, { ...of, crewId: measureCrew, date }, clock);
    const kind = 'delivery' as const;
    delivery = await bookTestVisit(shop, { ...of, kind, crewId: fitCrew, date: next }, clock);
    pass(undoMs);
    await send();
    expect([texts().length, mails().length]).toEqual([2, 2]);
  });

  const pass = (ms: number) => {
    clock = new Date(clock.getTime() + ms);
  };
  const texts = () => test.fakeSms.messagesFor(phone).map(({ body }) => body);
  const mails = () => test.fakeEmail.mailsFor(email);

  async function sending(ports: typeof test.ports = test.ports) {
    const { db } = await database();
    return { db, ports, compose: composeVisitMessage, now: () => clock };
  }
  async function send(ports?: typeof test.ports) {
    return sendDue(await sending(ports));
  }
  async function move(visit: BookedVisit, time: string): Promise<BookedVisit> {
    pass(1_000);
    const { id: visitId, version, crewId } = visit;
    const date = visit.startsAt.slice(0, 10);
    const overrideReason = 'a test';
    const input = moveVisitInput.parse({ visitId, version, crewId, date, time, overrideReason });
    return moveVisit(await contextOf(shop, 'scheduler', clock), input);
  }
  async function moved(channel: 'sms' | 'email' = 'sms') {
    const { db } = await database();
    const rows = await db.select().from(messages).where(eq(messages.occasion, 'moved'));
    return rows.filter((row) => row.channel === channel && row.state !== 'withdrawn');
  }

  it('are told in one text and one e-mail, each visit with its new time and its own page', async () => {
    await move(measure, '14:00');
    await move(delivery, '15:00');
    pass(undoMs);
    await send();
    const [text, ...more] = texts().slice(2);
    expect(more).toEqual([]);
    expect(text).toContain('Site measure:');
    expect(text).toContain('2:00-4:00 PM');
    expect(text).toContain('Cabinet delivery:');
    expect(text).toContain('3:00-5:00 PM');
    for (const { id } of [measure, delivery]) {
      expect(text).toContain(`/v/${await tokenOfVisit(shop, id)}`);
    }
    const [mail, ...otherMails] = mails().slice(2);
    expect(otherMails).toEqual([]);
    expect(mail?.text).toContain('between 9:00 and 11:00 AM');
    const files = (mail?.attachments ?? []).flatMap(({ text: file }) => file ?? []);
    const uids = files.map((file) =>
      new ICAL.Component(ICAL.parse(file))
        .getFirstSubcomponent('vevent')
        ?.getFirstPropertyValue('uid'),
    );
    expect(new Set(uids).size).toBe(2);
    await send();
    expect([texts().length, mails().length]).toEqual([3, 3]);

    // One text on the shop's bill, and one report for both.
    const sent = await moved();
    expect(new Set(sent.map(({ providerId }) => providerId)).size).toBe(1);
    expect(sent.filter(({ segments }) => segments > 0)).toHaveLength(1);
    const { db } = await database();
    const providerId = sent[0]?.providerId ?? '';
    const report = { providerId, state: 'delivered' as const, isFinal: true, refusal: null };
    await hearReport(db, report, { messageId: null, now: clock });
    expect((await moved()).map(({ state }) => state)).toEqual(['delivered', 'delivered']);
  });

  it('wait until the last of them can no longer be taken back', async () => {
    await move(measure, '14:00');
    pass(undoMs - 2_000);
    await move(delivery, '15:00');
    pass(2_000);
    expect(await send()).toBe(0);
    pass(undoMs);
    await send();
    expect(texts().slice(2)).toHaveLength(1);
  });

  it('are told once still, by their newest times, when one of them moves again before', async () => {
    const first = await move(measure, '14:00');
    await move(delivery, '15:00');
    await move(first, '12:00');
    pass(undoMs);
    await send();
    const [text, ...more] = texts().slice(2);
    expect(more).toEqual([]);
    expect(text).toContain('12:00-2:00 PM');
    expect(text).not.toContain('2:00-4:00 PM');
  });

  it('are told apart when one of them is called off before', async () => {
    const first = await move(measure, '14:00');
    await move(delivery, '15:00');
    const { id: visitId, version } = first;
    const off = { visitId, version, reason: 'The floor is not down.' };
    await callOffVisit(await contextOf(shop, 'scheduler', clock), off);
    pass(undoMs);
    await send();
    const last = texts().slice(2).toSorted();
    expect(last).toHaveLength(2);
    expect(last.some((text) => text.includes('is called off'))).toBe(true);
    expect(last.some((text) => text.includes('your cabinet delivery moves from'))).toBe(true);
  });

  it('are told once when the worker dies between the provider’s yes and our books', async () => {
    await move(measure, '14:00');
    await move(delivery, '15:00');
    pass(undoMs);
    let isTaken = () => {};
    const taken = new Promise<void>((resolve) => {
      isTaken = resolve;
    });
    void send({
      ...test.ports,
      sms: {
        ...test.ports.sms,
        send: async (sms) => {
          await test.ports.sms.send(sms);
          isTaken();
          return new Promise<never>(() => {});
        },
      },
    });
    await taken;
    pass(leaseMs + 1);
    await settle(await sending());
    await send();
    expect(texts().slice(2)).toHaveLength(1);
    expect((await moved()).map(({ state }) => state)).toEqual(['sent', 'sent']);
  });

  it('are one thing to do when the text is refused', async () => {
    test.fakeSms.faults.set({ kind: 'refuse', code: 21614 }, { to: phone });
    await move(measure, '14:00');
    await move(delivery, '15:00');
    pass(undoMs);
    await send();
    expect((await moved()).map(({ state }) => state)).toEqual(['refused', 'refused']);
    const { db } = await database();
    const items = await db.select().from(schedulerItems);
    const customerId = (await moved())[0]?.customerId;
    expect(items.filter((item) => item.customerId === customerId)).toMatchObject([
      { kind: 'not-delivered' },
    ]);
  });
});
