import { randomBytes } from 'node:crypto';
import { and, eq, inArray } from 'drizzle-orm';
import twilio from 'twilio';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as inboundRoute } from '@/app/api/webhooks/sms/route';
import { POST as statusRoute } from '@/app/api/webhooks/sms/status/route';
import { consents, customers, jobs, messages, schedulerItems, visits } from '@/db/schema';
import { textAnswers } from '@/lib/messages/occasions';
import { database } from '@/server/base/database';
import type { RouteHandler } from '@/server/base/handle';
import { getPorts } from '@/server/ports/choose-ports';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('what the texting provider posts', () => {
  let shop: TestShop;
  let crewId: string;
  let person = 0;
  beforeAll(async () => {
    shop = await makeShop();
    ({ crewId } = await makeCrew(shop));
  });

  async function post(
    route: RouteHandler,
    path: string,
    params: Record<string, string>,
    signed?: string,
  ): Promise<number> {
    const account = (await getPorts()).fakes.sms?.account;
    if (!account) throw new Error('the fake provider does not run');
    const url = `http://localhost:3000${path}`;
    const signature = twilio.getExpectedTwilioSignature(account.authToken, url, params);
    // A proxy may have changed the host that the request names.
    const request = new Request(url.replace('localhost:3000', 'inside:8080'), {
      method: 'POST',
      headers: {
        'content-type': 'application/x-www-form-urlencoded',
        'x-twilio-signature': signed ?? signature,
      },
      body: new URLSearchParams(params).toString(),
    });
    return (await route(request)).status;
  }

  const newSid = () => `SM${randomBytes(16).toString('hex')}`;
  const text = (from: string, body: string, sid = newSid(), signed?: string) =>
    post(
      inboundRoute,
      '/api/webhooks/sms',
      { MessageSid: sid, From: from, To: '+12025550100', Body: body },
      signed,
    );
  const report = (sid: string, status: string, options: { key?: string; code?: string } = {}) =>
    post(statusRoute, `/api/webhooks/sms/status${options.key ? `?key=${options.key}` : ''}`, {
      MessageSid: sid,
      MessageStatus: status,
      ...(options.code ? { ErrorCode: options.code } : {}),
    });

  const nextPhone = () => {
    person += 1;
    return `+1303555${String(100 + person).padStart(4, '0')}`;
  };

  /** A booked visit whose customer was texted about it. */
  async function told(phone = nextPhone(), of = shop, crew = crewId) {
    const { jobId } = await startTestJob(of, { customer: { phone } });
    const date = new Date(Date.UTC(2032, 0, 1 + 7 * (person + 1))).toISOString().slice(0, 10);
    person += 1;
    const visit = await bookTestVisit(of, { jobId, crewId: crew, date });
    const { db } = await database();
    const sid = newSid();
    const [message] = await db
      .update(messages)
      .set({ state: 'sent', toAddress: phone, providerId: sid, sentAt: new Date() })
      .where(
        and(
          eq(messages.visitId, visit.id),
          eq(messages.occasion, 'booked'),
          eq(messages.channel, 'sms'),
        ),
      )
      .returning({ id: messages.id });
    if (!message) throw new Error('nothing was told');
    return { phone, visit, sid, messageId: message.id };
  }

  async function statusOf(visitId: string) {
    const { db } = await database();
    const [row] = await db
      .select({ status: visits.status, says: visits.customerSays })
      .from(visits)
      .where(eq(visits.id, visitId));
    return row;
  }
  async function messageOf(id: string) {
    const { db } = await database();
    const [row] = await db.select().from(messages).where(eq(messages.id, id));
    return row;
  }
  async function receivedFrom(jobId: string) {
    const { db } = await database();
    return db
      .select({ body: messages.body, reason: messages.reason })
      .from(messages)
      .where(and(eq(messages.jobId, jobId), eq(messages.state, 'received')));
  }
  /** Our newest text on an occasion is on their phone now. */
  async function arrivesOnPhone(phone: string, occasion: string) {
    const { db } = await database();
    const sentAt = new Date(Date.now() + 1_000);
    await db
      .update(messages)
      .set({ state: 'sent', toAddress: phone, sentAt })
      .where(and(eq(messages.occasion, occasion), eq(messages.state, 'waiting')));
  }
  async function answersTo(visitId: string) {
    const { db } = await database();
    const rows = await db
      .select({ occasion: messages.occasion })
      .from(messages)
      .where(and(eq(messages.visitId, visitId), inArray(messages.occasion, [...textAnswers])));
    return rows.map(({ occasion }) => occasion);
  }
  async function itemsOf(visitId: string) {
    const { db } = await database();
    return db.select().from(schedulerItems).where(eq(schedulerItems.visitId, visitId));
  }
  async function mayText(jobId: string) {
    const { db } = await database();
    const rows = await db
      .select({ given: consents.given, how: consents.how })
      .from(consents)
      .innerJoin(customers, eq(customers.id, consents.customerId))
      .innerJoin(jobs, eq(jobs.customerId, customers.id))
      .where(and(eq(jobs.id, jobId), eq(consents.channel, 'sms')))
      .orderBy(consents.sequence);
    return rows.at(-1);
  }

  it('confirms the visit that waits for an answer from this number', async () => {
    const { phone, visit } = await told();
    expect(await text(phone, 'Yes, thank you!')).toBe(200);
    expect(await statusOf(visit.id)).toMatchObject({ status: 'confirmed' });
    expect(await receivedFrom(visit.jobId)).toEqual([
      { body: 'Yes, thank you!', reason: 'Confirmed by this text.' },
    ]);
  });

  it('takes a text that is posted twice once', async () => {
    const { phone, visit } = await told();
    const sid = newSid();
    await text(phone, 'Can we do another day?', sid);
    await text(phone, 'Can we do another day?', sid);
    expect(await receivedFrom(visit.jobId)).toHaveLength(1);
    expect(await statusOf(visit.id)).toEqual({
      status: 'booked',
      says: 'Can we do another day?',
    });
  });

  it('guesses nothing when two visits wait for an answer: it asks which, and takes a number', async () => {
    const first = await told();
    const second = await told(first.phone);
    await text(first.phone, 'Yes');
    expect(await statusOf(first.visit.id)).toMatchObject({ status: 'booked' });
    expect(await statusOf(second.visit.id)).toMatchObject({ status: 'booked' });
    expect(await receivedFrom(second.visit.jobId)).toEqual([
      { body: 'Yes', reason: 'Two visits wait for an answer: asked which is meant.' },
    ]);
    await arrivesOnPhone(first.phone, 'which-visit');
    await text(first.phone, 'the second one, please');
    expect(await statusOf(first.visit.id)).toMatchObject({ status: 'booked' });
    expect(await statusOf(second.visit.id)).toMatchObject({ status: 'confirmed' });
  });

  it('answers HELP with who texts, and not for ever', async () => {
    const { phone, visit } = await told();
    for (let count = 0; count < 5; count += 1) await text(phone, 'HELP');
    expect(await answersTo(visit.id)).toEqual(['help', 'help', 'help']);
    expect(await itemsOf(visit.id)).toMatchObject([
      { kind: 'unclear-reply' },
      { kind: 'unclear-reply' },
    ]);
  });

  it('sends the link to other times to who asks for one', async () => {
    const { phone, visit } = await told();
    await text(phone, 'Can we do another day?');
    expect(await answersTo(visit.id)).toEqual(['other-time']);
    expect(await itemsOf(visit.id)).toMatchObject([
      { kind: 'asks-other-time', words: 'Measure: Can we do another day?' },
    ]);
  });

  it('ends texts at once on STOP in every shop that has the number, and takes them up on START', async () => {
    const otherShop = await makeShop();
    const otherCrew = await makeCrew(otherShop);
    const here = await told();
    const there = await told(here.phone, otherShop, otherCrew.crewId);
    await text(here.phone, 'STOP');
    for (const { visit } of [here, there]) {
      expect(await mayText(visit.jobId)).toEqual({ given: false, how: 'texted STOP' });
      const { db } = await database();
      const waiting = await db.$count(
        messages,
        and(
          eq(messages.visitId, visit.id),
          eq(messages.channel, 'sms'),
          eq(messages.state, 'waiting'),
        ),
      );
      expect(waiting).toBe(0);
      expect(await statusOf(visit.id)).toMatchObject({ status: 'booked' });
    }
    await text(here.phone, 'START');
    expect(await mayText(here.visit.jobId)).toMatchObject({ given: true });
  });

  it('keeps what is unclear for the scheduler and changes nothing', async () => {
    const { phone, visit } = await told();
    await text(phone, 'Yes but the dog bites');
    expect(await statusOf(visit.id)).toMatchObject({ status: 'booked' });
    expect(await receivedFrom(visit.jobId)).toEqual([
      { body: 'Yes but the dog bites', reason: 'Read it: it is not clear what is meant.' },
    ]);
  });

  it('hears nothing from a forged post', async () => {
    const { phone, visit, sid, messageId } = await told();
    expect(await text(phone, 'Yes', newSid(), 'forged')).toBe(403);
    expect(await statusOf(visit.id)).toMatchObject({ status: 'booked' });
    const path = '/api/webhooks/sms/status';
    const params = { MessageSid: sid, MessageStatus: 'delivered' };
    expect(await post(statusRoute, path, params, 'forged')).toBe(403);
    expect(await messageOf(messageId)).toMatchObject({ state: 'sent' });
  });

  it('lets no stranger’s number answer for anybody', async () => {
    const { visit } = await told();
    expect(await text(nextPhone(), 'Yes')).toBe(200);
    expect(await statusOf(visit.id)).toMatchObject({ status: 'booked' });
  });

  it('takes reports late, twice and out of order', async () => {
    const { sid, messageId } = await told();
    await report(sid, 'delivered');
    await report(sid, 'delivered');
    await report(sid, 'sent');
    await report(sid, 'failed', { code: '30008' });
    expect(await messageOf(messageId)).toMatchObject({ state: 'delivered', reason: '' });
  });

  it('finds the message by our own key when the report comes before the answer to the sending', async () => {
    const { messageId } = await told();
    const { db } = await database();
    await db
      .update(messages)
      .set({ state: 'sending', providerId: null })
      .where(eq(messages.id, messageId));
    const sid = newSid();
    await report(sid, 'delivered', { key: messageId });
    expect(await messageOf(messageId)).toMatchObject({ state: 'delivered', providerId: sid });
  });

  it('says "call them" of a text that did not arrive, and hears STOP in a report', async () => {
    const late = await told();
    await report(late.sid, 'undelivered', { code: '30003' });
    expect(await messageOf(late.messageId)).toMatchObject({
      state: 'refused',
      reason: 'Not delivered: call them. The phone is off or out of reach.',
    });
    const stopped = await told();
    await report(stopped.sid, 'failed', { code: '21610' });
    expect(await mayText(stopped.visit.jobId)).toMatchObject({ given: false });
  });
});
