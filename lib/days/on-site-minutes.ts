export type OnSite = {
  arrivedAt: string | null;
  leftAt: string | null;
  /** In any order. */
  pauses: readonly { what: 'pause' | 'go-on'; at: string }[];
};

/**
 * Minutes worked on site up to a moment: from arriving to leaving, less the pauses.
 *
 * Edge: a pause that nobody ended ends with the visit, or lasts until now; a second pause inside one, and
 * going on twice, change nothing; what lies before the arrival or after the leaving does not count.
 * Whole minutes, down. Example: 8:00 to 16:30 with a break from 12:00 to 12:30 is 480.
 */
export function onSiteMinutes({ arrivedAt, leftAt, pauses }: OnSite, nowMs: number): number {
  if (arrivedAt === null) return 0;
  const from = Date.parse(arrivedAt);
  const until = leftAt === null ? nowMs : Date.parse(leftAt);
  const marks = pauses
    .map(({ what, at }) => ({ what, atMs: Math.min(until, Math.max(from, Date.parse(at))) }))
    .sort((one, other) => one.atMs - other.atMs);
  let workedMs = 0;
  let runningFrom: number | null = from;
  for (const { what, atMs } of marks) {
    if (what === 'pause' && runningFrom !== null) {
      workedMs += atMs - runningFrom;
      runningFrom = null;
    } else if (what === 'go-on' && runningFrom === null) runningFrom = atMs;
  }
  if (runningFrom !== null) workedMs += until - runningFrom;
  return Math.max(0, Math.floor(workedMs / 60_000));
}

/** Whether work rests now: the last word was a pause. */
export function isPaused(pauses: OnSite['pauses']): boolean {
  const last = [...pauses].sort((one, other) => Date.parse(one.at) - Date.parse(other.at)).at(-1);
  return last?.what === 'pause';
}
