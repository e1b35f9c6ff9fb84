'use client';

import Link from 'next/link';
import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import { Verdict } from '@/components/ui/verdict';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import type { ProblemDetails } from '@/lib/problem-details';
import { doesKind, visitKindWords } from '@/lib/schedule/visit-kind-words';
import { useCallOffVisit, useMoveVisit } from './change-visit-query';
import { canChange } from './place';
import { type Placing, PlacingFields } from './placing-fields';
import { HeldActions } from './times/held-actions';
import { isWorthAsking, type RefusedMove } from './use-mover';
import { useTakeBack } from './use-take-back';
import { useYesByPhone } from './use-yes-by-phone';
import { minutesWords, statusWords } from './visit-words';

type VisitDialogProps = {
  visit: VisitView;
  /** Local day and time of its start, in the shop's zone. */
  start: { date: string; time: string };
  crews: readonly CrewView[];
  mayBook: boolean;
  /** Looks for times that work in place of this one. */
  onAnotherTime: () => void;
  /** Somebody was faster, or a gate stands against it. */
  onRefused: (refused: RefusedMove) => void;
  onClose: () => void;
};

/** One visit opened: who and where, how it stands, and what can be done with it. */
export function VisitDialog({
  visit,
  start,
  crews,
  mayBook,
  onAnotherTime,
  onRefused,
  onClose,
}: VisitDialogProps) {
  const { words, verdict } = statusWords[visit.status];
  const isChangeable = mayBook && canChange(visit);
  const sayYes = useYesByPhone();
  return (
    <Dialog
      isOpen
      onClose={onClose}
      title={`${visitKindWords[visit.kind]} · ${visit.customerName}`}
    >
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1">
        <dt className="text-graphite">Where</dt>
        <dd>
          {visit.street}
          {visit.town ? `, ${visit.town}` : ''}
        </dd>
        <dt className="text-graphite">When</dt>
        <dd>
          {visit.dayWords}, arriving {visit.windowWords}; {minutesWords(visit.workMinutes)} of work
          {visit.pieces.length > 1 ? ` over ${visit.pieces.length} days` : ''}
        </dd>
        <dt className="text-graphite">Who</dt>
        <dd>{visit.crewName}</dd>
        <dt className="text-graphite">Stands</dt>
        <dd>
          <Verdict kind={verdict}>{words}</Verdict>
          {visit.customerSays ? <span className="text-ochre"> “{visit.customerSays}”</span> : null}
        </dd>
        {visit.phone ? (
          <>
            <dt className="text-graphite">Phone</dt>
            <dd>
              <a href={`tel:${visit.phone.replace(/[^+\d]/g, '')}`} className="underline">
                {visit.phone}
              </a>
            </dd>
          </>
        ) : null}
        <dt className="text-graphite">Job</dt>
        <dd>
          <Link href={paths.job(visit.jobId)} className="underline">
            {visit.jobNumber}, {visit.jobTitle}
          </Link>
        </dd>
      </dl>
      {isChangeable ? (
        <div className="flex flex-wrap gap-3">
          <Button onClick={onAnotherTime} data-first-focus>
            Times that work instead
          </Button>
          {visit.status === 'booked' ? (
            <Button
              look="line"
              onClick={() => {
                void sayYes(visit);
                onClose();
              }}
            >
              They said yes on the phone
            </Button>
          ) : null}
        </div>
      ) : null}
      {mayBook && visit.status === 'held' ? (
        <HeldActions visitId={visit.id} onDone={onClose} />
      ) : null}
      {isChangeable ? <MoveForm {...{ visit, start, crews, onRefused, onClose }} /> : null}
      {isChangeable ? <CallOffForm {...{ visit, onClose }} /> : null}
    </Dialog>
  );
}

function MoveForm({
  visit,
  start,
  crews,
  onRefused,
  onClose,
}: Omit<VisitDialogProps, 'mayBook' | 'onAnotherTime'>) {
  // What was seen when it was opened: a change by somebody else meanwhile must not be moved over unseen.
  const [seen] = useState(visit);
  const [placing, setPlacing] = useState<Placing>({
    crewId: visit.crewId,
    ...start,
    workMinutes: visit.workMinutes,
  });
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const move = useMoveVisit();
  const takeBack = useTakeBack();
  const able = crews.filter((crew) => crew.does === doesKind[visit.kind]);

  async function submit(event: FormEvent) {
    event.preventDefault();
    setProblem(null);
    try {
      const { id, version } = seen;
      const moved = await move.mutateAsync({
        visitId: id,
        version,
        ...placing,
        overrideReason: '',
      });
      showToast({
        text: `Moved to ${moved.dayWords}, ${moved.windowWords}. The customer is told.`,
        undo: () => void takeBack(moved),
      });
      onClose();
    } catch (caught) {
      const refusal = problemOf(caught);
      if (!isWorthAsking(refusal)) return setProblem(refusal);
      onClose();
      onRefused({ visit: seen, place: placing, problem: refusal });
    }
  }

  return (
    <form onSubmit={submit} className="flex flex-col gap-3 border-t border-rule pt-3">
      <PlacingFields crews={able} placing={placing} onChange={setPlacing} problem={problem} />
      <FormError problem={problem} shownFields={['crewId', 'date', 'time', 'workMinutes']} />
      <div>
        <Button look="line" type="submit" busyText={move.isPending ? 'Moving…' : undefined}>
          Move it
        </Button>
      </div>
    </form>
  );
}

function CallOffForm({ visit, onClose }: { visit: VisitView; onClose: () => void }) {
  const [reason, setReason] = useState('');
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const callOff = useCallOffVisit();
  const takeBack = useTakeBack();

  async function submit(event: FormEvent) {
    event.preventDefault();
    try {
      const { id, version } = visit;
      const off = await callOff.mutateAsync({ visitId: id, version, reason });
      showToast({
        text: `Called off: ${visit.customerName}, ${visit.dayWords}`,
        undo: () => void takeBack(off),
      });
      onClose();
    } catch (caught) {
      setProblem(problemOf(caught));
    }
  }

  return (
    <form onSubmit={submit} className="flex flex-wrap items-end gap-3 border-t border-rule pt-3">
      <div className="min-w-52 flex-1">
        <TextField
          label="Or call it off, because"
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          error={problem?.errors?.reason}
          required
        />
      </div>
      <Button type="submit" look="chalk" busyText={callOff.isPending ? 'Calling off…' : undefined}>
        Call it off
      </Button>
      <FormError problem={problem} shownFields={['reason']} />
    </form>
  );
}
