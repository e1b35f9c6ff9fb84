import { beforeAll, describe, expect, inject, it } from 'vitest';
import type { RoomRow } from '@/lib/contracts/jobs';
import type { WallBookView } from '@/lib/contracts/rooms';
import { apiPaths, paths } from '@/lib/paths';
import { getAt } from '../help/ask-at';
import { useBrowser } from '../help/browser';
import { pressNext, typeInches } from '../help/pad';

/** Two people of the demo's shop in one room of it, each without a signal. */
describe('two phones in one room', () => {
  const browser = useBrowser();
  const as = (role: 'owner' | 'measurer') => ({
    baseUrl: inject('baseUrl'),
    cookie: inject('sessions')[role],
  });
  let roomId = '';
  let book: WallBookView;
  beforeAll(async () => {
    const jobs = await getAt<{ id: string; stage: string }[]>(as('owner'), apiPaths.jobs());
    for (const { id } of jobs.filter(({ stage }) => stage === 'measured')) {
      const rooms = await getAt<RoomRow[]>(as('owner'), `${apiPaths.rooms()}?jobId=${id}`);
      roomId ||= rooms.find(({ revision }) => revision === null)?.id ?? '';
    }
    book = await getAt<WallBookView>(as('owner'), apiPaths.room(roomId));
  });

  it('keep both sets and show each the other’s reading with the name and the difference', async () => {
    const wall = book.wallBook.room.chains[0]?.walls[0];
    if (!wall) throw new Error('the room has no walls');
    const mayLog = [/ERR_INTERNET_DISCONNECTED/, /ERR_FAILED/];
    const phones = await Promise.all(
      (['measurer', 'owner'] as const).map(async (role) => {
        const context = await browser.openContext({ size: 'phone', as: role, mayLog });
        const page = await context.newPage();
        await page.goto(paths.today());
        await page.getByText('all sent · ready for no signal').waitFor();
        await page.goto(`${paths.walls(roomId)}#add/length/${wall.id}`);
        await page.getByRole('heading', { level: 1, name: `Wall ${wall.name}, length` }).waitFor();
        await context.setOffline(true);
        return { context, page };
      }),
    );
    const [mine, theirs] = phones;
    if (!mine || !theirs) throw new Error('two phones were opened');

    // At a height that nobody has read yet, so that the two stand beside each other alone.
    for (const [phone, inches] of [
      [mine, 140],
      [theirs, 141],
    ] as const) {
      await typeInches(phone.page, 70 * 25.4, 25.4 / 16);
      await pressNext(phone.page);
      await phone.page.locator('output[aria-label="length"]').waitFor();
      await typeInches(phone.page, inches * 25.4, 25.4 / 16);
      await pressNext(phone.page);
      await phone.page.getByText('saved here · 1, no signal').waitFor();
    }
    for (const { context, page } of [mine, theirs]) {
      await context.setOffline(false);
      await page.getByText(/^all sent/).waitFor({ timeout: 60_000 });
    }

    const { wallBook, readers } = await getAt<WallBookView>(as('owner'), apiPaths.room(roomId));
    const known = new Set(book.wallBook.readings.map(({ id }) => id));
    const added = wallBook.readings.filter(({ id }) => !known.has(id));
    expect(added.map((reading) => 'valueMm' in reading && reading.valueMm / 25.4)).toEqual([
      140, 141,
    ]);
    // Nothing that stood there was touched.
    expect(wallBook.readings.filter(({ id }) => known.has(id))).toEqual(book.wallBook.readings);
    const nameOf = (at: number) =>
      readers.find(({ readingIds }) => readingIds.includes(added[at]?.id ?? ''))?.name;

    for (const [phone, other, words] of [
      [mine, 1, '1" more'],
      [theirs, 0, '1" less'],
    ] as const) {
      await phone.page.reload();
      await phone.page.goto(`${paths.walls(roomId)}#wall/${wall.id}`);
      const line = phone.page.getByRole('link', { name: new RegExp(`${nameOf(other)} read`) });
      expect(await line.first().textContent()).toContain(words);
    }
    await mine.page.goto(`${paths.walls(roomId)}#leave`);
    await mine.page
      .getByText(new RegExp(`140".*\\(${nameOf(0)}\\).*141".*\\(${nameOf(1)}\\)`))
      .waitFor();
  });
});
