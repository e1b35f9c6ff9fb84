import { useEffect, useEffectEvent } from 'react';
import { goOnAfterMs } from '@/lib/walls-pad/go-on';

/** Goes on a moment after a draft was made whole, unless another touch replaces or clears it first. */
export function useGoOn(going: object | null, goOn: () => void): void {
  const go = useEffectEvent(goOn);
  useEffect(() => {
    if (going === null) return;
    const timer = setTimeout(() => go(), goOnAfterMs);
    return () => clearTimeout(timer);
  }, [going]);
}
