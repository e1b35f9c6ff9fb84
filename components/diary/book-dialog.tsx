'use client';

import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { FormError } from '@/components/ui/form-error';
import { TextareaField } from '@/components/ui/textarea-field';
import { showToast } from '@/components/ui/toast-store';
import type { BookVisitInput, CrewView, WaitingItem } from '@/lib/contracts/visits';
import type { ProblemDetails } from '@/lib/problem-details';
import { doesKind, visitKindWords } from '@/lib/schedule/visit-kind-words';
import { useBookVisit } from './change-visit-query';
import { type Placing, PlacingFields } from './placing-fields';
import { useTakeBack } from './use-take-back';

type BookDialogProps = {
  item: WaitingItem;
  crews: readonly CrewView[];
  /** Where it was dropped, or the first day it may take place. */
  start: { date: string; time: string; crewId?: string };
  onClose: () => void;
  onBooked: (date: string) => void;
};

/** Places one waiting visit: crew, day, time. A gate that is not passed asks for the reason, and keeps it. */
export function BookDialog({ item, crews, start, onClose, onBooked }: BookDialogProps) {
  const able = crews.filter((crew) => crew.does === doesKind[item.kind]);
  const [placing, setPlacing] = useState<Placing>({
    crewId: able.find(({ id }) => id === start.crewId)?.id ?? able[0]?.id ?? '',
    date: start.date,
    time: start.time,
    workMinutes: item.workMinutes,
  });
  const [overrideReason, setOverrideReason] = useState('');
  // Kept over tries: a booking that got through although its answer was lost is not made twice.
  const [idempotencyKey] = useState(() => crypto.randomUUID());
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const book = useBookVisit();
  const takeBack = useTakeBack();
  const openGates =
    item.state === 'now' || (item.from !== null && placing.date >= item.from) ? [] : item.openGates;

  async function submit(event: FormEvent) {
    event.preventDefault();
    setProblem(null);
    const { jobId, kind } = item;
    const input: BookVisitInput = { idempotencyKey, jobId, kind, ...placing, overrideReason };
    try {
      const visit = await book.mutateAsync(input);
      showToast({
        text: `Booked: ${visit.customerName}, ${visit.dayWords}, ${visit.windowWords}`,
        undo: () => void takeBack(visit),
      });
      onBooked(placing.date);
    } catch (caught) {
      setProblem(problemOf(caught));
    }
  }

  return (
    <Dialog
      isOpen
      onClose={onClose}
      title={`${visitKindWords[item.kind]} · ${item.customerName}, ${item.street}`}
    >
      <form onSubmit={submit} className="flex flex-col gap-4">
        <p className="text-graphite">{item.why}</p>
        <PlacingFields crews={able} placing={placing} onChange={setPlacing} problem={problem} />
        {openGates.length > 0 ? (
          <TextareaField
            label="Why book it all the same?"
            hint={openGates.map((gate) => gate.words).join('; ')}
            value={overrideReason}
            onChange={(event) => setOverrideReason(event.target.value)}
            required
          />
        ) : null}
        <FormError problem={problem} shownFields={['crewId', 'date', 'time', 'workMinutes']} />
        <div className="flex flex-wrap gap-2">
          <Button type="submit" busyText={book.isPending ? 'Booking…' : undefined}>
            Book and tell the customer
          </Button>
          <Button look="line" onClick={onClose}>
            Leave it
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
