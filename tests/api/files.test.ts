import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as fileRoute } from '@/app/api/files/[fileId]/route';
import { POST as addRoute, GET as listRoute } from '@/app/api/files/route';
import type { PhotoRow } from '@/lib/contracts/files';
import { apiPaths } from '@/lib/paths';
import { getJob } from '@/server/jobs/get-job';
import { callRoute } from '../help/call-route';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { type PutKitchen, putDrawnKitchen } from '../help/put-kitchen';
import { cameraExif, jpegOfSize, plainJpeg, segment, withSegments } from '../help/test-photo';

const origin = 'http://localhost:3000';

describe('photos of a room', () => {
  let shop: TestShop;
  let kitchen: PutKitchen;
  let otherKitchen: PutKitchen;
  let measurer: string;
  let scheduler: string;
  let stranger: string;
  beforeAll(async () => {
    shop = await makeShop();
    const otherShop = await makeShop();
    kitchen = await putDrawnKitchen(shop);
    otherKitchen = await putDrawnKitchen(otherShop);
    measurer = await cookieOf(shop.people.measurer);
    scheduler = await cookieOf(shop.people.scheduler);
    stranger = await cookieOf(otherShop.people.owner);
  });

  const said = <Change extends Record<string, string>>(change = {} as Change) => ({
    fileId: randomUUID(),
    roomId: kitchen.roomId,
    takenAt: '2026-12-01T15:00:00.000Z',
    ...change,
  });

  async function send(
    about: Record<string, string>,
    body: Uint8Array<ArrayBuffer> | ReadableStream<Uint8Array>,
    headers: Record<string, string> = {},
  ) {
    const request = new Request(`${origin}${apiPaths.files()}?${new URLSearchParams(about)}`, {
      method: 'POST',
      headers: { origin, cookie: measurer, 'content-type': 'image/jpeg', ...headers },
      body,
      duplex: 'half',
    } as RequestInit);
    const response = await addRoute(request);
    return { status: response.status, body: (await response.json()) as Record<string, unknown> };
  }

  async function show(fileId: string, cookie = scheduler, headers: Record<string, string> = {}) {
    const request = new Request(`${origin}${apiPaths.file(fileId)}`, {
      headers: { cookie, ...headers },
    });
    return fileRoute(request, { params: Promise.resolve({ fileId }) });
  }

  const list = async (query: string, cookie = scheduler) => {
    const answer = await callRoute(listRoute, {
      method: 'GET',
      url: `/api/files?${query}`,
      cookie,
    });
    return { status: answer.status, photos: answer.body as PhotoRow[] };
  };

  it('are kept without place and owner, listed with their room, and shown to the shop’s people', async () => {
    const wallId = kitchen.wallBook.room.chains[0]?.walls[1]?.id ?? '';
    const about = said({ wallId, caption: 'Wall B: 95 1/16 at the casing' });
    const photo = withSegments(cameraExif(1), segment(0xfe, 'taken at 12 Salt Row'));
    expect(await send(about, Uint8Array.from(photo))).toMatchObject({
      status: 200,
      body: { fileId: about.fileId },
    });

    const { photos } = await list(`roomId=${kitchen.roomId}`);
    expect(photos.find(({ id }) => id === about.fileId)).toEqual({
      id: about.fileId,
      roomId: kitchen.roomId,
      wallId,
      caption: about.caption,
      widthPx: 16,
      heightPx: 12,
      takenAt: about.takenAt,
      takenBy: 'Measurer Test',
    });
    expect((await list(`jobId=${kitchen.jobId}`)).photos).toEqual(photos);

    const shown = await show(about.fileId);
    expect(shown.status).toBe(200);
    expect(shown.headers.get('content-type')).toBe('image/jpeg');
    expect(shown.headers.get('x-content-type-options')).toBe('nosniff');
    expect(shown.headers.get('content-security-policy')).toContain('sandbox');
    expect(new Uint8Array(await shown.arrayBuffer())).toEqual(plainJpeg());
    const story = (await getJob(await contextOf(shop, 'owner'), { jobId: kitchen.jobId })).story;
    expect(JSON.stringify(story)).toContain('Took a photo in Kitchen');
  });

  it('are not sent again to a browser that has them, and asked for each time all the same', async () => {
    const about = said();
    await send(about, Uint8Array.from(plainJpeg()));
    const first = await show(about.fileId);
    expect(first.headers.get('cache-control')).toBe('private, no-cache');
    const etag = first.headers.get('etag') ?? '';
    expect((await show(about.fileId, scheduler, { 'if-none-match': etag })).status).toBe(304);
    expect((await show(about.fileId, '', { 'if-none-match': etag })).status).toBe(401);
  });

  it('sent twice are kept once; another picture under the same id changes nothing', async () => {
    const about = said();
    const before = (await list(`roomId=${kitchen.roomId}`)).photos.length;
    for (const _time of [1, 2]) {
      expect((await send(about, Uint8Array.from(plainJpeg()))).status).toBe(200);
    }
    const other = await send(about, Uint8Array.from(withSegments(cameraExif(6))));
    expect(other).toMatchObject({ status: 409, body: { code: 'id-taken' } });
    expect((await list(`roomId=${kitchen.roomId}`)).photos.length).toBe(before + 1);
    expect(new Uint8Array(await (await show(about.fileId)).arrayBuffer())).toEqual(plainJpeg());
  });

  it.each<[string, number, string, () => Buffer | Uint8Array]>([
    ['nothing', 415, 'not-a-photo', () => new Uint8Array()],
    [
      'a PNG that calls itself a JPEG',
      415,
      'not-a-photo',
      () => Buffer.from('\x89PNG\r\n\x1a\n', 'latin1'),
    ],
    [
      'an SVG with a program in it',
      415,
      'not-a-photo',
      () => Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>'),
    ],
    ['a page', 415, 'not-a-photo', () => Buffer.from('<!doctype html><script>1</script>')],
    ['an archive', 415, 'not-a-photo', () => Buffer.from('PK\x03\x04', 'latin1')],
    [
      'an archive behind a picture',
      422,
      'photo-carries-more',
      () => Buffer.concat([plainJpeg(), Buffer.from('PK\x03\x04more', 'latin1')]),
    ],
    ['a picture cut short', 422, 'photo-broken', () => plainJpeg().subarray(0, 120)],
    ['a picture that opens to gigabytes', 422, 'photo-too-large', () => jpegOfSize(60_000, 60_000)],
  ])('refuses %s, and says so', async (_what, status, code, make) => {
    const about = said();
    const answer = await send(about, Uint8Array.from(make()));
    expect(answer).toMatchObject({ status, body: { code } });
    expect(JSON.stringify(answer.body)).toContain('othing was kept');
    expect((await show(about.fileId)).status).toBe(404);
  });

  it('refuses more than 8 MB by what is declared, and by what comes when less was declared', async () => {
    const declared = { 'content-length': '8000001' };
    expect(await send(said(), Uint8Array.from(plainJpeg()), declared)).toMatchObject({
      status: 413,
      body: { code: 'too-large' },
    });
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 100_000;
        controller.enqueue(new Uint8Array(100_000));
      },
    });
    expect((await send(said(), endless)).status).toBe(413);
    expect(sent).toBeLessThan(9_000_000);
  });

  it('refuses who may not measure, who is not signed in, and other sites', async () => {
    const photo = () => Uint8Array.from(plainJpeg());
    expect((await send(said(), photo(), { cookie: scheduler })).status).toBe(403);
    expect((await send(said(), photo(), { cookie: '' })).status).toBe(401);
    expect((await send(said(), photo(), { origin: 'https://evil.example' })).status).toBe(403);
    expect((await send(said({ fileId: 'x' }), photo())).status).toBe(422);
  });

  it('of another shop are not there', async () => {
    const about = said();
    await send(about, Uint8Array.from(plainJpeg()));
    expect((await show(about.fileId, stranger)).status).toBe(404);
    expect((await list(`roomId=${kitchen.roomId}`, stranger)).status).toBe(404);
    expect((await list(`jobId=${kitchen.jobId}`, stranger)).status).toBe(404);
    const theirs = said({ roomId: otherKitchen.roomId });
    expect((await send(theirs, Uint8Array.from(plainJpeg()))).status).toBe(404);
    // Its id is taken by this shop; the stranger learns only that it is.
    const taken = said({ fileId: about.fileId, roomId: otherKitchen.roomId });
    const answer = await send(taken, Uint8Array.from(plainJpeg()), { cookie: stranger });
    expect(answer).toMatchObject({ status: 409 });
    expect((await show(about.fileId)).status).toBe(200);
    expect((await list('')).status).toBe(422);
  });
});
