import { useEffect, useEffectEvent, useState } from 'react';

export type Once<Value> =
  | { state: 'reading' }
  | { state: 'here'; value: Value }
  | { state: 'failed' };

/** What the phone's store holds when it is asked, and no later: for what a screen then changes itself. */
export function useOnce<Value>(key: string, read: () => Promise<Value>): Once<Value> {
  const [once, setOnce] = useState<{ key: string; once: Once<Value> }>({
    key,
    once: { state: 'reading' },
  });
  const readNow = useEffectEvent(read);

  useEffect(() => {
    let isShown = true;
    readNow()
      .then((value) => isShown && setOnce({ key, once: { state: 'here', value } }))
      .catch(() => isShown && setOnce({ key, once: { state: 'failed' } }));
    return () => {
      isShown = false;
    };
  }, [key]);

  return once.key === key ? once.once : { state: 'reading' };
}
