const FIRST_MS = 1_000;
const LONGEST_MS = 60_000;

/**
 * How long to wait after a number of failures in a row: doubled each time to a minute, spread by a
 * quarter either way so that a van full of phones does not knock at once.
 *
 * Edge: no failure, no wait. `spread` is from 0 to 1, by the caller's own chance.
 * Example: third failure, spread 0.5: 4000 ms.
 */
export function backOffMs(failures: number, spread: number): number {
  if (failures <= 0) return 0;
  const doubled = Math.min(LONGEST_MS, FIRST_MS * 2 ** Math.min(failures - 1, 16));
  return Math.round(doubled * (0.75 + spread / 2));
}
