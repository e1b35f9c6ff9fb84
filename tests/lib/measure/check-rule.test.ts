import { describe, expect, it } from 'vitest';
import { checkRule, ruleFor } from '@/lib/measure/check-rule';
import { figure } from '@/lib/measure/figure';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { nhbc2020 } from '@/lib/measure/rules/nhbc';
import type { CheckKind } from '@/lib/measure/rules/rule-set';
import { PUBLISHED_RULE_SETS, ruleSetsOf } from '@/lib/measure/rules/rule-sets';
import { sheetCorrection } from '@/lib/measure/sheet-correction';

const rules = defaultShopRules('UK').fit;
const shop = ruleSetsOf(rules);
const judge = (value: number, U: number, check: CheckKind = 'wall-plumb', span = 2_400) =>
  checkRule(shop, check, figure(value, U / 2, ['a']), span).value;

describe('judging a figure by a rule', () => {
  it.each([
    [6.1, 0, 'over', false],
    [6.1, 1, 'over', true],
    [6, 0, 'close', false],
    [4.8, 0, 'close', false],
    [4.7, 0, 'within', false],
    [4.7, 1.4, 'close', true],
    [-7, 0.5, 'over', false],
    [0, 0, 'within', false],
  ])('judges %d ± %d against 6 as %s', (value, U, verdict, inDoubt) => {
    expect(judge(value, U)).toMatchObject({ verdict, inDoubt, limitMm: 6, spanMm: 0 });
  });

  it('names the rule, its source and what to do, and steps up where it is serious', () => {
    expect(judge(14, 0)).toMatchObject({
      serious: true,
      rule: 'The shop’s own',
      source: 'common practice, no source',
      action: 'Show the customer; agree what the bench leaves long.',
    });
    expect(judge(8, 0)?.serious).toBe(false);
  });

  it('judges an aisle by its least', () => {
    expect(judge(990, 0, 'aisle')?.verdict).toBe('over');
    expect(judge(1_001, 4, 'aisle')).toMatchObject({ verdict: 'close', inDoubt: true });
    expect(judge(1_100, 4, 'aisle')?.verdict).toBe('within');
  });

  it('reads a published set over its own straightedge, and leaves the rest to the shop', () => {
    const sets = ruleSetsOf({ ...rules, ruleSet: 'nhbc-2020' });
    const wall = checkRule(sets, 'wall-straightness', figure(7.2, 0.3, []), 600).value;
    expect(wall).toMatchObject({
      verdict: 'over',
      inDoubt: false,
      limitMm: 3,
      spanMm: 2_000,
      edition: '2020',
      clause: '9.1.3',
    });
    expect(checkRule(sets, 'floor-fall', figure(5, 0.3, []), 3_000).value?.ruleSetId).toBe('shop');
  });

  it('scales the shop’s corner rule with the depth', () => {
    expect(judge(3, 0, 'corner-square', 300)?.limitMm).toBe(3);
    expect(judge(3, 0, 'corner-square', 600)?.limitMm).toBe(6);
  });

  it('says so when no set limits a check', () => {
    const { value, problems } = checkRule([nhbc2020], 'aisle', figure(900, 1, ['a']), 0);
    expect(value).toBeNull();
    expect(problems[0]).toMatchObject({ code: 'no-limit', severity: 'warning' });
  });

  it('refuses a figure that is none', () => {
    const { problems } = checkRule(shop, 'wall-plumb', figure(Number.NaN, 1, ['a']), 1_000);
    expect(problems[0]?.code).toBe('figure-unknown');
  });

  it('gives every published rule a source, an edition, a clause and an address', () => {
    const ids = new Set<string>();
    for (const { id, rules: published } of PUBLISHED_RULE_SETS) {
      expect(ids.has(id)).toBe(false);
      ids.add(id);
      for (const rule of published) {
        expect(rule.source).not.toBe('');
        expect(rule.edition).not.toBe('');
        expect(rule.clause).not.toBe('');
        expect(rule.address).toMatch(/^https?:\/\//);
        expect(rule.action).not.toBe('');
      }
    }
  });

  it('answers every check of a fit from the shop’s own set', () => {
    for (const check of [
      'wall-straightness',
      'wall-plumb',
      'corner-square',
      'floor-fall',
    ] as const) {
      expect(ruleFor(shop, check)?.ruleSet.id).toBe('shop');
    }
  });
});

describe('sheets that are not what they are called', () => {
  const actual = { value: 18.3, u: 0.05, from: ['caliper'] };

  it('corrects a size that stacks thicknesses, the error n-fold', () => {
    const { value, problems } = sheetCorrection({
      nominalMm: 19.05,
      actual,
      thicknesses: 3,
      standard: 'PS 1',
    });
    expect(value?.correction.value).toBeCloseTo(-2.25, 9);
    expect(value?.correction.u).toBeCloseTo(0.15, 9);
    expect(value?.stacked.value).toBeCloseTo(54.9, 9);
    expect(value?.limits?.source).toBe('PS 1');
    expect(problems).toEqual([]);
  });

  it('warns of a sheet outside the published limits, when the reading is sure of it', () => {
    const thin = { ...actual, value: 18.1 };
    const check = (u: number) =>
      sheetCorrection({
        nominalMm: 19.05,
        actual: { ...thin, u },
        thicknesses: 1,
        standard: 'PS 1',
      }).problems;
    expect(check(0.05)[0]?.code).toBe('sheet-out-of-limits');
    expect(check(0.2)).toEqual([]);
  });

  it('changes nothing for no thickness and refuses half of one', () => {
    const none = sheetCorrection({ nominalMm: 18, actual, thicknesses: 0 }).value;
    expect(none?.correction).toMatchObject({ value: 0, u: 0 });
    expect(sheetCorrection({ nominalMm: 18, actual, thicknesses: 0.5 }).value).toBeNull();
    expect(
      sheetCorrection({ nominalMm: 18, actual: { ...actual, value: Number.NaN }, thicknesses: 1 })
        .value,
    ).toBeNull();
  });
});
