import { randomInt, randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, inject, it } from 'vitest';
import type { VisitView } from '@/lib/contracts/visits';
import { apiPaths, paths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import { getAt } from '../help/ask-at';
import { useBrowser } from '../help/browser';
import { expectNoSeriousFault } from '../help/browser-faults';
import { moveShopToMorning } from '../help/morning-shop';
import { settled } from '../help/settled';
import { cookiesOf } from '../help/sign-in-at';

/** What goes back and forth between a scheduler and a customer who reads Spanish, in a shop of their own. */
describe('the exchange between scheduler and customer', () => {
  const browser = useBrowser();
  const baseUrl = inject('baseUrl');
  // Of the range kept for fiction, where no customer of the demo is.
  const phone = `+1646${5_550_100 + randomInt(100)}`;
  let owner: { baseUrl: string; cookie: string };
  let visit: VisitView;
  let link = '';

  beforeAll(async () => {
    owner = await openShop();
    const { zone } = await moveShopToMorning(owner);
    const { id: jobId } = await getAt<{ id: string }>(owner, apiPaths.jobs(), {
      body: {
        customer: { name: 'Lucía Soto', phone, language: 'es', mayText: true },
        site: { street: '5 Quay Rise', town: 'Quayside', yearBuilt: 1931 },
        title: 'Kitchen, one wall',
        wallsReady: 'closed',
      },
    });
    const people = await getAt<{ id: string }[]>(owner, apiPaths.people());
    const personIds = people.map(({ id }) => id);
    const crew = await getAt<{ id: string }>(owner, apiPaths.crews(), {
      body: { name: 'Measure', does: 'measure', colour: '1', personIds },
    });
    visit = await getAt<VisitView>(owner, apiPaths.visits(), {
      body: {
        idempotencyKey: randomUUID(),
        jobId,
        kind: 'site-measure',
        crewId: crew.id,
        date: addDays(localDate(new Date(), zone), 9),
        time: '10:00',
        overrideReason: 'A test of today.',
      },
    });
  }, 60_000);

  async function openShop() {
    const email = `owner-${randomUUID().slice(0, 8)}@shop.example`;
    const response = await fetch(baseUrl + apiPaths.shops(), {
      method: 'POST',
      headers: { origin: baseUrl, 'content-type': 'application/json' },
      body: JSON.stringify({
        shopName: 'Exchange Cabinets',
        region: 'US',
        zone: 'America/New_York',
        unit: 'in',
        personName: 'Ada Bell',
        email,
        password: 'a-long-password',
      }),
    });
    expect(response.status).toBe(200);
    return { baseUrl, cookie: cookiesOf(response) };
  }

  /** The link in the text that the customer's phone has got, asked for until it is there. */
  async function textedLink(): Promise<string> {
    const read = async () => {
      const page = await fetch(baseUrl + paths.demoPhoneOf({ number: phone }));
      return /href="(?:https?:\/\/[^/"]+)?(\/v\/[\w-]{22})"/.exec(await page.text())?.[1] ?? '';
    };
    await expect.poll(read, { timeout: 30_000 }).not.toBe('');
    return read();
  }

  const office = () => browser.openPage({ cookie: owner.cookie });

  const now = async () =>
    (await getAt<VisitView[]>(owner, `${apiPaths.visits()}?from=2020-01-01&to=2099-01-01`)).find(
      ({ id }) => id === visit.id,
    );

  it('reaches the customer’s phone by itself, once nobody can take the booking back', async () => {
    link = await textedLink();
  });

  it('is confirmed in Spanish on a phone without scripts, by a tap and by nothing less', async () => {
    const plain = await browser.openPage({ size: 'phone', javaScript: false });
    await plain.goto(link);
    await plain.goto(link);
    expect(await now()).toMatchObject({ status: 'booked', version: 1 });
    expect(await plain.locator('main').getAttribute('lang')).toBe('es');
    await plain.getByRole('button', { name: 'Sí, está bien' }).click();
    await plain.getByText('Gracias, su visita queda confirmada. Hasta entonces.').waitFor();
    expect(await now()).toMatchObject({ status: 'confirmed' });
  });

  it('shows no serious fault to axe, closed by day and open by night', async () => {
    const day = await browser.openPage({ size: 'phone' });
    await day.goto(link);
    await expectNoSeriousFault(day);
    const night = await browser.openPage({ size: 'phone', theme: 'dark' });
    await night.goto(link);
    await night.getByText('Todavía no estamos listos').click();
    await expectNoSeriousFault(night);
  });

  it('moves to another time from real openings, kept while they choose, without scripts', async () => {
    const plain = await browser.openPage({ size: 'phone', javaScript: false });
    await plain.goto(link);
    await plain.getByRole('link', { name: 'Pedir otra fecha' }).click();
    const first = plain.locator('form[action$="/hold"] button').first();
    const words = await first.locator('span').allTextContents();
    await first.click();
    await plain.getByRole('heading', { name: /Guardada para usted hasta/ }).waitFor();
    expect(await now()).toMatchObject({ status: 'confirmed', startsAt: visit.startsAt });

    const page = await browser.openPage({ size: 'phone' });
    await page.goto(`${link}/times`);
    await page.getByText(/quedan 1[0-4]:\d\d/).waitFor();
    await expectNoSeriousFault(page);

    await plain.getByRole('button', { name: 'Elegir esta fecha' }).click();
    await plain.getByText('Gracias, su visita queda confirmada. Hasta entonces.').waitFor();
    await plain.getByText(words[1] ?? 'no window').waitFor();
    const moved = await now();
    expect(moved).toMatchObject({ status: 'confirmed' });
    expect(moved?.startsAt).not.toBe(visit.startsAt);
  });

  it('hears that something is not ready, and that it is', async () => {
    const plain = await browser.openPage({ size: 'phone', javaScript: false });
    await plain.goto(link);
    await plain.getByText('Todavía no estamos listos').click();
    await plain.getByLabel('La electricidad').check();
    await plain.getByRole('button', { name: 'Avisar al taller' }).click();
    await plain.getByText('Usted nos dijo').waitFor();
    await plain.getByRole('button', { name: 'Ya está listo' }).click();
    await plain.getByRole('button', { name: 'Sí, está bien' }).waitFor();
  });

  it('puts what is not clear before the scheduler, who answers by hand beside the thread', async () => {
    const customer = await browser.openPage({ size: 'phone' });
    await customer.goto(paths.demoPhoneOf({ number: phone }));
    await customer.getByLabel('Text back').fill('¿Muerde el perro?');
    await customer.getByRole('button', { name: 'Send' }).click();
    await customer.getByText('¿Muerde el perro?').waitFor();

    const page = await office();
    await page.goto(paths.messages());
    const line = page.getByRole('listitem').filter({ hasText: '¿Muerde el perro?' });
    await line.waitFor();
    await line.getByRole('link', { name: 'Lucía Soto' }).click();
    await page.getByRole('heading', { level: 1, name: 'Lucía Soto' }).waitFor();
    await settled(page);
    await page.getByLabel('Your words').fill('No — it’s a cat 😀');
    await page.getByText(/😀 \(U\+1F600\)/).waitFor();
    await page.getByLabel('Your words').fill('No — it’s a cat.');
    await page.getByText('1 message', { exact: true }).waitFor();
    await page.getByRole('button', { name: 'Send' }).click();
    await page.getByText('On its way').waitFor();
    await expectNoSeriousFault(page);
    await page
      .getByRole('button', { name: /^Seen to/ })
      .last()
      .click();
    await expect
      .poll(async () => {
        await customer.goto(paths.demoPhoneOf({ number: phone }));
        return customer.getByText("No - it's a cat.").count();
      })
      .toBe(1);
  });

  it('lets the owner write the words, and says at once what could not be sent', async () => {
    const page = await office();
    await page.goto(paths.wordings());
    await settled(page);
    const text = page.getByLabel('Text', { exact: true });
    await text.fill('{shop}: it’s {dya}');
    await page.getByText('There is no field {dya}', { exact: false }).first().waitFor();
    await expectNoSeriousFault(page);
    await text.fill('{shop}: we come {day}, {window}. {link}');
    await page.getByLabel('Preview').getByText('Exchange Cabinets: we come').waitFor();
    await page.getByRole('button', { name: 'Save' }).first().click();
    await page.getByRole('button', { name: 'Back to Setwell’s words' }).waitFor();
  });
});
