export type QueueState = {
  /** Everything here that the office has not got, photos among it. */
  unsent: readonly { personId: string; parked: string | null }[];
  personId: string;
  /** The office asked for sign-in since the last thing it took. */
  isSignedOut: boolean;
  /** The last request had no answer. */
  isOffline: boolean;
  /** The day can go on without a signal. */
  isReady: boolean;
};
export type StripState = {
  kind: 'sent' | 'waiting' | 'sign-in' | 'parked';
  words: string;
};

/**
 * What the strip says, always: what is safe on the phone, what waits, what the office would not take.
 *
 * Example: three waiting, no signal: "saved here · 3, no signal"; nothing waiting, the day fetched: "all
 * sent · ready for no signal".
 */
export function stripState(state: QueueState): StripState {
  const { unsent, personId, isSignedOut, isOffline, isReady } = state;
  const own = unsent.filter((item) => item.personId === personId);
  const parked = own.filter((item) => item.parked !== null).length;
  const waiting = own.length - parked;
  const others = unsent.length - own.length;
  const ofOthers = others > 0 ? ` · ${others} of another person` : '';
  if (parked > 0) {
    const more = waiting > 0 ? ` · ${waiting} to send` : '';
    return { kind: 'parked', words: `saved here · ${parked} not taken${more}` };
  }
  if (waiting === 0) {
    const ready = isReady && ofOthers === '' ? ' · ready for no signal' : '';
    return { kind: 'sent', words: `all sent${ready}${ofOthers}` };
  }
  if (isSignedOut) return { kind: 'sign-in', words: `saved here · sign in to send ${waiting}` };
  return {
    kind: 'waiting',
    words: `saved here · ${waiting}${isOffline ? ', no signal' : ' to send'}${ofOthers}`,
  };
}
