'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { showToast } from '@/components/ui/toast-store';

/** Does one thing to a snag and reads the page anew; what went wrong is said at the foot. */
export function useSnagRequest() {
  const router = useRouter();
  const [isBusy, setIsBusy] = useState(false);
  const ask = async (work: () => Promise<unknown>, done: string): Promise<boolean> => {
    setIsBusy(true);
    try {
      await work();
      showToast({ text: done });
      router.refresh();
      return true;
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
      return false;
    } finally {
      setIsBusy(false);
    }
  };
  return { ask, isBusy };
}
