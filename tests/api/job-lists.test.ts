import { randomUUID } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as exportRoute } from '@/app/api/exports/jobs/route';
import { POST as previewRoute } from '@/app/api/imports/preview/route';
import { POST as importRoute } from '@/app/api/imports/route';
import { audit, consents, customers, jobs, shops, sites } from '@/db/schema';
import type { ImportedList, ListPreview } from '@/lib/contracts/job-lists';
import type { RouteHandler } from '@/server/base/handle';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';
import { readStrictCsv } from '../help/strict-csv';

describe('a list of customers and jobs', () => {
  let shop: TestShop;
  let scheduler: string;
  beforeAll(async () => {
    shop = await makeShop();
    scheduler = await cookieOf(shop.people.scheduler);
  });

  async function send(
    route: RouteHandler,
    list: string | Uint8Array,
    said = {},
    cookie = scheduler,
  ) {
    const body = typeof list === 'string' ? new TextEncoder().encode(list) : list;
    const request = new Request(`http://localhost:3000/api/imports?${new URLSearchParams(said)}`, {
      method: 'POST',
      headers: { origin: 'http://localhost:3000', 'content-type': 'text/csv', cookie },
      body: body as BodyInit,
    });
    const answer = await route(request);
    return { status: answer.status, body: await answer.json() };
  }
  const preview = async (list: string | Uint8Array, said = {}) =>
    (await send(previewRoute, list, said)).body as ListPreview;
  const bringIn = (list: string, said: Record<string, string>, cookie = scheduler) =>
    send(importRoute, list, { idempotencyKey: randomUUID(), ...said }, cookie);

  async function kept(of = shop) {
    const { db } = await contextOf(of, 'owner');
    const ofShop = of.shop.id;
    return {
      jobs: await db.select().from(jobs).where(eq(jobs.shopId, ofShop)).orderBy(jobs.number),
      customers: await db.select().from(customers).where(eq(customers.shopId, ofShop)),
      sites: await db.select().from(sites).where(eq(sites.shopId, ofShop)),
    };
  }

  it('is looked at without writing anything: columns, problems in words, doubles', async () => {
    await startTestJob(shop, {
      customer: { name: 'Ada Known', phone: '(212) 555-0101', email: 'ada@known.example' },
    });
    await startTestJob(shop, { site: { street: 'Große Straße 3', town: 'Ñandú' } });
    const before = await kept();
    const list = [
      'Client;Phone;E-mail;Address;City;Colour',
      'Ada K.;212-555-0101;;9 New Street;Gannet;red',
      'Bo Next;;bo@next.example;12 Alder ROW;Fernhollow;',
      'Cy Wrong;12;nobody;;;',
      'Di First;(212) 555-0102;;1 Elm;Gannet;',
      'Di Again;+1 212 555 0102;;2 Elm;Gannet;',
      'Ed Accent;;;GROßE straße, 3;ñandú;',
    ].join('\r\n');
    const seen = await preview(list);
    expect(seen).toMatchObject({
      encoding: 'UTF-8',
      separator: ';',
      columns: ['customer', 'phone', 'email', 'street', 'town', null],
      samples: ['Ada K.', '212-555-0101', 'bo@next.example', '9 New Street', 'Gannet', 'red'],
      counts: { ready: 1, problems: 1, doubles: 4 },
    });
    expect(seen.rows.map(({ row, double }) => [row, double])).toEqual([
      [2, 'the phone of Ada Known, job 1'],
      [3, 'the address of Ada Known, job 1'],
      [4, ''],
      [5, ''],
      [6, 'the phone of row 5'],
      [7, 'the address of Robin Testwood, job 2'],
    ]);
    expect(seen.rows[2]).toMatchObject({
      words: 'Cy Wrong',
      problems: expect.arrayContaining([
        'E-mail: That is no e-mail address.',
        'Street: Give the street and number.',
      ]),
    });
    expect(await kept()).toEqual(before);
  });

  it('with a bad row brings in nothing, until that row is left out', async () => {
    const of = await makeShop();
    const cookie = await cookieOf(of.people.owner);
    const list = 'Customer,Street\nAda,1 Elm\n,2 Elm\nBo,3 Elm\n';
    const refused = await bringIn(list, { columns: 'customer,street' }, cookie);
    expect(refused.status).toBe(422);
    expect(refused.body).toMatchObject({
      code: 'list-has-problems',
      detail: expect.stringContaining('row 3: Customer: Give the customer a name.'),
    });
    expect((await kept(of)).customers).toEqual([]);
    const done = await bringIn(
      list,
      { columns: 'customer,street', leaveOutProblems: 'yes' },
      cookie,
    );
    expect(done.body).toEqual({ jobs: 2, leftOut: 1 });
    const { jobs: made, customers: people } = await kept(of);
    expect(made.map(({ number, title }) => [number, title])).toEqual([
      [1, 'New enquiry'],
      [2, 'New enquiry'],
    ]);
    expect(people.map(({ name }) => name).sort()).toEqual(['Ada', 'Bo']);
    const { jobId } = await startTestJob(of);
    expect((await kept(of)).jobs.find(({ id }) => id === jobId)?.number).toBe(3);
  });

  it('sent twice, and many times at once, comes in once', async () => {
    const of = await makeShop();
    const cookie = await cookieOf(of.people.owner);
    const said = { columns: 'customer,street', idempotencyKey: randomUUID() };
    const list = 'Customer,Street\nAda,1 Elm\n';
    const answers = await Promise.all([1, 2, 3].map(() => send(importRoute, list, said, cookie)));
    expect(answers.map(({ body }) => body)).toEqual(Array(3).fill({ jobs: 1, leftOut: 0 }));
    expect((await kept(of)).jobs).toHaveLength(1);
    // A second list of the same people finds them there.
    const again = await bringIn(list, { columns: 'customer,street' }, cookie);
    expect(again.body).toEqual({ jobs: 0, leftOut: 1 });
  });

  it('gives a further job to a customer who is known, when it is told to', async () => {
    const of = await makeShop();
    const cookie = await cookieOf(of.people.owner);
    await startTestJob(of, { customer: { name: 'Ada Known', phone: '(212) 555-0101' } });
    const list =
      'Customer,Phone,Street,Job\nAda Known,212-555-0101,9 New,Pantry\nBo,2125550103,1 Elm,Bath\nBo,2125550103,1 Elm,Laundry\n';
    const columns = 'customer,phone,street,title';
    expect((await bringIn(list, { columns, takeDoubles: 'yes' }, cookie)).body).toEqual({
      jobs: 3,
      leftOut: 0,
    });
    const { jobs: made, customers: people } = await kept(of);
    expect(people.map(({ name }) => name).sort()).toEqual(['Ada Known', 'Bo']);
    expect(made[0]?.customerId).toBe(made[1]?.customerId);
    expect(made[2]?.customerId).toBe(made[3]?.customerId);
    const { db } = await contextOf(of, 'owner');
    // Nobody agreed to anything by standing in a list.
    const bo = people.find(({ name }) => name === 'Bo');
    expect(
      await db
        .select()
        .from(consents)
        .where(eq(consents.customerId, bo?.id ?? '')),
    ).toEqual([]);
    const story = await db
      .select()
      .from(audit)
      .where(and(eq(audit.shopId, of.shop.id), eq(audit.verb, 'import-list')));
    expect(story.map(({ summary }) => summary)).toContain('Job 3 started from a list: Bath');
  });

  it('is read from the encodings and separators of spreadsheets', async () => {
    const latin = Uint8Array.from(
      Buffer.from('Name;Street\nJosé Müller;Große Straße 3\n', 'latin1'),
    );
    expect(await preview(latin)).toMatchObject({
      encoding: 'Windows-1252',
      rows: [{ words: 'José Müller, Große Straße 3' }],
    });
    const marked = new TextEncoder().encode(
      '\uFEFF"Name"\t"Street"\r\n"Ada ""the"" first"\t"1 Elm\nrear"\r\n',
    );
    expect(await preview(marked)).toMatchObject({
      separator: '\t',
      headings: ['Name', 'Street'],
      rows: [{ row: 2, problems: ['Street: Write it in one line.'] }],
    });
  });

  it.each([
    ['of nothing but headings', 'Name,Street\n', 'nothing under the headings'],
    ['that is empty', '', 'nothing under the headings'],
    ['that is a spreadsheet file and no text', 'PK\u0003\u0004\0\0', 'Save the sheet as CSV'],
    ['of too many rows', `Name\n${'Ada\n'.repeat(2_001)}`, 'Take 2000 at a time'],
    ['of too many columns', `${'a,'.repeat(101)}b\n1\n`, 'Take 100 at most'],
    ['whose quotes do not close', 'Name,Street\n"Ada,1 Elm\n', 'quotes'],
  ])('%s is refused, and says what to do', async (_, list, words) => {
    const { status, body } = await send(previewRoute, list);
    expect(status).toBe(422);
    expect(body.detail).toContain(words);
  });

  it('of more than two megabytes is let go', async () => {
    const { status } = await send(previewRoute, new Uint8Array(2_000_001));
    expect(status).toBe(413);
  });

  it('with one column named twice is refused', async () => {
    const { status, body } = await send(previewRoute, 'a,b\n1,2\n', {
      columns: 'customer,customer',
    });
    expect(status).toBe(422);
    expect(body.errors.columns).toContain('Two columns are the same thing');
  });

  it('is the office’s to bring in and to take away, and nobody’s of another shop', async () => {
    const list = 'Customer,Street\nAda,1 Elm\n';
    const crew = await cookieOf(shop.people.crew);
    expect((await send(previewRoute, list, {}, crew)).status).toBe(403);
    expect((await bringIn(list, { columns: 'customer,street' }, crew)).status).toBe(403);
    expect((await send(previewRoute, list, {}, '')).status).toBe(401);
    expect((await takeAway(crew)).status).toBe(403);
    const other = await makeShop();
    const { text } = await takeAway(await cookieOf(other.people.owner));
    expect(text).not.toContain('Ada Known');
    // The same phone in another shop is nobody that this one knows.
    const seen = await send(
      previewRoute,
      'Customer,Phone,Street\nAda,212-555-0101,1 Elm\n',
      {},
      await cookieOf(other.people.owner),
    );
    expect(seen.body.rows[0].double).toBe('');
  });

  it('taken away runs nothing in a spreadsheet, and comes in again as it was', async () => {
    const of = await makeShop();
    const cookie = await cookieOf(of.people.owner);
    await startTestJob(of, {
      title: '=HYPERLINK("http://evil.example")',
      notes: 'line one\n"quoted", and more',
      customer: {
        name: '@Ada, the +1',
        phone: '(212) 555-0104',
        email: 'ada@one.example',
        language: 'es',
      },
      site: {
        latitude: -41.28431,
        longitude: -58.31196,
        floorsUp: -1,
        hasLift: true,
        yearBuilt: 1931,
        wayIn: '-5 steps',
      },
      siteReadyOn: '2026-12-24',
      wallsReady: 'bare-studs',
      roomCount: 3,
    });
    const { text, headers } = await takeAway(cookie);
    expect(headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(headers.get('content-disposition')).toContain('attachment');
    const rows = readStrictCsv(text.replace(/^\uFEFF/, ''));
    // A number stays a number; all else that a spreadsheet would run does not begin so.
    for (const cell of rows.flat()) {
      expect(cell).not.toMatch(/^(?![+-]?\d+(?:\.\d+)?$)[=+\-@\t\r]/);
    }

    const second = await makeShop();
    const back = await cookieOf(second.people.owner);
    const { columns } = (await send(previewRoute, text, {}, back)).body as ListPreview;
    const done = await bringIn(text, { columns: columns.map((one) => one ?? '').join(',') }, back);
    expect(done.body as ImportedList).toEqual({ jobs: 1, leftOut: 0 });
    const [was, is] = [await kept(of), await kept(second)];
    const facts = (row: object) => {
      const { id, shopId, createdAt, customerId, siteId, number, ...rest } = row as Record<
        string,
        unknown
      >;
      return rest;
    };
    expect(is.jobs.map(facts)).toEqual(was.jobs.map(facts));
    expect(is.sites.map(facts)).toEqual(was.sites.map(facts));
    expect(is.customers.map(facts)).toEqual(was.customers.map(facts));
    const { db } = await contextOf(second, 'owner');
    const [row] = await db
      .select({ next: shops.nextJobNumber })
      .from(shops)
      .where(eq(shops.id, second.shop.id));
    expect(row?.next).toBe(2);
  });

  async function takeAway(cookie: string) {
    const request = new Request('http://localhost:3000/api/exports/jobs', { headers: { cookie } });
    const answer = await exportRoute(request);
    const bytes = new Uint8Array(await answer.arrayBuffer());
    const text = new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes);
    return { status: answer.status, headers: answer.headers, text };
  }
});
