import { describe, expect, inject, it } from 'vitest';
import type { JobRow } from '@/lib/contracts/jobs';
import { apiPaths, paths } from '@/lib/paths';
import type { Role } from '@/lib/permissions';
import { getAt } from '../help/ask-at';
import { keepPicture, signIn, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { settled } from '../help/settled';

describe('doors', () => {
  const browser = useBrowser();

  it.each<[Role, string, string]>([
    ['measurer', paths.messages(), paths.today()],
    ['crew', paths.messages(), paths.today()],
    ['bench', paths.messages(), paths.bench()],
    ['measurer', paths.newJob(), paths.today()],
    ['bench', paths.newJob(), paths.bench()],
  ])('a %s who opens %s is led to %s', async (role, address, home) => {
    const page = await browser.openPage({ as: role });
    await page.goto(address);
    await page.waitForURL(`**${home}`);
    expect(await page.locator(`nav a[href="${address}"]`).count()).toBe(0);
  });

  it('a stranger is asked to sign in, and is then where they wanted to go', async () => {
    const page = await browser.openPage();
    await page.goto(paths.messages());
    expect(new URL(page.url()).pathname).toBe(paths.signIn());
    await page.getByLabel('E-mail').fill('scheduler@juniperbend.example');
    await page.getByLabel('Password').fill('setwell-demo');
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page.waitForURL(`**${paths.messages()}`);
    await page.getByRole('heading', { name: 'Messages', level: 1 }).waitFor();
  });

  it('a wrong password is told in words, and the e-mail stays', async () => {
    const page = await browser.openPage({ mayLog: [/status of 401/] });
    await page.goto(paths.signIn());
    await page.getByLabel('E-mail').fill('scheduler@juniperbend.example');
    await page.getByLabel('Password').fill('not-the-password');
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page.getByRole('alert').filter({ hasText: /\w/ }).waitFor();
    expect(await page.getByLabel('E-mail').inputValue()).toBe('scheduler@juniperbend.example');
    await expectNoSeriousFault(page);
  });

  it('a job of another shop is not there', async () => {
    const owner = { baseUrl: inject('baseUrl'), cookie: inject('sessions').owner };
    const [job] = await getAt<JobRow[]>(owner, apiPaths.jobs());
    const page = await browser.openPage({ mayLog: [/status of 404/] });
    await page.goto(paths.signIn());
    await page.getByLabel('E-mail').fill('owner@farshore.example');
    await page.getByLabel('Password').fill('setwell-demo');
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page.waitForURL(`**${paths.diary()}`);
    await page.goto(paths.job(job?.id ?? ''));
    await page.getByText('Nothing at this address').waitFor();
  });

  it('the demo’s sign-in takes one tap for each person', async () => {
    const page = await browser.openPage({ size: 'phone' });
    await signIn(page, 'crew');
    expect(new URL(page.url()).pathname).toBe(paths.today());
  });

  it('a text back from the demo’s phone goes through the program and is shown on it', async () => {
    const page = await browser.openPage({ size: 'phone' });
    const number = '+12125550166';
    const words = 'Which entrance do you take?';
    const answer = await page.request.post(paths.demoReply(), { form: { number, body: words } });
    expect(answer.url()).toContain(paths.demoPhoneOf({ number }));
    await page.goto(paths.demoPhoneOf({ number }));
    await page.getByText(words).waitFor();
    await expectNoSeriousFault(page);
  });

  it('a new shop opens by sign-up, and each of its empty pages says what to do first', async () => {
    const page = await browser.openPage();
    await page.goto(paths.signUp());
    await page.getByLabel(/^The shop.s name/).fill('Low Tide');
    await page.getByLabel('Your name').fill('Tilda Low');
    await page.getByLabel('Your e-mail').fill('tilda@lowtide.example');
    await page.getByLabel('A password').fill('a-long-password');
    await page.getByRole('button', { name: 'Open the shop' }).click();
    await page.waitForURL(`**${paths.start()}`);
    const pages: [string, RegExp][] = [
      [paths.diary(), /Nothing waits/],
      [paths.jobs(), /No jobs yet/],
      [paths.bench(), /Nothing to build here/],
      [paths.messages(), /Nothing told yet/],
      [paths.crews(), /Tilda Low/],
      [paths.today(), /Nothing booked/],
    ];
    for (const [address, words] of pages) {
      await page.goto(address);
      await page.getByText(words).filter({ visible: true }).first().waitFor();
      await keepPicture(page, `empty-${address.slice(1)}`);
      await expectNoSeriousFault(page);
    }
    await page.goto(paths.jobs());
    await page.getByRole('link', { name: 'Start the first job' }).click();
    await page.waitForURL(`**${paths.newJob()}`);
  });

  it('a page made dark stays dark when it is opened again', async () => {
    const page = await browser.openPage({ as: 'owner' });
    await page.goto(paths.jobs());
    await settled(page);
    const ground = () => page.evaluate(() => getComputedStyle(document.body).backgroundColor);
    const light = await ground();
    await page.getByLabel('Screen').filter({ visible: true }).selectOption('dark');
    // With motion reduced each change still takes a hundredth of a millisecond.
    await expect.poll(ground).not.toBe(light);
    const dark = await ground();
    await page.reload();
    expect(await ground()).toBe(dark);
    await expectNoSeriousFault(page);
  });
});
