import type { PhoneDatabase } from './phone-tables';

type Library = { database: PhoneDatabase; liveQuery: typeof import('./phone-tables').liveQuery };

let here: Library | null = null;
let coming: Promise<Library> | null = null;

/** A watched question is asked again this soon where the store's library did not come. */
const ASK_AGAIN_MS = 5_000;

/**
 * Does it with the phone's own store. Its library is a third of what a phone page would load and comes after
 * the page is drawn: what is tapped before waits for it, in order. Once it is here nothing comes between, since
 * within a transaction or a watched question only the store's own promises may be awaited.
 */
export function inStore<Value>(work: (database: PhoneDatabase) => Promise<Value>): Promise<Value> {
  return here ? work(here.database) : library().then(({ database }) => work(database));
}

/** Tells what the store answers, now and after every change of it, until the returned function is called. */
export function watchStore<Value>(
  read: () => Promise<Value>,
  listener: { next: (value: Value) => void; error: () => void },
): () => void {
  let stop = () => {};
  let isStopped = false;
  const ask = () => {
    library().then(
      ({ liveQuery }) => {
        if (isStopped) return;
        const subscription = liveQuery(read).subscribe(listener);
        stop = () => subscription.unsubscribe();
      },
      () => {
        if (isStopped) return;
        listener.error();
        const timer = setTimeout(ask, ASK_AGAIN_MS);
        stop = () => clearTimeout(timer);
      },
    );
  };
  ask();
  return () => {
    isStopped = true;
    stop();
  };
}

function library(): Promise<Library> {
  if (coming) return coming;
  const asked = import('./phone-tables').then(
    ({ phoneTables, liveQuery }): Library => ({ database: phoneTables(), liveQuery }),
  );
  // The first to hear of it, so that nobody later is served before those who wait.
  asked.then(
    (library) => {
      here = library;
    },
    () => {
      // A weak signal: whoever comes next asks for it anew.
      coming = null;
    },
  );
  coming = asked;
  return asked;
}
