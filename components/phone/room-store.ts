import type { WallBookView } from '@/lib/contracts/rooms';
import { bookOnPhone, newerView } from '@/lib/sync/book-on-phone';
import type { Queued } from '@/lib/sync/queued';
import { phoneDatabase } from './phone-database';
import { readQueueOfRoom } from './queue-store';

export type RoomOnPhone = {
  /** With everything read here, sent or not. */
  view: WallBookView;
  /** Of this room, still here. */
  queue: Queued[];
};

/** Keeps what the office has just shown of a room; nothing read here goes missing by it. */
export async function rememberRoom(view: WallBookView): Promise<void> {
  const { rooms } = phoneDatabase();
  const roomId = view.wallBook.room.id;
  await phoneDatabase().transaction('rw', rooms, async () => {
    const kept = await rooms.get(roomId);
    await rooms.put({ roomId, view: newerView(kept?.view ?? null, view) });
  });
}

/** The room as this phone knows it; null when it was never opened here. */
export async function readRoom(roomId: string): Promise<RoomOnPhone | null> {
  const kept = await phoneDatabase().rooms.get(roomId);
  if (!kept) return null;
  const queue = await readQueueOfRoom(roomId);
  return { view: bookOnPhone(kept.view, queue), queue };
}
