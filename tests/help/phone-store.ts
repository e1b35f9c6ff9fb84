import type { Page } from 'playwright-core';

/** Everything in one store of the phone, as its own page sees it. */
export function readStore<Row>(page: Page, name: string): Promise<Row[]> {
  return page.evaluate(
    (store) =>
      new Promise<Row[]>((resolve, reject) => {
        const opening = indexedDB.open('setwell');
        opening.onerror = () => reject(opening.error);
        opening.onsuccess = () => {
          const database = opening.result;
          const all = database.transaction(store).objectStore(store).getAll();
          all.onerror = () => reject(all.error);
          all.onsuccess = () => {
            database.close();
            resolve(all.result as Row[]);
          };
        };
      }),
    name,
  );
}

/** The addresses of everything that the worker keeps. */
export function keptAddresses(page: Page): Promise<string[]> {
  return page.evaluate(async () => {
    const names = await caches.keys();
    const kept = await Promise.all(names.map(async (name) => (await caches.open(name)).keys()));
    return kept.flat().map(({ url }) => new URL(url).pathname);
  });
}
