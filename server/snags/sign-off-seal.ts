import type { PenStrokes, SignedSnag } from '@/lib/contracts/sign-offs';
import { sortedJson } from '@/lib/sync/sorted-json';
import { sealRecord } from '@/server/base/sealed-text';

/** Everything that was signed, and by whom it was taken; instants as texts, as the database gives them back. */
export type SealedParts = {
  shopId: string;
  id: string;
  jobId: string;
  visitId: string;
  name: string;
  language: 'en' | 'es';
  statement: string;
  strokes: PenStrokes;
  snags: SignedSnag[];
  signedAt: Date;
  takenBy: string;
  receivedAt: Date;
};

/** The seal of a sign-off: over every part of it, in one order. */
export function signOffSeal(parts: SealedParts): string {
  const { shopId, id, jobId, visitId, name, language, statement, strokes, snags, takenBy } = parts;
  return sealRecord(
    sortedJson({
      ...{ shopId, id, jobId, visitId, name, language, statement, strokes, snags, takenBy },
      signedAt: parts.signedAt.toISOString(),
      receivedAt: parts.receivedAt.toISOString(),
    }),
  );
}
