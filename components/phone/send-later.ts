/** Its name between page and worker. */
export const sendLaterTag = 'setwell.send';

type SyncManager = { register: (tag: string) => Promise<void> };

/**
 * Asks the browser to wake the worker when there is a signal, though the page is closed by then. Only some
 * browsers can; on the others what is kept goes out the next time a phone page is open.
 */
export async function askToSendLater(): Promise<void> {
  try {
    const registration = await navigator.serviceWorker?.getRegistration();
    const { sync } = (registration ?? {}) as { sync?: SyncManager };
    await sync?.register(sendLaterTag);
  } catch {
    // Refused in private windows; nothing is lost by it.
  }
}
