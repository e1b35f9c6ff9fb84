import { eq } from 'drizzle-orm';
import { strFromU8, unzipSync } from 'fflate';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  POST as eraseRoute,
  GET as previewRoute,
} from '@/app/api/customers/[customerId]/erasure/route';
import { GET as exportRoute } from '@/app/api/customers/[customerId]/export/route';
import { audit, consents, customers, jobs, messages, shops, sites, visits } from '@/db/schema';
import type { Role } from '@/lib/permissions';
import { database } from '@/server/base/database';
import { forgetOld } from '@/server/keeping/forget-old';
import { changeConsent } from '@/server/messages/change-consent';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { bookTestVisit } from '../help/book-test-visit';
import { callRoute } from '../help/call-route';
import { makeCrew } from '../help/make-crew';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

const name = 'Juno Marsh';
const told = { name, phone: '(212) 555-0188', email: 'juno@customer.example' };

describe('a customer who asks what is known of them, and to be forgotten', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  let crewId: string;
  const cookies = {} as Record<Role, string>;
  let otherOwner: string;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    ({ crewId } = await makeCrew(shop));
    for (const role of ['owner', 'scheduler', 'measurer', 'bench', 'crew'] as const) {
      cookies[role] = await cookieOf(shop.people[role]);
    }
    otherOwner = await cookieOf(otherShop.people.owner);
  });

  let dayOfMonth = 6;
  async function bookedCustomer() {
    dayOfMonth += 1;
    const { jobId } = await startTestJob(shop, {
      customer: told,
      site: { street: '88 Sedge Walk', wayIn: 'Blue gate' },
      notes: `Ring ${name} first`,
    });
    const date = `2026-12-${String(dayOfMonth).padStart(2, '0')}`;
    const visit = await bookTestVisit(shop, { jobId, crewId, date });
    const { db } = await database();
    const [job] = await db.select().from(jobs).where(eq(jobs.id, jobId));
    return { jobId, visit, customerId: job?.customerId as string };
  }

  async function callOff({ visit }: Awaited<ReturnType<typeof bookedCustomer>>) {
    await callOffVisit(await contextOf(shop, 'scheduler'), {
      visitId: visit.id,
      version: visit.version,
      reason: 'Called off by the customer',
    });
  }

  const erase = (customerId: string, nameAgain: string, cookie = cookies.owner) =>
    callRoute(eraseRoute, { params: { customerId }, body: { nameAgain }, cookie });

  it('gives everything in one file, with the texts and without the way in', async () => {
    const { customerId } = await bookedCustomer();
    const { db } = await database();
    await db
      .update(sites)
      .set({ accessCodeSealed: 'sealed way in' })
      .where(eq(sites.customerId, customerId));
    const asked = new Request('http://localhost:3000/api/test', {
      headers: { cookie: cookies.owner },
    });
    const answer = await exportRoute(asked, { params: Promise.resolve({ customerId }) });
    expect(answer.status).toBe(200);
    const zip = unzipSync(new Uint8Array(await answer.arrayBuffer()));
    const text = strFromU8(zip['customer.json'] as Uint8Array);
    const record = JSON.parse(text);
    expect(record.customer).toMatchObject({ name, email: told.email });
    expect(record.visits).toHaveLength(1);
    expect(record.messages.length).toBeGreaterThan(0);
    expect(text).not.toContain('sealed way in');
  });

  it('is not forgotten while a crew still drives there, nor by a slip of the hand', async () => {
    const booked = await bookedCustomer();
    const preview = await callRoute(previewRoute, {
      method: 'GET',
      params: { customerId: booked.customerId },
      cookie: cookies.owner,
    });
    expect(preview.body).toMatchObject({ customerName: name, jobs: 1, openVisits: 1 });
    expect(await erase(booked.customerId, name)).toMatchObject({
      status: 409,
      body: { code: 'visits-open' },
    });
    await callOff(booked);
    expect(await erase(booked.customerId, 'Juno')).toMatchObject({
      status: 422,
      body: { code: 'name-differs' },
    });
    const { db } = await database();
    const [still] = await db.select().from(customers).where(eq(customers.id, booked.customerId));
    expect(still?.name).toBe(name);
  });

  it('is in no row any more once erased, while jobs and times stay', async () => {
    const booked = await bookedCustomer();
    await callOff(booked);
    expect((await erase(booked.customerId, 'juno marsh ')).status).toBe(200);
    const { db } = await database();
    const rows = JSON.stringify([
      await db.select().from(customers).where(eq(customers.id, booked.customerId)),
      await db.select().from(sites).where(eq(sites.customerId, booked.customerId)),
      await db.select().from(jobs).where(eq(jobs.id, booked.jobId)),
      await db.select().from(visits).where(eq(visits.jobId, booked.jobId)),
      await db.select().from(messages).where(eq(messages.jobId, booked.jobId)),
      await db.select().from(audit).where(eq(audit.jobId, booked.jobId)),
    ]);
    for (const word of [name, '5550188', told.email, 'Sedge', 'Blue gate']) {
      expect(rows).not.toContain(word);
    }
    const kept = await db.select().from(visits).where(eq(visits.jobId, booked.jobId));
    expect(kept[0]?.startsAt.toISOString()).toBe(booked.visit.startsAt);
    expect((await erase(booked.customerId, 'anything')).status).toBe(200);
  });

  it('is not texted under a new name when they said stop before they were erased', async () => {
    const booked = await bookedCustomer();
    const { db } = await database();
    const { customerId } = booked;
    await db.transaction((tx) =>
      changeConsent(tx, {
        shopId: shop.shop.id,
        customerId,
        channel: 'sms',
        given: false,
        how: 'texted STOP',
        at: new Date(),
      }),
    );
    await callOff(booked);
    expect((await erase(customerId, name)).status).toBe(200);
    const again = await bookedCustomer();
    const said = await db
      .select({ channel: consents.channel, given: consents.given })
      .from(consents)
      .where(eq(consents.customerId, again.customerId))
      .orderBy(consents.sequence);
    expect(said.filter(({ channel }) => channel === 'sms').at(-1)?.given).toBe(false);
    const sent = await db.select().from(messages).where(eq(messages.jobId, again.jobId));
    expect(sent.filter(({ channel }) => channel === 'sms')).toEqual([]);
  });

  it('is forgotten by the shop’s own rule, years after the last visit, and not while a job is open', async () => {
    const { db } = await database();
    const closed = await bookedCustomer();
    await callOff(closed);
    await db.update(jobs).set({ stage: 'signed-off' }).where(eq(jobs.id, closed.jobId));
    const open = await bookedCustomer();
    await callOff(open);
    const inYears = (years: number) => new Date(Date.now() + years * 366 * 86_400_000);
    expect(await forgetOld(db, inYears(9))).toBe(0);
    const { rules } = shop.shop;
    await db
      .update(shops)
      .set({ rules: { ...rules, keeping: { customerYears: 3 } } })
      .where(eq(shops.id, shop.shop.id));
    const nameOf = async (customerId: string) =>
      (await db.select().from(customers).where(eq(customers.id, customerId)))[0]?.name;
    await forgetOld(db, inYears(2));
    expect(await nameOf(closed.customerId)).toBe(name);
    await forgetOld(db, inYears(4));
    expect(await nameOf(closed.customerId)).toBe('Erased customer');
    expect(await nameOf(open.customerId)).toBe(name);
    await db.update(shops).set({ rules }).where(eq(shops.id, shop.shop.id));
  });

  it('is shown and erased by the owner of the shop alone', async () => {
    const { customerId } = await bookedCustomer();
    for (const role of ['scheduler', 'measurer', 'bench', 'crew'] as const) {
      const cookie = cookies[role];
      const asked = { method: 'GET', params: { customerId }, cookie } as const;
      expect((await callRoute(exportRoute, asked)).status).toBe(403);
      expect((await callRoute(previewRoute, asked)).status).toBe(403);
      expect((await erase(customerId, name, cookie)).status).toBe(403);
    }
    const other = { method: 'GET', params: { customerId }, cookie: otherOwner } as const;
    expect((await callRoute(exportRoute, other)).status).toBe(404);
    expect((await callRoute(previewRoute, other)).status).toBe(404);
    expect((await erase(customerId, name, otherOwner)).status).toBe(404);
  });
});
