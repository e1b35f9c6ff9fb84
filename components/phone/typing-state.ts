/** Whether something is half typed on this phone, in any of its tabs: then no newer program takes over. */

const lockName = 'setwell.typing';
const listeners = new Set<() => void>();
let typing = 0;

/** Until the returned function is called, something is half typed here. */
export function holdTyping(): () => void {
  typing += 1;
  const { letGo, gone } = holdForOtherTabs();
  return () => {
    typing -= 1;
    letGo();
    // Told once the other tabs can see it too.
    void gone.then(() => {
      if (typing === 0) for (const listener of listeners) listener();
    });
  };
}

export const isTypingHere = (): boolean => typing > 0;

/** Called each time nothing is half typed here any more. */
export function whenAtRest(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Does it if nothing is half typed in any tab; false otherwise, and nothing was done. */
export async function ifAtRest(work: () => void): Promise<boolean> {
  if (isTypingHere()) return false;
  if (!navigator.locks) {
    work();
    return true;
  }
  return navigator.locks.request(lockName, { mode: 'exclusive', ifAvailable: true }, (lock) => {
    if (lock) work();
    return lock !== null;
  });
}

function holdForOtherTabs(): { letGo: () => void; gone: Promise<void> } {
  if (!navigator.locks) return { letGo: () => {}, gone: Promise.resolve() };
  let letGo = () => {};
  const held = new Promise<void>((resolve) => {
    letGo = resolve;
  });
  // A page that is thrown away lets go of its locks by itself.
  const gone = navigator.locks.request(lockName, { mode: 'shared' }, () => held).catch(() => {});
  return { letGo, gone };
}
