'use client';

import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextareaField } from '@/components/ui/textarea-field';
import type { StaleVisit } from '@/lib/contracts/visit-changes';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { useDiaryLocale } from './diary-locale';
import type { Place } from './place';
import type { RefusedMove } from './use-mover';
import { minutesWords, statusWords } from './visit-words';

type RefusedMoveDialogProps = {
  refused: RefusedMove;
  crews: readonly CrewView[];
  onAgain: (visit: VisitView, place: Place, overrideReason: string) => void;
  onClose: () => void;
};

/**
 * A move that came too late, or that a gate stands against: what is so now, what was wanted, and the same
 * again on what is so now.
 */
export function RefusedMoveDialog({ refused, crews, onAgain, onClose }: RefusedMoveDialogProps) {
  const { visit, place, problem } = refused;
  const [reason, setReason] = useState('');
  const now = problem.code === 'visit-changed' ? (problem.current as StaleVisit) : null;
  const crewName = crews.find(({ id }) => id === place.crewId)?.name ?? '';
  const day = formatLocalDayShort(place.date, useDiaryLocale());

  function again(event: FormEvent) {
    event.preventDefault();
    onAgain(now ?? visit, place, reason);
  }

  return (
    <Dialog
      isOpen
      onClose={onClose}
      title={now ? `${visit.customerName}: somebody was faster` : `${visit.customerName}: not yet`}
    >
      <form onSubmit={again} className="flex flex-col gap-4">
        {now ? <WhatChanged now={now} /> : <p>{problem.detail ?? problem.title}</p>}
        <p>
          You wanted: <b>{`${day}, ${place.time}`}</b>, {crewName},{' '}
          {minutesWords(place.workMinutes)}.
        </p>
        {now ? null : (
          <TextareaField
            label="Why it is put there all the same"
            value={reason}
            onChange={(event) => setReason(event.target.value)}
            required
          />
        )}
        <div className="flex flex-wrap gap-2">
          <Button type="submit">{now ? 'Do it all the same' : 'Move it there'}</Button>
          <Button look="line" onClick={onClose}>
            Leave it as it is
          </Button>
        </div>
      </form>
    </Dialog>
  );
}

function WhatChanged({ now }: { now: StaleVisit }) {
  return (
    <>
      {now.lastChange ? (
        <p>
          <b>{now.lastChange.by}</b>, {now.lastChange.atWords}: {now.lastChange.summary}
        </p>
      ) : null}
      <p>
        It is now: <b>{`${now.dayWords}, ${now.windowWords}`}</b>, {now.crewName},{' '}
        {minutesWords(now.workMinutes)}, {statusWords[now.status].words}. Nothing of yours was
        written.
      </p>
    </>
  );
}
