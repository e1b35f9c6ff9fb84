import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import type { RunVerdict as Word } from '@/lib/measure/run-fit';

const kinds: Record<Word, VerdictKind> = {
  fits: 'within',
  tight: 'close',
  loose: 'close',
  short: 'over',
};

/** How a run comes out: fits, tight, loose, short. */
export function RunVerdict({ verdict, className }: { verdict: Word; className?: string }) {
  return (
    <Verdict kind={kinds[verdict]} className={className}>
      {verdict}
    </Verdict>
  );
}
