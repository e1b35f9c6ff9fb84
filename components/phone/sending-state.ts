/** How the last request went; every strip of the page listens. */
export type SendingState = { isSignedOut: boolean; isOffline: boolean };

let state: SendingState = { isSignedOut: false, isOffline: false };
const listeners = new Set<() => void>();

export function changeSendingState(next: SendingState): void {
  if (next.isSignedOut === state.isSignedOut && next.isOffline === state.isOffline) return;
  state = next;
  for (const listener of listeners) listener();
}

export const currentSendingState = (): SendingState => state;

export function subscribeToSending(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
