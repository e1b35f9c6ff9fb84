import type { WallBookView } from '@/lib/contracts/rooms';
import { apiPaths } from '@/lib/paths';
import { getJson } from './get-json';
import { inStore } from './phone-database';
import { rememberRoom } from './room-store';

/** A second person in the same room is seen this soon. */
const EVERY_MS = 90_000;

type Refreshing = {
  roomId: string;
  personId: string;
  /** The page did not come from the office just now. */
  isStale: boolean;
};

/**
 * While a room is open, takes over what others read of it: when the signal is back, when the page is looked
 * at again, and now and then, until the returned function is called. Nothing read here goes missing by it.
 */
export function startRefreshing({ roomId, personId, isStale }: Refreshing): () => void {
  let isRunning = false;
  const refresh = async () => {
    if (isRunning || document.visibilityState !== 'visible' || !navigator.onLine) return;
    isRunning = true;
    try {
      if (await isAtOffice(roomId)) {
        const view = await getJson<WallBookView>(apiPaths.room(roomId));
        if (view) await rememberRoom(view, personId);
      }
    } catch {
      // A store that fails here fails the screen too, and it says so.
    }
    isRunning = false;
  };
  const timer = setInterval(refresh, EVERY_MS);
  window.addEventListener('online', refresh);
  document.addEventListener('visibilitychange', refresh);
  if (isStale) void refresh();
  return () => {
    clearInterval(timer);
    window.removeEventListener('online', refresh);
    document.removeEventListener('visibilitychange', refresh);
  };
}

/** A room that was begun here is unknown there until its drawing was sent. */
async function isAtOffice(roomId: string): Promise<boolean> {
  const kept = await inStore(({ rooms }) => rooms.get(roomId));
  return (kept?.view.wallBook.room.chains.length ?? 0) > 0;
}
