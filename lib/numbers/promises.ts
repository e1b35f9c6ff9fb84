import type { Figure } from '@/lib/contracts/numbers';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import type { VisitFact } from './facts';
import { splitBy } from './tally';

/** Share of the visits that came due whose customer had said yes before that day began, in the shop's zone. */
export function confirmedBefore(visits: readonly VisitFact[], zone: string): Figure {
  const lines = visits.map((visit) => {
    const on = localDate(visit.startsAt, zone);
    const isConfirmed =
      visit.confirmedAt !== null && visit.confirmedAt < fromLocal(on, '00:00', zone);
    return { visit, on, isConfirmed };
  });
  return {
    key: 'confirmed-before',
    unit: 'share',
    value: shareOf(lines.map(({ isConfirmed }) => isConfirmed)),
    outOf: lines.length,
    splits: splitBy(lines, ({ visit, isConfirmed }) => ({
      name: visitKindWords[visit.kind],
      value: isConfirmed ? 1 : 0,
      outOf: 1,
    })),
    lines: lines
      .filter(({ isConfirmed }) => !isConfirmed)
      .map(({ visit, on }) => ({
        ...jobOf(visit),
        on,
        words: `${visitKindWords[visit.kind]}: no yes before the day`,
        value: null,
      })),
    caution: null,
  };
}

/** Share of arrivals inside the promised window, its ends included. */
export function inTheWindow(visits: readonly VisitFact[], zone: string): Figure {
  const arrivals = visits.flatMap((visit) => {
    const { arrivedAt, windowStartsAt, windowEndsAt } = visit;
    if (!arrivedAt) return [];
    const lateMin = (arrivedAt.getTime() - windowEndsAt.getTime()) / 60_000;
    const earlyMin = (windowStartsAt.getTime() - arrivedAt.getTime()) / 60_000;
    return [{ visit, arrivedAt, lateMin, earlyMin, isIn: lateMin <= 0 && earlyMin <= 0 }];
  });
  return {
    key: 'in-the-window',
    unit: 'share',
    value: shareOf(arrivals.map(({ isIn }) => isIn)),
    outOf: arrivals.length,
    splits: splitBy(arrivals, ({ visit, isIn }) => ({
      name: visit.crewName,
      value: isIn ? 1 : 0,
      outOf: 1,
    })),
    lines: arrivals
      .filter(({ isIn }) => !isIn)
      .map(({ visit, arrivedAt, lateMin, earlyMin }) => ({
        ...jobOf(visit),
        on: localDate(arrivedAt, zone),
        words: `${visitKindWords[visit.kind]}, ${visit.crewName}: ${
          lateMin > 0 ? `${Math.round(lateMin)} min late` : `${Math.round(earlyMin)} min early`
        }`,
        value: null,
      })),
    caution: null,
  };
}

export const jobOf = ({ jobId, jobNumber }: { jobId: string; jobNumber: number }) => ({
  jobId,
  jobNumber,
});

function shareOf(answers: readonly boolean[]): number | null {
  return answers.length === 0 ? null : answers.filter(Boolean).length / answers.length;
}
