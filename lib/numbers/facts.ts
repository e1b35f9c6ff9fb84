import type { SnagKind } from '@/lib/contracts/snags';
import type { VisitKind } from '@/lib/schedule/visit-kind';

export type Span = { startsAt: Date; endsAt: Date };

/** A visit that was to happen in the period: neither held nor called off. */
export type VisitFact = {
  visitId: string;
  jobId: string;
  jobNumber: number;
  kind: VisitKind;
  crewName: string;
  status: 'booked' | 'confirmed' | 'on-the-way' | 'on-site' | 'done' | 'missed';
  startsAt: Date;
  windowStartsAt: Date;
  windowEndsAt: Date;
  confirmedAt: Date | null;
  arrivedAt: Date | null;
  leftAt: Date | null;
  /** Work that was expected, of the whole crew side by side, not summed over its people. */
  workMinutes: number;
  /** One a day. */
  pieces: Span[];
  pauses: Span[];
};

export type SnagFact = {
  jobId: string;
  jobNumber: number;
  kind: SnagKind;
  place: string;
  foundAt: Date;
};

/** A sheet that went to the bench with a run whose fillers come out too small. */
export type ShortReleaseFact = {
  jobId: string;
  jobNumber: number;
  roomName: string;
  revision: string;
  releasedAt: Date;
};

export type JobFact = { jobId: string; jobNumber: number; enquiredAt: Date };

export type MessageFact = {
  jobId: string;
  jobNumber: number;
  sentAt: Date;
  occasion: string;
  segments: number;
};

/** One crew's drive of one day, base to base, with the visits it was for. */
export type DriveFact = {
  crewName: string;
  day: string;
  minutes: number;
  visits: { jobId: string; jobNumber: number; kind: VisitKind }[];
};
