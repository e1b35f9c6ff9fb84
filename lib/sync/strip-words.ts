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
  language?: 'en' | 'es';
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
  const say = words[state.language ?? 'en'];
  const own = unsent.filter((item) => item.personId === personId);
  const parked = own.filter((item) => item.parked !== null).length;
  const waiting = own.length - parked;
  const others = unsent.length - own.length;
  const ofOthers = others > 0 ? ` · ${say.ofOthers(others)}` : '';
  if (parked > 0) {
    const more = waiting > 0 ? ` · ${say.toSend(waiting)}` : '';
    return { kind: 'parked', words: `${say.saved} · ${say.notTaken(parked)}${more}` };
  }
  if (waiting === 0) {
    const ready = isReady && ofOthers === '' ? ` · ${say.ready}` : '';
    return { kind: 'sent', words: `${say.allSent}${ready}${ofOthers}` };
  }
  if (isSignedOut) return { kind: 'sign-in', words: `${say.saved} · ${say.signIn(waiting)}` };
  return {
    kind: 'waiting',
    words: `${say.saved} · ${isOffline ? say.noSignal(waiting) : say.toSend(waiting)}${ofOthers}`,
  };
}

const words = {
  en: {
    saved: 'saved here',
    allSent: 'all sent',
    ready: 'ready for no signal',
    toSend: (count: number) => `${count} to send`,
    noSignal: (count: number) => `${count}, no signal`,
    notTaken: (count: number) => `${count} not taken`,
    signIn: (count: number) => `sign in to send ${count}`,
    ofOthers: (count: number) => `${count} of another person`,
  },
  es: {
    saved: 'guardado aquí',
    allSent: 'todo enviado',
    ready: 'listo sin señal',
    toSend: (count: number) => `${count} por enviar`,
    noSignal: (count: number) => `${count}, sin señal`,
    notTaken: (count: number) => `${count} no aceptado`,
    signIn: (count: number) => `entre para enviar ${count}`,
    ofOthers: (count: number) => `${count} de otra persona`,
  },
};
