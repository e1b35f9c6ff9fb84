import { eq, sql } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { POST as statusRoute } from '@/app/api/webhooks/sms/status/route';
import { consents, customers, jobs, messages, schedulerItems, shops } from '@/db/schema';
import { database } from '@/server/base/database';
import { askLate } from '@/server/messages/ask-late';
import { leaseMs } from '@/server/messages/claim-due';
import type { Compose } from '@/server/messages/compose';
import { type Sending, sendDue } from '@/server/messages/send-due';
import { settle } from '@/server/messages/settle';
import { getPorts } from '@/server/ports/choose-ports';
import type { SmsFault } from '@/server/ports/sms/fake-sms-api';
import { bookTestVisit } from '../help/book-test-visit';
import { makeCrew } from '../help/make-crew';
import { makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';
import { openWebhookDoor } from '../help/webhook-door';

/** Messages of the run with every fault at once; the bench sends a thousand. */
const many = Number(process.env.SETWELL_MESSAGES ?? 240);

const compose: Compose = async (_, message) =>
  message.channel === 'sms'
    ? { is: 'sms', body: message.occasion }
    : { is: 'email', email: { subject: message.occasion, text: message.occasion } };

/** The instant at which a worker dies: from there on its work never ends. */
const steps = ['composing', 'writing down', 'sending', 'taken by the provider'] as const;
type Step = (typeof steps)[number];

describe('faults of the worker and of the provider', () => {
  let shop: TestShop;
  let visit: { id: string; jobId: string };
  let customerId: string;
  let door: Awaited<ReturnType<typeof openWebhookDoor>>;
  let clock: Date;
  const phone = '+12125550199';
  const inbox = 'faults@customer.example';

  beforeAll(async () => {
    shop = await makeShop();
    const { db } = await database();
    const { rules } = shop.shop;
    rules.booking = { ...rules.booking, quietFrom: '00:00', quietUntil: '00:00' };
    await db.update(shops).set({ rules }).where(eq(shops.id, shop.shop.id));
    const { crewId } = await makeCrew(shop);
    const { jobId } = await startTestJob(shop, { customer: { phone, email: inbox } });
    const booked = await bookTestVisit(shop, { jobId, crewId, date: '2034-05-15' }, new Date());
    visit = { id: booked.id, jobId };
    const [job] = await db.select().from(jobs).where(eq(jobs.id, jobId));
    customerId = job?.customerId ?? '';
    door = await openWebhookDoor({ '/api/webhooks/sms/status': statusRoute });
  });
  afterAll(async () => {
    const { fakes } = await getPorts();
    await Promise.all([fakes.sms?.stop(), fakes.email?.stop()]);
    await door.close();
  });
  beforeEach(async () => {
    clock = new Date();
    const { db } = await database();
    await db.delete(messages);
    await db.delete(schedulerItems);
    const { fakes } = await getPorts();
    fakes.sms?.faults.clear();
    fakes.email?.faults.clear();
  });
  const pass = (ms: number) => {
    clock = new Date(clock.getTime() + ms);
  };

  async function put(names: string[], channel: 'sms' | 'email' | 'both' = 'sms') {
    const { db } = await database();
    await db.insert(messages).values(
      names.map((occasion, index) => ({
        shopId: shop.shop.id,
        customerId,
        jobId: visit.jobId,
        visitId: visit.id,
        occasion,
        channel: channel === 'both' ? (index % 2 ? ('sms' as const) : ('email' as const)) : channel,
        key: `fault:${occasion}`,
        dueAt: clock,
      })),
    );
  }
  async function sending(change: Partial<Sending> = {}): Promise<Sending> {
    const { db } = await database();
    return { db, ports: await getPorts(), compose, now: () => clock, ...change };
  }
  async function work() {
    const all = await sending();
    await settle(all);
    await sendDue(all);
    await askLate(all);
  }
  async function onPhone(names: string[]) {
    const { fakes } = await getPorts();
    const texts = fakes.sms?.messagesFor(phone) ?? [];
    return texts.map(({ body }) => body).filter((body) => names.includes(body));
  }
  async function inInbox(names: string[]) {
    const { fakes } = await getPorts();
    const mails = fakes.email?.mailsFor(inbox) ?? [];
    return mails.filter(({ subject }) => names.includes(subject));
  }
  async function stateOf(name: string) {
    const { db } = await database();
    const [row] = await db.select().from(messages).where(eq(messages.occasion, name));
    return row;
  }
  /** Settles what a worker left behind, as the next one does when its lease is over. */
  async function nextWorker() {
    pass(leaseMs + 1);
    await work();
    pass(leaseMs + 1);
    await work();
  }

  it.each(steps)('a worker killed while %s loses nothing and sends nothing twice', async (step) => {
    const name = `killed while ${step}`;
    await put([name]);
    let isDead = () => {};
    const died = new Promise<void>((resolve) => {
      isDead = resolve;
    });
    const die = () => {
      isDead();
      return new Promise<never>(() => {});
    };
    const ports = await getPorts();
    const dying: Record<Step, Partial<Sending>> = {
      composing: { compose: die },
      'writing down': {
        ports: { ...ports, sms: { ...ports.sms, send: die } },
        // The body never reached our books.
        compose: async () => ({ is: 'sms', body: '' }),
      },
      sending: { ports: { ...ports, sms: { ...ports.sms, send: die } } },
      'taken by the provider': {
        ports: {
          ...ports,
          sms: {
            ...ports.sms,
            send: async (sms) => {
              await ports.sms.send(sms);
              return die();
            },
          },
        },
      },
    };
    void sendDue(await sending(dying[step]));
    await died;
    expect(await stateOf(name)).toMatchObject({
      state: expect.stringMatching(/sending|delivered/),
    });
    await nextWorker();
    expect(await onPhone([name])).toEqual([name]);
    expect((await stateOf(name))?.state).toMatch(/^(sent|delivered)$/);
  });

  const late: SmsFault = {
    kind: 'report',
    steps: [{ status: 'delivered', afterMs: 400 }],
  };
  const twice: SmsFault = {
    kind: 'report',
    steps: [
      { status: 'sent', afterMs: 1 },
      { status: 'delivered', afterMs: 1 },
      { status: 'delivered', afterMs: 1 },
      { status: 'sent', afterMs: 1 },
      { status: 'undelivered', errorCode: 30003, afterMs: 1 },
    ],
  };

  it.each([
    ['late', late],
    ['twice and out of order', twice],
  ])('a report that comes %s leaves it delivered', async (how, fault) => {
    const name = `reported ${how}`;
    await put([name]);
    const { fakes } = await getPorts();
    fakes.sms?.faults.set(fault, { times: 1 });
    await work();
    await fakes.sms?.idle();
    expect(await stateOf(name)).toMatchObject({ state: 'delivered', askAt: null });
    expect(await onPhone([name])).toEqual([name]);
  });

  it('asks for a report that never comes, and in the end says that nobody knows', async () => {
    const name = 'never reported';
    await put([name]);
    const { fakes } = await getPorts();
    fakes.sms?.faults.set({ kind: 'report', steps: [] }, { times: 1 });
    await work();
    const asked: number[] = [];
    for (let round = 0; round < 10; round += 1) {
      const askAt = (await stateOf(name))?.askAt;
      if (!askAt) break;
      asked.push(Math.round((askAt.getTime() - clock.getTime()) / 60_000));
      clock = askAt;
      await work();
    }
    expect(asked).toEqual([10, 50, 300, 1080]);
    expect(await stateOf(name)).toMatchObject({
      state: 'sent',
      reason: 'The provider never said whether it arrived.',
    });
    expect(await onPhone([name])).toEqual([name]);
  });

  it('puts what was not delivered before the scheduler, and texts that number no more', async () => {
    const name = 'to a landline';
    await put([name]);
    const { fakes } = await getPorts();
    const steps = [{ status: 'undelivered', errorCode: 30006, afterMs: 1 }];
    fakes.sms?.faults.set({ kind: 'report', steps }, { times: 1 });
    await work();
    await fakes.sms?.idle();
    expect(await stateOf(name)).toMatchObject({
      state: 'refused',
      reason: expect.stringContaining('Not delivered: call them.'),
    });
    const { db } = await database();
    expect(await db.select().from(schedulerItems)).toMatchObject([
      { kind: 'not-delivered', customerId, visitId: visit.id, doneAt: null },
    ]);
    await put(['after it']);
    await work();
    expect(await stateOf('after it')).toMatchObject({
      state: 'withdrawn',
      reason: 'The customer: this number takes no texts.',
    });
    await db.update(customers).set({ untextablePhone: '' }).where(eq(customers.id, customerId));
  });

  it('does not take one of two equal texts for the other when an answer is lost', async () => {
    await put(['first', 'second']);
    const same: Partial<Sending> = { compose: async () => ({ is: 'sms', body: 'the same words' }) };
    const { fakes } = await getPorts();
    fakes.sms?.faults.set({ kind: 'drop-before' }, { times: 1 });
    await sendDue(await sending(same));
    pass(20_000);
    await settle(await sending(same));
    await sendDue(await sending(same));
    expect(await onPhone(['the same words'])).toHaveLength(2);
    const ids = [await stateOf('first'), await stateOf('second')].map((row) => row?.providerId);
    expect(new Set(ids).size).toBe(2);
  });

  it('sends each of many messages once by two workers, whatever the services do, and states each', {
    timeout: 120_000,
  }, async () => {
    const names = Array.from({ length: many }, (_, index) => `load ${index}`);
    await put(names, 'both');
    const { fakes } = await getPorts();
    const share = Math.ceil(many / 24);
    const faults: SmsFault[] = [
      { kind: 'refuse', code: 20429 },
      { kind: 'refuse', code: 20500 },
      { kind: 'slow', delayMs: 40 },
      { kind: 'drop-before' },
      { kind: 'drop-after' },
      { kind: 'report', steps: [] },
      late,
      twice,
    ];
    for (const fault of faults) fakes.sms?.faults.set(fault, { times: share });
    fakes.email?.faults.set({ kind: 'refuse', code: 451 }, { times: share });
    fakes.email?.faults.set({ kind: 'slow', delayMs: 40 }, { times: share });
    fakes.email?.faults.set({ kind: 'drop-before' }, { times: share });
    const { db } = await database();
    const isOpen = sql`${messages.state} in ('waiting', 'sending')`;
    for (let round = 0; round < 20; round += 1) {
      await Promise.all([work(), work()]);
      if ((await db.$count(messages, isOpen)) === 0) break;
      pass(leaseMs + 1);
    }
    await fakes.sms?.idle();
    for (let round = 0; round < 5; round += 1) {
      pass(25 * 3_600_000);
      await Promise.all([work(), work()]);
    }
    const mails = (await inInbox(names)).map(({ subject }) => subject);
    const got = [...(await onPhone(names)), ...mails];
    expect(got.toSorted()).toEqual(names.toSorted());
    const states = await db
      .select({ state: messages.state, reason: messages.reason, askAt: messages.askAt })
      .from(messages);
    expect(states.every(({ state }) => state === 'sent' || state === 'delivered')).toBe(true);
    expect(states.every(({ askAt }) => askAt === null)).toBe(true);
    expect(await db.$count(consents, eq(consents.given, false))).toBe(0);
  });
});
