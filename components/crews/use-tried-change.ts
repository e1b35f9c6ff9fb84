'use client';

import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import type { CrewChange, VisitOutside } from '@/lib/contracts/crews';
import type { ProblemDetails } from '@/lib/problem-details';

type Send<Change> = (change: Change & { isTrial: boolean }) => Promise<CrewChange>;

/**
 * A change is tried first. Where it would leave visits outside the crew's days, they are shown and it waits
 * for a second word; else it is kept at once.
 */
export function useTriedChange<Change extends object>(send: Send<Change>, onKept: () => void) {
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [waiting, setWaiting] = useState<{ change: Change; outside: VisitOutside[] } | null>(null);

  async function run(work: () => Promise<void>) {
    if (isBusy) return;
    setIsBusy(true);
    setProblem(null);
    try {
      await work();
    } catch (caught) {
      setWaiting(null);
      setProblem(problemOf(caught));
    } finally {
      setIsBusy(false);
    }
  }

  const keep = (change: Change) =>
    run(async () => {
      await send({ ...change, isTrial: false });
      setWaiting(null);
      onKept();
    });

  const save = (change: Change) =>
    run(async () => {
      const { newlyOutside } = await send({ ...change, isTrial: true });
      if (newlyOutside.length > 0) {
        setWaiting({ change, outside: newlyOutside });
        return;
      }
      await send({ ...change, isTrial: false });
      onKept();
    });

  return {
    isBusy,
    problem,
    fail: setProblem,
    save,
    /** What the change would leave outside; null while nothing is asked. */
    outside: waiting?.outside ?? null,
    keepAnyway: () => waiting && keep(waiting.change),
    letBe: () => setWaiting(null),
  };
}
