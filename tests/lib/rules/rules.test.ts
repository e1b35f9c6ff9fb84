import { describe, expect, it } from 'vitest';
import { ownRuleSet } from '@/lib/contracts/rule-sets';
import { checkRule } from '@/lib/measure';
import { copyRuleSet, withLimit } from '@/lib/measure/rules/copy-rule-set';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { limitAt } from '@/lib/measure/rules/rule-set';
import { PUBLISHED_RULE_SETS, ruleSetsOf } from '@/lib/measure/rules/rule-sets';
import { ruleChanges } from '@/lib/rules/rule-changes';

const rules = defaultShopRules('US');

describe('a shop’s own copy of a rule set', () => {
  it('judges as the published set does, until a figure is changed', () => {
    for (const set of PUBLISHED_RULE_SETS) {
      const copy = ownRuleSet.parse(copyRuleSet(set, 'own-1'));
      copy.rules.forEach((rule, at) => {
        for (const spanMm of [100, 1_000, 2_500, 6_000]) {
          const published = set.rules[at];
          expect(published && limitAt(published.limit, spanMm)).toBe(limitAt(rule.limit, spanMm));
        }
        expect(rule.source).toBe(set.rules[at]?.source);
      });
    }
  });

  it('says of a changed figure that it is the shop’s, and of the others who published them', () => {
    const [set] = PUBLISHED_RULE_SETS;
    if (!set) throw new Error('there is no set');
    const copy = withLimit(copyRuleSet(set, 'own-1'), 0, 4);
    expect(copy.rules[0]?.edition).toMatch(/^changed by the shop/);
    expect(copy.rules[0]?.address).toBe('');
    expect(copy.rules[1]).toEqual(copyRuleSet(set, 'own-1').rules[1]);
    const same = withLimit(
      copyRuleSet(set, 'own-1'),
      1,
      limitAt(set.rules[1]?.limit ?? { kind: 'constant', limitMm: 0 }, 1),
      0,
    );
    expect(same.rules[1]?.limit.kind).toBe(set.rules[1]?.limit.kind);
  });

  it('gives the verdict once it is picked, and leaves the rest to the shop’s own', () => {
    const set = PUBLISHED_RULE_SETS.find(({ id }) => id === 'nhbc-2020');
    if (!set) throw new Error('there is no such set');
    const at = set.rules.findIndex(({ check }) => check === 'wall-straightness');
    const own = withLimit(copyRuleSet(set, 'own-1'), at, 1);
    const fit = { ...rules.fit, ruleSet: 'own-1', ownRuleSets: [own] };
    const figure = { value: 2, U: 0.2, from: [] };
    const judgedBy = (fitRules: typeof fit) =>
      checkRule(ruleSetsOf(fitRules), 'wall-straightness', figure, 2_000).value;
    expect(judgedBy(fit)?.verdict).toBe('over');
    expect(judgedBy({ ...fit, ruleSet: 'nhbc-2020' })?.verdict).toBe('within');
    expect(ruleSetsOf(fit).map(({ id }) => id)).toEqual(['own-1', 'shop']);
  });
});

describe('a change of the shop’s rules, told', () => {
  it('names each rule with from, to and what it moves, in the shop’s unit', () => {
    const before = { name: 'Juniper Bend', zone: 'America/New_York', ...rules };
    const after = {
      zone: 'America/Denver',
      fit: { ...rules.fit, fillerMostMm: 50.8 },
      booking: { ...rules.booking, workdays: [1, 2, 3] },
    };
    expect(ruleChanges(before, after)).toEqual([
      {
        label: 'Time zone',
        affects: expect.any(String),
        from: 'America/New_York',
        to: 'America/Denver',
      },
      {
        label: 'Greatest filler',
        affects: 'when a run is loose',
        from: expect.any(String),
        to: expect.stringMatching(/^2( in|")?$/),
      },
      {
        label: 'Days worked',
        affects: 'times that are offered',
        from: 'Mon Tue Wed Thu Fri',
        to: 'Mon Tue Wed',
      },
    ]);
  });

  it('says nothing of what stays as it was', () => {
    expect(ruleChanges(rules, { fit: rules.fit, booking: { ...rules.booking } })).toEqual([]);
  });
});
