import { beforeAll, describe, expect, it } from 'vitest';
import type { SheetView } from '@/lib/contracts/rooms';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { cautionsFor } from '@/lib/sheet/cautions';
import { cutList } from '@/lib/sheet/cut-list';
import { figureText } from '@/lib/sheet/figure-text';
import { proofRows } from '@/lib/sheet/proof-rows';
import { sheetPdf } from '@/server/sheets/sheet-pdf';
import { crookedKitchen } from '../help/crooked-kitchen';
import { readPdf } from '../help/read-pdf';
import { releasedSheet } from '../help/released-sheet';

const print = {
  size: 'letter',
  releasedOn: 'Tue, Dec 1, 2026',
  printedAt: 'Wed, Dec 2, 2026, 8:10 AM',
  printedOn: new Date('2026-12-02T13:10:00Z'),
} as const;

async function printed(sheet: SheetView, size: 'letter' | 'A4' = 'letter') {
  return readPdf(await sheetPdf(sheet, { ...print, size }));
}

describe('sheetPdf', () => {
  const sheet = releasedSheet({ overrideReason: 'customer agreed on the phone' });
  let pages: string[];
  let title: string;
  beforeAll(async () => {
    ({ pages, title } = await printed(sheet));
  });

  it('takes no page more when it is superseded, however much has changed since', async () => {
    const changes = Array.from(
      { length: 14 },
      (_, index) => `Wall A, stud ${index + 1}: taken back`,
    );
    const { pages: after } = await printed({ ...sheet, newerRevision: 'C', supersededBy: changes });
    expect(after).toHaveLength(pages.length);
    expect(after[0]).toContain('and 9 more');
    for (const page of after) expect(page).toContain('Superseded by revision C');
  });

  it('strikes in the cut list what stood there on the revision before', async () => {
    const [row] = cutList(sheet.fit, sheet.runs, 'US');
    if (!row) throw new Error('nothing is cut');
    const { key, runId, wallId } = row;
    const marks = [{ on: 'cut', key, runId, wallId, was: '9 7/8"' } as const];
    const { pages: revised } = await printed({ ...sheet, revised: { revision: 'B', marks } });
    expect(revised.join(' ')).toMatch(/rev B, was/);
    expect(pages.join(' ')).not.toMatch(/rev B, was/);
  });

  it('names shop, job, room, revision, dates and what changed on the first page', () => {
    expect(title).toBe('2418 Kitchen, revision B');
    for (const words of [
      'Juniper Bend',
      'job 2418',
      'Robin Testwood',
      'Kitchen: plan',
      'Ines Testwell',
      'Tue, Dec 1, 2026',
      'Wed, Dec 2, 2026, 8:10 AM',
      'Sink wall: sink 36" is now 33"',
      'customer agreed on the phone',
      'leaf 1 of',
    ]) {
      expect(pages[0]).toContain(words);
    }
  });

  it('carries the title block and the revision on every page', async () => {
    expect(pages.length).toBeGreaterThanOrEqual(5);
    pages.forEach((page, index) => {
      expect(page).toContain(`leaf ${index + 1} of ${pages.length}`);
      expect(page).toMatch(/revision .*\bB\b/);
    });
  });

  it('lists every piece with its cut as the shop writes it', async () => {
    const list = pages.find((page) => page.includes('cut list and toe kick heights')) ?? '';
    for (const row of cutList(sheet.fit, sheet.runs, 'US')) {
      expect(list).toContain(row.piece);
      expect(list).toContain(figureText(row.cut, sheet.rules).value);
    }
    expect(list).toContain('2 9/16"');
  });

  it('gives the kick heights of each unit at its four corners', async () => {
    const all = pages.join(' ');
    for (const run of sheet.fit.runs) {
      if (!run.kicks) continue;
      expect(all).toContain(`Toe kick heights, ${run.name}`);
      for (const { height } of run.kicks.corners) {
        expect(all).toContain(figureText(height, sheet.rules).value);
      }
    }
  });

  it('draws a page for each wall with runs, to a scale that it names', async () => {
    const walls = pages.filter((page) => /Wall [AC]: /.test(page));
    expect(walls).toHaveLength(2);
    for (const page of walls) {
      expect(page).toContain('to the foot (1:');
      expect(page).toContain('out-of-true drawn');
    }
    expect(walls[0]).toContain('Largest plumb block');
    expect(walls[0]).toContain('dishwasher');
  });

  it('names rule and source behind each verdict', async () => {
    const proof = pages.filter((page) => page.includes('proved on site')).join(' ');
    const rows = proofRows(sheet.fit, sheet.rules);
    expect(rows.length).toBeGreaterThan(10);
    for (const { check, rule, verdict } of rows) {
      expect(proof).toContain(check);
      expect(proof).toContain(rule);
      if (check !== 'The readings together') expect(proof).toContain(verdict);
    }
  });

  it('ends the first page with the cautions that belong to this room', async () => {
    const { runs, wallBook, isOldHouse } = sheet;
    const all = pages.join(' ');
    for (const caution of cautionsFor({ runs, readings: wallBook.readings, isOldHouse })) {
      expect(all).toContain(caution);
    }
  });

  it('says on every page that it is superseded, and by which revision, only when it is', async () => {
    expect(pages.some((page) => /superseded/i.test(page))).toBe(false);
    const older = await printed(releasedSheet({ newerRevision: 'C' }));
    for (const page of older.pages) {
      expect(page).toContain('Superseded by revision C. Do not cut from revision B.');
    }
    const changed = await printed(releasedSheet({ supersededBy: ['Read since: wall A, 141"'] }));
    expect(changed.pages[0]).toContain('Superseded: the room has changed since.');
    expect(changed.pages[0]).toContain('Read since: wall A, 141"');
  });

  it('prints on letter or on A4, on its side, with letters of its own', async () => {
    const letter = await printed(sheet);
    expect(new Set(letter.sizes.map(String))).toEqual(new Set(['792,612']));
    const metric = releasedSheet({}, { rules: defaultShopRules('UK').fit });
    const a4 = await printed(metric, 'A4');
    expect(new Set(a4.sizes.map(String))).toEqual(new Set(['841.89,595.28']));
    expect(a4.pages.some((page) => page.includes('· 1:25 ·'))).toBe(true);
    expect(letter.fonts.length).toBeGreaterThan(0);
    expect(letter.fonts.every((name) => /\+WorkSans/.test(name))).toBe(true);
  });

  it('prints the letters of Europe and Viet Nam, and a question mark for what it has not', async () => {
    const { pages: abroad } = await printed(
      releasedSheet({ customerName: 'Łukasz Žižić', shopName: 'Đặng & Søn', street: '台所 5' }),
    );
    expect(abroad[0]).toContain('Łukasz Žižić');
    expect(abroad[0]).toContain('Đặng & Søn');
    expect(abroad[0]).toContain('?? 5');
  });

  it('goes on to another page where a list is long, and loses no line', async () => {
    const changes = Array.from({ length: 90 }, (_, index) => `Change number ${index + 1} of many`);
    const { release } = sheet;
    const long = await printed(releasedSheet({ release: { ...release, changes } }));
    const all = long.pages.join(' ');
    for (const words of changes) expect(all).toContain(words);
    expect(all).toContain('Changed since the revision before, continued');
  });

  it('is made before anything is read, and says what is not known', async () => {
    const { wallBook, runs } = crookedKitchen();
    const rules = defaultShopRules('US').fit;
    const unread = { ...wallBook, readings: [] };
    const bare = releasedSheet({
      wallBook: unread,
      runs,
      fit: fitRoom(unread, runs, rules),
    });
    const unknown = await printed(bare);
    expect(unknown.pages[0]).toContain('not read A');
    expect(unknown.pages[0]).toContain('Sink wall: not filled, too little is read.');
    expect(unknown.pages.join(' ')).toContain('Nothing to cut.');
  });
});
