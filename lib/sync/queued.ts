import type { DayEvent } from '@/lib/contracts/day-events';
import type { Reading } from '@/lib/contracts/readings';
import type { ReportVisitInput } from '@/lib/contracts/visits';
import type { Room } from '@/lib/contracts/wall-book';

/** What the phone has to tell the office. Types alone are taken from the contracts: no schema is loaded. */
export type QueuedWork =
  | { kind: 'room'; jobId: string; room: Room }
  | { kind: 'reading'; reading: Reading }
  | { kind: 'submit'; roomId: string }
  | { kind: 'report'; report: ReportVisitInput }
  | { kind: 'event'; event: DayEvent };

/** One thing in the phone's queue; it leaves only when the office has said that it has it. */
export type Queued = {
  /** Grows by one with each thing kept; things are sent in this order. */
  order: number;
  /** The reading's or the event's own id, or one made for the thing. */
  id: string;
  /** Who took it. Another person's sign-in does not send it. */
  personId: string;
  roomId: string | null;
  work: QueuedWork;
  /** Why the office would not take it; null while it waits. */
  parked: string | null;
};

/** The room that a piece of work belongs to. */
export function roomIdOf(work: QueuedWork): string | null {
  switch (work.kind) {
    case 'room':
      return work.room.id;
    case 'reading':
      return work.reading.roomId;
    case 'submit':
      return work.roomId;
    case 'report':
    case 'event':
      return null;
  }
}

/** The id under which the office names it, where it has one of its own. */
export function ownIdOf(work: QueuedWork): string | null {
  if (work.kind === 'reading') return work.reading.id;
  return work.kind === 'event' ? work.event.id : null;
}
