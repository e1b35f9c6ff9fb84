/** What a rule says of a figure: within, close or over, by which rule and source. */
import { type Outcome, problem, refused, warning } from '@/lib/problem';
import type { Figure } from './figure';
import { type CheckKind, limitAt, type Rule, type RuleSet } from './rules/rule-set';

export type RuleVerdict = {
  check: CheckKind;
  verdict: 'within' | 'close' | 'over';
  /** The figure's own U spans the limit. */
  inDoubt: boolean;
  /** Past the rule's second level as well. */
  serious: boolean;
  limitMm: number;
  /** The span over which the limit holds; 0 where it holds for any. */
  spanMm: number;
  rule: string;
  ruleSetId: string;
  source: string;
  edition: string;
  clause: string;
  address: string;
  /** What the shop does about it; the serious one where that is reached. */
  action: string;
};

/** From here a value is close to a limit it has not passed. */
const CLOSE_SHARE = 0.8;
/** A value this near a limit lies on it (MEASURE "The fit of a job": ties within 1e-6). */
const ON_LIMIT_MM = 1e-6;

/**
 * Judges the size of a figure over a span by the first of the rule sets that limits the check.
 *
 * over: value > limit (in doubt while value − U ≤ limit); close: value ≥ 80 % of the limit, or value + U >
 * limit; within: the rest. A rule of the sense 'least' (an aisle): over when value < limit, close when
 * value − U < limit.
 * Edge: sizes count, so a lean either way is judged alike. A rule read over its own straightedge
 * (`ruleFor(…).overMm`) is judged by that length, whatever span is given.
 * Example: 7.2 ± 0.6 (U) under a 2 m straightedge by NHBC 2020: limit 3, over, not in doubt.
 * Problems: `figure-unknown`; warning `no-limit` when no set limits the check (value null).
 * Source: the rule's own; the share of 80 % is common practice, no source.
 */
export function checkRule(
  ruleSets: readonly RuleSet[],
  check: CheckKind,
  value: Pick<Figure, 'value' | 'U' | 'from'>,
  spanMm: number,
): Outcome<RuleVerdict> {
  if (!Number.isFinite(value.value) || !Number.isFinite(value.U) || !(spanMm >= 0)) {
    const message = 'There is no figure to judge. Take the reading again.';
    return refused(problem('figure-unknown', message, value.from));
  }
  const found = ruleFor(ruleSets, check);
  if (!found) {
    const message = 'No rule limits this. Write one under Shop rules.';
    return { value: null, problems: [warning('no-limit', message, value.from)] };
  }
  const { ruleSet, rule } = found;
  const span = rule.overMm ?? spanMm;
  const limitMm = limitAt(rule.limit, span);
  const size = Math.abs(value.value);
  const serious = rule.serious !== undefined && isOver(size, rule.serious.limitMm, rule.sense);
  return {
    value: {
      check,
      verdict: verdictOf(size, value.U, limitMm, rule.sense),
      inDoubt: Math.abs(size - limitMm) < value.U,
      serious,
      limitMm,
      spanMm: rule.limit.kind === 'constant' && rule.overMm === null ? 0 : span,
      rule: ruleSet.name,
      ruleSetId: ruleSet.id,
      source: rule.source,
      edition: rule.edition,
      clause: rule.clause,
      address: rule.address,
      action: serious && rule.serious ? rule.serious.action : rule.action,
    },
    problems: [],
  };
}

/** The rule that will judge a check, and the set it stands in; null when none limits it. */
export function ruleFor(
  ruleSets: readonly RuleSet[],
  check: CheckKind,
): { ruleSet: RuleSet; rule: Rule } | null {
  for (const ruleSet of ruleSets) {
    const rule = ruleSet.rules.find((candidate) => candidate.check === check);
    if (rule) return { ruleSet, rule };
  }
  return null;
}

const isOver = (size: number, limit: number, sense: Rule['sense']) =>
  sense === 'most' ? size > limit + ON_LIMIT_MM : size < limit - ON_LIMIT_MM;

function verdictOf(size: number, U: number, limit: number, sense: Rule['sense']) {
  if (isOver(size, limit, sense)) return 'over';
  if (sense === 'least') return size - U < limit - ON_LIMIT_MM ? 'close' : 'within';
  const isClose = size >= CLOSE_SHARE * limit - ON_LIMIT_MM || size + U > limit + ON_LIMIT_MM;
  return isClose ? 'close' : 'within';
}
