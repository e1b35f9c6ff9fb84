import type { Page } from 'playwright-core';
import { describe, expect, inject, it } from 'vitest';
import type { MessageView } from '@/lib/contracts/messages';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths, paths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { localDate, toLocal } from '@/lib/time/local-moment';
import { getAt } from '../help/ask-at';
import { keepPicture, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { settled } from '../help/settled';

const zone = 'America/New_York';

/** Each books for a customer of its own, so that none waits for another. */
describe('booking with the customer on the phone', () => {
  const browser = useBrowser();
  const scheduler = { baseUrl: inject('baseUrl'), cookie: inject('sessions').scheduler };
  const today = () => localDate(new Date(), zone);

  async function visitOf(customer: string): Promise<VisitView | undefined> {
    const visits = await getAt<VisitView[]>(
      scheduler,
      `${apiPaths.visits()}?from=${today()}&to=${addDays(today(), 120)}`,
    );
    return visits.find(({ customerName }) => customerName === customer);
  }
  const startOf = (visit: VisitView | undefined) =>
    visit && toLocal(new Date(visit.startsAt), zone);
  const bar = (page: Page, customer: string) =>
    page.locator('[data-visit-id]', { hasText: customer });

  async function openBoard(as: 'scheduler' | 'owner' = 'scheduler', on?: string): Promise<Page> {
    const page = await browser.openPage({ as, mayLog: [/status of 409/] });
    await page.goto(on ? paths.diaryOn(on) : paths.diary());
    await settled(page);
    await page.keyboard.press('c');
    await page.getByRole('region', { name: 'Crews by day' }).waitFor();
    await settled(page);
    return page;
  }

  it('by mouse: the best times with reasons, drawn in the diary; taken back in time, nobody hears of it', async () => {
    const page = await openBoard();
    await page.getByRole('searchbox', { name: 'Find who waits or is booked' }).fill('pryce');
    await page.getByRole('button', { name: /^Times that work: .*Odile Pryce/ }).click();
    const openings = page.locator('[data-openings] li');
    await openings.first().waitFor();
    expect(await openings.first().textContent()).toMatch(/min/);
    await openings.nth(1).getByRole('button').click();
    await page.locator('[data-ghost]').first().waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'times-that-work');
    await page.getByRole('button', { name: 'Book it' }).click();
    await page.getByText('Booked: Odile Pryce').waitFor();
    await bar(page, 'Odile Pryce').first().waitFor();
    const booked = await visitOf('Odile Pryce');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByText('Odile Pryce waits to be booked again').waitFor();
    await expect.poll(() => visitOf('Odile Pryce')).toBeUndefined();
    const told = await getAt<MessageView[]>(
      scheduler,
      `${apiPaths.messages()}?jobId=${booked?.jobId}`,
    );
    expect(told.filter(({ state }) => state !== 'withdrawn')).toEqual([]);
  });

  it('by keyboard alone, in a few presses; then a day later by key, as one move', async () => {
    const page = await openBoard();
    for (const key of ['f', ...'fenn', 'Enter']) await page.keyboard.press(key);
    await page.locator('[data-openings] li').nth(1).waitFor();
    for (const key of ['2', 'Enter']) await page.keyboard.press(key);
    await page.getByText('Booked: Bram Fenn').waitFor();
    const booked = await visitOf('Bram Fenn');
    await settled(page);
    await bar(page, 'Bram Fenn').focus();
    await page.keyboard.press('Shift+ArrowRight');
    await page.keyboard.press('Shift+ArrowDown');
    await page.getByText(/^Bram Fenn: /).waitFor();
    const moved = await visitOf('Bram Fenn');
    expect(moved?.version).toBe((booked?.version ?? 0) + 1);
    expect((startOf(moved)?.date ?? '') > (startOf(booked)?.date ?? '')).toBe(true);
    await expectNoSeriousFault(page);
    await keepPicture(page, 'crews-board');
  });

  it('on a phone: kept a quarter of an hour while the customer thinks, booked, and kept again by undo', async () => {
    const page = await browser.openPage({ as: 'scheduler', size: 'phone' });
    await page.goto(paths.diary());
    await settled(page);
    await page.getByRole('button', { name: /^Times that work: .*Wren Castell/ }).tap();
    await page.locator('[data-openings] li').first().waitFor();
    await expectNoSeriousFault(page);
    await page.getByRole('button', { name: 'Keep 15 min' }).tap();
    await page.getByText(/^Kept for 1[45]:/).waitFor();
    expect((await visitOf('Wren Castell'))?.status).toBe('held');
    await keepPicture(page, 'times-that-work');
    await page.getByRole('button', { name: 'Book the held time' }).tap();
    await page.getByText('Booked: Wren Castell').waitFor();
    expect((await visitOf('Wren Castell'))?.status).toBe('booked');
    await page.getByRole('button', { name: 'Undo' }).tap();
    await page.getByText('Wren Castell waits to be booked again, the time is held').waitFor();
    expect((await visitOf('Wren Castell'))?.status).toBe('held');
  });

  it('shows two at once what the other does, and lets neither move over it unseen', async () => {
    const start = startOf(await visitOf('Bram Fenn'));
    const mine = await openBoard('scheduler', start?.date);
    const theirs = await openBoard('owner', start?.date);
    await bar(mine, 'Bram Fenn').click();
    const dialog = mine.getByRole('dialog');
    await dialog.getByLabel('Starts').fill('13:30');

    await bar(theirs, 'Bram Fenn').focus();
    await theirs.keyboard.press('-');
    await theirs.getByText(/^Bram Fenn: /).waitFor();
    await expect
      .poll(() => bar(mine, 'Bram Fenn').getAttribute('aria-label'), { timeout: 10_000 })
      .toMatch(/, 1 h,/);

    await dialog.getByRole('button', { name: 'Move it' }).click();
    const faster = mine.getByRole('dialog', { name: /somebody was faster/ });
    await faster.getByText('June Bend').waitFor();
    await expectNoSeriousFault(mine);
    await faster.getByRole('button', { name: 'Do it all the same' }).click();
    await expect.poll(async () => startOf(await visitOf('Bram Fenn'))?.time).toBe('13:30');
  });
});
