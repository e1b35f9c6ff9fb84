import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Room } from '@/lib/contracts/wall-book';
import type { Queued } from './queued';

/**
 * The room's book as this phone knows it: what the office last showed, and after it everything that is
 * still here, sent or not.
 *
 * Edge: a reading that is in both counts once. The newest drawing that waits here wins; one
 * that the office refused counts only where the office has none.
 * Example: the office has a, b; the phone keeps b, c: the book holds a, b, c.
 */
export function bookOnPhone(view: WallBookView, queue: readonly Queued[]): WallBookView {
  const here = [...queue]
    .filter(({ roomId }) => roomId === view.wallBook.room.id)
    .sort((one, other) => one.order - other.order);
  const isDrawn = view.wallBook.room.chains.length > 0;
  const rooms = here.flatMap(({ work, parked }) =>
    work.kind === 'room' && (parked === null || !isDrawn) ? [work.room] : [],
  );
  const readings = here.flatMap(({ work }) => (work.kind === 'reading' ? [work.reading] : []));
  return withSent(view, readings, rooms.at(-1) ?? null);
}

/** The office's last word on a room with what it has taken since. */
export function withSent(
  view: WallBookView,
  readings: readonly Reading[],
  room: Room | null,
): WallBookView {
  const { wallBook } = view;
  return {
    ...view,
    wallBook: {
      ...wallBook,
      room: room ?? wallBook.room,
      readings: [...new Map([...wallBook.readings, ...readings].map((r) => [r.id, r])).values()],
    },
  };
}

/**
 * A newer view of the office over one that the phone kept: nothing that was read goes missing, whichever
 * of the two was drawn first.
 */
export function newerView(kept: WallBookView | null, fresh: WallBookView): WallBookView {
  if (!kept) return fresh;
  const known = new Set(fresh.wallBook.readings.map(({ id }) => id));
  const later = kept.wallBook.readings.filter(({ id }) => !known.has(id));
  const room = fresh.wallBook.room.chains.length > 0 ? null : kept.wallBook.room;
  return withSent(fresh, later, room);
}
