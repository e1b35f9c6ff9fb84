'use client';

import { useEffect, useEffectEvent, useState } from 'react';
import { watchStore } from './phone-database';

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

  useEffect(
    () =>
      watchStore(() => readNow(), {
        next: (value) => setLive({ key, live: { state: 'here', value } }),
        error: () => setLive({ key, live: { state: 'failed' } }),
      }),
    [key],
  );

  return live.key === key ? live.live : { state: 'reading' };
}
