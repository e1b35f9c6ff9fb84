'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { showToast } from '@/components/ui/toast-store';
import type { ProblemDetails } from '@/lib/problem-details';
import { sendTakeUp } from './take-up-query';

/** Takes a sheet up and reads the page anew. */
export function useTakeUp() {
  const router = useRouter();
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  async function takeUp(releaseId: string) {
    if (isBusy) return;
    setIsBusy(true);
    setProblem(null);
    try {
      await sendTakeUp(releaseId);
      showToast({ text: 'Taken up. The job is in build.' });
      router.refresh();
    } catch (caught) {
      setProblem(problemOf(caught));
    } finally {
      setIsBusy(false);
    }
  }
  return { takeUp, isBusy, problem };
}
