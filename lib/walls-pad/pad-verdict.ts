import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Tool, WallBook } from '@/lib/contracts/wall-book';
import { checkRule } from '@/lib/measure/check-rule';
import type { CheckKind } from '@/lib/measure/rules/rule-set';
import { ruleSetsOf } from '@/lib/measure/rules/rule-sets';
import { standingReadings } from '@/lib/measure/standing-readings';
import { type RuleBehind, ruleBehind } from '@/lib/sheet/rule-behind';

/** What the pad says of a value at once. note: nothing to judge it by yet. */
export type PadVerdict = {
  kind: 'within' | 'close' | 'over' | 'note';
  words: string;
  /** The rule that judged it; absent where nothing but the readings themselves is compared. */
  by?: RuleBehind;
};

/** What a value is judged by. */
export type VerdictInput = { book: WallBook; runs: Run[]; rules: FitRules };

export type JudgeInput<R extends Reading> = VerdictInput & {
  reading: R;
  tool: Tool;
  /** Standing readings other than this one and the one it corrects. */
  others: Reading[];
};

/**
 * A size judged by the rule set that the shop has picked, else by the shop's own, as the fit judges it.
 *
 * Example: 7 mm ± 0.5 out of plumb over 2400 by NHBC 2020: close to 8 mm, "NHBC Standards 2020, 9.1.3 …".
 * Source: the rule's own; see `checkRule`.
 */
export function judgedBy(
  rules: FitRules,
  check: CheckKind,
  { value, U }: { value: number; U: number },
  spanMm: number,
): { kind: PadVerdict['kind']; by?: RuleBehind; serious: boolean } {
  const judged = checkRule(ruleSetsOf(rules), check, { value, U, from: [] }, spanMm).value;
  if (!judged) return { kind: 'note', serious: false };
  const { verdict, serious } = judged;
  return { kind: verdict, by: ruleBehind(judged, rules), serious };
}

const ranks: PadVerdict['kind'][] = ['note', 'within', 'close', 'over'];

/** Several verdicts of one value as one: the worst rules, all is said. */
export function worstOf(verdicts: PadVerdict[]): PadVerdict | null {
  const [first] = verdicts;
  if (!first) return null;
  const worst = verdicts.reduce((one, other) =>
    ranks.indexOf(other.kind) > ranks.indexOf(one.kind) ? other : one,
  );
  const words = [worst, ...verdicts.filter((each) => each !== worst)].map((each) => each.words);
  return { kind: worst.kind, words: words.join(' '), ...(worst.by ? { by: worst.by } : {}) };
}

/** What stands in the book besides this reading and the one it corrects. */
export function otherReadings(book: WallBook, reading: Reading): Reading[] {
  return standingReadings(book.readings).filter(
    ({ id }) => id !== reading.id && id !== reading.replaces,
  );
}
