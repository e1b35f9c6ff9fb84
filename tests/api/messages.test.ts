import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { POST as consentRoute } from '@/app/api/customers/[customerId]/consent/route';
import { PATCH as languageRoute } from '@/app/api/customers/[customerId]/language/route';
import { DELETE as itemRoute } from '@/app/api/messages/items/[itemId]/route';
import { GET as countRoute } from '@/app/api/messages/items/route';
import { GET as listRoute, POST as writeRoute } from '@/app/api/messages/route';
import { PATCH as settingsRoute } from '@/app/api/messages/settings/route';
import { POST as testRoute } from '@/app/api/messages/test/route';
import { PATCH as saveWordingRoute, GET as wordingsRoute } from '@/app/api/messages/wordings/route';
import { consents, customers, jobs, messages, schedulerItems } from '@/db/schema';
import type { WordingsView } from '@/lib/contracts/wordings';
import type { Role } from '@/lib/permissions';
import { database } from '@/server/base/database';
import { getThread } from '@/server/messages/get-thread';
import { listItems } from '@/server/messages/list-items';
import { putItem } from '@/server/messages/scheduler-items';
import { getPorts } from '@/server/ports/choose-ports';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { refusalOf } from '../help/refusal-of';
import { startTestJob } from '../help/start-test-job';

