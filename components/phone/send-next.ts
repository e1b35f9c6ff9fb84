import { nextBatch } from '@/lib/sync/next-batch';
import { type Settled, settleBatch } from '@/lib/sync/settle-batch';
import { inStore } from './phone-database';
import { postBatch } from './post-batch';
import { readQueue, settleQueue } from './queue-store';

/** What to do after it; 'nothing': nothing waits any more. */
export type AfterSending = Settled['next'] | 'nothing';

/** Sends what is next, readings in their order and a photo only when none of them waits. Page and worker use it alike. */
export async function sendNext(personId: string): Promise<AfterSending> {
  const batch = nextBatch(await readQueue(), personId);
  if (batch) {
    const settled = settleBatch(batch, await postBatch(batch));
    await settleQueue(batch, settled);
    return settled.next;
  }
  if ((await inStore(({ photos }) => photos.count())) === 0) return 'nothing';
  const { sendOnePhoto } = await import('@/components/photos/send-photos');
  return sendOnePhoto(personId);
}

/** One sender at a time. Where the browser has no locks, two may send the same: the office takes it once. */
export async function alone(work: () => Promise<void>): Promise<void> {
  if (!navigator.locks) return work();
  await navigator.locks.request('setwell.send', work);
}
