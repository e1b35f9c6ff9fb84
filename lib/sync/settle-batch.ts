import { readProblemDetails } from '@/lib/problem-details';
import type { Batch } from './next-batch';

/** What came back: a status with its JSON, or nothing at all. */
export type Answer = { status: number; json: unknown } | 'no-answer';

export type Settled = {
  /** The office has these: they may leave the phone. */
  sentIds: string[];
  /** The office will not take these as they are: they stay, and are shown. */
  parked: { id: string; message: string }[];
  /** What to do before the next request. */
  next: 'go-on' | 'wait' | 'sign-in';
};

/** Asked to slow down or too slow: not the fault of what was sent. */
const PASSING = new Set([408, 425, 429]);

/**
 * What an answer means for the things that were sent. Only an id that the office named in a 2xx answer
 * leaves; whatever is in doubt stays.
 *
 * Edge: a 2xx that is not the office's own JSON (a hotel's sign-in page) is no answer. 401 keeps and asks
 * for sign-in; other 4xx park; 5xx, 3xx and no answer wait.
 * Example: readings a, b sent, `accepted: [a]`: a leaves, b stays and waits.
 */
export function settleBatch({ items }: Batch, answer: Answer): Settled {
  const nothing = { sentIds: [], parked: [] };
  if (answer === 'no-answer') return { ...nothing, next: 'wait' };
  const { status, json } = answer;
  if (status === 401) return { ...nothing, next: 'sign-in' };
  if (status >= 200 && status < 300) return settleTaken(items, json);
  if (status >= 400 && status < 500 && !isPassing(status)) {
    const message = refusalWords(json, status);
    return { sentIds: [], parked: items.map(({ id }) => ({ id, message })), next: 'go-on' };
  }
  return { ...nothing, next: 'wait' };
}

function settleTaken(items: Batch['items'], json: unknown): Settled {
  if (typeof json !== 'object' || json === null) return { sentIds: [], parked: [], next: 'wait' };
  const { kind } = items[0].work;
  if (kind !== 'reading' && kind !== 'event') {
    return { sentIds: [items[0].id], parked: [], next: 'go-on' };
  }
  const { accepted, parked } = json as { accepted?: unknown; parked?: unknown };
  const sent = new Set(Array.isArray(accepted) ? accepted : []);
  const ids = items.map(({ id }) => id);
  const sentIds = ids.filter((id) => sent.has(id));
  const parkedHere = parkedList(parked).filter(({ id }) => ids.includes(id) && !sent.has(id));
  const isSettled = sentIds.length + parkedHere.length > 0;
  return { sentIds, parked: parkedHere, next: isSettled ? 'go-on' : 'wait' };
}

function parkedList(parked: unknown): { id: string; message: string }[] {
  if (!Array.isArray(parked)) return [];
  return parked.flatMap((each: unknown) => {
    const { id, message } = (each ?? {}) as { id?: unknown; message?: unknown };
    if (typeof id !== 'string') return [];
    return [{ id, message: typeof message === 'string' ? message : 'Not understood.' }];
  });
}

export function isPassing(status: number): boolean {
  return PASSING.has(status);
}

/** Why the office would not take it, in its own words. */
export function refusalWords(json: unknown, status: number): string {
  const problem = readProblemDetails(json);
  return problem?.detail ?? problem?.title ?? `The office refused it (${status}).`;
}
