'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useBookVisit, useMoveVisit } from '@/components/diary/change-visit-query';
import { useTakeBack } from '@/components/diary/use-take-back';
import { problemOf } from '@/components/shell/ask-server';
import { showToast } from '@/components/ui/toast-store';
import type { HeldVisit, Opening } from '@/lib/contracts/openings';
import type { ProblemDetails } from '@/lib/problem-details';
import { useHoldOpening } from './hold-query';
import { openingsKey } from './openings-query';
import type { TimesSubject } from './times-subject';

/** Books the chosen time, or moves the visit there; a time that went in the meantime is said, and looked for anew. */
export function useBookOpening(subject: TimesSubject, onBooked: (date: string) => void) {
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  // Kept over tries: a booking that got through although its answer was lost is not made twice.
  const [keys] = useState(() => new Map<string, string>());
  const book = useBookVisit();
  const move = useMoveVisit();
  const [held, setHeld] = useState<HeldVisit | null>(null);
  const hold = useHoldOpening();
  const takeBack = useTakeBack();
  const client = useQueryClient();

  /** Whether it is booked now. */
  async function bookOpening(opening: Opening, overrideReason: string): Promise<boolean> {
    const { crewId, date, time, workMinutes } = opening;
    const place = { crewId, date, time, workMinutes, overrideReason };
    const { jobId, kind, visit } = subject;
    setProblem(null);
    try {
      const booked = visit
        ? await move.mutateAsync({ visitId: visit.id, version: visit.version, ...place })
        : await book.mutateAsync({
            idempotencyKey: keyFor(keys, `${crewId} ${date} ${time}`),
            jobId,
            kind,
            ...place,
          });
      showToast({
        text: `${visit ? 'Moved' : 'Booked'}: ${booked.customerName}, ${booked.dayWords}, ${booked.windowWords}`,
        undo: () => void takeBack(booked),
      });
      onBooked(date);
      return true;
    } catch (caught) {
      setProblem(problemOf(caught));
      await client.invalidateQueries({ queryKey: openingsKey });
      return false;
    }
  }

  async function holdOpening(opening: Opening, overrideReason: string) {
    const { crewId, date, time, workMinutes } = opening;
    setProblem(null);
    try {
      const { jobId, kind, visit } = subject;
      setHeld(
        await hold.mutateAsync({
          idempotencyKey: crypto.randomUUID(),
          jobId,
          kind,
          ...(visit ? { forVisitId: visit.id } : {}),
          ...{ crewId, date, time, workMinutes, overrideReason },
        }),
      );
    } catch (caught) {
      setProblem(problemOf(caught));
    }
  }

  return {
    bookOpening,
    holdOpening,
    held,
    problem,
    isPending: book.isPending || move.isPending || hold.isPending,
  };
}

function keyFor(keys: Map<string, string>, place: string): string {
  const key = keys.get(place) ?? crypto.randomUUID();
  keys.set(place, key);
  return key;
}
