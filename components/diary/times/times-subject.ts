import type { VisitView, WaitingItem } from '@/lib/contracts/visits';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';

/** What a time is looked for: a job that waits, or a visit that shall have another. */
export type TimesSubject = {
  jobId: string;
  kind: VisitKind;
  customerName: string;
  street: string;
  town: string;
  jobTitle: string;
  jobNumber: number;
  /** What the customer wished for, or said. */
  says: string;
  openGates: WaitingItem['openGates'];
  visit: VisitView | null;
};

export const subjectOfItem = (item: WaitingItem): TimesSubject => ({
  jobId: item.jobId,
  kind: item.kind,
  customerName: item.customerName,
  street: item.street,
  town: item.town,
  jobTitle: item.jobTitle,
  jobNumber: item.jobNumber,
  says: item.wish,
  openGates: item.openGates,
  visit: null,
});

export const subjectOfVisit = (visit: VisitView): TimesSubject => ({
  jobId: visit.jobId,
  kind: visit.kind,
  customerName: visit.customerName,
  street: visit.street,
  town: visit.town,
  jobTitle: visit.jobTitle,
  jobNumber: visit.jobNumber,
  says: visit.customerSays,
  openGates: [],
  visit,
});

/** Example: "Install · Fenn, 3 Salt Row". */
export const subjectTitle = ({ kind, customerName, street }: TimesSubject): string =>
  `${visitKindWords[kind]} · ${customerName}, ${street}`;
