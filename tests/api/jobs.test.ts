import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { POST as readyRoute } from '@/app/api/jobs/[jobId]/ready/route';
import { PATCH as changeJobRoute, GET as getJobRoute } from '@/app/api/jobs/[jobId]/route';
import { GET as listJobsRoute, POST as startJobRoute } from '@/app/api/jobs/route';
import { consents, customers, jobs } from '@/db/schema';
import type { JobRow, JobView } from '@/lib/contracts/jobs';
import type { Role } from '@/lib/permissions';
import { database } from '@/server/base/database';
import { callRoute } from '../help/call-route';
import { cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

describe('jobs', () => {
  let shop: TestShop;
  let otherShop: TestShop;
  const cookies = {} as Record<Role, string>;
  let otherCookie: string;
  beforeAll(async () => {
    shop = await makeShop();
    otherShop = await makeShop();
    for (const role of ['owner', 'scheduler', 'measurer', 'bench', 'crew'] as const) {
      cookies[role] = await cookieOf(shop.people[role]);
    }
    otherCookie = await cookieOf(otherShop.people.owner);
  });

  const newJob = {
    title: 'Pantry, one wall',
    customer: { name: 'Wren Halloway', phone: '212-555-0163', mayText: true, mayEmail: true },
    site: { street: '4 Quarry Lane', town: 'Stonebeck' },
  };

  async function search(text: string, cookie = cookies.crew): Promise<JobRow[]> {
    const url = `/api/jobs?search=${encodeURIComponent(text)}`;
    return (await callRoute(listJobsRoute, { method: 'GET', url, cookie })).body as JobRow[];
  }

  async function get(jobId: string, cookie = cookies.bench) {
    return callRoute(getJobRoute, { method: 'GET', params: { jobId }, cookie });
  }

  it('starts a job with customer, site, number, phone as E.164 and the consent that was given', async () => {
    const answer = await callRoute(startJobRoute, { cookie: cookies.scheduler, body: newJob });
    expect(answer.status).toBe(200);
    const { id, number } = answer.body as { id: string; number: number };
    const view = (await get(id)).body as JobView;
    expect(view).toMatchObject({
      number,
      stage: 'enquiry',
      customerName: 'Wren Halloway',
      phone: '+12125550163',
      street: '4 Quarry Lane',
      mayText: true,
      mayEmail: false,
      nextVisit: null,
    });
    expect(view.story).toMatchObject([{ who: 'Scheduler Test', summary: expect.any(String) }]);
    const { db } = await database();
    const given = await db
      .select({ channel: consents.channel, how: consents.how, by: consents.byPersonId })
      .from(consents)
      .innerJoin(customers, eq(customers.id, consents.customerId))
      .where(and(eq(consents.shopId, shop.shop.id), eq(customers.name, 'Wren Halloway')));
    expect(given).toEqual([
      {
        channel: 'sms',
        how: 'agreed when the job was taken',
        by: shop.people.scheduler.personId,
      },
    ]);
  });

  it('says at the field that a phone number cannot be called, and writes nothing', async () => {
    const { db } = await database();
    const count = () => db.$count(customers, eq(customers.shopId, shop.shop.id));
    const before = await count();
    const answer = await callRoute(startJobRoute, {
      cookie: cookies.scheduler,
      body: { ...newJob, customer: { ...newJob.customer, phone: '555-01' } },
    });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ errors: { 'customer.phone': expect.any(String) } });
    expect(await count()).toBe(before);
  });

  it('numbers twenty jobs started at once without a gap or a repeat', async () => {
    const fresh = await makeShop();
    const started = await Promise.all(Array.from({ length: 20 }, () => startTestJob(fresh)));
    expect(started.map(({ number }) => number).sort((a, b) => a - b)).toEqual(
      Array.from({ length: 20 }, (_, index) => index + 1),
    );
  });

  it('finds a job by part of name, street, title or phone, and by its number', async () => {
    const { jobId, number } = await startTestJob(shop, {
      title: 'Scullery 100%',
      customer: { name: 'Imogen Larkspur', phone: '(212) 555-0188' },
      site: { street: '77 Bellwether Street' },
    });
    for (const text of ['larks', 'BELLWETHER', 'scullery', '555-0188', `#${number}`, '100%']) {
      expect(
        (await search(text)).map(({ id }) => id),
        text,
      ).toContain(jobId);
    }
    expect(await search('larks_')).toEqual([]);
  });

  it('finds a job by what only its notes say, and by two words that stand in two places', async () => {
    const { jobId } = await startTestJob(shop, {
      notes: 'Ask about the larder hinges',
      customer: { name: 'Ada Kestrel' },
      site: { street: '3 Heron Walk', town: 'Saltmere' },
    });
    expect((await search('larder')).map(({ id }) => id)).toEqual([jobId]);
    expect((await search('kestrel saltmere')).map(({ id }) => id)).toEqual([jobId]);
    expect(await search('kestrel fernhollow')).toEqual([]);
    expect(await search('larder', otherCookie)).toEqual([]);
  });

  it('keeps what the office learned and tells it in the story', async () => {
    const { jobId } = await startTestJob(shop);
    const answer = await callRoute(changeJobRoute, {
      method: 'PATCH',
      params: { jobId },
      cookie: cookies.owner,
      body: { floorAgreed: true, wayIn: 'Key at the neighbour' },
    });
    expect(answer.status).toBe(200);
    const view = (await get(jobId)).body as JobView;
    expect(view).toMatchObject({ floorAgreed: true, wayIn: 'Key at the neighbour', unitCount: 11 });
    expect(view.story[0]?.summary).toBe('Floor agreed, Way in changed');
  });

  it('puts a job on hold and takes it up where its history left it', async () => {
    const { jobId } = await startTestJob(shop);
    const change = async (onHold: boolean) =>
      callRoute(changeJobRoute, {
        method: 'PATCH',
        params: { jobId },
        cookie: cookies.scheduler,
        body: { onHold },
      });
    expect((await change(true)).body).toMatchObject({ stage: 'on-hold' });
    expect((await change(false)).body).toMatchObject({ stage: 'enquiry' });
  });

  it('moves a job in build to ready when the bench says so, and not for a day to come', async () => {
    const { jobId } = await startTestJob(shop);
    const { db } = await database();
    await db.update(jobs).set({ stage: 'in-build' }).where(eq(jobs.id, jobId));
    const say = async (readyOn: string | null) =>
      callRoute(readyRoute, { params: { jobId }, cookie: cookies.bench, body: { readyOn } });
    expect((await say('2099-01-05')).body).toMatchObject({ stage: 'in-build' });
    expect((await say('2020-01-06')).body).toMatchObject({ stage: 'ready' });
    expect(((await get(jobId)).body as JobView).readyOn).toBe('2020-01-06');
  });

  it('lets bench, crew and measurer read jobs and change none', async () => {
    const { jobId } = await startTestJob(shop);
    for (const role of ['bench', 'crew', 'measurer'] as const) {
      const cookie = cookies[role];
      expect((await get(jobId, cookie)).status).toBe(200);
      expect((await callRoute(startJobRoute, { cookie, body: newJob })).status).toBe(403);
      const change = { method: 'PATCH', params: { jobId }, cookie, body: { title: 'X' } } as const;
      expect((await callRoute(changeJobRoute, change)).status).toBe(403);
    }
    const ready = { params: { jobId }, cookie: cookies.crew, body: { readyOn: '2026-12-01' } };
    expect((await callRoute(readyRoute, ready)).status).toBe(403);
  });

  it('knows no job of another shop', async () => {
    const { jobId } = await startTestJob(shop, { customer: { name: 'Only Here' } });
    const cookie = otherCookie;
    expect((await get(jobId, cookie)).status).toBe(404);
    expect(await search('Only Here', cookie)).toEqual([]);
    const change = { method: 'PATCH', params: { jobId }, cookie, body: { title: 'X' } } as const;
    expect((await callRoute(changeJobRoute, change)).status).toBe(404);
    const ready = { params: { jobId }, cookie, body: { readyOn: '2026-12-01' } };
    expect((await callRoute(readyRoute, ready)).status).toBe(404);
  });

  it('asks a stranger to sign in', async () => {
    expect((await callRoute(listJobsRoute, { method: 'GET' })).status).toBe(401);
    expect((await callRoute(startJobRoute, { body: newJob })).status).toBe(401);
  });
});
