import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Reading, Run, Tool, WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';

/** What the pad says of a value at once. note: nothing to judge it by yet. */
export type PadVerdict = { kind: 'within' | 'close' | 'over' | 'note'; words: string };

/** What a value is judged by. */
export type VerdictInput = { book: WallBook; runs: Run[]; rules: FitRules };

export type JudgeInput<R extends Reading> = VerdictInput & {
  reading: R;
  tool: Tool;
  /** Standing readings other than this one and the one it corrects. */
  others: Reading[];
};

/** `close` from this share of the limit on (MEASURE "Rules" in DEVELOPERS.md). */
const CLOSE_FROM = 0.8;

/**
 * A size against a limit: over past it, close from 80 % of it or where its U reaches past it.
 *
 * Example: 5 mm ± 0.5 against 6 mm is close; 4 ± 0.5 is within; 6.1 ± 0.5 is over.
 * Source: MEASURE "Rules"; common practice.
 */
export function judged(sizeMm: number, expandedMm: number, limitMm: number): PadVerdict['kind'] {
  if (sizeMm > limitMm) return 'over';
  return sizeMm >= CLOSE_FROM * limitMm || sizeMm + expandedMm > limitMm ? 'close' : 'within';
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
  return { kind: worst.kind, words: words.join(' ') };
}

/** What stands in the book besides this reading and the one it corrects. */
export function otherReadings(book: WallBook, reading: Reading): Reading[] {
  return standingReadings(book.readings).filter(
    ({ id }) => id !== reading.id && id !== reading.replaces,
  );
}
