import { describe, expect, test } from 'vitest';
import { changeShopRulesInput, fitRules } from '@/lib/contracts/shop-rules';
import { actualWidths } from '@/lib/measure/actual-widths';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { sampleRun, sampleUnit } from './sample-runs';
import { bookOf } from './true-room';

const inches = fitRules.parse(defaultShopRules('US').fit);
const panel = sampleUnit(1, { kind: 'panel', widthMm: 19.05, sheets: 1 });
const box = sampleUnit(2, { widthMm: 762 });
const run = sampleRun(1, 0, { units: [panel, box, sampleUnit(3, { widthMm: 38.1, sheets: 2 })] });

describe('sheets as they really are', () => {
  test('nothing changes until a sheet was read', () => {
    expect(actualWidths([run], inches).runs).toEqual([run]);
  });

  test('a thin sheet takes its part from each width that stacks it, and nothing from a built box', () => {
    const { runs, problems } = actualWidths([run], { ...inches, sheetActualMm: 18.3 });
    expect(runs[0]?.units.map(({ widthMm }) => Math.round(widthMm * 100) / 100)).toEqual([
      18.3, 762, 36.6,
    ]);
    expect(problems).toEqual([]);
  });

  test('a sheet outside the published limits is said, with the units that stack it', () => {
    const { problems } = actualWidths([run], { ...inches, sheetActualMm: 17.4 });
    expect(problems).toMatchObject([
      { code: 'sheet-out-of-limits', about: [panel.id, run.units[2]?.id] },
    ]);
  });

  test('a run with a thinner panel has that much more slack', () => {
    const walls = [3_000, 2_000, 3_000, 2_000].map((lengthMm, i) => ({
      name: 'ABCD'.charAt(i),
      lengthMm,
      cornerDeg: 90,
      lean: 0,
      bowMm: 0,
    }));
    const book = bookOf({ closed: true, zRefMm: 910, floor: () => 0, walls }, {});
    const slack = (sheetActualMm: number | null) =>
      fitRoom(book, [run], { ...inches, sheetActualMm }).runs[0]?.fill?.slack.value ?? Number.NaN;
    expect(slack(18.3) - slack(null)).toBeCloseTo(3 * 0.75, 3);
  });

  test('a sheet that is far from its name is refused in the shop rules', () => {
    const parsed = changeShopRulesInput.safeParse({ fit: { ...inches, sheetActualMm: 12 } });
    expect(parsed.error?.issues[0]).toMatchObject({ path: ['fit', 'sheetActualMm'] });
  });
});
