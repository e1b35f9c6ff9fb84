import type { Verdict } from '@/lib/measure/fit-figure';
import type { Tone } from './shape';

/** The colour of the worst of some verdicts; quiet where nothing was judged. */
export function worstTone(verdicts: readonly Verdict[]): Tone {
  if (verdicts.some(({ verdict }) => verdict === 'over')) return 'over';
  if (verdicts.some(({ verdict }) => verdict === 'close')) return 'close';
  return verdicts.length > 0 ? 'within' : 'quiet';
}
