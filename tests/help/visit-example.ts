import type { VisitView } from '@/lib/contracts/visits';

/** A booked install as the diary gets it; its times are those of its pieces. */
export function visitExample(
  given: Pick<VisitView, 'id' | 'pieces'> & Partial<VisitView>,
): VisitView {
  const startsAt = given.pieces[0]?.startsAt ?? '2026-12-07T12:30:00.000Z';
  const endsAt = given.pieces.at(-1)?.endsAt ?? startsAt;
  return {
    version: 1,
    kind: 'install',
    status: 'booked',
    jobId: 'job',
    jobNumber: 1,
    jobTitle: 'Kitchen',
    customerName: 'Wilma Stroud',
    phone: '',
    street: '5 Quay Rise',
    town: 'Quayside',
    wayIn: '',
    crewId: 'north',
    crewName: 'Crew North',
    startsAt,
    endsAt,
    windowStartsAt: startsAt,
    windowEndsAt: startsAt,
    dayWords: '',
    windowWords: '',
    workMinutes: 480,
    customerSays: '',
    confirmedAt: null,
    expectedAt: null,
    arrivedAt: null,
    leftAt: null,
    ...given,
  };
}
