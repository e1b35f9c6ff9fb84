import type { SnagKind, SnagMender } from '@/lib/contracts/snags';

/** For the job's story and for paper; the screens have their own, in the reader's language. */
export const snagKindWords: Record<SnagKind, string> = {
  fault: 'Snag',
  short: 'Part short',
  damaged: 'Part damaged',
  'wrong-part': 'Wrong part',
};

export const snagMenderWords: Record<SnagMender, string> = {
  crew: 'crew',
  bench: 'bench',
  supplier: 'supplier',
  'other-trade': 'another trade',
  customer: 'customer',
};
