import {
  type DayEvent,
  type DayEventsAnswer,
  type DayEventsInput,
  dayEvent,
} from '@/lib/contracts/day-events';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { kickWorker } from '@/server/messages/worker';
import { writeDayEvent } from './write-day-event';

/**
 * Takes a crew's taps in the order in which they were made. Each is a transaction of its own: what was
 * taken stays taken, what is refused goes back to the phone with why, and sent again all is as it was.
 */
export async function recordDayEvents(
  ctx: PersonContext,
  { events }: DayEventsInput,
): Promise<DayEventsAnswer> {
  mustBeAllowed(ctx, 'visits:report');
  const answer: DayEventsAnswer = { accepted: [], parked: [] };
  for (const raw of events) {
    const read = dayEvent.safeParse(raw);
    if (!read.success) {
      const message = read.error.issues[0]?.message ?? 'Not understood.';
      answer.parked.push({ id: idOf(raw), message });
      continue;
    }
    const message = await take(ctx, read.data);
    if (message === null) answer.accepted.push(read.data.id);
    else answer.parked.push({ id: read.data.id, message });
  }
  kickWorker();
  return answer;
}

/** Null when it was taken; else why not. What is no refusal is a bug, and the phone tries again later. */
async function take(ctx: PersonContext, event: DayEvent): Promise<string | null> {
  try {
    await ctx.db.transaction((tx) => writeDayEvent(tx, ctx, event));
    return null;
  } catch (error) {
    if (error instanceof Refusal) return error.refusal.message;
    throw error;
  }
}

function idOf(raw: unknown): string {
  const id = raw !== null && typeof raw === 'object' && 'id' in raw ? raw.id : '';
  return typeof id === 'string' ? id.slice(0, 60) : '';
}
