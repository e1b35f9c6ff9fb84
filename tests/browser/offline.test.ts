import type { Page } from 'playwright-core';
import { beforeAll, beforeEach, describe, expect, inject, it } from 'vitest';
import type { PhotoRow } from '@/lib/contracts/files';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { VisitView } from '@/lib/contracts/visits';
import type { Reading } from '@/lib/contracts/wall-book';
import { apiPaths, paths } from '@/lib/paths';
import type { Queued } from '@/lib/sync/queued';
import { answerPad, questionOn } from '../help/answer-pad';
import { getAt } from '../help/ask-at';
import { expectNoSeriousFault } from '../help/browser-faults';
import { type OwnPhone, useOwnPhones } from '../help/own-phone';
import { pressNext, typeInches } from '../help/pad';
import { readStore } from '../help/phone-store';
import { openShopOfToday, type ShopOfToday } from '../help/shop-of-today';
import { plainJpeg } from '../help/test-photo';
import { inShort, readOff } from '../help/true-kitchen';
import { wakeWorker } from '../help/wake-worker';
import { openWobblyLine, type WobblyLine } from '../help/wobbly-line';

describe('a room read with no signal at all', () => {
  const ownPhone = useOwnPhones();
  let shop: ShopOfToday;
  let line: WobblyLine;
  beforeAll(async () => {
    shop = await openShopOfToday(inject('baseUrl'), 'Nan Reed');
    line = await openWobblyLine(inject('baseUrl'));
  });

  beforeEach(() => line.set('through'));

  const phoneOf = (own: ShopOfToday) => ownPhone({ ...own, baseUrl: line.baseUrl });
  /** The browser knows that there is no signal, and its worker, which it does not tell, finds none either. */
  async function loseSignal(phone: OwnPhone): Promise<void> {
    line.set('gone');
    await phone.setOffline(true);
  }
  async function findSignal(phone: OwnPhone): Promise<void> {
    line.set('through');
    await phone.setOffline(false);
  }

  /** As the phone has it, sent or not: the drawing that waits, without readings. */
  async function bookOn(page: Page): Promise<WallBookView> {
    const [row] = await readStore<{ view: WallBookView }>(page, 'rooms');
    const queue = await readStore<Queued>(page, 'queue');
    const drawn = queue.flatMap(({ work }) => (work.kind === 'room' ? [work.room] : [])).at(-1);
    if (!row || !drawn) throw new Error('the phone has no room');
    return { ...row.view, wallBook: { ...row.view.wallBook, room: drawn } };
  }

  const taken = async (page: Page): Promise<Reading[]> =>
    (await readStore<Queued>(page, 'queue')).flatMap(({ work }) =>
      work.kind === 'reading' ? [work.reading] : [],
    );

  it('arrives whole, once and in order, though the phone died three times in between', async () => {
    const phone = await phoneOf(shop);
    await phone.page.goto(paths.today());
    await phone.page.getByText('all sent · ready for no signal').waitFor();
    await loseSignal(phone);

    // From here on there is no signal: the day, the stop and a new room open all the same.
    await phone.page.reload();
    await phone.page.getByRole('link', { name: new RegExp(shop.customer) }).tap();
    await phone.page.getByRole('button', { name: 'Arrived' }).tap();
    await expectNoSeriousFault(phone.page);
    await phone.page.getByRole('button', { name: 'Draw the first room' }).tap();
    await phone.page.getByRole('button', { name: /^All round/ }).tap();
    for (const inches of [142, 120, 142, 120]) {
      await typeInches(phone.page, inches * 25.4, 25.4 / 16);
      await pressNext(phone.page);
    }
    await phone.page.getByRole('button', { name: 'Start measuring' }).tap();
    await phone.page.getByRole('heading', { name: /^Corner D–A/ }).waitFor();
    const [address = ''] = phone.page.url().split('#');
    const book = await bookOn(phone.page);
    const asked = readOff(book);
    const { stepMm } = book.rules;
    expect(asked.length).toBeGreaterThan(15);
    const roomId = book.wallBook.room.id;

    const deaths = [3, 9, 14];
    for (const [at, reading] of asked.entries()) {
      await answerPad(phone.page, reading, stepMm);
      if (!deaths.includes(at)) continue;
      // Half a value stands there; the battery is empty.
      const question = await questionOn(phone.page);
      await phone.page.getByRole('button', { name: '9', exact: true }).tap();
      const before = (await taken(phone.page)).map(inShort);
      expect(before).toEqual(asked.slice(0, at + 1).map(inShort));
      await phone.kill();
      await phone.start();
      await phone.page.goto(address);
      await phone.page.getByRole('heading', { level: 1, name: question }).waitFor();
      expect((await taken(phone.page)).map(inShort)).toEqual(before);
      expect(await phone.page.locator('output').textContent()).toMatch(/^9/);
      await phone.page.getByRole('button', { name: 'clear' }).tap();
    }
    await phone.page.getByText('Nothing more is asked for').waitFor();

    await markPhoto(phone.page);
    await phone.page.goto(`${address}#leave`);
    await phone.page.getByRole('heading', { name: 'Does it hold together?' }).waitFor();
    await expectNoSeriousFault(phone.page);
    await phone.page.getByRole('button', { name: 'Hand the wall book in' }).tap();
    await phone.page.getByText('waits to be sent').waitFor();
    await phone.page.getByText(/^saved here · \d+, no signal$/).waitFor();

    await findSignal(phone);
    await phone.page.getByText(/^all sent/).waitFor({ timeout: 60_000 });
    const { wallBook, submittedAt, readers } = await getAt<WallBookView>(
      shop,
      apiPaths.room(roomId),
    );
    expect(wallBook.readings.map(inShort)).toEqual(asked.map(inShort));
    expect(new Set(wallBook.readings.map(({ id }) => id)).size).toBe(asked.length);
    expect(readers.map(({ name }) => name)).toEqual(['Nan Reed']);
    expect(submittedAt).not.toBe(null);
    const photos = await getAt<PhotoRow[]>(shop, apiPaths.photosOfRoom(roomId));
    expect(photos).toMatchObject([
      { caption: expect.stringMatching(/^Wall A: \d+/), takenBy: 'Nan Reed' },
    ]);
    expect(await readStore(phone.page, 'queue')).toEqual([]);
  });

  it('goes out by itself when the signal is back, though every page was closed by then', async () => {
    const own = await openShopOfToday(inject('baseUrl'), 'Bo Marsh');
    const phone = await phoneOf(own);
    await phone.page.goto(paths.todayVisit(own.visitId));
    await phone.page.getByText('all sent · ready for no signal').waitFor();
    await loseSignal(phone);
    await phone.page.getByRole('button', { name: 'Arrived' }).tap();
    await phone.page.getByText('saved here · 1, no signal').waitFor();
    const status = async () => (await getAt<VisitView>(own, apiPaths.visit(own.visitId))).status;
    expect(await status()).toBe('booked');
    const context = phone.page.context();
    await phone.page.goto('about:blank');
    await findSignal(phone);
    await wakeWorker(context, line.baseUrl);
    await expect.poll(status, { timeout: 15_000 }).toBe('on-site');
  });

  /** Takes a photo of wall A and puts a circle, an arrow and a figure on it. */
  async function markPhoto(page: Page): Promise<void> {
    await page.getByRole('link', { name: 'The whole room' }).tap();
    await page
      .getByRole('listitem')
      .getByRole('link', { name: /^Wall A/ })
      .tap();
    await page.getByRole('heading', { level: 1, name: 'Wall A' }).waitFor();
    await page.getByLabel('Take a photo').setInputFiles({
      name: 'wall.jpg',
      mimeType: 'image/jpeg',
      buffer: Buffer.from(plainJpeg()),
    });
    const picture = page.getByRole('img', { name: 'Wall A' });
    await picture.tap();
    await expect.poll(() => marksOf(page)).toEqual(['circle']);
    await page.getByRole('button', { name: 'Arrow' }).tap();
    await picture.tap({ position: { x: 30, y: 30 } });
    await expect.poll(() => marksOf(page)).toEqual(['circle', 'arrow']);
    await page.getByRole('button', { name: 'Figure' }).tap();
    await page
      .getByRole('button', { name: /Length/ })
      .first()
      .tap();
    await picture.tap({ position: { x: 60, y: 30 } });
    await expect.poll(() => marksOf(page)).toEqual(['circle', 'arrow', 'words']);
    await expectNoSeriousFault(page);
    await page.getByRole('button', { name: 'Done' }).tap();
    await page.getByRole('list', { name: 'Photos' }).getByRole('img').waitFor();
    await expectNoSeriousFault(page);
  }

  const marksOf = async (page: Page) =>
    (await readStore<{ marks: { kind: string }[] }>(page, 'photos'))[0]?.marks.map(
      ({ kind }) => kind,
    );
});
