import type { WallBookView } from '@/lib/contracts/rooms';
import { readBlank } from './kept-store';
import { readRoom } from './room-store';

/**
 * The wall book of a room as this phone has it, or an empty one where the room is begun here; null when
 * neither is kept.
 */
export async function readBook(
  roomId: string,
  jobId: string | null,
  personId: string,
): Promise<WallBookView | null> {
  const kept = await readRoom(roomId, personId);
  if (kept) return kept.view;
  const blank = jobId === null ? null : await readBlank(jobId);
  if (!blank) return null;
  const { wallBook } = blank;
  return { ...blank, wallBook: { ...wallBook, room: { ...wallBook.room, id: roomId } } };
}
