import type { Queued } from './queued';

export type QueueState = {
  queue: readonly Queued[];
  personId: string;
  /** The office asked for sign-in since the last thing it took. */
  isSignedOut: boolean;
  /** The last request had no answer. */
  isOffline: boolean;
};
export type StripState = {
  kind: 'sent' | 'waiting' | 'sign-in' | 'parked';
  words: string;
};

/**
 * What the strip says, always: what is safe on the phone, what waits, what the office would not take.
 *
 * Example: three waiting, no signal: "saved here · 3, no signal".
 */
export function stripState({ queue, personId, isSignedOut, isOffline }: QueueState): StripState {
  const own = queue.filter((item) => item.personId === personId);
  const parked = own.filter((item) => item.parked !== null).length;
  const waiting = own.length - parked;
  const others = queue.length - own.length;
  const ofOthers = others > 0 ? ` · ${others} of another person` : '';
  if (parked > 0) {
    const more = waiting > 0 ? ` · ${waiting} to send` : '';
    return { kind: 'parked', words: `saved here · ${parked} not taken${more}` };
  }
  if (waiting === 0) return { kind: 'sent', words: `all sent${ofOthers}` };
  if (isSignedOut) return { kind: 'sign-in', words: `saved here · sign in to send ${waiting}` };
  return {
    kind: 'waiting',
    words: `saved here · ${waiting}${isOffline ? ', no signal' : ' to send'}${ofOthers}`,
  };
}
