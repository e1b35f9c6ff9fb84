import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Verdict } from '@/lib/measure/fit-figure';
import { COMMON_PRACTICE } from '@/lib/measure/rules/rule-set';
import type { RunFit } from '@/lib/measure/run-fit';
import { formatLength } from '@/lib/units/format-length';

/** The rule that a verdict was given by: one short line, and what stands behind it. */
export type RuleBehind = {
  /** "DIN 18202, table 2: at most 8 mm over 2400 mm". */
  short: string;
  details: { label: string; words: string }[];
  /** Where the source was read; empty for the shop's own. */
  address: string;
};

type Judged = Pick<
  Verdict,
  'check' | 'limitMm' | 'spanMm' | 'rule' | 'source' | 'edition' | 'clause' | 'address' | 'action'
>;
type Steps = Pick<FitRules, 'unit' | 'stepMm'>;

/**
 * Whose rule it is, where it stands, what it allows and over what length, in one line; edition, whole clause
 * and what to do about it behind that.
 *
 * Edge: a rule of the shop's own says that it has no published source. An aisle is "at least".
 * Example: NHBC 2020 on plumb over 2440 gives "NHBC Standards 2020, 9.1.3: at most 8 mm over 2440 mm".
 */
export function ruleBehind(judged: Judged, { unit, stepMm }: Steps): RuleBehind {
  const { check, limitMm, spanMm, rule, source, edition, clause, address, action } = judged;
  const length = (mm: number) => formatLength(mm, { unit, stepMm });
  const isOwn = source === COMMON_PRACTICE;
  const sense = check === 'aisle' ? 'at least' : 'at most';
  const over = spanMm > 0 ? ` over ${length(spanMm)}` : '';
  const place = isOwn ? 'common practice' : placeWords(clause);
  return {
    short: `${[rule, place].filter(Boolean).join(', ')}: ${sense} ${length(limitMm)}${over}`,
    details: [
      { label: 'Limit', words: `${sense} ${length(limitMm)}${over || ', whatever the length'}` },
      ...(isOwn
        ? [{ label: 'Source', words: 'Common practice, no published source; set in Shop rules.' }]
        : [
            { label: 'Source', words: [source, edition].filter(Boolean).join(', ') },
            { label: 'Clause', words: clause },
          ]),
      { label: 'What to do', words: action },
    ].filter(({ words }) => words !== ''),
    address,
  };
}

/** "table 3, row 6: finished walls and ceilings" stands as "table 3, row 6" in the short line. */
function placeWords(clause: string): string {
  return clause.split(/[:;]/)[0]?.trim() ?? '';
}

/**
 * What a run's own verdict (fits, tight, loose, short) is held against: the shop's least and greatest filler
 * at each end, and what it keeps clear of the wall.
 *
 * Example: "The shop’s own fillers: left 1 1/2\" to 3\", right 1 1/2\" to 3\"".
 */
export function fillRuleBehind(
  { left, right }: Pick<RunFit, 'left' | 'right'>,
  { unit, stepMm, gableClearanceMm, fillerPlane }: FitRules,
): RuleBehind {
  const length = (mm: number) => formatLength(mm, { unit, stepMm });
  const range = ({ leastMm, mostMm }: RunFit['left']) => `${length(leastMm)} to ${length(mostMm)}`;
  const plane = fillerPlane === 'door-front' ? 'the doors' : 'the boxes';
  return {
    short: `The shop’s own fillers: left ${range(left)}, right ${range(right)}`,
    details: [
      { label: 'Limit', words: `face width in the plane of ${plane}, least over the height` },
      { label: 'Clear', words: `${length(gableClearanceMm)} between a gable and the end wall` },
      { label: 'Source', words: 'Common practice, no published source; set in Shop rules.' },
    ],
    address: '',
  };
}
