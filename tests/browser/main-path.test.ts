import type { Locator, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, inject, it } from 'vitest';
import type { FitView, RecordReadingsAnswer, WallBookView } from '@/lib/contracts/rooms';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths, paths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { toLocal } from '@/lib/time/local-moment';
import { answerPad, isTypedAtOnce, questionOn } from '../help/answer-pad';
import { getAt } from '../help/ask-at';
import { keepPicture, signIn, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { moveShopToMorning } from '../help/morning-shop';
import { pressNext, typeInches } from '../help/pad';
import { settled } from '../help/settled';
import { inShort, readOff, trueAngleDeg, trueLengthMm } from '../help/true-kitchen';

const customer = 'Wilma Stroud';
const phone = '+12125550187';

/** One job, from the first call to the booked install, each step by the person who does it; each builds on the last. */
describe('one job from the first call to the booked install', () => {
  const browser = useBrowser();
  const baseUrl = inject('baseUrl');
  const as = (role: 'owner' | 'scheduler' | 'measurer') => ({
    baseUrl,
    cookie: inject('sessions')[role],
  });
  let shop: Awaited<ReturnType<typeof moveShopToMorning>>;
  let jobId = '';
  let roomId = '';
  let customerLink = '';

  beforeAll(async () => {
    shop = await moveShopToMorning(as('owner'));
  });
  afterAll(() => shop.putBack());

  let isBroken = false;
  beforeEach(({ skip }) => {
    if (isBroken) skip('a step before this one failed');
  });
  afterEach(({ task }) => {
    isBroken ||= task.result?.state === 'fail';
  });

  const visits = (from: string, to: string) =>
    getAt<VisitView[]>(as('scheduler'), `${apiPaths.visits()}?from=${from}&to=${to}`);
  const waitingLine = (page: Page): Locator =>
    page.locator('li[data-waiting]', { hasText: customer });

  it('begins with a call: customer, site and job in one go', async () => {
    const page = await browser.openPage({ as: 'scheduler' });
    await page.goto(paths.jobs());
    await settled(page);
    await page.keyboard.press('n');
    await page.waitForURL(`**${paths.newJob()}`);
    await page.getByLabel('Customer', { exact: true }).fill(customer);
    await page.getByLabel('Phone').fill('(212) 555-0187');
    await page.getByLabel('May be texted').check();
    await page.getByLabel('E-mail', { exact: false }).first().fill('wilma@stroud.example');
    await page.getByLabel('May be e-mailed').check();
    await page.getByLabel('Street and number').fill('5 Quay Rise');
    await page.getByLabel('Town').fill('Quayside');
    await page.getByLabel('The job').fill('Kitchen, one wall, 5 units');
    await page.getByLabel('Units, about').fill('5');
    await expectNoSeriousFault(page);
    await page.getByRole('button', { name: 'Save the job' }).click();
    await page.getByRole('heading', { level: 1, name: new RegExp(customer) }).waitFor();
    jobId = new URL(page.url()).pathname.split('/').at(-1) ?? '';
    await expectNoSeriousFault(page);
  });

  it('is booked by key from the waiting list, and a taken time is refused in clear words', async () => {
    const page = await browser.openPage({ as: 'scheduler', mayLog: [/status of 409/] });
    await page.goto(paths.diary());
    await settled(page);
    const key = await waitingLine(page).locator('kbd').first().textContent();
    await page.keyboard.press(key ?? '');
    await page.getByRole('heading', { name: 'Times that work' }).waitFor();
    await page.keyboard.press('b');
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('heading', { name: new RegExp(customer) }).waitFor();
    const days = await visits(shop.today, addDays(shop.today, 20));
    const taken = days.find(
      ({ crewName, startsAt }) =>
        crewName === 'Measure: Ines' && toLocal(new Date(startsAt), shop.zone).date > shop.today,
    );
    if (!taken) throw new Error('the demo has no measure of Ines to come');
    await dialog.getByLabel('Crew').selectOption({ label: 'Measure: Ines (Ines)' });
    await place(dialog, toLocal(new Date(taken.startsAt), shop.zone));
    await dialog.getByRole('button', { name: /^Book and tell/ }).click();
    const alert = dialog.getByRole('alert');
    await alert.waitFor();
    expect(await alert.textContent()).toMatch(new RegExp(`Ines.*${taken.customerName}`, 's'));
    await expectNoSeriousFault(page);

    await place(dialog, freeToday(days));
    await dialog.getByRole('button', { name: /^Book and tell/ }).click();
    await page.getByText(`Booked: ${customer}`).waitFor();
    await dialog.waitFor({ state: 'hidden' });
    await expect.poll(() => waitingLine(page).count()).toBe(0);
    await expectNoSeriousFault(page);
  });

  async function place(dialog: Locator, { date, time }: { date: string; time: string }) {
    await dialog.getByLabel('Day', { exact: true }).fill(date);
    await dialog.getByLabel('Starts').fill(time);
  }

  /** The first quarter of an hour from now with a free hour and a half of Ines after it. */
  function freeToday(days: VisitView[]) {
    const quarterMs = 15 * 60_000;
    const busy = days
      .filter(({ crewName }) => crewName === 'Measure: Ines')
      .flatMap(({ pieces }) => pieces);
    let start = Math.ceil(Date.now() / quarterMs) * quarterMs;
    const isTaken = () =>
      busy.some(
        ({ startsAt, endsAt }) =>
          Date.parse(startsAt) < start + 90 * 60_000 && start < Date.parse(endsAt),
      );
    while (isTaken()) start += quarterMs;
    return toLocal(new Date(start), shop.zone);
  }

  it('tells the customer by text, who says yes on a page without scripts', async () => {
    const page = await browser.openPage({ size: 'phone' });
    const link = await textedLink(page);
    await expectNoSeriousFault(page);
    customerLink = link;

    const plain = await browser.openPage({ size: 'phone', javaScript: false });
    await plain.goto(customerLink);
    await plain.getByText('5 Quay Rise').first().waitFor();
    await plain.getByRole('button', { name: 'Yes, that works' }).click();
    await plain.getByText('Thank you, it is confirmed').waitFor();
    expect(await plain.getByRole('button', { name: 'Yes, that works' }).count()).toBe(0);

    await page.goto(customerLink);
    await page.getByText('Thank you, it is confirmed').waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'customer-confirmed');
  });

  /** The newest text of the fake phone, asked for until it has arrived, and the link in it. */
  async function textedLink(page: Page, least = 1): Promise<string> {
    const links = page.locator('ol a[href*="/v/"]');
    await expect
      .poll(
        async () => {
          await page.goto(paths.demoPhoneOf({ number: phone }));
          return links.count();
        },
        // The office may take a booking back for twelve seconds before anybody is told.
        { timeout: 30_000 },
      )
      .toBeGreaterThanOrEqual(least);
    return (await links.last().getAttribute('href')) ?? '';
  }

  it('shows in the diary as confirmed', async () => {
    const page = await browser.openPage({ as: 'scheduler' });
    await page.goto(paths.diaryOn(shop.today));
    await page.locator('.visit', { hasText: customer }).click();
    await page.getByRole('dialog').getByText('said yes').waitFor();
    await expectNoSeriousFault(page);
  });

  it('stands on the measurer’s phone, who arrives and draws the room', async () => {
    const page = await browser.openPage({ size: 'phone' });
    await signIn(page, 'measurer');
    await page.getByRole('link', { name: new RegExp(customer) }).waitFor();
    await expectNoSeriousFault(page);
    await page.getByRole('link', { name: new RegExp(customer) }).tap();
    await page.getByRole('button', { name: 'Arrived' }).tap();
    await page.getByRole('button', { name: 'Done' }).waitFor();
    await expectNoSeriousFault(page);
    await page.getByRole('button', { name: 'Draw the first room' }).tap();
    await page.getByRole('button', { name: /^All round/ }).tap();
    await expectNoSeriousFault(page);
    for (const inches of [142, 120, 142, 120]) {
      await typeInches(page, inches * 25.4, 25.4 / 16);
      await pressNext(page);
    }
    await page.getByRole('button', { name: 'Kitchen', exact: true }).tap();
    await expectNoSeriousFault(page);
    await page.getByRole('button', { name: 'Start measuring' }).tap();
    await page.getByRole('heading', { name: /^Corner D–A/ }).waitFor();
    await page.getByText('all sent').waitFor();
    roomId = new URL(page.url()).pathname.split('/').at(-1) ?? '';
  });

  it('is read on the pad, closed in the middle, and has lost nothing when it is opened again', async () => {
    const book = await wallBook();
    const asked = readOff(book);
    expect(asked.length).toBeGreaterThan(15);
    const half = asked.findIndex((one, at) => at >= asked.length / 2 && isTypedAtOnce(one));
    const context = await browser.openContext({ size: 'phone', as: 'measurer' });
    const first = await context.newPage();
    await first.goto(paths.walls(roomId));
    for (const reading of asked.slice(0, half)) await answerPad(first, reading, book.rules.stepMm);
    await expectNoSeriousFault(first);
    await keepPicture(first, 'pad');
    // Half a value is kept as well.
    const question = await questionOn(first);
    await first.getByRole('button', { name: '9', exact: true }).tap();
    await first.close();

    const again = await context.newPage();
    await again.goto(paths.walls(roomId));
    await again.getByRole('heading', { level: 1, name: question }).waitFor();
    expect(await again.locator('output').textContent()).toMatch(/^9/);
    await again.getByRole('button', { name: 'clear' }).tap();
    for (const reading of asked.slice(half)) await answerPad(again, reading, book.rules.stepMm);
    await again.getByText('Nothing more is asked for').waitFor();
    await again.getByText('all sent').waitFor();
    const kept = (await wallBook()).wallBook.readings;
    expect(kept.map(inShort)).toEqual(asked.map(inShort));
  });

  const wallBook = () => getAt<WallBookView>(as('measurer'), apiPaths.room(roomId));

  it('gets a run laid out along its wall, and then asks for what that run needs', async () => {
    const page = await browser.openPage({ as: 'measurer' });
    await page.goto(paths.room(jobId, roomId));
    await page.getByRole('link', { name: 'Lay out a new run on wall A' }).click();
    const editor = page.getByRole('region', { name: /^Lay out/ });
    for (const [index, inches] of ['30', '33', '24', '30', '21'].entries()) {
      await editor.getByRole('button', { name: /^Base \d/ }).click();
      const width = editor.getByLabel(/^Width of/).nth(index);
      await width.fill(inches);
      await width.blur();
    }
    await editor.getByText('fits', { exact: true }).waitFor();
    await expectNoSeriousFault(page);
    await editor.getByRole('button', { name: 'Save the run' }).click();
    await editor.waitFor({ state: 'detached' });

    const book = await wallBook();
    expect(book.runs.map(({ units }) => units.length)).toEqual([5]);
    const known = new Set(book.wallBook.readings.map(inShort));
    const rest = readOff(book).filter((reading) => !known.has(inShort(reading)));
    expect(rest.length).toBeGreaterThan(0);
    const answer = await getAt<RecordReadingsAnswer>(as('measurer'), apiPaths.readings(), {
      body: { roomId, readings: rest },
    });
    expect(answer.parked).toEqual([]);
  });

  it('is handed in from the phone, once what is missing and what disagrees was looked at', async () => {
    const page = await browser.openPage({ size: 'phone', as: 'measurer' });
    await page.goto(`${paths.walls(roomId)}#leave`);
    await page.getByRole('heading', { name: 'Before you leave' }).waitFor();
    await page.getByText('Nothing speaks against the readings').waitFor();
    await expectNoSeriousFault(page);
    await page.getByRole('button', { name: 'Hand the wall book in' }).tap();
    await page.getByText('all sent').waitFor();
    await page.getByText(/^handed in/).waitFor();
  });

  it('shows what the walls mean, each figure with how sure it is, and as the room truly stands', async () => {
    const page = await browser.openPage({ as: 'measurer' });
    await page.goto(paths.room(jobId, roomId));
    await page.getByRole('heading', { name: 'Cut list' }).waitFor();
    expect(await page.getByRole('row', { name: /^Filler, left/ }).textContent()).toMatch(/±/);
    await expectNoSeriousFault(page);
    await keepPicture(page, 'fit');

    const { fit } = await getAt<FitView>(as('measurer'), apiPaths.fit(roomId));
    expect(fit.corners).toHaveLength(4);
    for (const [index, { angle }] of fit.corners.entries()) {
      if (!angle) throw new Error('a corner has no angle');
      const errorDeg = angle.value - (trueAngleDeg(index, 914.4) ?? 0);
      expect(Math.abs(errorDeg)).toBeLessThan(1.5 * angle.U);
    }
    const opening = fit.runs[0]?.clearOpening?.opening;
    if (!opening) throw new Error('the run has no clear opening');
    // The largest block that goes in is a little less than the wall is long, never more.
    expect(opening.value).toBeLessThan(trueLengthMm(0, 914.4) + opening.U);
    expect(opening.value).toBeGreaterThan(trueLengthMm(0, 914.4) - 15);
  });

  it('is released as revision A, which the bench takes up and says when it is ready', async () => {
    const measurer = await browser.openPage({ as: 'measurer' });
    await measurer.goto(paths.room(jobId, roomId));
    const reason = measurer.getByLabel('Why it goes out all the same');
    if (await reason.count()) await reason.fill('The customer knows of it.');
    await measurer.getByRole('button', { name: 'Release revision A to the bench' }).click();
    await measurer.getByRole('heading', { name: 'Shop sheet, revision A' }).waitFor();
    await expectNoSeriousFault(measurer);

    const bench = await browser.openPage({ size: 'tablet' });
    await signIn(bench, 'bench');
    const card = bench.getByRole('article', { name: new RegExp(customer) });
    await expectNoSeriousFault(bench);
    await card.getByRole('link', { name: 'Kitchen, revision A' }).click();
    await bench.getByRole('button', { name: 'Take it up at the bench' }).click();
    await bench.getByText('taken up:').first().waitFor();
    await keepPicture(bench, 'sheet');
    await bench.goto(paths.bench());
    await keepPicture(bench, 'bench');
    await card.getByRole('button', { name: 'Ready', exact: true }).click();
    await card.getByLabel('Where they stand').fill('rack 3 by the door');
    await card.getByRole('button', { name: 'They are ready' }).click();
    await bench.getByText('Said. The waiting list knows.').waitFor();
  });

  it('is then offered as an install, is booked, and the customer is told again', async () => {
    const page = await browser.openPage({ as: 'scheduler' });
    await page.goto(paths.job(jobId));
    const floor = page.getByLabel('Floor down, or its build-up agreed');
    await floor.check();
    await page
      .locator('form')
      .filter({ has: floor })
      .getByRole('button', { name: 'Save', exact: true })
      .click();
    await page.getByText('Saved').waitFor();
    await page.goto(paths.diary());
    const line = waitingLine(page);
    expect(await line.textContent()).toContain(`Install · ${customer}`);
    await line.getByText(/^now: revision A released/).waitFor();
    await line.getByRole('button', { name: /^Times that work/ }).click();
    await page.getByRole('heading', { name: 'Times that work' }).waitFor();
    await page.keyboard.press('b');
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Day', { exact: true }).fill(addDays(shop.today, 21));
    await dialog.getByRole('button', { name: /^Book and tell/ }).click();
    await page.getByText(`Booked: ${customer}`).waitFor();
    await keepPicture(page, 'diary-with-install');

    const phonePage = await browser.openPage({ size: 'phone' });
    const link = await textedLink(phonePage, 2);
    await phonePage.goto(link);
    await phonePage.getByText('to set your cabinets').waitFor();
    await expectNoSeriousFault(phonePage);
  });
});
