import type { CrewSnag, SnagView } from '@/lib/contracts/snags';

/** A stop as the phone knows it, tapped over. */
export type StopSnags = Pick<
  CrewSnag,
  'visitId' | 'customerName' | 'street' | 'town' | 'nextOn'
> & {
  jobId: string;
  snags: readonly SnagView[];
};

type Told = {
  /** The office's last word across jobs. */
  told: readonly CrewSnag[];
  stops: readonly StopSnags[];
  /** Tapped as closed here and not yet with the office; their stops need not be kept. */
  closedIds: readonly string[];
  /** The phone's own day. */
  today: string;
};

/**
 * What a crew has to mend on all its jobs, as the phone knows it: the office's list, and over it every stop
 * that is kept here, with what was found and closed on site since. By due date, the undated last.
 *
 * Edge: two visits of one job bring a snag once; what one of its stops knows as closed is closed.
 * Example: the office tells of two, one of them was closed here, one found here: two, in order of due date.
 */
export function snagsToMend({ told, stops, closedIds, today }: Told): CrewSnag[] {
  const closed = new Set([
    ...closedIds,
    ...stops.flatMap(({ snags }) => snags.flatMap(({ id, closedAt }) => (closedAt ? [id] : []))),
  ]);
  const found = new Map<string, CrewSnag>();
  for (const { snags, jobId, ...stop } of stops) {
    for (const snag of snags) {
      if (snag.mender === 'crew' && !found.has(snag.id)) {
        found.set(snag.id, { ...snag, ...stop, jobId });
      }
    }
  }
  // The office knows which visit comes next.
  for (const snag of told) found.set(snag.id, snag);
  return [...found.values()]
    .filter(({ id }) => !closed.has(id))
    .map((snag) => ({ ...snag, isLate: snag.dueOn !== null && snag.dueOn < today }))
    .sort(byDue);
}

function byDue(one: CrewSnag, other: CrewSnag): number {
  // A tilde comes after every digit.
  const [due, otherDue] = [one.dueOn ?? '~', other.dueOn ?? '~'];
  if (due !== otherDue) return due < otherDue ? -1 : 1;
  return one.foundAt < other.foundAt ? -1 : one.foundAt > other.foundAt ? 1 : 0;
}
