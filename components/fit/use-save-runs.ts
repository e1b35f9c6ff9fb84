'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { showToast } from '@/components/ui/toast-store';
import type { FitView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import type { ProblemDetails } from '@/lib/problem-details';
import { sendRuns } from './save-runs-query';

type Seen = Pick<FitView, 'runs' | 'runsMark'> & { roomId: string };

/** Saves runs and offers the way back: undo puts back what stood before, unless somebody changed it since. */
export function useSaveRuns({ roomId, runs: before, runsMark }: Seen) {
  const router = useRouter();
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);

  async function undo(seenRunsMark: string) {
    try {
      await sendRuns({ roomId, runs: before, seenRunsMark });
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
    }
  }

  async function save(runs: Run[], told: string): Promise<boolean> {
    if (isBusy) return false;
    setIsBusy(true);
    setProblem(null);
    try {
      const { runsMark: newMark } = await sendRuns({ roomId, runs, seenRunsMark: runsMark });
      showToast({ text: told, undo: () => void undo(newMark) });
      router.refresh();
      return true;
    } catch (caught) {
      setProblem(problemOf(caught));
      return false;
    } finally {
      setIsBusy(false);
    }
  }
  return { save, isBusy, problem };
}
