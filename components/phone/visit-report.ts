import type { ReportVisitInput, TodayVisit, VisitStatus } from '@/lib/contracts/visits';
import type { Queued } from '@/lib/sync/queued';

export type VisitTap = ReportVisitInput['what'];

/** Running late leaves the visit where it stands. */
const statusAfter: Partial<Record<VisitTap, VisitStatus>> = {
  'on-the-way': 'on-the-way',
  arrived: 'on-site',
  done: 'done',
  'nobody-home': 'missed',
};

/** How a visit stands with the taps that are still on this phone. */
export function statusOnPhone(visit: TodayVisit, queue: readonly Queued[]): VisitStatus {
  const taps = queue.flatMap(({ work, parked }) =>
    parked === null && work.kind === 'report' && work.report.visitId === visit.id
      ? [statusAfter[work.report.what] ?? []].flat()
      : [],
  );
  return taps.at(-1) ?? visit.status;
}

/** When they came and left, by the office and by the taps that are still on this phone. */
export function arrivalOnPhone(visit: TodayVisit, queue: readonly Queued[]) {
  const tappedAt = (...whats: VisitTap[]) =>
    queue.flatMap(({ work, parked }) =>
      parked === null &&
      work.kind === 'report' &&
      work.report.visitId === visit.id &&
      whats.includes(work.report.what)
        ? [work.report.at]
        : [],
    )[0] ?? null;
  return {
    arrivedAt: visit.arrivedAt ?? tappedAt('arrived'),
    leftAt: visit.leftAt ?? tappedAt('done', 'nobody-home'),
  };
}

/** What can be tapped next, the likeliest first. */
export function tapsFrom(status: VisitStatus): VisitTap[] {
  switch (status) {
    case 'held':
    case 'booked':
    case 'confirmed':
      return ['on-the-way', 'arrived', 'running-late'];
    case 'on-the-way':
      return ['arrived', 'running-late', 'nobody-home'];
    case 'on-site':
      return ['done', 'nobody-home'];
    case 'done':
    case 'missed':
    case 'called-off':
      return [];
  }
}
