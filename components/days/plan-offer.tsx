'use client';

import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { sayProblem } from '@/components/shell/say-problem';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { showToast } from '@/components/ui/toast-store';
import type { DayPlanView } from '@/lib/contracts/day-plans';
import type { ProblemDetails } from '@/lib/problem-details';
import { useAcceptDayPlan } from './day-plan-query';
import { changesBack, savedWords } from './plan-moves';

/** The better order in minutes before and after, taken whole or not at all. */
export function PlanOffer({
  plan,
  what,
  onDone,
}: {
  plan: DayPlanView;
  /** "Crew North", "all crews". */
  what: string;
  onDone: () => void;
}) {
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [idempotencyKey] = useState(() => crypto.randomUUID());
  const accept = useAcceptDayPlan();
  const { date, changes, nowDriveMinutes, betterDriveMinutes, isDriveEstimated } = plan;

  async function take() {
    setProblem(null);
    try {
      const { changed } = await accept.mutateAsync({ idempotencyKey, date, changes });
      showToast({
        text: `${changed} ${changed === 1 ? 'visit' : 'visits'} moved. No promise is broken.`,
        undo: () => void putBack(),
      });
      onDone();
    } catch (caught) {
      setProblem(problemOf(caught));
    }
  }

  async function putBack() {
    try {
      const back = { idempotencyKey: crypto.randomUUID(), date, changes: changesBack(plan) };
      await accept.mutateAsync(back);
      showToast({ text: 'Taken back: the day is in the order that it had.' });
    } catch (caught) {
      sayProblem(caught);
    }
  }

  if (changes.length === 0) {
    return (
      <div className="flex flex-wrap items-center gap-3 border border-rule bg-sheet px-3 py-2">
        <p className="flex-1">No better order was found for {what}: this is the best one.</p>
        <Button look="line" onClick={onDone}>
          Back to the day
        </Button>
      </div>
    );
  }
  return (
    <div className="flex flex-col gap-2 border border-ink bg-sheet px-3 py-2">
      <p>
        <b>Better order for {what}: </b>
        {Math.round(nowDriveMinutes)} → {Math.round(betterDriveMinutes)} min of driving,{' '}
        <b>{savedWords(nowDriveMinutes, betterDriveMinutes)}</b>
        {isDriveEstimated ? ' (drive times estimated)' : ''}. {changes.length}{' '}
        {changes.length === 1 ? 'visit moves' : 'visits move'}; every promised window is kept.
      </p>
      <FormError problem={problem} />
      <div className="flex flex-wrap gap-2">
        <Button
          onClick={() => void take()}
          busyText={accept.isPending ? 'Putting in order…' : undefined}
        >
          Put the day in this order
        </Button>
        <Button look="line" onClick={onDone} keyName="Esc">
          Leave it as it is
        </Button>
      </div>
    </div>
  );
}
