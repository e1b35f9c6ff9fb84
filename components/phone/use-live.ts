'use client';

import { liveQuery } from 'dexie';
import { useEffect, useEffectEvent, useState } from 'react';

export type Live<Value> =
  | { state: 'reading' }
  | { state: 'here'; value: Value }
  | { state: 'failed' };

/** What the phone's store holds, now and after every change, in this tab or another. `key` names the question. */
export function useLive<Value>(key: string, read: () => Promise<Value>): Live<Value> {
  const [live, setLive] = useState<{ key: string; live: Live<Value> }>({
    key,
    live: { state: 'reading' },
  });
  const readNow = useEffectEvent(read);

  useEffect(() => {
    const subscription = liveQuery(() => readNow()).subscribe({
      next: (value) => setLive({ key, live: { state: 'here', value } }),
      error: () => setLive({ key, live: { state: 'failed' } }),
    });
    return () => subscription.unsubscribe();
  }, [key]);

  return live.key === key ? live.live : { state: 'reading' };
}
