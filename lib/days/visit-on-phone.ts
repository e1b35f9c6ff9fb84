import type { TodayVisit } from '@/lib/contracts/visits';
import { progressRank, statusAfter } from '@/lib/days/visit-progress';
import type { Queued, QueuedWork } from '@/lib/sync/queued';

type Standing = Pick<TodayVisit, 'id' | 'status' | 'arrivedAt' | 'leftAt'>;

/**
 * A visit with what its crew tapped, in order; the first time of a thing holds.
 * Example: booked, tapped "arrived" at 08:10 and "done" at 12:00: done, there from 08:10 to 12:00.
 */
export function visitAfter<Visit extends Standing>(
  visit: Visit,
  taps: readonly QueuedWork[],
): Visit {
  let after = visit;
  for (const work of taps) {
    if (work.kind !== 'report' || work.report.visitId !== visit.id) continue;
    const { what, at } = work.report;
    if (what === 'running-late') continue;
    const status = statusAfter[what];
    if (progressRank[status] <= progressRank[after.status]) continue;
    const arrivedAt = after.arrivedAt ?? (status === 'on-site' ? at : null);
    const leftAt = after.leftAt ?? (progressRank[status] === 3 ? at : null);
    after = { ...after, status, arrivedAt, leftAt };
  }
  return after;
}

/**
 * A visit as a page was drawn with it, or as the phone has kept it since: whichever has gone on further. A page
 * that stays open is not drawn anew when the office has taken a tap.
 */
export function furtherVisit<Visit extends Standing>(drawn: Visit, kept: Standing | null): Visit {
  if (!kept || progressRank[kept.status] <= progressRank[drawn.status]) return drawn;
  const { status, arrivedAt, leftAt } = kept;
  return {
    ...drawn,
    status,
    arrivedAt: drawn.arrivedAt ?? arrivedAt,
    leftAt: drawn.leftAt ?? leftAt,
  };
}

/** Taps that wait on this phone; one that the office refused is none. */
export function waitingWork(queue: readonly Queued[]): QueuedWork[] {
  return queue.flatMap(({ work, parked }) => (parked === null ? [work] : []));
}

/** Nothing more is done there. */
export const isOver = ({ status }: Pick<Standing, 'status'>): boolean => progressRank[status] >= 3;
