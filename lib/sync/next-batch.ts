import { apiPaths } from '@/lib/paths';
import type { Queued } from './queued';

/** One request: what it carries, and where it goes. */
export type Batch = { items: [Queued, ...Queued[]]; path: string; body: unknown };

/** A few seconds of a weak signal carry this many; a lost answer costs no more than this again. */
export const MOST_READINGS = 50;
/** Taps of a crew's day; a signature among them weighs as much as many. */
export const MOST_EVENTS = 20;

/**
 * What to send next, strictly in the order in which it was kept: a run of readings of one room, a run of
 * the day's events, or one other thing; null when nothing waits.
 *
 * Edge: parked things are passed over, and so is the handing in of a room while a reading of it is parked.
 * Things that another person took wait for that person.
 * Example: readings r1 r2 of one room, then its submit: first r1 and r2 together, then the submit.
 */
export function nextBatch(queue: readonly Queued[], personId: string): Batch | null {
  const own = [...queue]
    .filter((item) => item.personId === personId)
    .sort((one, other) => one.order - other.order);
  const halted = new Set(
    own.filter(({ work, parked }) => parked !== null && work.kind === 'reading').map(roomOf),
  );
  const waiting = own.filter(
    (item) => item.parked === null && !(item.work.kind === 'submit' && halted.has(item.roomId)),
  );
  const [first] = waiting;
  if (!first) return null;
  switch (first.work.kind) {
    case 'room': {
      const { jobId, room } = first.work;
      return { items: [first], path: apiPaths.rooms(), body: { jobId, room } };
    }
    case 'submit':
      return { items: [first], path: apiPaths.submitRoom(first.work.roomId), body: {} };
    case 'report':
      return {
        items: [first],
        path: apiPaths.reportVisit(first.work.report.visitId),
        body: first.work.report,
      };
    case 'reading':
      return readingsBatch(first, waiting);
    case 'event':
      return eventsBatch(first, waiting);
  }
}

function eventsBatch(first: Queued, waiting: Queued[]): Batch {
  const end = waiting.findIndex(({ work }) => work.kind !== 'event');
  const run = waiting.slice(1, end < 0 ? undefined : end).slice(0, MOST_EVENTS - 1);
  const items: Batch['items'] = [first, ...run];
  const events = items.map(({ work }) => (work.kind === 'event' ? work.event : null));
  return { items, path: apiPaths.dayEvents(), body: { events } };
}

function readingsBatch(first: Queued, waiting: Queued[]): Batch {
  const end = waiting.findIndex(
    ({ work, roomId }) => work.kind !== 'reading' || roomId !== first.roomId,
  );
  const run = waiting.slice(1, end < 0 ? undefined : end).slice(0, MOST_READINGS - 1);
  const items: Batch['items'] = [first, ...run];
  const readings = items.map(({ work }) => (work.kind === 'reading' ? work.reading : null));
  return { items, path: apiPaths.readings(), body: { roomId: first.roomId, readings } };
}

function roomOf({ roomId }: Queued): string | null {
  return roomId;
}
