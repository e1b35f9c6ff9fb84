import { sketchKey } from '@/components/walls/draft-keys';
import type { WallBookView } from '@/lib/contracts/rooms';
import { bookOnPhone, newerView } from '@/lib/sync/book-on-phone';
import type { Queued } from '@/lib/sync/queued';
import { readDraft } from './draft-store';
import { inStore } from './phone-database';
import { readQueue, readQueueOfRoom } from './queue-store';

export type RoomOnPhone = {
  /** With everything read here, sent or not. */
  view: WallBookView;
  /** Of this room, still here. */
  queue: Queued[];
};

/** Keeps what the office has just shown this person of a room; nothing read here goes missing by it. */
export async function rememberRoom(view: WallBookView, personId: string): Promise<void> {
  const roomId = view.wallBook.room.id;
  await inStore((database) =>
    database.transaction('rw', database.rooms, async () => {
      const kept = await database.rooms.get(roomId);
      const before = kept?.personId === personId ? kept.view : null;
      await database.rooms.put({ roomId, personId, view: newerView(before, view) });
    }),
  );
}

/** The room as this phone knows it; null when this person never opened it here. */
export async function readRoom(roomId: string, personId: string): Promise<RoomOnPhone | null> {
  const kept = await inStore(({ rooms }) => rooms.get(roomId));
  if (kept?.personId !== personId) return null;
  const queue = await readQueueOfRoom(roomId);
  return { view: bookOnPhone(kept.view, queue), queue };
}

/** The rooms of a job that this phone has drawn or begun to draw, sent or not; the latter by the words given. */
export async function readRoomsOfJob(
  jobId: string,
  personId: string,
  halfDrawn: string,
): Promise<{ id: string; name: string }[]> {
  const kept = await inStore(({ rooms }) =>
    rooms.filter((row) => row.personId === personId && row.view.jobId === jobId).toArray(),
  );
  const found = new Map<string, string>();
  for (const { roomId, view } of kept) {
    const { room } = bookOnPhone(view, await readQueueOfRoom(roomId)).wallBook;
    if (room.chains.length > 0) found.set(roomId, room.name);
    else if (await readDraft(sketchKey(roomId))) found.set(roomId, halfDrawn);
  }
  for (const { work } of await readQueue()) {
    if (work.kind === 'room' && work.jobId === jobId) found.set(work.room.id, work.room.name);
  }
  return [...found].map(([id, name]) => ({ id, name }));
}
