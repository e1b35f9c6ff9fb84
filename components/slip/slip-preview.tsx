'use client';

import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import { Verdict } from '@/components/ui/verdict';
import type { SlipPreview as Preview, SlipMove } from '@/lib/contracts/slips';
import type { ProblemDetails } from '@/lib/problem-details';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { useAcceptSlip } from './slip-query';

/** All that a slip moves, before anything is moved; accepted whole, or not at all. */
export function SlipPreview({
  preview,
  onAccepted,
  onBack,
}: {
  preview: Preview;
  onAccepted: () => void;
  onBack: () => void;
}) {
  const [reason, setReason] = useState('');
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [idempotencyKey] = useState(() => crypto.randomUUID());
  const accept = useAcceptSlip();
  const placed = preview.moves.flatMap((move) =>
    move.proposal ? [{ ...move, proposal: move.proposal }] : [],
  );
  const unplaced = preview.moves.length - placed.length;

  async function take(event: FormEvent) {
    event.preventDefault();
    setProblem(null);
    try {
      const { moved, customersTold } = await accept.mutateAsync({
        idempotencyKey,
        reason,
        jobs: preview.jobs.map(({ jobId, readyOn }) => ({ jobId, readyOn })),
        moves: placed.map(({ visitId, version, proposal: { crewId, date, time } }) => ({
          visitId,
          version,
          crewId,
          date,
          time,
        })),
      });
      showToast({
        text: `${countOf(moved, 'visit')} moved, ${countOf(customersTold, 'customer')} told.`,
      });
      onAccepted();
    } catch (caught) {
      setProblem(problemOf(caught));
    }
  }

  return (
    <form onSubmit={take} className="flex flex-col gap-4">
      {preview.moves.length > 0 ? <MovesTable moves={preview.moves} /> : null}
      {preview.moves.length === 0 ? <p>No booked visit is in the way: nothing moves.</p> : null}
      <ul className="text-note text-graphite">
        {preview.jobs.map((job) => (
          <li key={job.jobId}>
            {job.customerName}, job {job.jobNumber}: ready {job.readyWords}, was {job.wasReadyWords}
          </li>
        ))}
        {preview.staying > 0 ? (
          <li>{countOf(preview.staying, 'visit')} of these jobs stay where they are.</li>
        ) : null}
      </ul>
      {unplaced > 0 ? (
        <p className="font-medium text-chalk">
          For {countOf(unplaced, 'visit')} no time was found: they stay where they are, and are to
          be moved by hand or called off.
        </p>
      ) : null}
      <TextField
        label="Why the shop is late"
        hint="Kept with each job. Customers are told the new time, once each, and not this."
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        error={problem?.errors?.reason}
        required
      />
      <FormError problem={problem} shownFields={['reason']} />
      <div className="flex flex-wrap gap-2">
        <Button type="submit" busyText={accept.isPending ? 'Moving them all…' : undefined}>
          {placed.length === 0
            ? 'Set the new days'
            : `Move ${placed.length === 1 ? 'it' : `all ${placed.length}`} and tell ${countOf(preview.customersToTell, 'customer')}`}
        </Button>
        <Button look="line" onClick={onBack}>
          Choose again
        </Button>
      </div>
    </form>
  );
}

function MovesTable({ moves }: { moves: readonly SlipMove[] }) {
  return (
    <div className="overflow-x-auto">
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">Visits that the slip moves</caption>
        <thead>
          <tr className="border-b border-ink text-note text-graphite">
            <th className="py-1 pr-4 font-medium">Visit</th>
            <th className="py-1 pr-4 font-medium">Stands now</th>
            <th className="py-1 pr-4 font-medium">What is in its way</th>
            <th className="py-1 font-medium">Goes to</th>
          </tr>
        </thead>
        <tbody>
          {moves.map((move) => (
            <MoveRow key={move.visitId} move={move} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

function MoveRow({ move }: { move: SlipMove }) {
  const { proposal } = move;
  return (
    <tr className="border-b border-rule align-top">
      <th scope="row" className="py-2 pr-4 font-normal">
        <b>{move.customerName}</b>
        <span className="block text-note text-graphite">
          {visitKindWords[move.kind]}, job {move.jobNumber}
        </span>
      </th>
      <td className="py-2 pr-4">
        {move.dayWords}, {move.windowWords}
        <span className="block text-note text-graphite">{move.crewName}</span>
      </td>
      <td className="py-2 pr-4 text-note text-ochre">{move.brokenGates.join(' ')}</td>
      <td className="py-2">
        {proposal ? (
          <>
            <b>
              {proposal.dayWords}, {proposal.windowWords}
            </b>
            <span className="block text-note text-graphite">
              {proposal.crewName} · {proposal.why}
            </span>
          </>
        ) : (
          <Verdict kind="problem">{move.whyNone}</Verdict>
        )}
      </td>
    </tr>
  );
}

const countOf = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;
