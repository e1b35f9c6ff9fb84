/** What is known of a job when a visit is to be booked, and what a gate answers. */
import type { LocalDate } from '@/lib/time/civil';
import type { TextLocale } from '@/lib/time/text-locale';
import type { WorkingDays } from '@/lib/time/workdays';
import type { VisitKind } from './visit-kind';

export const gateKeys = [
  'site-ready',
  'walls-closed',
  'access-given',
  'customer-ready',
  'measured',
  'released',
  'cabinets-ready',
  'floor-agreed',
  'delivered',
  'bases-set',
  'installed',
] as const;
export type GateKey = (typeof gateKeys)[number];

export type JobFacts = {
  wallsReady: 'not-yet' | 'bare-studs' | 'closed';
  /** When the walls will be ready, where somebody said so. */
  siteReadyOn: LocalDate | null;
  /** Somebody is in, or the way in is known. */
  accessGiven: boolean;
  /** What the customer says is not ready; empty when nothing is open. */
  notReady: string;
  /** The day the readings were handed in. */
  measuredOn: LocalDate | null;
  /** The newest revision; superseded when readings came after it. */
  release: { revision: string; releasedOn: LocalDate; isSuperseded: boolean } | null;
  /** The bench says that the cabinets are ready, or when they will be. */
  readyOn: LocalDate | null;
  /** Floor down, or its build-up agreed. */
  floorAgreed: boolean;
  /** Day of a delivery booked apart from the install. */
  deliveryOn: LocalDate | null;
  /** Last day of the install that is booked or done. */
  install: { lastDay: LocalDate; isDone: boolean } | null;
  /** Base units fixed, though the install may go on. */
  basesSet: boolean;
};

export type GateInput = {
  kind: VisitKind;
  facts: JobFacts;
  /** Of the shop's booking rules: lead time from release to ready, and the days worked. */
  rules: WorkingDays & { leadWorkdays: number };
  /** Today's civil date in the shop's zone. */
  today: LocalDate;
  locale: TextLocale;
};

export type GateState =
  | { state: 'passed'; words: string }
  | { state: 'from'; from: LocalDate; words: string }
  | { state: 'blocked'; words: string };
