import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, inject, it, vi } from 'vitest';
import type { CrewSetting, CrewsView } from '@/lib/contracts/crews';
import type { JobView } from '@/lib/contracts/jobs';
import type { OpeningsView } from '@/lib/contracts/openings';
import type { VisitView, WaitingItem } from '@/lib/contracts/visits';
import { towns } from '@/lib/island/demo-island';
import { apiPaths, paths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { formatDay } from '@/lib/time/format-instant';
import { localDate } from '@/lib/time/local-moment';
import { getAt } from '../help/ask-at';
import { keepPicture, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { settled } from '../help/settled';

const zone = 'America/New_York';

describe('a day on the map, and a shop that is late', () => {
  const browser = useBrowser();
  const scheduler = { baseUrl: inject('baseUrl'), cookie: inject('sessions').scheduler };
  const today = localDate(new Date(), zone);
  /** A Monday that no other test fills. */
  const monday = addDays(today, 85 - new Date(`${today}T12:00Z`).getUTCDay());
  let tor: CrewSetting;
  beforeAll(async () => {
    const { crews } = await getAt<CrewsView>(scheduler, apiPaths.crewSettings());
    const found = crews.find(({ name }) => name === 'Measure: Tor');
    if (!found) throw new Error('the demo has no measurer Tor');
    tor = found;
  });

  const visits = (from: string, to: string) =>
    getAt<VisitView[]>(scheduler, `${apiPaths.visits()}?from=${from}&to=${to}`);
  const visitOf = async (customer: string) =>
    (await visits(today, addDays(today, 120))).find(
      ({ customerName }) => customerName === customer,
    );
  const timesOfDay = async () =>
    Object.fromEntries(
      (await visits(monday, addDays(monday, 1))).map(({ customerName, startsAt }) => [
        customerName,
        startsAt,
      ]),
    );

  /** A measure of a new customer somewhere on the island, with Tor. */
  async function stop(name: string, town: keyof typeof towns, time: string): Promise<void> {
    const { latitude, longitude } = towns[town];
    const { id: jobId } = await getAt<{ id: string }>(scheduler, apiPaths.jobs(), {
      body: {
        customer: { name },
        site: { street: '4 Test Row', town, latitude, longitude, wayIn: 'Side door' },
        title: 'Kitchen',
        wallsReady: 'closed',
      },
    });
    const booking = { jobId, kind: 'site-measure', crewId: tor.id, date: monday, time };
    await getAt(scheduler, apiPaths.visits(), {
      body: { idempotencyKey: crypto.randomUUID(), workMinutes: 20, ...booking },
    });
  }

  async function openDay(mayLog: RegExp[] = []): Promise<Page> {
    const page = await browser.openPage({ as: 'scheduler', mayLog });
    await page.goto(paths.day(monday));
    await page.getByRole('region', { name: 'Measure: Tor' }).getByText('Nora Quill').waitFor();
    await settled(page);
    return page;
  }
  const names = (page: Page) =>
    page.getByRole('region', { name: 'Measure: Tor' }).locator('ol li a').allTextContents();

  it('is put in better order: looked at first, then taken, every promise kept, and taken back', async () => {
    await stop('Nora Quill', 'Upper Fold', '08:00');
    await stop('Sam Dray', 'Quayside', '09:00');
    await stop('Lio Brack', 'Upper Fold', '09:45');
    const before = await timesOfDay();
    const page = await openDay();
    const map = page.getByRole('region', { name: 'Map of the day' });
    expect(await map.locator('.day-map-stop').count()).toBe(3);
    await page.getByRole('button', { name: 'Better order for Measure: Tor' }).click();
    await page.getByText(/\d+ → \d+ min of driving, \d+ min less/).waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'day-better-order');
    expect(await timesOfDay()).toEqual(before);
    const offered = await names(page);

    await page.getByRole('button', { name: 'Put the day in this order' }).click();
    await page.getByText(/visits? moved. No promise is broken/).waitFor();
    const taken = await visits(monday, addDays(monday, 1));
    expect(taken.map(({ startsAt }) => startsAt)).not.toEqual(Object.values(before));
    expect(taken.map(({ customerName }) => customerName)).toEqual(
      offered.map((words) => taken.find((v) => words.includes(v.customerName))?.customerName),
    );
    for (const [index, visit] of taken.entries()) {
      expect(visit.startsAt >= visit.windowStartsAt).toBe(true);
      expect(visit.startsAt <= visit.windowEndsAt).toBe(true);
      expect(visit.startsAt >= (taken[index - 1]?.endsAt ?? '')).toBe(true);
    }

    await page.keyboard.press('u');
    await page.getByText('Taken back: the day is in the order that it had.').waitFor();
    expect(await timesOfDay()).toEqual(before);
  });

  it('stays as it is when somebody moved one of the visits while the order was looked at', async () => {
    const page = await openDay([/status of 409/, /net::ERR/]);
    // Their news does not reach this screen in time.
    await page.route(`**${apiPaths.live()}`, (route) => route.abort());
    await page.reload();
    await settled(page);
    await page.getByRole('button', { name: 'Better order for Measure: Tor' }).click();
    const take = page.getByRole('button', { name: 'Put the day in this order' });
    await take.waitFor();
    const visit = await visitOf('Lio Brack');
    await getAt(scheduler, apiPaths.visit(visit?.id ?? ''), {
      method: 'PATCH',
      body: { version: visit?.version, crewId: tor.id, date: monday, time: '13:00' },
    });
    const before = await timesOfDay();
    await take.click();
    await page.getByText(/Nothing was changed: this visit is different by now/).waitFor();
    expect(await timesOfDay()).toEqual(before);
  });

  /** Books the install of a job that waits as soon as a crew can, so that a late bench is in its way. */
  async function bookSoonest(customer: string): Promise<void> {
    const waiting = await getAt<WaitingItem[]>(scheduler, apiPaths.waiting());
    const item = waiting.find(({ customerName }) => customerName === customer);
    if (!item) throw new Error(`${customer} does not wait in the demo`);
    const { jobId, kind } = item;
    const { openings } = await getAt<OpeningsView>(scheduler, apiPaths.openings(), {
      body: { jobId, kind, limit: 60 },
    });
    const [soonest] = openings.sort((a, b) => a.startsAt.localeCompare(b.startsAt));
    if (!soonest) throw new Error(`no time works for ${customer}`);
    const { crewId, date, time, workMinutes } = soonest;
    await getAt(scheduler, apiPaths.visits(), {
      body: { idempotencyKey: crypto.randomUUID(), jobId, kind, crewId, date, time, workMinutes },
    });
  }

  it('moves all that a late shop moves at once, three days over six jobs, and tells each customer', async () => {
    const late = ['Mo Fairlie', 'Ines Tarn', 'Vera Knoll'];
    for (const customer of late) await bookSoonest(customer);
    const before = await Promise.all(late.map(visitOf));
    const page = await browser.openPage({ as: 'scheduler' });
    await page.goto(paths.diary());
    await settled(page);
    await page.getByRole('link', { name: 'The shop is late…' }).click();
    await page.getByRole('heading', { level: 1, name: 'The shop is late' }).waitFor();
    await settled(page);
    for (const customer of [...late, 'Cass Orme', 'Roy Tansy', 'Bea Sandys'])
      await page.getByRole('checkbox', { name: new RegExp(customer) }).check();
    await expectNoSeriousFault(page);
    expect(await page.getByLabel('Working days late').inputValue()).toBe('3');
    await page.getByRole('button', { name: 'See what it moves' }).click();
    for (const customer of late)
      await page.getByRole('row', { name: new RegExp(customer) }).waitFor();
    await expectNoSeriousFault(page);
    await keepPicture(page, 'slip');
    expect((await Promise.all(late.map(visitOf))).map((visit) => visit?.version)).toEqual(
      before.map((visit) => visit?.version),
    );
    await page.getByLabel('Why the shop is late').fill('The finish has not cured.');
    await page.getByRole('button', { name: /^Move all \d and tell/ }).click();
    await page.getByText(/\d visits moved, \d customers told/).waitFor();
    for (const visit of before) {
      const after = await visitOf(visit?.customerName ?? '');
      expect(after?.version).toBe((visit?.version ?? 0) + 1);
      expect((after?.startsAt ?? '') > (visit?.startsAt ?? '')).toBe(true);
      if (after) await mailedDay(after);
    }
  });

  /** The customer's inbox, as the fake keeps it, names the new day once. */
  async function mailedDay({ jobId, windowStartsAt }: VisitView): Promise<void> {
    const { email, language } = await getAt<JobView>(scheduler, apiPaths.job(jobId));
    const day = formatDay(new Date(windowStartsAt), zone, { language, region: 'US' });
    await vi.waitFor(
      async () => {
        const inbox = await fetch(scheduler.baseUrl + paths.demoPhoneOf({ address: email }));
        expect(await inbox.text()).toContain(day);
      },
      { timeout: 30_000, interval: 400 },
    );
  }
});
