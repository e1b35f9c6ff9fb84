import type { Page } from 'playwright-core';
import { beforeAll, beforeEach, describe, expect, inject, it } from 'vitest';
import type { PhotoRow } from '@/lib/contracts/files';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths, paths } from '@/lib/paths';
import type { Queued } from '@/lib/sync/queued';
import { answerPad, isTypedAtOnce, questionOn } from '../help/answer-pad';
import { getAt } from '../help/ask-at';
import { expectNoSeriousFault } from '../help/browser-faults';
import { drawSixWalls } from '../help/draw-kitchen';
import { type OwnPhone, useOwnPhones } from '../help/own-phone';
import { pressNext, typeInches } from '../help/pad';
import { readStore } from '../help/phone-store';
import { joinAsMeasurer, openShopOfToday, type ShopOfToday } from '../help/shop-of-today';
import { plainJpeg } from '../help/test-photo';
import { inShort, readOff, sixWalls, sixWallsInches } from '../help/true-kitchen';
import { wakeWorker } from '../help/wake-worker';
import { openWobblyLine, type WobblyLine } from '../help/wobbly-line';

describe('a room read with no signal at all', () => {
  const ownPhone = useOwnPhones();
  let shop: ShopOfToday;
  /** The session of the other measurer. */
  let second = '';
  let line: WobblyLine;
  beforeAll(async () => {
    shop = await openShopOfToday(inject('baseUrl'), 'Nan Reed');
    second = await joinAsMeasurer(shop, 'Bo Marsh');
    line = await openWobblyLine(inject('baseUrl'));
  });

  beforeEach(() => line.set('through'));

  const isReady = (page: Page) => page.getByText('all sent · ready for no signal').waitFor();
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

  it('arrives whole, once and in order, though the phone died three times and another read there too', async () => {
    const phone = await phoneOf(shop);
    await phone.page.goto(paths.today());
    await isReady(phone.page);
    await loseSignal(phone);

    // From here on there is no signal: the day, the stop and a new room open all the same.
    await phone.page.reload();
    await phone.page.getByRole('link', { name: new RegExp(shop.customer) }).tap();
    await phone.page.getByRole('button', { name: 'Arrived' }).tap();
    await expectNoSeriousFault(phone.page);
    await phone.page.getByRole('button', { name: 'Draw the first room' }).tap();
    const hand = handOf(phone);
    await hand.does(() => drawSixWalls(phone.page));
    await phone.page.getByRole('heading', { name: /^Corner F–A/ }).waitFor();
    const [address = ''] = phone.page.url().split('#');
    const book = await bookOn(phone.page);
    const walls = book.wallBook.room.chains.flatMap((chain) => chain.walls);
    expect(walls.map(({ nominalLengthMm }) => Math.round(nominalLengthMm / 25.4))).toEqual(
      sixWallsInches,
    );
    const asked = readOff(book, sixWalls);
    const { stepMm } = book.rules;
    expect(asked.length).toBeGreaterThan(25);

    // Each time with a figure half typed, so before a question that is answered by digits at once.
    const deaths = [3, Math.floor(asked.length / 2), asked.length - 3].map((from) =>
      asked.findIndex((_, at) => at >= from && asked.slice(at + 1, at + 2).some(isTypedAtOnce)),
    );
    for (const [at, reading] of asked.entries()) {
      await hand.does(() => answerPad(phone.page, reading, stepMm));
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
    console.log(
      `· a kitchen of six walls, drawn and read: ${asked.length} readings, ${hand.words()}`,
    );

    await markPhoto(phone.page);
    await phone.page.goto(`${address}#leave`);
    await phone.page.getByRole('heading', { name: 'Does it hold together?' }).waitFor();
    await expectNoSeriousFault(phone.page);
    await phone.page.getByRole('button', { name: 'Hand the wall book in' }).tap();
    await phone.page.getByText('waits to be sent').waitFor();
    await phone.page.getByText(/^saved here · \d+, no signal$/).waitFor();

    await findSignal(phone);
    await phone.page.getByText(/^all sent/).waitFor({ timeout: 60_000 });
    const roomId = book.wallBook.room.id;
    const sent = await getAt<WallBookView>(shop, apiPaths.room(roomId));
    expect(sent.wallBook.readings.map(inShort)).toEqual(asked.map(inShort));
    expect(new Set(sent.wallBook.readings.map(({ id }) => id)).size).toBe(asked.length);
    expect(sent.submittedAt).not.toBe(null);
    const photos = await getAt<PhotoRow[]>(shop, apiPaths.photosOfRoom(roomId));
    expect(photos).toMatchObject([
      { caption: expect.stringMatching(/^Wall A: \d+/), takenBy: 'Nan Reed' },
    ]);
    expect(await readStore(phone.page, 'queue')).toEqual([]);

    const other = await ownPhone({ ...shop, baseUrl: line.baseUrl, cookie: second });
    await readBesideEachOther([phone, other], sent);
  });

  /** Both read wall A at a height that nobody has read yet, 140 and 141 inches, and neither hears of the other. */
  async function readBesideEachOther(phones: [OwnPhone, OwnPhone], before: WallBookView) {
    const { id: roomId, chains } = before.wallBook.room;
    const wallId = chains[0]?.walls[0]?.id ?? '';
    for (const phone of phones) {
      await phone.page.goto(paths.today());
      await isReady(phone.page);
      await phone.page.goto(`${paths.walls(roomId)}#add/length/${wallId}`);
      await phone.page.getByRole('heading', { level: 1, name: 'Wall A, length' }).waitFor();
      await phone.setOffline(true);
    }
    line.set('gone');
    for (const [at, { page }] of phones.entries()) {
      await typeInches(page, 70 * 25.4, 25.4 / 16);
      await pressNext(page);
      await page.locator('output[aria-label="length"]').waitFor();
      await typeInches(page, (140 + at) * 25.4, 25.4 / 16);
      await pressNext(page);
      await page.getByText('saved here · 1, no signal').waitFor();
    }
    for (const phone of phones) {
      await findSignal(phone);
      await phone.page.getByText(/^all sent/).waitFor({ timeout: 60_000 });
    }
    const { wallBook, readers } = await getAt<WallBookView>(shop, apiPaths.room(roomId));
    const known = new Set(before.wallBook.readings.map(({ id }) => id));
    const added = wallBook.readings.filter(({ id }) => !known.has(id));
    expect(added.map((reading) => 'valueMm' in reading && reading.valueMm / 25.4)).toEqual([
      140, 141,
    ]);
    // Nothing that stood there was touched.
    expect(wallBook.readings.filter(({ id }) => known.has(id))).toEqual(before.wallBook.readings);
    const readBy = ({ id }: Reading) =>
      readers.find(({ readingIds }) => readingIds.includes(id))?.name;
    expect(added.map(readBy)).toEqual(['Nan Reed', 'Bo Marsh']);

    // Each is shown the other's, with the name and the difference.
    const says: [OwnPhone, RegExp, string][] = [
      [phones[0], /Bo Marsh read/, '1" more'],
      [phones[1], /Nan Reed read/, '1" less'],
    ];
    for (const [{ page }, name, words] of says) {
      await page.goto(`${paths.walls(roomId)}#wall/${wallId}`);
      await page.reload();
      expect(await page.getByRole('link', { name }).first().textContent()).toContain(words);
    }
    await phones[0].page.goto(`${paths.walls(roomId)}#leave`);
    await phones[0].page.getByText(/140".*\(Nan Reed\).*141".*\(Bo Marsh\)/).waitFor();
  }

  /** What a thumb does on a phone: how many taps, and how long the phone took for them. */
  function handOf(phone: OwnPhone) {
    let [taps, ms] = [0, 0];
    return {
      does: async (work: () => Promise<void>) => {
        const [tapsBefore, began] = [phone.taps, performance.now()];
        await work();
        taps += phone.taps - tapsBefore;
        ms += performance.now() - began;
      },
      words: () => `${taps} taps, ${Math.round(ms / 1_000)} s by a robot that need not look`,
    };
  }

  it('goes out by itself when the signal is back, though every page was closed by then', async () => {
    const own = await openShopOfToday(inject('baseUrl'), 'Ida Quill');
    const phone = await phoneOf(own);
    await phone.page.goto(paths.todayVisit(own.visitId));
    await isReady(phone.page);
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

  it('keeps what is tapped before the library of its store has come', async () => {
    const own = await openShopOfToday(inject('baseUrl'), 'Ada Moss');
    const phone = await phoneOf(own);
    let letCome = () => {};
    const coming = new Promise<void>((resolve) => {
      letCome = resolve;
    });
    let isHeld = false;
    await phone.page.route('**/_next/static/chunks/*.js', async (route) => {
      const response = await route.fetch();
      const body = await response.text();
      if (body.includes('MissingAPIError')) {
        isHeld = true;
        await coming;
      }
      await route.fulfill({ response, body });
    });
    // The library that is held back is a part of the load.
    await phone.page.goto(paths.todayVisit(own.visitId), { waitUntil: 'commit' });
    await expect.poll(() => isHeld, { timeout: 15_000 }).toBe(true);
    await phone.page.getByRole('button', { name: 'Arrived' }).tap();
    const status = async () => (await getAt<VisitView>(own, apiPaths.visit(own.visitId))).status;
    expect(await status()).toBe('booked');
    letCome();
    await expect.poll(status, { timeout: 15_000 }).toBe('on-site');
    await phone.page.getByText(/^all sent/).waitFor();
    await phone.page.unrouteAll({ behavior: 'ignoreErrors' });
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
