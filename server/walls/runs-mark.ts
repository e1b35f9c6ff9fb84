import { createHash } from 'node:crypto';
import type { Run } from '@/lib/contracts/runs';
import { sortedJson } from '@/lib/sync/sorted-json';

/** The same for the same runs: a screen sends it back to show what it saw. */
export function runsMark(runs: readonly Run[]): string {
  return createHash('sha256').update(sortedJson(runs)).digest('base64url').slice(0, 22);
}
