import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { Verdict, type VerdictKind } from './verdict';

const edges: Record<VerdictKind, string> = {
  within: 'border-moss',
  close: 'border-ochre',
  over: 'border-chalk',
  confirmed: 'border-moss',
  waiting: 'border-ochre',
  problem: 'border-chalk',
  late: 'border-chalk',
  off: 'border-graphite',
};

type VerdictNoteProps = { kind: VerdictKind; word?: ReactNode; children: ReactNode };

/** A verdict with what it means, marked by a coloured edge: under a reading, beside a drawing. */
export function VerdictNote({ kind, word, children }: VerdictNoteProps) {
  return (
    <div className={classNames('border-l-4 bg-tint px-3 py-2 print:py-0.5', edges[kind])}>
      <Verdict kind={kind} className="mr-2 font-bold">
        {word}
      </Verdict>
      {children}
    </div>
  );
}
