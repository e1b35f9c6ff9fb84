import type { FitRules } from '@/lib/contracts/shop-rules';
import type { CornerFit, Fit } from '@/lib/measure/fit';
import type { FitFigure, Share, Verdict } from '@/lib/measure/fit-figure';
import { COMMON_PRACTICE } from '@/lib/measure/rules/rule-set';
import { formatLength } from '@/lib/units/format-length';
import { type RuleBehind, ruleBehind } from './rule-behind';

/** One check of the room against a rule: what was read, what the rule allows, and whose rule it is. */
export type ProofRow = {
  key: string;
  /** "Corner A–B", "Wall B, plumb". */
  check: string;
  /** The figure that was judged; null where the words say it. */
  read: FitFigure | null;
  readWords: string;
  limitWords: string;
  verdict: Share;
  inDoubt: boolean;
  /** "DIN 18202:2019-07, table 2", or "common practice, no source". */
  rule: string;
  /** The same as one line that opens; null where no rule judged. */
  by: RuleBehind | null;
  action: string;
};

/**
 * What was proved on site: corners, walls, floor, runs, and whether the room closes; as they are walked.
 *
 * Edge: readings that nothing checks are in doubt; a corner that is true within the reading says so; what no rule judges is left out, but for corners,
 * which stand with their angle.
 */
export function proofRows(fit: Fit, rules: FitRules): ProofRow[] {
  return [
    ...fit.corners.flatMap((corner) => cornerRows(corner, rules)),
    ...fit.walls.flatMap(({ name, verdicts }) => rowsOf(verdicts, `Wall ${name}`, rules)),
    ...(fit.floor ? rowsOf(fit.floor.verdicts, 'Floor', rules) : []),
    ...fit.runs.flatMap(({ name, verdicts }) => rowsOf(verdicts, name, rules)),
    ...closureRow(fit),
  ];
}

function cornerRows(corner: CornerFit, rules: FitRules): ProofRow[] {
  const subject = `Corner ${corner.name}`;
  const readWords = corner.trueWithinReading ? 'true within the reading' : '';
  if (corner.verdicts.length > 0) {
    return rowsOf(corner.verdicts, subject, rules).map((row) => ({
      ...row,
      readWords: readWords || row.readWords,
    }));
  }
  if (!corner.angle) return [];
  return [
    {
      key: `corner ${corner.cornerWallId}`,
      check: subject,
      read: corner.angle,
      readWords,
      limitWords: '',
      verdict: 'within',
      inDoubt: false,
      rule: 'no rule of this shop judges it',
      by: null,
      action: '',
    },
  ];
}

function rowsOf(verdicts: readonly Verdict[], subject: string, rules: FitRules): ProofRow[] {
  return verdicts.map((verdict) => ({
    key: `${subject} ${verdict.check} ${verdict.value.from[0] ?? ''} ${verdict.value.value}`,
    check: `${subject}${checkWords(verdict.check)}`,
    read: verdict.value,
    readWords: justPastWords(verdict, rules),
    limitWords: limitWords(verdict, rules),
    verdict: verdict.verdict,
    inDoubt: verdict.inDoubt,
    rule: ruleWords(verdict),
    by: ruleBehind(verdict, rules),
    action: verdict.action,
  }));
}

/** On the shop's step a figure may look the same as the limit that it is past; nothing to say else. */
function justPastWords({ check, value, limitMm, verdict }: Verdict, rules: FitRules): string {
  const isSameOnStep = formatLength(Math.abs(value.value), rules) === formatLength(limitMm, rules);
  if (verdict !== 'over' || !isSameOnStep) return '';
  return check === 'aisle' ? 'just under the least' : 'just over the limit';
}

function limitWords({ limitMm, spanMm }: Verdict, { unit, stepMm }: FitRules): string {
  const length = (mm: number) => formatLength(mm, { unit, stepMm });
  return spanMm > 0 ? `${length(limitMm)} in ${length(spanMm)}` : length(limitMm);
}

/** Whose rule it is: name, edition, clause; or that it has no source. */
export function ruleWords({ rule, source, edition, clause }: Verdict): string {
  if (source === COMMON_PRACTICE) return `${rule}: ${source}`;
  return [...new Set([rule, source, edition, clause].filter(Boolean))].join(', ');
}

const subjects: [pattern: RegExp, words: string][] = [
  [/^ceiling-fall/, ', ceiling'],
  [/straightedge/, ', under a straightedge'],
  [/straight/, ', straight'],
  [/plumb|lean/, ', plumb'],
  [/flat/, ', flat'],
  [/fall|level/, ', level'],
  [/square|corner|offset/, ''],
];

function checkWords(check: string): string {
  return (
    subjects.find(([pattern]) => pattern.test(check))?.[1] ?? `, ${check.replaceAll('-', ' ')}`
  );
}

function closureRow({ closure }: Fit): ProofRow[] {
  const { adjustment } = closure;
  // A room of which nothing was read lies as drawn, and proves nothing.
  if (!adjustment || adjustment.observations.length === 0) return [];
  const { value, limit, passes, degreesOfFreedom } = adjustment.chiSquare;
  const [chain] = closure.chains.filter(({ relativePrecision }) => relativePrecision !== null);
  return [
    {
      key: 'room closes',
      check: 'The readings together',
      read: chain?.linear ?? null,
      readWords: chain?.relativePrecision
        ? `1 : ${Math.round(chain.relativePrecision).toLocaleString('en')}`
        : '',
      limitWords: `χ² ${value.toFixed(1)} of ${limit.toFixed(1)}`,
      verdict: passes && !closure.suspect ? 'within' : 'over',
      inDoubt: degreesOfFreedom <= 0,
      rule: 'least squares, global test at 1 %',
      by: {
        short: `Least squares, χ² test at 1 %: at most ${limit.toFixed(1)}`,
        details: [
          {
            label: 'Limit',
            words: `χ² of ${limit.toFixed(1)}: a true room passes it 1 time in 100`,
          },
          {
            label: 'Source',
            words: 'Global test of a least-squares adjustment, Baarda (1968), recalled',
          },
          { label: 'What to do', words: closure.words },
        ],
        address: '',
      },
      action: closure.words,
    },
  ];
}
