'use client';

import { useState } from 'react';
import { useTakeBack } from '@/components/diary/use-take-back';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { showToast } from '@/components/ui/toast-store';
import type { ProblemDetails } from '@/lib/problem-details';
import { useLetGoHeldTime, useTakeHeldTime } from './hold-query';

/** A time that is held: it becomes the booking, or is free again. */
export function HeldActions({ visitId, onDone }: { visitId: string; onDone: () => void }) {
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const take = useTakeHeldTime();
  const letGo = useLetGoHeldTime();
  const takeBack = useTakeBack();

  async function run(work: () => Promise<{ text: string; undo?: () => void }>) {
    setProblem(null);
    try {
      showToast(await work());
      onDone();
    } catch (caught) {
      setProblem(problemOf(caught));
    }
  }

  return (
    <div className="flex flex-col gap-2">
      <FormError problem={problem} />
      <div className="flex flex-wrap gap-2">
        <Button
          busyText={take.isPending ? 'Booking…' : undefined}
          onClick={() =>
            run(async () => {
              const taken = await take.mutateAsync({ visitId });
              const { customerName, dayWords, windowWords } = taken;
              return {
                text: `Booked: ${customerName}, ${dayWords}, ${windowWords}`,
                undo: () => void takeBack(taken),
              };
            })
          }
        >
          Book the held time
        </Button>
        <Button
          look="line"
          busyText={letGo.isPending ? 'Letting go…' : undefined}
          onClick={() =>
            run(async () => {
              await letGo.mutateAsync({ visitId });
              return { text: 'Let go: the time is free again.' };
            })
          }
        >
          Let it go
        </Button>
      </div>
    </div>
  );
}
