import type { ReactNode } from 'react';
import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import type { PadVerdict } from '@/lib/walls-pad/pad-verdict';
import { FractionWords } from './fraction-words';

export type PadSays =
  /** It cannot be: what to do. */
  | { kind: 'refused'; words: string }
  | PadVerdict
  /** Nothing typed yet: why it is asked for. */
  | { kind: 'why'; words: string };

const edges: Record<PadSays['kind'], string> = {
  refused: 'border-chalk',
  over: 'border-chalk',
  close: 'border-ochre',
  within: 'border-moss',
  note: 'border-rule',
  why: 'border-rule',
};
const marks: Partial<Record<PadSays['kind'], { kind: VerdictKind; word?: string }>> = {
  refused: { kind: 'problem', word: 'not kept' },
  over: { kind: 'over' },
  close: { kind: 'close' },
  within: { kind: 'within' },
};

type PadSaysBoxProps = {
  says: PadSays;
  /** Opens the rule that judged it. */
  onRule?: () => void;
  children?: ReactNode;
};

/** What the value means, at once, in a place that keeps its height so that no key moves under the thumb. */
export function PadSaysBox({ says, onRule, children }: PadSaysBoxProps) {
  const mark = marks[says.kind];
  const by = 'by' in says ? says.by : undefined;
  return (
    <div
      role="status"
      className={`mx-3.5 mt-1 flex min-h-[5.2rem] flex-col justify-center border-l-4 bg-tint px-2.5 py-1 text-note leading-[1.3] ${edges[says.kind]}`}
    >
      <p>
        {mark ? (
          <Verdict kind={mark.kind} className="mr-1.5 font-bold">
            {mark.word}
          </Verdict>
        ) : null}
        <FractionWords>{says.words}</FractionWords>
        {children}
      </p>
      {by ? (
        <button
          type="button"
          onClick={onRule}
          className="min-h-6 touch-manipulation self-start text-left text-graphite underline decoration-dotted underline-offset-2"
        >
          <FractionWords>{by.short}</FractionWords>
        </button>
      ) : null}
    </div>
  );
}
