/** A signal that is there answers well within this. */
const USUAL_MS = 3_000;
/** After a page has not come, the next is not waited for as long again. */
const SHORT_MS = 900;
const REMEMBERED_MS = 45_000;

/**
 * How long a page is waited for before the phone shows what it keeps: each tap in a dead spot would
 * otherwise cost the whole of it.
 *
 * Example: nothing has failed: 3000 ms; a page did not come 10 s ago: 900 ms.
 */
export function pagePatienceMs(failedAtMs: number | null, nowMs: number): number {
  const isFresh = failedAtMs !== null && nowMs - failedAtMs < REMEMBERED_MS;
  return isFresh ? SHORT_MS : USUAL_MS;
}
