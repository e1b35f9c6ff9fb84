import type { Figure } from '@/lib/contracts/numbers';
import type { SnagKind } from '@/lib/contracts/snags';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { localDate } from '@/lib/time/local-moment';
import type { ShortReleaseFact, SnagFact, VisitFact } from './facts';
import { jobOf } from './promises';
import { splitBy } from './tally';

export const snagKindWords: Record<SnagKind, string> = {
  fault: 'a fault to mend',
  short: 'a part too short',
  damaged: 'a damaged part',
  'wrong-part': 'the wrong part',
};

/**
 * Trips that a job should not have needed: nobody home, measured again, or a return visit, each with why.
 *
 * @param visits those of the period
 * @param measuredBefore jobs with a site measure done before the period
 * @param snags of the same jobs, whenever found: the newest before the return says why it was made
 */
export function secondTrips(
  visits: readonly VisitFact[],
  known: { measuredBefore: ReadonlySet<string>; snags: readonly SnagFact[] },
  zone: string,
): Figure {
  const measured = new Set(known.measuredBefore);
  const inOrder = [...visits].sort((a, b) => a.startsAt.getTime() - b.startsAt.getTime());
  const trips = inOrder.flatMap((visit) => {
    const why = whyAgain(visit, measured, known.snags);
    if (visit.kind === 'site-measure' && visit.status === 'done') measured.add(visit.jobId);
    return why ? [{ visit, why }] : [];
  });
  return {
    key: 'second-trips',
    unit: 'count',
    value: trips.length,
    outOf: visits.filter(({ status }) => status === 'done' || status === 'missed').length,
    splits: splitBy(trips, ({ why }) => ({ name: why, value: 1 })),
    lines: trips.map(({ visit, why }) => ({
      ...jobOf(visit),
      on: localDate(visit.startsAt, zone),
      words: `${visitKindWords[visit.kind]}, ${visit.crewName}: ${why}`,
      value: null,
    })),
    caution: null,
  };
}

function whyAgain(
  visit: VisitFact,
  measured: ReadonlySet<string>,
  snags: readonly SnagFact[],
): string | null {
  if (visit.status === 'missed') return 'nobody home';
  if (visit.status !== 'done') return null;
  if (visit.kind === 'site-measure' && measured.has(visit.jobId)) return 'measured again';
  if (visit.kind !== 'return') return null;
  const newest = snags
    .filter(({ jobId, foundAt }) => jobId === visit.jobId && foundAt < visit.startsAt)
    .sort((a, b) => b.foundAt.getTime() - a.foundAt.getTime())[0];
  return newest ? snagKindWords[newest.kind] : 'no snag written down';
}

/** What the bench made too short: found on site, or released although the run came out short. */
export function shortFills(
  found: { snags: readonly SnagFact[]; releases: readonly ShortReleaseFact[] },
  zone: string,
): Figure {
  const onSite = found.snags.filter(({ kind }) => kind === 'short');
  return {
    key: 'short-fills',
    unit: 'count',
    value: onSite.length + found.releases.length,
    outOf: onSite.length + found.releases.length,
    splits: [
      { name: 'found short on site', value: onSite.length, outOf: null },
      { name: 'released short', value: found.releases.length, outOf: null },
    ],
    lines: [
      ...onSite.map((snag) => ({
        ...jobOf(snag),
        on: localDate(snag.foundAt, zone),
        words: `short on site${snag.place ? `: ${snag.place}` : ''}`,
        value: null,
      })),
      ...found.releases.map((release) => ({
        ...jobOf(release),
        on: localDate(release.releasedAt, zone),
        words: `${release.roomName}, revision ${release.revision}: released short`,
        value: null,
      })),
    ],
    caution: null,
  };
}
