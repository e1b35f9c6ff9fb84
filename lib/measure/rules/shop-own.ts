/** The shop's own rule set, made from its shop rules. */
import type { FitRules } from '@/lib/contracts/shop-rules';
import { COMMON_PRACTICE, type Rule, type RuleSet } from './rule-set';

const constant = (limitMm: number) => ({ kind: 'constant', limitMm }) as const;

/**
 * The shop's own limits as a rule set; every one is marked as the shop's, without a published source.
 *
 * Edge: it answers every check that a fit asks for, so that a published set may leave any to it.
 * Example: `shopRuleSet(defaultShopRules('UK').fit)` limits a wall to 6 mm out of plumb, 13 is serious.
 */
export function shopRuleSet(rules: FitRules): RuleSet {
  const own = (
    check: Rule['check'],
    limit: Rule['limit'],
    action: string,
    serious?: Rule['serious'],
  ): Rule => ({
    check,
    limit,
    overMm: null,
    sense: 'most',
    ...(serious ? { serious } : {}),
    source: COMMON_PRACTICE,
    edition: 'the shop’s own rules',
    clause: '',
    address: '',
    action,
  });
  const wall = {
    limitMm: rules.plumbSeriousMm,
    action: 'Show the customer; agree what the bench leaves long.',
  };
  const floor = {
    limitMm: rules.floorFallDecisionMm,
    action: 'Needs a decision, told to the customer.',
  };
  return {
    id: 'shop',
    name: 'The shop’s own',
    region: 'any',
    rules: [
      own('wall-straightness', constant(rules.plumbFlagMm), 'Allow for it in the scribe.', wall),
      own(
        'wall-plumb',
        constant(rules.plumbFlagMm),
        'Taper the filler; check the tall units.',
        wall,
      ),
      own(
        'corner-square',
        { kind: 'proportional', limitMm: rules.cornerFlagMm, perMm: rules.cornerFlagOverMm },
        'Check the filler and the counter at this corner.',
      ),
      own('floor-fall', constant(rules.floorFallFlagMm), 'Check the legs at both ends.', floor),
      own('floor-straightness', constant(rules.floorFallFlagMm), 'Check the legs between.', floor),
      own('ceiling-fall', constant(rules.plumbSeriousMm), 'Ask how the top is to be closed.'),
      own(
        'ceiling-straightness',
        constant(rules.plumbSeriousMm),
        'Ask how the top is to be closed.',
      ),
      own('gap-at-wall', constant(rules.wallGapAimMm), 'Scribe closer.', {
        limitMm: rules.wallGapRejectMm,
        action: 'Not accepted: refit.',
      }),
      own('pieces-against-whole', constant(rules.piecesAskMm), 'Measure the pieces again.', {
        limitMm: rules.piecesRefuseMm,
        action: 'No release until the pieces add up.',
      }),
      {
        ...own('aisle', constant(rules.aisleLeastMm), 'Move it, or agree a narrower aisle.'),
        sense: 'least',
      },
    ],
  };
}
