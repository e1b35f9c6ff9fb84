'use client';

import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { LinkButton } from '@/components/ui/link-button';
import { Verdict } from '@/components/ui/verdict';
import type { BenchSheet } from '@/lib/contracts/bench';
import { paths } from '@/lib/paths';
import { ReadyForm } from './ready-form';

type BenchCardProps = {
  sheet: BenchSheet;
  /** Null where this person may not. */
  onTakeUp: (() => void) | null;
  maySayReady: boolean;
  mayBook: boolean;
};

/** One sheet: when it is needed, which revision counts, and how far it is. */
export function BenchCard({ sheet, onTakeUp, maySayReady, mayBook }: BenchCardProps) {
  const { jobId, roomId, revision, needWords, isSuperseded, lateDays } = sheet;
  return (
    <article
      aria-label={`${sheet.customerName}, ${sheet.roomName}`}
      className={`grid gap-x-6 gap-y-3 rounded border bg-sheet px-5 py-4 lg:grid-cols-[10.5rem_minmax(0,1fr)_minmax(0,18rem)] ${
        isSuperseded ? 'border-2 border-chalk' : 'border-ink'
      }`}
    >
      <div>
        <p className="text-note text-graphite">needed</p>
        <p className="text-title leading-tight font-bold whitespace-nowrap">
          {needWords ?? 'not booked'}
        </p>
        {lateDays > 0 ? (
          <Verdict kind="late">{lateDays === 1 ? '1 day late' : `${lateDays} days late`}</Verdict>
        ) : null}
      </div>
      <div className="flex min-w-0 flex-col gap-1">
        <p className="leading-tight font-bold">
          <Link href={paths.job(jobId)} className="hover:underline">
            {sheet.customerName}
          </Link>
        </p>
        <p className="text-body text-graphite">
          {sheet.jobNumber} · {sheet.jobTitle}
          {sheet.finish ? ` · ${sheet.finish}` : ''}
        </p>
        <div className="flex flex-wrap items-center gap-3 pt-1">
          <LinkButton
            size="thumb"
            look="line"
            className="w-auto"
            href={paths.sheet(jobId, roomId, revision)}
          >
            {sheet.roomName}, revision {revision}
          </LinkButton>
          {isSuperseded ? <Verdict kind="over">superseded: do not cut</Verdict> : null}
        </div>
        <p className="text-note text-graphite">released {sheet.releasedAtWords}</p>
      </div>
      <div className="flex flex-col gap-3">
        {sheet.takenUpWords ? (
          <Verdict kind="confirmed" className="text-body">
            taken up {sheet.takenUpWords}
          </Verdict>
        ) : onTakeUp ? (
          <Button size="thumb" onClick={onTakeUp}>
            Take it up
          </Button>
        ) : (
          <Verdict kind="waiting">not taken up</Verdict>
        )}
        <ReadyState sheet={sheet} />
        {maySayReady ? <ReadyForm key={`${sheet.readyOn} ${sheet.isReady}`} sheet={sheet} /> : null}
        {lateDays > 0 && mayBook ? (
          <LinkButton size="thumb" look="line" href={paths.slipOf(jobId, lateDays)}>
            See what it moves
          </LinkButton>
        ) : null}
      </div>
    </article>
  );
}

function ReadyState({ sheet }: { sheet: BenchSheet }) {
  const { isReady, readyWords, readyWhere, readyWhy, lateDays } = sheet;
  if (isReady)
    return <Verdict kind="confirmed">ready{readyWhere ? `: ${readyWhere}` : ''}</Verdict>;
  if (!readyWords) return null;
  return (
    <div>
      <Verdict kind={lateDays > 0 ? 'late' : 'waiting'}>will be ready {readyWords}</Verdict>
      {readyWhy ? <p className="text-body text-graphite">{readyWhy}</p> : null}
      {lateDays > 0 ? (
        <p className="text-body text-graphite">It stands before the scheduler.</p>
      ) : null}
    </div>
  );
}
