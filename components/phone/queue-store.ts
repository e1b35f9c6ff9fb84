import { stopOnPhone } from '@/lib/days/stop-on-phone';
import { withSent } from '@/lib/sync/book-on-phone';
import type { Batch } from '@/lib/sync/next-batch';
import { ownIdOf, type Queued, type QueuedWork, roomIdOf } from '@/lib/sync/queued';
import type { Settled } from '@/lib/sync/settle-batch';
import { putStop, putVisitsAfter, readHolder, readKeptStop } from './kept-store';
import { newId } from './new-id';
import { inStore } from './phone-database';
import { tapperOf } from './tapper';

/** Puts work on the phone's disk. When it has resolved, the work cannot be lost but with the phone. */
export async function keepWork(personId: string, works: readonly QueuedWork[]): Promise<void> {
  const items = works.map((work) => ({
    id: ownIdOf(work) ?? newId(),
    personId,
    roomId: roomIdOf(work),
    work,
    parked: null,
  }));
  await inStore(({ queue }) => queue.bulkAdd(items));
}

export function readQueue(): Promise<Queued[]> {
  return inStore(({ queue }) => queue.orderBy('order').toArray());
}

export function readQueueOfRoom(roomId: string): Promise<Queued[]> {
  return inStore(({ queue }) => queue.where('roomId').equals(roomId).sortBy('order'));
}

/** One transaction: what the office has taken moves from the queue to the room's last known state. */
export async function settleQueue({ items }: Batch, settled: Settled): Promise<void> {
  const sentIds = new Set(settled.sentIds);
  const sent = items.filter(({ id }) => sentIds.has(id));
  await inStore((database) => {
    const { queue, rooms, kept } = database;
    return database.transaction('rw', queue, rooms, kept, async () => {
      await rememberSent(sent);
      await rememberTold(sent);
      await rememberReports(sent);
      await queue.bulkDelete(sent.map(({ order }) => order));
      for (const { id, message } of settled.parked) {
        await queue.where('id').equals(id).modify({ parked: message });
      }
    });
  });
}

/** Sends parked things once more: after a sign-in as somebody who may, or a mended room. */
export async function tryParkedAgain(personId: string): Promise<void> {
  await inStore(({ queue }) =>
    queue
      .filter((item) => item.personId === personId && item.parked !== null)
      .modify({ parked: null }),
  );
}

/** What the office has of a stop now, so that it stays on the screen when it has left the queue. */
async function rememberTold(sent: Queued[]): Promise<void> {
  const events = sent.flatMap(({ work }) => (work.kind === 'event' ? [work.event] : []));
  for (const visitId of new Set(events.map((event) => event.visitId))) {
    const stop = await readKeptStop(visitId);
    const holder = await readHolder();
    if (stop && holder) await putStop(stopOnPhone(stop, events, tapperOf(holder.personName)));
  }
}

/** How the visits stand now: the page that shows them may stay open for hours. */
async function rememberReports(sent: Queued[]): Promise<void> {
  const works = sent.map(({ work }) => work);
  if (works.some(({ kind }) => kind === 'report')) await putVisitsAfter(works);
}

async function rememberSent(sent: Queued[]): Promise<void> {
  for (const roomId of new Set(sent.map((item) => item.roomId))) {
    const kept = roomId === null ? undefined : await inStore(({ rooms }) => rooms.get(roomId));
    if (!kept) continue;
    const works = sent
      .filter((item) => item.roomId === roomId && item.personId === kept.personId)
      .map(({ work }) => work);
    const readings = works.flatMap((work) => (work.kind === 'reading' ? [work.reading] : []));
    const drawn = works.flatMap((work) => (work.kind === 'room' ? [work.room] : []));
    const view = withSent(kept.view, readings, drawn.at(-1) ?? null);
    const isSubmitted = works.some(({ kind }) => kind === 'submit');
    const submittedAt = isSubmitted ? new Date().toISOString() : view.submittedAt;
    await inStore(({ rooms }) => rooms.put({ ...kept, view: { ...view, submittedAt } }));
  }
}
