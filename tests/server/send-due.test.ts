import { and, eq, ne } from 'drizzle-orm';
import ICAL from 'ical.js';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { consents, customers, messages, shops, visits } from '@/db/schema';
import { type BookedVisit, moveVisitInput } from '@/lib/contracts/visits';
import { database } from '@/server/base/database';
import { changeConsent } from '@/server/messages/change-consent';
import { claimDue, leaseMs } from '@/server/messages/claim-due';
import type { Compose } from '@/server/messages/compose';
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

type TestPorts = Awaited<ReturnType<typeof openTestPorts>>;
type Given = Parameters<typeof startTestJob>[1];

describe('sending what is due', () => {
  let test: TestPorts;
  let shop: TestShop;
  let crewId: string;
  /** The clock of everything here: the provider's own is the real one. */
  let clock: Date;
  let person = 0;
  const day = '2031-05-15';
  beforeAll(async () => {
    test = await openTestPorts();
    shop = await makeShop({ name: 'Juniper Bend' });
    // Never quiet, so that the tests pass by night as well; the quiet hours have a shop of their own.
    const { rules } = shop.shop;
    rules.booking = { ...rules.booking, quietFrom: '00:00', quietUntil: '00:00' };
    const { db } = await database();
    await db.update(shops).set({ rules }).where(eq(shops.id, shop.shop.id));
    ({ crewId } = await makeCrew(shop));
  });
  afterAll(() => test.stop());
  beforeEach(async () => {
    clock = new Date();
    test.fakeSms.faults.clear();
    test.fakeEmail.faults.clear();
    const { db } = await database();
    await db.delete(messages);
  });
  const pass = (ms: number) => {
    clock = new Date(clock.getTime() + ms);
  };

  /** A booked visit of a customer with a phone and an inbox of their own, and what they got there. */
  async function booked(given: Given = {}, of = shop, crew = crewId) {
    person += 1;
    const phone = `+1212555${String(100 + person).padStart(4, '0')}`;
    const email = `person-${person}@customer.example`;
    const customer = { phone, email, ...given.customer };
    const { jobId } = await startTestJob(of, { ...given, customer }, clock);
    const time = `${String(8 + (person % 4) * 2).padStart(2, '0')}:00`;
    const date = new Date(Date.parse(day) + 86_400_000 * 7 * person).toISOString().slice(0, 10);
    const visit = await bookTestVisit(of, { jobId, crewId: crew, date, time }, clock);
    pass(undoMs);
    return {
      visit,
      phone,
      texts: () => test.fakeSms.messagesFor(phone).map(({ body }) => body),
      mails: () => test.fakeEmail.mailsFor(email),
    };
  }

  async function send(compose: Compose = composeVisitMessage, ports = test.ports) {
    const { db } = await database();
    return sendDue({ db, ports, compose, now: () => clock });
  }
  async function settleNow() {
    const { db } = await database();
    return settle({ db, ports: test.ports, now: () => clock });
  }

  async function row(visit: BookedVisit, occasion: string, channel: 'sms' | 'email') {
    const { db } = await database();
    const [found] = await db
      .select()
      .from(messages)
      .where(
        and(
          eq(messages.visitId, visit.id),
          eq(messages.occasion, occasion),
          eq(messages.channel, channel),
        ),
      );
    if (!found) throw new Error('there is no such message');
    return found;
  }

  async function move(visit: BookedVisit) {
    pass(60_000);
    const ctx = await contextOf(shop, 'scheduler', clock);
    const date = new Date(Date.parse(visit.startsAt) + 86_400_000).toISOString().slice(0, 10);
    const to = { visitId: visit.id, version: visit.version, crewId, date, time: '14:00' };
    const moved = await moveVisit(ctx, moveVisitInput.parse(to));
    pass(undoMs);
    return moved;
  }

  function eventOf(mail: { attachments: { contentType: string; text: string | null }[] }) {
    const file = mail.attachments.find(({ text }) => text?.startsWith('BEGIN:VCALENDAR'));
    const calendar = new ICAL.Component(ICAL.parse(file?.text ?? ''));
    const component = calendar.getFirstSubcomponent('vevent');
    if (!component) throw new Error('the calendar has no event');
    return {
      method: calendar.getFirstPropertyValue('method'),
      status: component.getFirstPropertyValue('status'),
      event: new ICAL.Event(component),
      attendees: component.getAllProperties('attendee').map((each) => each.getFirstValue()),
    };
  }

  it('tells a booking by text and by e-mail, with the link that opens it', async () => {
    const { visit, texts, mails } = await booked({ customer: { name: 'Rosa Quill' } });
    await send();
    const link = `http://localhost:3000/v/${await tokenOfVisit(shop, visit.id)}`;
    expect(texts()).toHaveLength(1);
    expect(texts()[0]).toContain('Juniper Bend: your site measure is booked for Thursday, May 22.');
    expect(texts()[0]).toContain(link);
    const [mail] = mails();
    expect(mail).toMatchObject({
      subject: 'Your site measure with Juniper Bend: Thursday, May 22',
      replyTo: shop.shop.email,
    });
    expect(mail?.text).toContain(link);
    expect(await row(visit, 'booked', 'sms')).toMatchObject({
      state: 'sent',
      body: texts()[0],
      providerId: expect.stringMatching(/^SM/),
    });
    await send();
    expect([texts().length, mails().length]).toEqual([1, 1]);
  });

  it('updates the calendar entry when the visit moves, and removes it when it is called off', async () => {
    const { visit, texts, mails } = await booked();
    await send();
    const moved = await move(visit);
    await send();
    await callOffVisit(await contextOf(shop, 'scheduler', clock), {
      visitId: visit.id,
      version: moved.version,
      reason: 'The floor is not down.',
    });
    pass(undoMs);
    await send();
    const entries = mails().map(eventOf);
    expect(entries.map(({ method }) => method)).toEqual(['REQUEST', 'REQUEST', 'CANCEL']);
    expect(entries.map(({ event }) => event.sequence)).toEqual([1, 2, 3]);
    expect(new Set(entries.map(({ event }) => event.uid)).size).toBe(1);
    expect(entries[1]?.event.startDate.toJSDate().toISOString()).toBe(moved.startsAt);
    expect(entries[2]?.status).toBe('CANCELLED');
    expect(texts()).toHaveLength(3);
    expect(texts()[1]).toContain('moves from');
    expect(texts()[2]).toContain('is called off');
    expect(mails()[2]?.text).toContain('The floor is not down.');
  });

  it('keeps a text for the morning at the site, and sends the e-mail at once', async () => {
    const quiet = await makeShop({ zone: 'America/New_York' });
    const crew = await makeCrew(quiet);
    clock = new Date('2026-12-02T03:30:00Z');
    const { visit, texts, mails } = await booked({}, quiet, crew.crewId);
    expect((await row(visit, 'booked', 'sms')).dueAt.toISOString()).toBe(
      '2026-12-02T13:00:00.000Z',
    );
    const { db } = await database();
    // As if it had been due by day, and the worker only came to it at night.
    await db.update(messages).set({ dueAt: clock }).where(eq(messages.visitId, visit.id));
    await db.delete(messages).where(ne(messages.occasion, 'booked'));
    await send();
    expect([texts().length, mails().length]).toEqual([0, 1]);
    expect(await row(visit, 'booked', 'sms')).toMatchObject({
      state: 'waiting',
      dueAt: new Date('2026-12-02T13:00:00Z'),
      attempts: 0,
    });
    clock = new Date('2026-12-02T13:00:00Z');
    await send();
    expect(texts()).toHaveLength(1);
  });

  it('withdraws what waits when the customer says no, and what was claimed before', async () => {
    const { visit, texts } = await booked();
    const { db } = await database();
    const [{ customerId } = { customerId: '' }] = await db
      .select({ customerId: messages.customerId })
      .from(messages)
      .where(eq(messages.visitId, visit.id));
    await db.insert(consents).values({
      shopId: shop.shop.id,
      customerId,
      channel: 'sms',
      given: false,
      how: 'said so on the phone',
    });
    await send();
    expect(texts()).toEqual([]);
    expect(await row(visit, 'booked', 'sms')).toMatchObject({
      state: 'withdrawn',
      reason: 'The customer: said no to texts.',
    });
    const said = { shopId: shop.shop.id, customerId, channel: 'sms', given: false } as const;
    await db.transaction((tx) => changeConsent(tx, { ...said, how: 'texted STOP', at: clock }));
    expect(await row(visit, 'day-before', 'sms')).toMatchObject({
      state: 'withdrawn',
      reason: 'The customer texted STOP.',
    });
  });

  it('hears from the provider that a number said STOP, and texts it no more', async () => {
    const { visit, phone, texts } = await booked();
    test.fakeSms.faults.set({ kind: 'refuse', code: 21610 }, { to: phone });
    await send();
    expect(await row(visit, 'booked', 'sms')).toMatchObject({
      state: 'refused',
      reason: expect.stringMatching(/^Not delivered: call them\./),
    });
    expect(await row(visit, 'day-before', 'sms')).toMatchObject({ state: 'withdrawn' });
    test.fakeSms.faults.clear();
    await move(visit);
    await send();
    expect(texts()).toEqual([]);
  });

  it('says "call them" at once of a number that cannot be texted', async () => {
    const { visit, phone } = await booked();
    test.fakeSms.faults.set({ kind: 'refuse', code: 21614 }, { to: phone });
    await send();
    expect(await row(visit, 'booked', 'sms')).toMatchObject({ state: 'refused', attempts: 1 });
    expect(await row(visit, 'booked', 'email')).toMatchObject({ state: 'sent' });
  });

  it('tries again after longer and longer pauses, and in the end says "call them"', async () => {
    const { visit, phone, texts } = await booked();
    test.fakeSms.faults.set({ kind: 'refuse', code: 20429 }, { to: phone });
    const pauses: number[] = [];
    for (;;) {
      await send();
      const { state, dueAt } = await row(visit, 'booked', 'sms');
      if (state !== 'waiting') break;
      pauses.push((dueAt.getTime() - clock.getTime()) / 1000);
      clock = dueAt;
    }
    expect(pauses).toEqual([30, 60, 120, 240, 480, 960, 1920]);
    expect(await row(visit, 'booked', 'sms')).toMatchObject({ state: 'refused', attempts: 8 });
    expect(texts()).toEqual([]);
  });

  it('asks the provider before it sends again what a crash left half done', async () => {
    const { visit, texts } = await booked();
    const dying = {
      ...test.ports,
      sms: {
        ...test.ports.sms,
        send: async (sms: Parameters<typeof test.ports.sms.send>[0]) => {
          await test.ports.sms.send(sms);
          return new Promise<never>(() => {});
        },
      },
    };
    // The worker dies between the provider's yes and our own books: its round never ends.
    void send(composeVisitMessage, dying);
    await expect.poll(() => texts().length).toBe(1);
    expect(await row(visit, 'booked', 'sms')).toMatchObject({ state: 'sending' });
    expect(await settleNow()).toBe(0);
    pass(leaseMs + 1);
    await settleNow();
    await send();
    expect(await row(visit, 'booked', 'sms')).toMatchObject({
      state: 'sent',
      providerId: expect.stringMatching(/^SM/),
    });
    expect(texts()).toHaveLength(1);
  });

  it('sends once what a crash left undone before anything went out', async () => {
    const { visit, texts, mails } = await booked();
    const { db } = await database();
    expect(await claimDue(db, clock)).toHaveLength(2);
    await send();
    expect(texts()).toEqual([]);
    pass(leaseMs + 1);
    await settleNow();
    await send();
    expect([texts().length, mails().length]).toEqual([1, 1]);
    expect(await row(visit, 'booked', 'sms')).toMatchObject({ state: 'sent', attempts: 2 });
  });

  it.each(['drop-after', 'drop-before'] as const)(
    'sends once when the answer is lost (%s)',
    async (kind) => {
      const { visit, phone, texts } = await booked();
      test.fakeSms.faults.set({ kind }, { to: phone, times: 1 });
      await send();
      expect(await row(visit, 'booked', 'sms')).toMatchObject({ state: 'sending' });
      pass(20_000);
      await settleNow();
      await send();
      expect(await row(visit, 'booked', 'sms')).toMatchObject({ state: 'sent' });
      expect(texts()).toHaveLength(1);
    },
  );

  it('sends an e-mail whose answer was lost under the same Message-ID', async () => {
    const { mails } = await booked();
    test.fakeEmail.faults.set({ kind: 'drop-after' }, { times: 1 });
    await send();
    pass(40_000);
    await send();
    expect(mails()).toHaveLength(2);
    expect(mails()[0]?.messageId).toBe(mails()[1]?.messageId);
  });

  it('does not tell an old time that was claimed before the visit moved', async () => {
    const { visit, texts } = await booked();
    const { db } = await database();
    await claimDue(db, clock);
    await move(visit);
    pass(leaseMs);
    await settleNow();
    await send();
    expect(await row(visit, 'booked', 'sms')).toMatchObject({
      state: 'withdrawn',
      reason: 'The visit has changed since.',
    });
    expect(texts()).toHaveLength(1);
    expect(texts()[0]).toContain('moves from');
  });

  it('asks nobody to confirm what is confirmed, and sends nothing when it is of no use any more', async () => {
    const { visit, texts } = await booked();
    await send();
    const { db } = await database();
    const { dueAt } = await row(visit, 'please-confirm', 'sms');
    await db.update(visits).set({ status: 'confirmed' }).where(eq(visits.id, visit.id));
    clock = dueAt;
    await send();
    expect(await row(visit, 'please-confirm', 'sms')).toMatchObject({
      state: 'withdrawn',
      reason: 'Confirmed already.',
    });
    clock = new Date(visit.endsAt);
    pass(86_400_000);
    await send();
    expect(await row(visit, 'day-before', 'sms')).toMatchObject({
      state: 'withdrawn',
      reason: 'Too late to be of use.',
    });
    expect(texts()).toHaveLength(1);
  });

  it('keeps a name from becoming a header, a calendar line or a script', async () => {
    const { visit, mails } = await booked();
    const { db } = await database();
    const name =
      'Rosa\r\nBcc: evil@evil.example\r\nATTENDEE:mailto:evil@evil.example<script>x</script>';
    const [{ customerId } = { customerId: '' }] = await db
      .select({ customerId: messages.customerId })
      .from(messages)
      .where(eq(messages.visitId, visit.id));
    await db.update(customers).set({ name }).where(eq(customers.id, customerId));
    await send();
    const [mail] = mails();
    expect(mail?.recipients).toHaveLength(1);
    expect(Object.keys(mail?.headers ?? {})).not.toContain('bcc');
    expect(mail?.html).not.toContain('<script>');
    expect(eventOf(mail ?? { attachments: [] }).attendees).toHaveLength(1);
    expect(test.fakeEmail.mailsFor('evil@evil.example')).toEqual([]);
  });
});
