import { describe, expect, it } from 'vitest';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { openPoints } from '@/lib/sheet/open-points';
import { proofRows } from '@/lib/sheet/proof-rows';
import { formatLength } from '@/lib/units/format-length';
import { crookedKitchen } from '../../help/crooked-kitchen';

const own = defaultShopRules('US').fit;
const proofOf = (options: Parameters<typeof crookedKitchen>[0], rules = own) => {
  const { wallBook, runs } = crookedKitchen(options);
  const fit = fitRoom(wallBook, runs, rules);
  return { fit, rows: proofRows(fit, rules), missing: whatIsMissing(wallBook, runs, rules) };
};

describe('proofRows', () => {
  it('has one row for each verdict of the fit, and one for the readings together', () => {
    const { fit, rows } = proofOf({});
    expect(rows).toHaveLength(fit.verdicts.length + 1);
    expect(new Set(rows.map(({ key }) => key)).size).toBe(rows.length);
    expect(rows.at(-1)).toMatchObject({ check: 'The readings together', verdict: 'within' });
  });

  it('names rule and source beside every verdict, and says when there is none', () => {
    for (const { rule } of proofOf({}).rows) expect(rule).not.toBe('');
    const published = proofOf({}, { ...own, ruleSet: 'din-18202' }).rows;
    expect(published.some(({ rule }) => rule.startsWith('DIN 18202'))).toBe(true);
    expect(published.find(({ rule }) => rule.includes('practice'))?.rule).toMatch(
      /common practice, no source/,
    );
  });

  it('says that the readings disagree when one is a slip', () => {
    expect(proofOf({ misreadMm: 25.4 }).rows.at(-1)).toMatchObject({ verdict: 'over' });
  });

  it('tells a corner that is true within the reading in those words', () => {
    const { rows } = proofOf({ crookedness: 0 });
    const corners = rows.filter(({ check }) => check.startsWith('Corner'));
    expect(corners).toHaveLength(4);
    expect(corners.some(({ readWords }) => readWords === 'true within the reading')).toBe(true);
  });

  it('never shows a figure as its limit and calls it over without saying so', () => {
    const { fit, rows } = proofOf({});
    const same = fit.verdicts.filter(
      ({ verdict, value, limitMm }) =>
        verdict === 'over' &&
        formatLength(Math.abs(value.value), own) === formatLength(limitMm, own),
    );
    expect(same.length).toBeGreaterThan(0);
    for (const { words } of same) expect(words).toContain('just over');
    expect(rows.filter(({ readWords }) => readWords === 'just over the limit')).toHaveLength(
      same.length,
    );
  });

  it('proves nothing of a room of which nothing was read', () => {
    const { wallBook, runs } = crookedKitchen();
    const empty = fitRoom({ ...wallBook, readings: [] }, runs, own);
    expect(proofRows(empty, own)).toEqual([]);
  });

  it('calls the fall of a ceiling by its name', () => {
    const { rows } = proofOf({}, { ...own, ruleSet: 'din-18202' });
    const named = (pattern: RegExp) => rows.filter(({ check }) => pattern.test(check)).length;
    expect(named(/, ceiling$/)).toBeGreaterThan(0);
    expect(named(/^(Sink wall|Tall wall|Floor), level$/)).toBeGreaterThan(0);
    expect(named(/^Uppers.*, level$/)).toBe(0);
  });
});

describe('openPoints', () => {
  it('names what is over, what is missing and the suspect, and nothing in a room nearly true', () => {
    const bad = proofOf({ misreadMm: 25.4 });
    const points = openPoints(bad.fit, bad.missing);
    expect(points.some((words) => words.startsWith('Not read: '))).toBe(true);
    expect(points.some((words) => /Wall C.*too long/.test(words))).toBe(true);
    expect(points.some((words) => /^Wall D, plumb/.test(words))).toBe(true);
    const good = proofOf({ crookedness: 0.1 });
    expect(openPoints(good.fit, [])).toEqual([]);
  });
});
