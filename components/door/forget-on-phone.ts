/** What the phone pages keep of the office's words; the queue, the drafts and the photos are not among it. */
const forgotten = ['kept', 'rooms'];

/**
 * Clears on this device what the office showed to whoever was signed in: on a sign-out, and when somebody
 * signs in. What was read here and not sent stays, and goes out when its reader signs in again.
 * Written without the store's library, which the door does not load.
 */
export async function forgetOnPhone(): Promise<void> {
  try {
    const database = await openStore();
    if (!database) return;
    const names = forgotten.filter((name) => database.objectStoreNames.contains(name));
    if (names.length > 0) await clear(database, names);
    database.close();
  } catch (cause) {
    // A browser that keeps nothing has nothing to forget.
    console.warn('setwell: nothing was cleared here', cause);
  }
}

async function openStore(): Promise<IDBDatabase | null> {
  const known = await indexedDB.databases?.();
  // Opened where there is none, it would be made, empty and of no version.
  if (known && !known.some(({ name }) => name === 'setwell')) return null;
  return new Promise((resolve, reject) => {
    const request = indexedDB.open('setwell');
    request.onupgradeneeded = () => request.transaction?.abort();
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => (known ? reject(request.error) : resolve(null));
  });
}

function clear(database: IDBDatabase, names: string[]): Promise<void> {
  return new Promise((resolve, reject) => {
    const transaction = database.transaction(names, 'readwrite');
    for (const name of names) transaction.objectStore(name).clear();
    transaction.oncomplete = () => resolve();
    transaction.onerror = () => reject(transaction.error);
  });
}
