import { randomInt } from 'node:crypto';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { paths } from '@/lib/paths';
import { keepPicture, useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { countedHand, minutesOf } from '../help/counted-hand';
import { morningZone } from '../help/morning-shop';
import { settled } from '../help/settled';

const phone = `+1212555${`01${randomInt(10, 100)}`}`;

describe('a new shop', () => {
  const browser = useBrowser();

  it('goes from sign-up to a confirmed first visit in a quarter of an hour', async () => {
    const began = performance.now();
    // Texts go out by day alone, and the zone of a new shop is its browser's.
    const page = await browser.openPage({ timezone: morningZone(new Date()) });
    const hand = countedHand(page);
    const button = (name: string | RegExp) => page.getByRole('button', { name });
    const field = (label: string | RegExp) => page.getByLabel(label);
    const title = (name: string | RegExp) => page.getByRole('heading', { level: 1, name });

    await page.goto(paths.signUp());
    await settled(page);
    await hand.see(title('Open a new shop'));
    await hand.type(field(/^The shop.s name/), 'Spruce and Tenon');
    await hand.type(field('Your name'), 'Tilda Low');
    await hand.type(field('Your e-mail'), `tilda${randomInt(1_000_000)}@spruce.example`);
    await hand.type(field('A password'), 'a long password');
    await hand.click(button('Open the shop'));

    await page.waitForURL(`**${paths.start()}`);
    await settled(page);
    await hand.see(title('Start'));
    await expectNoSeriousFault(page);
    await hand.type(field(/phone that customers may call/), '(212) 555-0142');
    await hand.click(button('These are our hours'));
    await hand.click(button('Make this crew'));
    const startJob = page.getByRole('link', { name: 'Start a job' });
    await startJob.waitFor();
    await keepPicture(page, 'start');
    await hand.click(startJob);

    await page.waitForURL(`**${paths.newJob()}`);
    await settled(page);
    await hand.see(title('New job'));
    await hand.type(page.getByLabel('Customer', { exact: true }), 'Wanda Sedge');
    await hand.type(field('Phone'), phone);
    await hand.click(field(/^May be texted/));
    await hand.type(field('Street and number'), '18 Mill Lane');
    await hand.type(field('Town'), 'Fernhollow');
    await hand.type(field('The job'), 'Kitchen, L');
    await hand.click(button('Save the job'));

    await title(/Wanda Sedge/).waitFor();
    await settled(page);
    await hand.see(title(/Wanda Sedge/));
    await expectNoSeriousFault(page);
    await hand.click(page.getByRole('link', { name: 'Book the site measure' }));

    await page.waitForURL(`**${paths.diary()}**`);
    await settled(page);
    await hand.see(page.getByRole('heading', { name: 'Times that work' }));
    await page.locator('[data-openings] li').first().waitFor();
    await hand.click(button('Book it'));
    await page.getByText('Booked: Wanda Sedge').waitFor();

    await sayYes(await textedLink(await browser.openPage({ size: 'phone' })));

    await hand.click(page.getByRole('link', { name: 'Start', exact: true }));
    await page.waitForURL(`**${paths.start()}`);
    await hand.see(page.getByText('a first visit stands confirmed'));
    await hand.type(page.getByLabel('E-mail'), 'ines@spruce.example');
    await hand.click(button('Invite'));
    await page.getByText('You can also hand it over yourself').waitFor();
    await keepPicture(page, 'start-done');
    await expectNoSeriousFault(page);

    const { screens, clicks, keys, wordsRead } = hand.count;
    const robotSeconds = (performance.now() - began) / 1_000;
    const minutes = minutesOf(hand.count);
    console.log(
      `a new shop: robot ${robotSeconds.toFixed(0)} s, ${screens} screens, ${clicks} clicks, ${keys} keys, ` +
        `${wordsRead} words read; a person needs ${minutes.toFixed(1)} min`,
    );
    expect(minutes).toBeLessThan(15);
  });

  /** The text that the customer gets; the office may take a booking back for twelve seconds before. */
  async function textedLink(page: Page): Promise<Page> {
    const link = page.locator('ol a[href*="/v/"]').last();
    await expect
      .poll(
        async () => {
          await page.goto(paths.demoPhoneOf({ number: phone }));
          return link.count();
        },
        { timeout: 30_000, interval: 500 },
      )
      .toBe(1);
    await page.goto((await link.getAttribute('href')) ?? '');
    return page;
  }

  async function sayYes(page: Page) {
    await page.getByText('18 Mill Lane').first().waitFor();
    await page.getByRole('button', { name: 'Yes, that works' }).tap();
    await page.getByText('Thank you, it is confirmed').waitFor();
  }
});
