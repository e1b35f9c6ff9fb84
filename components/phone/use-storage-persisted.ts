import { useEffect, useState } from 'react';

/** Whether the browser has promised not to clear the store; null until it has said, or when it cannot. */
export function useStoragePersisted(): boolean | null {
  const [isPersisted, setIsPersisted] = useState<boolean | null>(null);
  useEffect(() => {
    let isShown = true;
    navigator.storage
      ?.persisted?.()
      .then((answer) => isShown && setIsPersisted(answer))
      .catch(() => {});
    return () => {
      isShown = false;
    };
  }, []);
  return isPersisted;
}
