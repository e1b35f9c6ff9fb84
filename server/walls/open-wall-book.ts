import type { OpenWallBookInput, WallBookView } from '@/lib/contracts/rooms';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { getWallBook } from './get-wall-book';
import { startWallBook } from './start-wall-book';

/**
 * The book of a room, or an empty one for a room of this job that the office does not know yet: a phone
 * makes the id, and may have drawn the room without being able to send it.
 */
export async function openWallBook(
  ctx: PersonContext,
  { roomId, jobId }: OpenWallBookInput,
): Promise<WallBookView> {
  mustBeAllowed(ctx, 'walls:measure');
  try {
    return await getWallBook(ctx, { roomId });
  } catch (error) {
    const isUnknown = error instanceof Refusal && error.refusal.status === 404;
    if (!isUnknown || jobId === undefined) throw error;
    return startWallBook(ctx, { roomId, jobId });
  }
}
