import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, inject, it } from 'vitest';
import type { PhotoRow } from '@/lib/contracts/files';
import type { StopView } from '@/lib/contracts/stops';
import type { VisitView } from '@/lib/contracts/visits';
import { asFoundAsks } from '@/lib/days/as-found-asks';
import { apiPaths, paths } from '@/lib/paths';
import { formatLength } from '@/lib/units/format-length';
import { getAt } from '../help/ask-at';
import { keepPicture, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { type CrewDayShop, openCrewDayShop } from '../help/crew-day-shop';
import { type OwnPhone, useOwnPhones } from '../help/own-phone';
import { readStore } from '../help/phone-store';
import { plainJpeg } from '../help/test-photo';
import { openWobblyLine, type WobblyLine } from '../help/wobbly-line';

describe('a crew’s day with no signal', () => {
  const browser = useBrowser();
  const ownPhone = useOwnPhones();
  let shop: CrewDayShop;
  let line: WobblyLine;
  beforeAll(async () => {
    shop = await openCrewDayShop(inject('baseUrl'), 'Nan Reed');
    line = await openWobblyLine(inject('baseUrl'));
  });

  const open = (page: Page, name: RegExp) => page.getByRole('link', { name }).tap();
  const press = (page: Page, name: string | RegExp) => page.getByRole('button', { name }).tap();
  const title = (page: Page, name: RegExp) =>
    page.getByRole('heading', { level: 1, name }).waitFor();

  it('goes from the first drive to the signature, arrives whole when the signal is back, and is seen at once in the office', async () => {
    const phone = await ownPhone({ ...shop, baseUrl: line.baseUrl });
    await phone.page.goto(paths.today());
    await phone.page.getByText('all sent · ready for no signal').waitFor();
    await expect
      .poll(
        async () => (await readStore<{ key: string }>(phone.page, 'kept')).map(({ key }) => key),
        { timeout: 40_000 },
      )
      .toContain(`code:${shop.installId}`);
    await expectNoSeriousFault(phone.page);

    const office = await browser.openPage({ cookie: shop.cookie });
    await office.goto(paths.job(shop.jobId));
    await office.getByText('none open').waitFor();

    line.set('gone');
    await phone.setOffline(true);
    const stop = paths.todayVisit(shop.installId);
    await phone.page.goto(stop);
    await press(phone.page, 'On my way');
    await press(phone.page, 'Arrived');
    await press(phone.page, 'Show the code');
    await phone.page.getByText(shop.accessCode).waitFor();
    await phone.page.getByText('In the lane behind').waitFor();
    await expectNoSeriousFault(phone.page);
    await keepPicture(phone.page, 'crew-stop');

    await lookAtTheSheet(phone.page);
    await readAgain(phone.page);
    await goThroughList(phone.page);
    await findSnags(phone);

    // The battery is empty in the middle of it.
    await phone.kill();
    await phone.start();
    await phone.page.goto(`${stop}#snags`);
    await phone.page.getByText('2 open').waitFor();
    // What the crew mends is in one list with that of other jobs, one tap from the day.
    await phone.page.goto(paths.today());
    await open(phone.page, /^Snags to mend/);
    await expectNoSeriousFault(phone.page);
    await keepPicture(phone.page, 'crew-mend');
    await open(phone.page, /Door of the sink base rubs/);
    await phone.page.getByLabel('How was it mended?').fill('planed the edge');
    await press(phone.page, 'Close it');
    await phone.page.getByText('Nothing to mend').waitFor();
    await phone.page.goto(`${stop}#snags`);
    await phone.page.getByText('1 open').waitFor();

    await sign(phone.page);
    await phone.page.goto(stop);
    await press(phone.page, 'Pause');
    await press(phone.page, 'A break');
    await press(phone.page, 'Go on');
    await press(phone.page, 'Done');
    await phone.page.getByText(/^saved here · \d+, no signal$/).waitFor();
    expect((await visitNow()).status).toBe('booked');

    line.set('through');
    await phone.setOffline(false);
    await phone.page.getByText(/^all sent/).waitFor({ timeout: 30_000 });
    await arrivedWhole();
    // The page stood open in the office all day, and nobody touched it.
    await office.getByRole('heading', { name: 'Signed' }).waitFor();
    await office.getByText('1 open').waitFor();
    expect(await readStore(phone.page, 'queue')).toEqual([]);
    // What the office has taken still stands on the phone's page, which stayed open too.
    await phone.page.getByRole('main').getByRole('link', { name: 'Today', exact: true }).waitFor();
    expect(await phone.page.getByRole('button', { name: 'Done', exact: true }).count()).toBe(0);
    console.log(`· a crew's day, from the first drive to the signature: ${phone.taps} taps`);
  });

  const visitNow = () => getAt<VisitView>(shop, apiPaths.visit(shop.installId));

  async function lookAtTheSheet(page: Page): Promise<void> {
    await open(page, /^What to bring/);
    await page
      .getByText(/Filler stock: \d+ strip/)
      .first()
      .waitFor();
    await press(page, 'Back');
    await open(page, /^Setting: Kitchen/);
    await page.getByText(/High point ▼ on wall/).waitFor();
    await page.getByRole('img', { name: 'Wall A', exact: true }).waitFor();
    await page
      .getByText(/Source: NIOSH 94-110/)
      .first()
      .waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'crew-setting');
    await press(page, 'Back');
  }

  async function readAgain(page: Page): Promise<void> {
    const { sheets } = await getAt<StopView>(shop, apiPaths.stop(shop.installId));
    const [sheet] = sheets;
    if (!sheet) throw new Error('nothing is released');
    const ask = asFoundAsks(sheet).find((one) => one.kind === 'diagonal' && one.corner === 'A–B');
    if (ask?.kind !== 'diagonal') throw new Error('no diagonal is asked');
    await open(page, /^Read again before setting/);
    const field = page.getByLabel(/^Corner A–B: diagonal/);
    await field.fill('high');
    await press(page, 'Compare with the sheet');
    await page.getByText('was not understood').waitFor();
    await field.fill(formatLength(ask.wasMm - 25.4, sheet.rules).replace('"', ''));
    await press(page, 'Compare with the sheet');
    await page.getByText('This is not as on the sheet:').waitFor();
    await page.getByText(/Sink wall, filler right: .* narrower at the front/).waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'crew-as-found');
    await press(page, 'Back');
  }

  async function goThroughList(page: Page): Promise<void> {
    await open(page, /^Checklist/);
    const item = (name: RegExp) => page.getByRole('group', { name });
    await item(/Floor and way in covered/)
      .getByRole('button', { name: 'Yes' })
      .tap();
    await item(/Looked for cables/)
      .getByRole('button', { name: 'No', exact: true })
      .tap();
    await page.getByLabel('What is wrong? The office reads it.').fill('no finder in the van');
    await press(page, 'Keep it');
    await page.getByText('2 of 13').waitFor();
    await expectNoSeriousFault(page);
    await press(page, 'Back');
  }

  async function findSnags({ page }: OwnPhone): Promise<void> {
    await open(page, /^Snags/);
    await open(page, /^New snag/);
    await page.getByLabel('What is not right?').fill('Door of the sink base rubs');
    await page
      .getByLabel('Take a photo')
      .setInputFiles({ name: 'a.jpg', mimeType: 'image/jpeg', buffer: Buffer.from(plainJpeg()) });
    await press(page, 'Done');
    await page.getByRole('img', { name: 'Door of the sink base rubs' }).waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'crew-snag');
    await press(page, 'Keep it');
    await page.getByText('1 open').waitFor();
    await press(page, 'Back');
    await open(page, /^Part short or damaged/);
    await page.getByLabel('What is not right?').fill('One drawer front is missing');
    await press(page, 'Keep it');
    await page.getByText('2 open').waitFor();
    await expectNoSeriousFault(page);
  }

  async function sign(page: Page): Promise<void> {
    await page.goto(`${paths.todayVisit(shop.installId)}#sign`);
    await title(page, /^Sign-off/);
    await press(page, 'I have read this, and I sign');
    await page.getByText('Sign in the field first.').waitFor();
    const glass = page.getByRole('img', { name: 'Sign here with a finger' });
    await glass.scrollIntoViewIfNeeded();
    const box = await glass.boundingBox();
    if (!box) throw new Error('there is no field to sign in');
    await page.mouse.move(box.x + 40, box.y + 80);
    await page.mouse.down();
    for (const [x, y] of [
      [90, 30],
      [130, 100],
      [190, 50],
    ] as const) {
      await page.mouse.move(box.x + x, box.y + y, { steps: 4 });
    }
    await page.mouse.up();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'crew-sign');
    await press(page, 'I have read this, and I sign');
    await page.getByText(/^Signed by Wilma/).waitFor();
  }

  async function arrivedWhole(): Promise<void> {
    expect(await visitNow()).toMatchObject({
      status: 'done',
      arrivedAt: expect.any(String),
      leftAt: expect.any(String),
    });
    const told = await getAt<StopView>(shop, apiPaths.stop(shop.installId));
    expect(told.checks.map(({ item, answer }) => `${item} ${answer}`).sort()).toEqual([
      'cables no',
      'covered yes',
    ]);
    expect(told.pauses.map(({ what }) => what)).toEqual(['pause', 'go-on']);
    expect(told.asFound).toHaveLength(1);
    expect(told.asFound[0]?.changes.join()).toContain('Sink wall, filler right');
    const [open, closed] = told.snags;
    expect(open).toMatchObject({ mender: 'bench', kind: 'short', closedAt: null });
    expect(closed).toMatchObject({ closedWords: 'planed the edge', closedAt: expect.any(String) });
    expect(told.signOff).toMatchObject({
      isUntouched: true,
      snags: [{ words: 'One drawer front is missing' }],
    });
    const photos = await getAt<PhotoRow[]>(shop, apiPaths.photosOfRoom(shop.roomId));
    expect(photos.map(({ id }) => id)).toEqual(closed?.photoIds);
    const job = await getAt<{ stage: string; story: { summary: string }[] }>(
      shop,
      apiPaths.job(shop.jobId),
    );
    expect(job.stage).toBe('snags');
    expect(JSON.stringify(job.story)).toContain('Looked at the access code');
    expect(JSON.stringify(job.story)).not.toContain(shop.accessCode);
  }
});
