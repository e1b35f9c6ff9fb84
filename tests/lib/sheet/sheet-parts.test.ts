import { describe, expect, it } from 'vitest';
import { run as runSchema } from '@/lib/contracts/runs';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { isOldHouse } from '@/lib/measure/rules/old-house';
import { cautionsFor } from '@/lib/sheet/cautions';
import { linesOfWall } from '@/lib/sheet/lines-of-wall';
import { alterableAbout, newRun, newUnit } from '@/lib/sheet/new-run';
import { readingLines } from '@/lib/sheet/reading-lines';
import { readingWords } from '@/lib/sheet/reading-words';
import { withWidths } from '@/lib/sheet/with-widths';
import { countedIds, crookedKitchen } from '../../help/crooked-kitchen';

const { wallBook, runs } = crookedKitchen();
const rules = defaultShopRules('US').fit;
const newId = countedIds(70_000);
const [wallA, wallB] = wallBook.room.chains[0]?.walls ?? [];
if (!wallA || !wallB) throw new Error('the kitchen is not whole');

describe('readingWords', () => {
  it('puts every kind of reading in words of the shop’s unit', () => {
    const kinds = new Map(wallBook.readings.map((reading) => [reading.kind, reading]));
    const words = [...kinds.values()].map(
      (reading) => readingWords(reading, wallBook.room, 'in').what,
    );
    expect(words).toEqual([
      'Wall D, length at 90"',
      'Corner C–D at 4"',
      'Diagonal from corner A–B to corner C–D at 36"',
      'Wall D, face at 114 11/64" along, 84" up',
      'Floor by wall D, 98 27/64" along, 22 3/64" out',
      'Ceiling by wall D, 98 27/64" along, 63/64" out',
      'Wall A, drain',
      'Wall A, stud',
      'Way in: back door',
    ]);
    for (const reading of wallBook.readings) {
      expect(readingWords(reading, wallBook.room, 'mm').came).not.toMatch(/NaN|undefined/);
    }
  });

  it('keeps a reading whose wall is no longer drawn', () => {
    const [first] = wallBook.readings;
    if (!first) throw new Error('nothing was read');
    const bare = { ...wallBook.room, chains: [] };
    expect(readingWords(first, bare, 'in').what).toMatch(/^A wall no longer drawn/);
  });
});

describe('linesOfWall', () => {
  it('gives a wall its own readings and both of its corners', () => {
    const lines = linesOfWall(readingLines(wallBook, {}, 'in'), wallBook, wallA.id);
    const corners = lines.filter(({ what }) => what.startsWith('Corner')).map(({ what }) => what);
    expect(corners).toEqual([
      'Corner D–A at 36"',
      'Corner D–A at 4"',
      'Corner A–B at 36"',
      'Corner A–B at 4"',
    ]);
    expect(lines.some(({ what }) => what.startsWith('Wall B'))).toBe(false);
  });
});

describe('newRun', () => {
  it.each(['US', 'UK', 'AU', 'EU'] as const)(
    'begins with a run that %s rules can keep',
    (region) => {
      const fit = defaultShopRules(region).fit;
      for (const level of ['base', 'wall', 'tall'] as const) {
        const made = newRun(fit, { id: newId(), wallId: wallA.id, name: 'New', level });
        expect(
          runSchema.parse({ ...made, units: [newUnit(fit, { id: newId(), kind: 'base' })] }),
        ).toBeTruthy();
        expect(made.z1Mm).toBeGreaterThan(made.z0Mm);
      }
    },
  );

  it('lets a unit be built six inches either way, never under six', () => {
    expect(alterableAbout(914.4, rules)).toEqual({ minMm: 762, maxMm: 1066.8, stepMm: 76.2 });
    expect(alterableAbout(200, rules).minMm).toBe(152.4);
  });
});

describe('withWidths', () => {
  it('changes the widths named and nothing else', () => {
    const [sinkWall] = runs;
    const [drawers, sink] = sinkWall?.units ?? [];
    if (!sinkWall || !drawers || !sink) throw new Error('the kitchen is not whole');
    const changed = withWidths(sinkWall, {
      changes: [{ unitId: sink.id, fromMm: 914.4, toMm: 838.2 }],
    });
    expect(changed.units.map(({ widthMm }) => widthMm)).toEqual(
      sinkWall.units.map(({ id, widthMm }) => (id === sink.id ? 838.2 : widthMm)),
    );
    expect(sink.widthMm).toBeCloseTo(914.4);
  });
});

describe('cautionsFor', () => {
  it('says what belongs to the units and the house, the local codes last', () => {
    const all = cautionsFor({ runs, readings: wallBook.readings, isOldHouse: true });
    expect(all[0]).toMatch(/studs or backing/);
    expect(all.some((words) => words.startsWith('Tall units'))).toBe(true);
    expect(all.some((words) => words.includes('licensed trade'))).toBe(true);
    expect(all.some((words) => words.includes('lead paint or asbestos'))).toBe(true);
    expect(all.at(-1)).toBe('Local codes and the maker’s instructions come first.');
  });

  it('leaves out what the sheet has no part in', () => {
    const few = cautionsFor({ runs: runs.slice(0, 1), readings: [], isOldHouse: false });
    expect(few.join(' ')).not.toMatch(/studs|Tall units|licensed|lead paint/);
  });
});

describe('isOldHouse', () => {
  it.each([
    [1977, 'US', true],
    [1978, 'US', false],
    [1999, 'UK', true],
    [2000, 'EU', false],
    [null, 'AU', true],
  ] as const)('takes a house of %s in %s as old: %s', (year, region, isOld) => {
    expect(isOldHouse(year, region)).toBe(isOld);
  });
});
