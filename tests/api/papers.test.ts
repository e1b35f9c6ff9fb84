import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as fileRoute } from '@/app/api/files/[fileId]/route';
import { POST as addRoute } from '@/app/api/jobs/[jobId]/papers/route';
import { listJobFiles } from '@/server/files/list-job-files';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { startTestJob } from '../help/start-test-job';

const pdf = new TextEncoder().encode('%PDF-1.4\n1 0 obj<<>>endobj\ntrailer<<>>\n%%EOF\n');

describe('papers of a job', () => {
  let shop: TestShop;
  let jobId: string;
  let scheduler: string;
  beforeAll(async () => {
    shop = await makeShop();
    scheduler = await cookieOf(shop.people.scheduler);
    ({ jobId } = await startTestJob(shop));
  });

  async function add(
    bytes: Uint8Array,
    { cookie = scheduler, name = 'Plan.pdf', id = randomUUID() } = {},
  ) {
    const query = new URLSearchParams({ fileId: id, name });
    const request = new Request(`http://localhost:3000/api/jobs/${jobId}/papers?${query}`, {
      method: 'POST',
      headers: { cookie, origin: 'http://localhost:3000' },
      body: new Uint8Array(bytes),
    });
    const answer = await addRoute(request, { params: Promise.resolve({ jobId }) });
    return { status: answer.status, body: await answer.json() };
  }

  it('are kept as they came, once, and given back to be looked at and never run', async () => {
    const id = randomUUID();
    expect((await add(pdf, { id })).status).toBe(200);
    expect((await add(pdf, { id })).status).toBe(200);
    const list = await listJobFiles(await contextOf(shop, 'bench'), { jobId });
    expect(list).toMatchObject([{ id, name: 'Plan.pdf', isPicture: false }]);
    const crew = await cookieOf(shop.people.crew);
    const asked = new Request('http://localhost:3000/x', { headers: { cookie: crew } });
    const file = await fileRoute(asked, { params: Promise.resolve({ fileId: id }) });
    expect(new Uint8Array(await file.arrayBuffer())).toEqual(pdf);
    expect(file.headers.get('content-type')).toBe('application/pdf');
    expect(file.headers.get('content-security-policy')).toContain('sandbox');
  });

  it('are refused when they are no PDF, whatever their name says, and nothing is kept', async () => {
    const before = await listJobFiles(await contextOf(shop, 'bench'), { jobId });
    const text = (words: string) => new TextEncoder().encode(words);
    for (const bytes of [
      text('<svg onload="alert(1)"></svg>'),
      text('PK\x03\x04 a packed archive'),
      text('%PDF-1.4 cut short'),
      text(''),
    ]) {
      expect(await add(bytes, { name: 'Plan.pdf' })).toMatchObject({ status: 415 });
    }
    expect((await add(pdf, { name: 'a\nb' })).status).toBe(422);
    expect(await listJobFiles(await contextOf(shop, 'bench'), { jobId })).toEqual(before);
  });

  it('are refused over twenty megabytes', async () => {
    const huge = new Uint8Array(20_000_001);
    huge.set(pdf);
    expect((await add(huge)).status).toBe(413);
  });

  it('are added by the office, to its own jobs', async () => {
    for (const role of ['measurer', 'bench', 'crew'] as const) {
      expect((await add(pdf, { cookie: await cookieOf(shop.people[role]) })).status).toBe(403);
    }
    const other = await cookieOf((await makeShop()).people.owner);
    expect((await add(pdf, { cookie: other })).status).toBe(404);
  });
});
