import type { Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths, paths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { toLocal } from '@/lib/time/local-moment';
import { getAt } from '../help/ask-at';
import { keepPicture, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { moveShopToMorning } from '../help/morning-shop';
import { settled } from '../help/settled';

describe('the diary under the hand', () => {
  const browser = useBrowser();
  const as = (role: 'owner' | 'scheduler') => ({
    baseUrl: inject('baseUrl'),
    cookie: inject('sessions')[role],
  });
  let shop: Awaited<ReturnType<typeof moveShopToMorning>>;
  /** A week that the demo leaves empty. */
  let monday = '';
  beforeAll(async () => {
    shop = await moveShopToMorning(as('owner'));
    monday = addDays(shop.today, 70 - new Date(`${shop.today}T12:00Z`).getUTCDay() + 1);
  });
  afterAll(() => shop.putBack());

  const visitOf = async (customer: string): Promise<VisitView | undefined> =>
    (
      await getAt<VisitView[]>(
        as('scheduler'),
        `${apiPaths.visits()}?from=${monday}&to=${addDays(monday, 7)}`,
      )
    ).find(({ customerName }) => customerName === customer);
  const startOf = (visit: VisitView | undefined) =>
    visit && toLocal(new Date(visit.startsAt), shop.zone);

  async function openWeek(mayLog: RegExp[] = []): Promise<Page> {
    const page = await browser.openPage({ as: 'scheduler', mayLog });
    await page.goto(paths.diaryOn(monday));
    await page.locator('li[data-waiting]').first().waitFor();
    // Keys are heard and lists stand still only then; a busy machine takes its time.
    await settled(page);
    return page;
  }

  /** The middle of a quarter of an hour of a day's column. */
  async function pointAt(page: Page, date: string, time: string) {
    const column = await boxOf(page.locator(`td.fc-timegrid-col[data-date="${date}"]`));
    const slot = await boxOf(page.locator(`td.fc-timegrid-slot-lane[data-time="${time}:00"]`));
    return { x: column.x + column.width / 2, y: slot.y + 3 };
  }

  async function boxOf(locator: Locator) {
    const box = await locator.boundingBox();
    if (!box) throw new Error('it is not on the screen');
    return box;
  }

  async function drag(page: Page, from: { x: number; y: number }, to: { x: number; y: number }) {
    await page.mouse.move(from.x, from.y);
    await page.mouse.down();
    await page.mouse.move(from.x + 8, from.y + 8, { steps: 4 });
    await page.mouse.move(to.x, to.y, { steps: 12 });
    await page.mouse.move(to.x, to.y + 1);
    await page.mouse.up();
  }

  it('rests when nothing happens', async () => {
    const page = await openWeek();
    const changes = await page.evaluate(async () => {
      let count = 0;
      const observer = new MutationObserver((records) => {
        count += records.length;
      });
      observer.observe(document.body, { subtree: true, childList: true, attributes: true });
      await new Promise((resolve) => setTimeout(resolve, 1_500));
      observer.disconnect();
      return count;
    });
    expect(changes).toBeLessThan(20);
  });

  it('takes a job from the waiting list where it is dropped', async () => {
    const page = await openWeek();
    const line = page.locator('li[data-waiting]', { hasText: 'Marit Aldous' });
    const from = await boxOf(line);
    const target = await pointAt(page, monday, '09:00');
    await drag(page, { x: from.x + 60, y: from.y + from.height / 2 }, target);
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('heading', { name: /Marit Aldous/ }).waitFor();
    expect(await dialog.getByLabel('Day', { exact: true }).inputValue()).toBe(monday);
    expect(await dialog.getByLabel('Starts').inputValue()).toBe('09:00');
    await expectNoSeriousFault(page);
    await keepPicture(page, 'book-dialog');
    await dialog.getByRole('button', { name: /^Book and tell/ }).click();
    await page.getByText('Booked: Marit Aldous').waitFor();
    expect(startOf(await visitOf('Marit Aldous'))).toMatchObject({ date: monday, time: '09:00' });
  });

  it('moves a visit where it is dragged, and takes that back by key', async () => {
    const page = await openWeek();
    const visit = page.locator('.visit', { hasText: 'Marit Aldous' });
    const box = await boxOf(visit);
    const grip = { x: box.x + box.width / 2, y: box.y + 12 };
    const to = await pointAt(page, addDays(monday, 2), '11:00');
    await drag(page, grip, { ...to, y: to.y + 9 });
    await page.getByText(/^Marit Aldous: /).waitFor();
    await expect
      .poll(async () => startOf(await visitOf('Marit Aldous'))?.date)
      .toBe(addDays(monday, 2));
    await page.keyboard.press('u');
    await expect
      .poll(async () => startOf(await visitOf('Marit Aldous')), { timeout: 5_000 })
      .toMatchObject({ date: monday, time: '09:00' });
  });

  it('puts a visit back that is dragged onto a taken time, and says who is there', async () => {
    const before = await visitOf('Marit Aldous');
    if (!before) throw new Error('the visit of the test before is not there');
    await getAt(as('scheduler'), apiPaths.visits(), {
      body: {
        idempotencyKey: crypto.randomUUID(),
        jobId: await waitingJob('Tomas Ruiz'),
        kind: 'site-measure',
        crewId: before.crewId,
        date: addDays(monday, 1),
        time: '10:00',
      },
    });
    const page = await openWeek([/status of 409/]);
    const visit = page.locator('.visit', { hasText: 'Marit Aldous' });
    const box = await boxOf(visit);
    const to = await pointAt(page, addDays(monday, 1), '10:30');
    await drag(page, { x: box.x + box.width / 2, y: box.y + 12 }, { ...to, y: to.y + 9 });
    await page
      .getByText(/Tomas Ruiz/)
      .and(page.locator('[role=status] *'))
      .first()
      .waitFor();
    expect(startOf(await visitOf('Marit Aldous'))).toMatchObject({ date: monday, time: '09:00' });
    await expect
      .poll(async () => Math.abs((await boxOf(visit)).x - box.x), { timeout: 5_000 })
      .toBeLessThan(3);
  });

  async function waitingJob(customer: string): Promise<string> {
    const list = await getAt<{ jobId: string; customerName: string }[]>(
      as('scheduler'),
      apiPaths.waiting(),
    );
    return list.find(({ customerName }) => customerName === customer)?.jobId ?? '';
  }

  it('goes by key: month, day, week, list, the list of keys, a job by name', async () => {
    const page = await openWeek();
    await page.keyboard.press('m');
    await page.locator('.fc-dayGridMonth-view').waitFor();
    await keepPicture(page, 'diary-month');
    await expectNoSeriousFault(page);
    await page.keyboard.press('d');
    await page.locator('.fc-timeGridDay-view').waitFor();
    await page.keyboard.press('w');
    await page.locator('.fc-timeGridWeek-view').waitFor();
    await page.keyboard.press('l');
    const list = page.getByRole('region', { name: 'List of visits' });
    await list.getByRole('button', { name: /Marit Aldous/ }).waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'diary-list');
    await page.keyboard.press('w');
    await page.keyboard.press('?');
    const keys = page.getByRole('dialog');
    await keys.getByText('Find a job or a page').waitFor();
    await expectNoSeriousFault(page);
    await page.keyboard.press('Escape');
    await keys.waitFor({ state: 'hidden' });
    await page.keyboard.press('/');
    await page.getByRole('dialog').getByRole('combobox').fill('Ember');
    await page.getByRole('option', { name: /Ruth Ember/ }).waitFor();
    await expectNoSeriousFault(page);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: /Ruth Ember/ }).waitFor();
  });

  it('finds a booked visit by name and opens it where it stands, by key alone', async () => {
    const page = await browser.openPage({ as: 'scheduler' });
    await page.goto(paths.diary());
    await settled(page);
    for (const key of ['f', ...'aldous']) await page.keyboard.press(key);
    await page.getByRole('heading', { name: 'Booked', exact: true }).waitFor();
    await expectNoSeriousFault(page);
    await settled(page);
    await page.keyboard.press('Enter');
    await page.getByRole('dialog', { name: /Marit Aldous/ }).waitFor();
    await page
      .getByText(new RegExp(`Week of \\w+ ${Number(monday.slice(8))}$`))
      .or(page.locator(`[data-date="${monday}"]`))
      .first()
      .waitFor();
  });
});
