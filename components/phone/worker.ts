import { ifAtRest, isTypingHere, whenAtRest } from './typing-state';

const scriptUrl = '/serwist/sw.js';
/** A page that is open all day asks this often whether there is a newer program. */
const ASK_AGAIN_MS = 3_600_000;

/**
 * Keeps the program itself on the phone, so that its pages open without a signal. A newer one takes over
 * when nothing is half typed, and the page is then loaded afresh; where the browser has no workers (plain
 * http, private windows) pages want a signal, and everything else goes on.
 */
export function startWorker(): () => void {
  const serviceWorker = workersOf(navigator);
  if (!serviceWorker) return () => {};
  let isStopped = false;
  let registration: ServiceWorkerRegistration | null = null;
  let askedAt = Date.now();
  // The first worker finds the page without one: nothing is older then.
  let hadWorker = serviceWorker.controller !== null;
  let isReloadDue = false;

  const takeOver = () => {
    const waiting = registration?.waiting;
    if (!waiting || isStopped) return;
    void ifAtRest(() => waiting.postMessage({ type: 'SKIP_WAITING' }));
  };
  const reloadAtRest = () => {
    if (!isReloadDue || isTypingHere()) return;
    isReloadDue = false;
    window.location.reload();
  };
  const changed = () => {
    isReloadDue = hadWorker;
    hadWorker = true;
    reloadAtRest();
  };
  const watch = (found: ServiceWorkerRegistration) => {
    registration = found;
    takeOver();
    // One may have been found before this page could listen.
    watchInstalling(found.installing);
    found.addEventListener('updatefound', () => watchInstalling(found.installing));
  };
  const watchInstalling = (installing: ServiceWorker | null) => {
    installing?.addEventListener('statechange', () => {
      if (installing.state === 'installed' && serviceWorker.controller) takeOver();
    });
  };
  const askAgain = () => {
    if (document.visibilityState !== 'visible' || Date.now() - askedAt < ASK_AGAIN_MS) return;
    askedAt = Date.now();
    registration?.update().catch(() => {});
  };

  serviceWorker
    .register(scriptUrl, { scope: '/', updateViaCache: 'none' })
    .then(watch)
    .catch((cause) => console.warn('setwell: pages will not open without a signal', cause));
  serviceWorker.addEventListener('controllerchange', changed);
  document.addEventListener('visibilitychange', askAgain);
  const stopListening = whenAtRest(() => {
    takeOver();
    reloadAtRest();
  });
  return () => {
    isStopped = true;
    stopListening();
    serviceWorker.removeEventListener('controllerchange', changed);
    document.removeEventListener('visibilitychange', askAgain);
  };
}

/** Read by name: the bundler takes `navigator.serviceWorker` to be there, and leaves a plain test for it out. */
function workersOf(owner: Navigator): ServiceWorkerContainer | null {
  return Reflect.get(owner, 'serviceWorker') ?? null;
}

/** Whether a worker has the program; asked once it may. */
export function subscribeToWorker(listener: () => void): () => void {
  navigator.serviceWorker?.addEventListener('controllerchange', listener);
  return () => navigator.serviceWorker?.removeEventListener('controllerchange', listener);
}

export const hasWorker = (): boolean => Boolean(navigator.serviceWorker?.controller);
