import type { DayEvent } from '@/lib/contracts/day-events';
import type { StopView } from '@/lib/contracts/stops';
import { stopOnPhone } from '@/lib/days/stop-on-phone';
import { readKeptStop } from './kept-store';
import { keepWork, readQueue } from './queue-store';
import { tapperOf } from './tapper';

type Holder = { personId: string; personName: string };

/** A stop with everything that was tapped here, sent or not; null when the office never showed it here. */
export async function readStop(
  visitId: string,
  holder: Holder,
  /** Shown by the office just now, and perhaps not kept yet. */
  fresh: StopView | null,
): Promise<StopView | null> {
  const kept = (await readKeptStop(visitId)) ?? fresh;
  if (!kept) return null;
  const events = (await readQueue()).flatMap(({ work, personId }) =>
    work.kind === 'event' && personId === holder.personId ? [work.event] : [],
  );
  return stopOnPhone(kept, events, tapperOf(holder.personName));
}

/** Safe on the phone's disk when it has resolved; it is sent by itself. */
export async function keepEvents(personId: string, events: readonly DayEvent[]): Promise<void> {
  await keepWork(
    personId,
    events.map((event) => ({ kind: 'event', event })),
  );
}
