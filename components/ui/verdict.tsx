import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { Glyph, type GlyphName } from './glyph';

export type VerdictKind = GlyphName;

const verdicts: Record<VerdictKind, { word: string; colour: string }> = {
  within: { word: 'within', colour: 'text-moss' },
  close: { word: 'close', colour: 'text-ochre' },
  over: { word: 'over', colour: 'text-chalk' },
  confirmed: { word: 'confirmed', colour: 'text-moss' },
  waiting: { word: 'no answer yet', colour: 'text-ochre' },
  problem: { word: 'problem', colour: 'text-chalk' },
  late: { word: 'late', colour: 'text-chalk' },
  off: { word: 'called off', colour: 'text-graphite' },
};

type VerdictProps = {
  kind: VerdictKind;
  /** In place of the usual word: "said yes Fri". */
  children?: ReactNode;
  className?: string;
};

/** How a thing stands: a glyph, a word and a colour that agree. */
export function Verdict({ kind, children, className }: VerdictProps) {
  const { word, colour } = verdicts[kind];
  return (
    <span
      className={classNames('inline-flex items-baseline gap-1.5 font-medium', colour, className)}
    >
      <Glyph name={kind} className="self-center" />
      <span>{children ?? word}</span>
    </span>
  );
}
