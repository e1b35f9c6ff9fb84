/** Every rule set the shop can pick. */
import type { FitRules } from '@/lib/contracts/shop-rules';
import { awi0620Custom, awi0620Economy, awi0620Premium } from './awi-0620';
import { bs8204Sr1, bs8204Sr2, bs8204Sr3 } from './bs-8204';
import { din18202, din18202Higher } from './din-18202';
import { nhbc2019, nhbc2020 } from './nhbc';
import type { RuleSet } from './rule-set';
import { shopRuleSet } from './shop-own';
import { usResidential } from './us-residential';

/** Published sets, as the Shop rules screen lists them; the shop's copies and `shop` stand beside them. */
export const PUBLISHED_RULE_SETS: readonly RuleSet[] = [
  usResidential,
  awi0620Premium,
  awi0620Custom,
  awi0620Economy,
  nhbc2020,
  nhbc2019,
  bs8204Sr1,
  bs8204Sr2,
  bs8204Sr3,
  din18202,
  din18202Higher,
];

/**
 * The rule sets that judge a shop's fits, in the order they are asked: the one picked, then the shop's
 * own for what that one does not limit.
 *
 * Edge: an unknown id leaves the shop's own alone. Example: ruleSet 'nhbc-2020' → [NHBC 2020, shop's own].
 */
export function ruleSetsOf(rules: FitRules): RuleSet[] {
  const all: readonly RuleSet[] = [...PUBLISHED_RULE_SETS, ...(rules.ownRuleSets ?? [])];
  const picked = all.filter(({ id }) => id === rules.ruleSet);
  return [...picked, shopRuleSet(rules)];
}
