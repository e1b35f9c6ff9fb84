import type { Opening } from '@/lib/contracts/openings';
import type { VisitView } from '@/lib/contracts/visits';
import type { TimesSubject } from './times-subject';

/** An opening as it would stand in the diary. It is drawn, and is nothing else: no id of it reaches the server. */
export function ghostVisit(subject: TimesSubject, opening: Opening): VisitView {
  return {
    id: 'ghost',
    version: 0,
    kind: subject.kind,
    status: 'held',
    jobId: subject.jobId,
    jobNumber: subject.jobNumber,
    jobTitle: subject.jobTitle,
    customerName: subject.customerName,
    phone: '',
    street: subject.street,
    town: subject.town,
    wayIn: '',
    crewId: opening.crewId,
    crewName: opening.crewName,
    startsAt: opening.startsAt,
    endsAt: opening.endsAt,
    windowStartsAt: opening.windowStartsAt,
    windowEndsAt: opening.windowEndsAt,
    dayWords: opening.dayWords,
    windowWords: opening.windowWords,
    workMinutes: opening.workMinutes,
    customerSays: '',
    confirmedAt: null,
    expectedAt: null,
    arrivedAt: null,
    leftAt: null,
    pieces: opening.pieces.map((piece, index) => ({ id: `ghost/${index}`, ...piece })),
  };
}
