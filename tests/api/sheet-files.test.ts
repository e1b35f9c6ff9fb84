import { randomUUID } from 'node:crypto';
import DxfParser from 'dxf-parser';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET as fileRoute } from '@/app/api/sheets/[releaseId]/files/[kind]/route';
import { type SheetFileKind, sheetFileKind } from '@/lib/contracts/sheet-files';
import { apiPaths } from '@/lib/paths';
import { roles } from '@/lib/permissions';
import { getFit } from '@/server/sheets/get-fit';
import { releaseSheet } from '@/server/sheets/release-sheet';
import { recordReadings } from '@/server/walls/record-readings';
import { saveRoom } from '@/server/walls/save-room';
import { contextOf, cookieOf, makeShop, type TestShop } from '../help/make-shop';
import { lengthOn, type PutKitchen, putKitchen } from '../help/put-kitchen';
import { readPdf } from '../help/read-pdf';
import { readStrictCsv } from '../help/strict-csv';
import { readStrictXml } from '../help/strict-xml';

describe('files of a sheet', () => {
  let shop: TestShop;
  let kitchen: PutKitchen;
  let releaseId: string;
  let benchCookie: string;
  beforeAll(async () => {
    shop = await makeShop({ name: 'Juniper Bend' });
    kitchen = await putKitchen(shop);
    releaseId = await release();
    benchCookie = await cookieOf(shop.people.bench);
  });

  async function release(): Promise<string> {
    const ctx = await contextOf(shop, 'measurer');
    const { fit, runsMark } = await getFit(ctx, { roomId: kitchen.roomId });
    const released = await releaseSheet(ctx, {
      roomId: kitchen.roomId,
      overrideReason: 'customer agreed on the phone',
      seenReadingIds: fit.readingIds,
      seenRunsMark: runsMark,
    });
    return released.releaseId;
  }

  async function take(
    kind: string,
    { id = releaseId, cookie = benchCookie }: { id?: string; cookie?: string | null } = {},
  ) {
    const address = `http://localhost:3000${apiPaths.sheetFile(id, kind as SheetFileKind)}`;
    const request = new Request(address, { headers: cookie ? { cookie } : {} });
    return fileRoute(request, { params: Promise.resolve({ releaseId: id, kind }) });
  }
  const bytesOf = async (answer: Response) => new Uint8Array(await answer.arrayBuffer());

  /** Every line and every word of the true-size drawing. */
  async function drawn() {
    const text = new TextDecoder().decode(await bytesOf(await take('drawings.dxf')));
    const entities = new DxfParser().parseSync(text)?.entities ?? [];
    return {
      places: entities.flatMap((entity) => ('vertices' in entity ? [entity.vertices] : [])),
      words: entities.flatMap((entity) => ('text' in entity ? [String(entity.text)] : [])),
    };
  }

  it.each([
    ['sheet.pdf', 'application/pdf', /^\d+-kitchen-rev-A\.pdf$/],
    [
      'cut-list.csv',
      'text/csv; charset=utf-8; header=present',
      /^\d+-kitchen-rev-A-cut-list\.csv$/,
    ],
    ['drawings.svg', 'image/svg+xml; charset=utf-8', /^\d+-kitchen-rev-A-drawings\.svg$/],
    ['drawings.dxf', 'image/vnd.dxf', /^\d+-kitchen-rev-A-true-size\.dxf$/],
  ])('gives %s its type and a name in plain words', async (kind, mediaType, name) => {
    const answer = await take(kind);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toBe(mediaType);
    const [, fileName = ''] =
      answer.headers.get('content-disposition')?.match(/^attachment; filename="([^"]+)"$/) ?? [];
    expect(fileName).toMatch(name);
    expect(answer.headers.get('x-content-type-options')).toBe('nosniff');
    const bytes = await bytesOf(answer);
    expect(answer.headers.get('content-length')).toBe(String(bytes.length));
  });

  it('makes each so that another library reads it', async () => {
    const { pages } = await readPdf(await bytesOf(await take('sheet.pdf')));
    expect(pages[0]).toContain('Juniper Bend');
    expect(pages[0]).toMatch(/released .*Measurer Test, Tue, Dec 1, 2026/);
    expect(pages.some((page) => /superseded/i.test(page))).toBe(false);
    const csv = new TextDecoder().decode(await bytesOf(await take('cut-list.csv')));
    expect(readStrictCsv(csv.replace(/^\uFEFF/, '')).length).toBeGreaterThan(5);
    const svg = new TextDecoder().decode(await bytesOf(await take('drawings.svg')));
    expect(readStrictXml(svg).some(({ attributes }) => attributes.id === 'plan')).toBe(true);
    const dxf = new TextDecoder().decode(await bytesOf(await take('drawings.dxf')));
    expect(new DxfParser().parseSync(dxf)?.entities.length).toBeGreaterThan(50);
  });

  it('says in each that the sheet is superseded once it is, and still gives what was frozen', async () => {
    const own = { ...kitchen };
    const { roomId, ...rest } = own;
    const ctx = await contextOf(shop, 'measurer', new Date('2026-12-02T15:00:00Z'));
    const before = await drawn();
    await recordReadings(ctx, { roomId, readings: [lengthOn(rest, 1, { valueMm: 2866.2 })] });
    const changed = await readPdf(await bytesOf(await take('sheet.pdf')));
    expect(changed.pages[0]).toContain('Superseded: the room has changed since.');
    expect(changed.pages[0]).toContain('Wall B, length at 36"');
    const after = await drawn();
    expect(after.words.some((words) => words.startsWith('SUPERSEDED'))).toBe(true);
    expect(after.places).toEqual(before.places);

    const newer = await release();
    const older = await readPdf(await bytesOf(await take('sheet.pdf')));
    for (const page of older.pages) expect(page).toContain('Superseded by revision B.');
    const current = await readPdf(await bytesOf(await take('sheet.pdf', { id: newer })));
    expect(current.pages.some((page) => /superseded/i.test(page))).toBe(false);
    expect(current.pages[0]).toContain('Read since: Wall B, length at 36"');
  });

  it('does not send again what the browser has', async () => {
    const etag = (await take('drawings.svg')).headers.get('etag') ?? '';
    const address = `http://localhost:3000${apiPaths.sheetFile(releaseId, 'drawings.svg')}`;
    const again = await fileRoute(
      new Request(address, { headers: { cookie: benchCookie, 'if-none-match': etag } }),
      { params: Promise.resolve({ releaseId, kind: 'drawings.svg' }) },
    );
    expect(again.status).toBe(304);
  });

  it('names a room of other letters twice: for old browsers, and as it is', async () => {
    const named = await putKitchen(shop);
    const room = { ...named.wallBook.room, name: 'Küche' };
    const ctx = await contextOf(shop, 'measurer');
    await saveRoom(ctx, { jobId: named.jobId, room });
    const { fit, runsMark } = await getFit(ctx, { roomId: named.roomId });
    const released = await releaseSheet(ctx, {
      roomId: named.roomId,
      overrideReason: 'customer agreed on the phone',
      seenReadingIds: fit.readingIds,
      seenRunsMark: runsMark,
    });
    const answer = await take('cut-list.csv', { id: released.releaseId });
    expect(answer.headers.get('content-disposition')).toMatch(
      /^attachment; filename="\d+-kuche-rev-A-cut-list\.csv"; filename\*=UTF-8''\d+-k%C3%BCche-rev-A-cut-list\.csv$/,
    );
  });

  it('shows them to every role of the shop', async () => {
    for (const role of roles) {
      const cookie = await cookieOf(shop.people[role]);
      expect((await take('cut-list.csv', { cookie })).status).toBe(200);
    }
  });

  it('shows nothing to another shop, and asks a stranger to sign in', async () => {
    const otherCookie = await cookieOf((await makeShop()).people.owner);
    for (const kind of sheetFileKind.options) {
      expect((await take(kind, { cookie: otherCookie })).status).toBe(404);
      expect((await take(kind, { cookie: null })).status).toBe(401);
    }
    expect((await take('sheet.pdf', { id: randomUUID() })).status).toBe(404);
  });

  it('understands no other kind and no other id', async () => {
    expect((await take('sheet.exe')).status).toBe(422);
    expect((await take('sheet.pdf', { id: '7' })).status).toBe(422);
  });
});
