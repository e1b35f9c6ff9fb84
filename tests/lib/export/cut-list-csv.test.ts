import { describe, expect, it } from 'vitest';
import { cutListColumns, cutListCsv } from '@/lib/export/cut-list-csv';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { crookedKitchen } from '../../help/crooked-kitchen';
import { releasedSheet } from '../../help/released-sheet';
import { readStrictCsv } from '../../help/strict-csv';

type Row = Record<(typeof cutListColumns)[number], string>;

function readBack(text: string): Row[] {
  const [columns = [], ...rows] = readStrictCsv(text.replace(/^\uFEFF/, ''));
  expect(columns).toEqual([...cutListColumns]);
  return rows.map((cells) => Object.fromEntries(columns.map((name, i) => [name, cells[i]])) as Row);
}

const sheet = releasedSheet();
const rows = readBack(cutListCsv(sheet));

describe('cutListCsv', () => {
  it('lists every filler with its end, its run and its blank in both units', () => {
    for (const run of sheet.fit.runs) {
      for (const end of ['left', 'right'] as const) {
        const { filler } = run[end];
        const row = rows.find(
          (one) => one.piece === 'Filler' && one.run === run.name && one.end === end,
        );
        if (!filler) {
          expect(row).toBeUndefined();
          continue;
        }
        expect(Number(row?.['blank mm'])).toBeCloseTo(filler.blank.value, 4);
        expect(Number(row?.['top or left mm'])).toBeCloseTo(filler.widths[0]?.width.value ?? 0, 4);
        expect(Number(row?.['plus or minus mm'])).toBeCloseTo(filler.blank.U, 4);
      }
    }
  });

  it('writes sizes as the shop does, a blank never smaller than its mm say', () => {
    const filler = rows.find(({ piece, run }) => piece === 'Filler' && run === 'Sink wall');
    expect(filler).toMatchObject({ blank: '2 9/16"', 'blank mm': '65.0875', work: 'blank' });
    const metric = releasedSheet({}, { rules: defaultShopRules('UK').fit });
    const inMm = readBack(cutListCsv(metric)).filter(({ work }) => work === 'blank');
    expect(inMm.length).toBeGreaterThan(0);
    for (const row of inMm) {
      expect(row.blank).toMatch(/^\d+(\.\d)? mm$/);
      expect(Number.parseFloat(row.blank)).toBeGreaterThanOrEqual(Number(row['blank mm']) - 1e-3);
    }
  });

  it('names job, room and revision in every row, and says whether it stands', () => {
    for (const row of rows) {
      expect(row).toMatchObject({ job: '2418', room: 'Kitchen', revision: 'B', state: 'stands' });
    }
    const older = readBack(cutListCsv(releasedSheet({ newerRevision: 'C' })));
    expect(new Set(older.map(({ state }) => state))).toEqual(new Set(['superseded by revision C']));
    const changed = readBack(cutListCsv(releasedSheet({ supersededBy: ['Read since: wall A'] })));
    expect(changed[0]?.state).toBe('superseded: the room has changed since');
  });

  it('gives the saw its angle in degrees and no mm', () => {
    const kitchen = crookedKitchen();
    const [sink, uppersLeft, uppersRight, tall] = kitchen.runs;
    if (!sink || !uppersLeft || !uppersRight || !tall) throw new Error('a run is missing');
    const wallB = kitchen.wallBook.room.chains[0]?.walls[1]?.id ?? '';
    const joined = {
      ...kitchen,
      runs: [
        { ...sink, right: { kind: 'run', runId: tall.id, through: 'this' } as const },
        {
          ...tall,
          wallId: wallB,
          left: { kind: 'run', runId: sink.id, through: 'other' } as const,
        },
      ],
    };
    const saw = readBack(cutListCsv(releasedSheet({}, { kitchen: joined }))).filter(
      ({ work }) => work === 'saw',
    );
    expect(saw).toHaveLength(1);
    expect(saw[0]?.blank).toMatch(/^\d+\.\d°$/);
    expect(saw[0]?.['blank mm']).toBe('');
    expect(Number(saw[0]?.['saw deg'])).toBeGreaterThan(0);
  });

  it('does not let a run’s name become a formula', () => {
    const kitchen = crookedKitchen();
    const runs = kitchen.runs.map((run) => ({ ...run, name: '=HYPERLINK("http://evil.example")' }));
    const named = readBack(cutListCsv(releasedSheet({}, { kitchen: { ...kitchen, runs } })));
    expect(named[0]?.run).toBe(`'=HYPERLINK("http://evil.example")`);
  });
});
