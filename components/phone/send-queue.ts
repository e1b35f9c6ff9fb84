import { isWaiting } from '@/lib/photos/kept-photo';
import { backOffMs } from '@/lib/sync/back-off';
import { inStore, watchStore } from './phone-database';
import { readQueue } from './queue-store';
import { askToSendLater } from './send-later';
import { alone, sendNext } from './send-next';
import { changeSendingState } from './sending-state';

/**
 * Sends what is kept, in order, until the returned function is called. It wakes when something is kept,
 * when the signal is back, when the page is looked at again, and after each pause.
 */
export function startSending(personId: string): () => void {
  let failures = 0;
  let isStopped = false;
  let isRunning = false;
  let isWanted = false;
  let timer: ReturnType<typeof setTimeout> | undefined;

  const wake = () => {
    clearTimeout(timer);
    if (isStopped) return;
    isWanted = true;
    if (!isRunning) void run();
  };

  const run = async () => {
    isRunning = true;
    while (isWanted && !isStopped) {
      isWanted = false;
      try {
        await alone(() => sendAll());
      } catch (cause) {
        // The store itself failed: nothing has left it, so it is tried again like a lost answer.
        console.warn('setwell: could not send', cause);
        pause();
      }
    }
    isRunning = false;
  };

  const sendAll = async () => {
    while (!isStopped) {
      const next = await sendNext(personId);
      if (next === 'nothing') return;
      changeSendingState({ isSignedOut: next === 'sign-in', isOffline: next === 'wait' });
      if (next === 'sign-in') return;
      if (next === 'wait') {
        void askToSendLater();
        return pause();
      }
      failures = 0;
    }
  };

  const pause = () => {
    failures += 1;
    clearTimeout(timer);
    timer = setTimeout(wake, backOffMs(failures, Math.random()));
  };

  const wakeAfresh = () => {
    failures = 0;
    wake();
  };
  const wakeWhenSeen = () => {
    if (document.visibilityState === 'visible') wakeAfresh();
  };

  const stopWatching = watchStore(readWaiting, { next: wakeIfMore(wake), error: () => {} });
  window.addEventListener('online', wakeAfresh);
  document.addEventListener('visibilitychange', wakeWhenSeen);
  return () => {
    isStopped = true;
    clearTimeout(timer);
    stopWatching();
    window.removeEventListener('online', wakeAfresh);
    document.removeEventListener('visibilitychange', wakeWhenSeen);
  };
}

async function readWaiting(): Promise<number> {
  const queue = await readQueue();
  const waiting = await inStore(({ photos }) =>
    photos.filter((photo) => isWaiting(photo) && photo.isDone).count(),
  );
  return queue.filter(({ parked }) => parked === null).length + waiting;
}

/** Fewer things waiting is our own doing; more is a reason to go. */
function wakeIfMore(wake: () => void): (waiting: number) => void {
  let before = 0;
  return (waiting) => {
    if (waiting > before) wake();
    before = waiting;
  };
}
