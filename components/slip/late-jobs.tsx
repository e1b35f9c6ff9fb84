'use client';

import { type FormEvent, useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { controlLook } from '@/components/ui/field-frame';
import { FormError } from '@/components/ui/form-error';
import { LinkButton } from '@/components/ui/link-button';
import { TextField } from '@/components/ui/text-field';
import type { JobRow } from '@/lib/contracts/jobs';
import type { SlipInput } from '@/lib/contracts/slips';
import { paths } from '@/lib/paths';
import type { ProblemDetails } from '@/lib/problem-details';
import { stageWords } from '@/lib/schedule';

/** Which jobs are late, and by how many working days. */
export function LateJobs({
  jobs,
  chosen,
  onChoose,
  onAsk,
  isAsking,
  problem,
}: {
  jobs: readonly JobRow[];
  chosen: ReadonlySet<string>;
  onChoose: (chosen: ReadonlySet<string>) => void;
  onAsk: (input: SlipInput) => void;
  isAsking: boolean;
  problem: ProblemDetails | null;
}) {
  const [days, setDays] = useState(3);
  const [typed, setTyped] = useState('');
  const shown = useMemo(
    () => jobs.filter((job) => textOf(job).includes(typed.toLowerCase())),
    [jobs, typed],
  );

  function toggle(jobId: string) {
    const next = new Set(chosen);
    if (!next.delete(jobId)) next.add(jobId);
    onChoose(next);
  }
  function ask(event: FormEvent) {
    event.preventDefault();
    onAsk({ jobIds: [...chosen], days });
  }

  if (jobs.length === 0) {
    return (
      <EmptyState
        title="Nothing is at the bench"
        action={<LinkButton href={paths.diary()}>To the diary</LinkButton>}
      >
        A job can be late once it is measured and until it is installed.
      </EmptyState>
    );
  }
  return (
    <form onSubmit={ask} className="flex flex-col gap-3">
      <input
        type="search"
        aria-label="Find a job"
        placeholder="Find a job"
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
        className={`${controlLook} max-w-72`}
      />
      <fieldset>
        <legend className="pb-1 font-bold">
          Late are ({chosen.size} of {jobs.length})
        </legend>
        <ul className="max-h-[50dvh] overflow-y-auto border-y border-rule">
          {shown.map((job) => (
            <li key={job.id} className="border-b border-rule last:border-b-0">
              <label className="flex min-h-9 cursor-pointer items-baseline gap-2.5 py-1.5 hover:bg-tint max-md:min-h-thumb max-md:items-center">
                <input
                  type="checkbox"
                  className="size-4 shrink-0 self-center accent-pine"
                  checked={chosen.has(job.id)}
                  onChange={() => toggle(job.id)}
                />
                <span className="min-w-0 flex-1">
                  <b>{job.customerName}</b>, {job.street}
                  <span className="block text-note text-graphite">
                    {job.number} · {job.title} · {stageWords[job.stage].toLowerCase()}
                  </span>
                </span>
                <span className="shrink-0 text-note text-graphite">
                  {job.nextVisit ?? 'nothing booked'}
                </span>
              </label>
            </li>
          ))}
        </ul>
      </fieldset>
      <div className="flex flex-wrap items-end gap-3">
        <div className="w-44">
          <TextField
            label="Working days late"
            type="number"
            min={1}
            max={260}
            value={days}
            onChange={(event) => setDays(Number(event.target.value))}
            error={problem?.errors?.days}
            required
          />
        </div>
        <Button
          type="submit"
          disabled={chosen.size === 0}
          busyText={isAsking ? 'Looking…' : undefined}
        >
          See what it moves
        </Button>
      </div>
      <FormError problem={problem} shownFields={['days']} />
    </form>
  );
}

const textOf = ({ customerName, street, title, number }: JobRow) =>
  `${customerName} ${street} ${title} ${number}`.toLowerCase();