describe('messages by hand, consent and wording', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  const cookies = new Map<string, string>();
  beforeAll(async () => {
    shop = await makeShop({ name: 'Juniper Bend' });
    otherShop = await makeShop();
  });
  afterAll(async () => {
    const { fakes } = await getPorts();
    await Promise.all([fakes.sms?.stop(), fakes.email?.stop()]);
  });

  async function cookie(role: Role, of = shop) {
    const { email } = of.people[role];
    const known = cookies.get(email) ?? (await cookieOf(of.people[role]));
    cookies.set(email, known);
    return known;
  }
  async function customer(given: Parameters<typeof startTestJob>[1] = {}) {
    const { jobId } = await startTestJob(shop, given);
    const { db } = await database();
    const [job] = await db
      .select({ customerId: jobs.customerId })
      .from(jobs)
      .where(eq(jobs.id, jobId));
    if (!job) throw new Error('there is no such job');
    return { jobId, customerId: job.customerId };
  }
  const letter = (to: { customerId: string; jobId: string | null }) => ({
    idempotencyKey: randomUUID(),
    channel: 'email',
    subject: 'About the floor',
    text: 'Hello Robin, the floor may come first.',
    ...to,
  });
  async function item(of: { customerId: string; jobId: string }) {
    const { db } = await database();
    const key = randomUUID();
    await db.transaction((tx) =>
      putItem(tx, {
        shopId: shop.shop.id,
        ...of,
        visitId: null,
        kind: 'unclear-reply',
        key,
        words: 'Read it',
        at: new Date(),
      }),
    );
    const [row] = await db.select().from(schedulerItems).where(eq(schedulerItems.key, key));
    if (!row) throw new Error('the item was not put');
    return row.id;
  }

  it('puts a letter into the outbox once, however often it is sent', async () => {
    const to = await customer();
    const body = letter(to);
    for (let count = 0; count < 2; count += 1) {
      const answer = await callRoute(writeRoute, { cookie: await cookie('scheduler'), body });
      expect(answer).toMatchObject({ status: 200, body: { goesOut: 'at once' } });
    }
    const thread = await getThread(await contextOf(shop, 'scheduler'), to);
    const mine = thread.messages.filter(({ occasion }) => occasion === 'by-hand');
    expect(mine).toMatchObject([
      { channel: 'email', body: body.text, writtenBy: 'Scheduler Test', state: 'waiting' },
    ]);
  });

  it('writes no text to who said no, and says why', async () => {
    const to = await customer({ customer: { mayText: false } });
    const body = { ...letter(to), channel: 'sms' };
    const answer = await callRoute(writeRoute, { cookie: await cookie('scheduler'), body });
    expect(answer).toMatchObject({ status: 409, body: { code: 'channel-not-allowed' } });
    const { db } = await database();
    expect(await db.$count(messages, eq(messages.customerId, to.customerId))).toBe(0);
  });

  it('lets only the office read and write, and only to its own customers', async () => {
    const to = await customer();
    const itemId = await item(to);
    const asCrew = await cookie('crew');
    const asOther = await cookie('owner', otherShop);
    const { customerId } = to;
    const consent = { channel: 'sms', given: false, way: 'on the phone' };
    const calls = [
      [writeRoute, { body: letter({ ...to, jobId: null }) }],
      [itemRoute, { method: 'DELETE', params: { itemId } }],
      [consentRoute, { body: consent, params: { customerId } }],
      [languageRoute, { method: 'PATCH', body: { language: 'es' }, params: { customerId } }],
    ] as const;
    for (const [route, call] of calls) {
      expect((await callRoute(route, { ...call, cookie: asCrew })).status).toBe(403);
      expect((await callRoute(route, { ...call, cookie: asOther })).status).toBe(404);
    }
    for (const route of [listRoute, wordingsRoute, countRoute]) {
      expect((await callRoute(route, { method: 'GET', cookie: asCrew })).status).toBe(403);
    }
    const listed = await callRoute(listRoute, { method: 'GET', cookie: asOther });
    expect(listed).toMatchObject({ status: 200, body: [] });
    const crew = await contextOf(shop, 'crew');
    expect(await refusalOf(getThread(crew, to))).toMatchObject({ status: 403 });
    const other = await contextOf(otherShop, 'scheduler');
    expect(await refusalOf(getThread(other, to))).toMatchObject({ status: 404 });
    const { jobId } = await customer();
    const mixed = { ...letter(to), jobId };
    const answer = await callRoute(writeRoute, { cookie: await cookie('owner'), body: mixed });
    expect(answer.status).toBe(404);
  });

  it('ticks a line off the list, and the first who does is named', async () => {
    const to = await customer();
    const itemId = await item(to);
    const ctx = await contextOf(shop, 'scheduler');
    const counted = async (of = shop) => {
      const asked = { method: 'GET', cookie: await cookie('owner', of) } as const;
      return (await callRoute(countRoute, asked)).body;
    };
    const before = (await counted()) as { toAnswer: number };
    const open = async () => (await listItems(ctx, to)).map(({ id }) => id);
    expect(await open()).toContain(itemId);
    for (const role of ['scheduler', 'owner'] as const) {
      const call = { method: 'DELETE', params: { itemId }, cookie: await cookie(role) } as const;
      expect((await callRoute(itemRoute, call)).status).toBe(200);
    }
    expect(await open()).not.toContain(itemId);
    expect(await counted()).toEqual({ toAnswer: before.toAnswer - 1 });
    expect(await counted(otherShop)).toEqual({ toAnswer: 0 });
    const { db } = await database();
    const [row] = await db.select().from(schedulerItems).where(eq(schedulerItems.id, itemId));
    expect(row?.doneBy).toBe('Scheduler Test');
  });

  it('ends texts at once when the customer says no on the phone, and asks for proof of a yes', async () => {
    const { jobId, customerId } = await customer();
    const { crewId } = await makeCrew(shop);
    await bookTestVisit(shop, { jobId, crewId, date: '2029-05-15' });
    const say = async (body: object) =>
      callRoute(consentRoute, { params: { customerId }, body, cookie: await cookie('scheduler') });
    const waiting = async () => {
      const { db } = await database();
      const rows = await db.select().from(messages).where(eq(messages.customerId, customerId));
      return rows.filter(({ channel, state }) => channel === 'sms' && state === 'waiting').length;
    };
    expect(await waiting()).toBeGreaterThan(0);
    const no = { channel: 'sms', given: false, way: 'on the phone', proof: 'Please no texts' };
    expect((await say(no)).status).toBe(200);
    expect(await waiting()).toBe(0);
    const yes = { channel: 'sms', given: true, way: 'in writing' };
    expect(await say(yes)).toMatchObject({
      status: 422,
      body: { errors: { proof: expect.stringContaining('proof') } },
    });
    expect((await say({ ...yes, proof: 'Their letter of 3 May' })).status).toBe(200);
    const thread = await getThread(await contextOf(shop, 'owner'), { customerId });
    expect(thread.channels).toContain('sms');
    expect(thread.consents.slice(0, 2)).toMatchObject([
      {
        given: true,
        how: 'agreed in writing',
        proof: 'Their letter of 3 May',
        by: 'Scheduler Test',
      },
      { given: false, how: 'said no on the phone', proof: 'Please no texts' },
    ]);
    const { db } = await database();
    await expect(
      db.update(consents).set({ given: true }).where(eq(consents.customerId, customerId)),
    ).rejects.toThrow();
  });

  it('tells a customer in their language from now on', async () => {
    const { customerId } = await customer();
    const call = { method: 'PATCH', body: { language: 'es' }, params: { customerId } } as const;
    await callRoute(languageRoute, { ...call, cookie: await cookie('scheduler') });
    const { db } = await database();
    const [row] = await db.select().from(customers).where(eq(customers.id, customerId));
    expect(row?.language).toBe('es');
  });

  it('saves the shop’s own words, and refuses what could not be sent', async () => {
    const words = { occasion: 'booked', language: 'en', subject: '', email: '' };
    const save = async (sms: string, role: Role = 'owner') =>
      callRoute(saveWordingRoute, {
        method: 'PATCH',
        body: { ...words, sms },
        cookie: await cookie(role),
      });
    const said = async () => {
      const read = { method: 'GET', cookie: await cookie('scheduler') } as const;
      const { body } = await callRoute(wordingsRoute, read);
      return (body as WordingsView).wordings.find(
        ({ occasion, language }) => occasion === 'booked' && language === 'en',
      );
    };
    const ours = await said();
    expect((await save('{shop}: we come {day}. {link}', 'scheduler')).status).toBe(403);
    expect(await save('{shop}: we come {date}')).toMatchObject({
      status: 422,
      body: { errors: { sms: expect.stringContaining('{date}') } },
    });
    expect(await said()).toEqual(ours);
    expect((await save('{shop}: we come {day}. {link}')).status).toBe(200);
    expect(await said()).toMatchObject({
      sms: '{shop}: we come {day}. {link}',
      subject: ours?.subject,
      isOwn: true,
    });
    expect((await save('')).status).toBe(200);
    expect(await said()).toEqual(ours);
  });

  it('keeps silent on the occasions that the owner switches off, and no answer is switched off', async () => {
    const quiet = await makeShop();
    const body = { silentOn: ['booked', 'help'], segmentPrice: 0.01, currency: 'USD' };
    const call = { method: 'PATCH', body } as const;
    const asScheduler = await cookieOf(quiet.people.scheduler);
    expect((await callRoute(settingsRoute, { ...call, cookie: asScheduler })).status).toBe(403);
    const asOwner = await cookieOf(quiet.people.owner);
    expect((await callRoute(settingsRoute, { ...call, cookie: asOwner })).status).toBe(200);
    const { body: read } = await callRoute(wordingsRoute, { method: 'GET', cookie: asOwner });
    expect((read as WordingsView).settings).toEqual({
      silentOn: ['booked'],
      segmentPrice: 0.01,
      currency: 'USD',
    });
    const { jobId } = await startTestJob(quiet);
    const { crewId } = await makeCrew(quiet);
    await bookTestVisit(quiet, { jobId, crewId, date: '2029-05-15' });
    const { db } = await database();
    const told = await db
      .select({ occasion: messages.occasion })
      .from(messages)
      .where(eq(messages.shopId, quiet.shop.id));
    expect(new Set(told.map(({ occasion }) => occasion))).toEqual(
      new Set(['please-confirm', 'asked-again', 'day-before']),
    );
  });

  it('says exactly what failed of a test to the owner’s own phone and inbox', async () => {
    const { fakes } = await getPorts();
    const send = async (body: object, role: Role = 'owner') =>
      callRoute(testRoute, { body, cookie: await cookie(role) });
    const text = { channel: 'sms', to: '(212) 555-0142' };
    expect((await send(text, 'scheduler')).status).toBe(403);
    fakes.sms?.faults.set({ kind: 'refuse', code: 21610 }, { times: 1 });
    expect((await send(text)).body).toMatchObject({
      arrived: 'no',
      message: 'This number said STOP and gets no texts.',
      advice: expect.stringContaining('START'),
      detail: '21610: Attempt to send to unsubscribed recipient',
    });
    fakes.email?.faults.set({ kind: 'refuse', code: 550 }, { times: 1 });
    const mail = { channel: 'email', to: 'owner@shop.example' };
    expect((await send(mail)).body).toMatchObject({
      arrived: 'no',
      detail: expect.stringContaining('550'),
    });
    expect((await send(mail)).body).toMatchObject({ arrived: 'sent' });
    expect((await send({ channel: 'sms', to: 'call me' })).status).toBe(422);
  });
});
