'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useJobSearch } from '@/components/shell/job-search-query';
import { usePageKeys } from '@/components/shell/page-keys';
import { type Column, DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { KeyHint } from '@/components/ui/key-hint';
import { LinkButton } from '@/components/ui/link-button';
import type { JobRow } from '@/lib/contracts/jobs';
import { apiPaths, paths } from '@/lib/paths';
import { stages, stageWords } from '@/lib/schedule/stages';
import { SavedViews } from './saved-views';

const columns: Column<JobRow>[] = [
  {
    key: 'number',
    header: 'No.',
    isForDesk: true,
    isNumber: true,
    cell: (job) => job.number,
    sortValue: (job) => job.number,
    text: (job) => String(job.number),
  },
  {
    key: 'customer',
    header: 'Customer',
    cell: (job) => (
      <Link href={paths.job(job.id)} className="font-bold hover:underline">
        {job.customerName}
      </Link>
    ),
    sortValue: (job) => job.customerName,
    text: (job) => `${job.customerName} ${job.phone}`,
  },
  {
    key: 'site',
    header: 'Site',
    cell: (job) => [job.street, job.town].filter(Boolean).join(', '),
    sortValue: (job) => `${job.town} ${job.street}`,
    text: (job) => `${job.street} ${job.town}`,
  },
  {
    key: 'title',
    header: 'Job',
    isForDesk: true,
    cell: (job) => job.title,
    text: (job) => job.title,
  },
  {
    key: 'stage',
    header: 'Stage',
    cell: (job) => stageWords[job.stage],
    sortValue: (job) => stages.indexOf(job.stage),
    choice: (job) => stageWords[job.stage],
  },
  {
    key: 'next',
    header: 'Next visit',
    cell: (job) => job.nextVisit ?? <span className="text-graphite">none booked</span>,
  },
  {
    key: 'map',
    header: 'Map',
    isForDesk: true,
    cell: (job) => (job.isOnMap ? '' : <span className="text-ochre">no pin</span>),
    choice: (job) => (job.isOnMap ? 'has a pin' : 'no pin'),
  },
  {
    key: 'units',
    header: 'Units',
    isForDesk: true,
    isNumber: true,
    cell: (job) => job.unitCount || '',
    sortValue: (job) => job.unitCount,
  },
];

const jobKey = ({ id }: JobRow) => id;

export function JobsTable({ jobs, mayStart }: { jobs: JobRow[]; mayStart: boolean }) {
  const router = useRouter();
  const [typed, setTyped] = useState('');
  // The list has the newest jobs; older ones, and what only the notes say, are asked for.
  const { data: found } = useJobSearch(typed);
  usePageKeys(
    'Jobs',
    mayStart ? [{ keys: 'n', words: 'New job', run: () => router.push(paths.newJob()) }] : [],
  );
  return (
    <DataTable
      name="jobs"
      onTyped={setTyped}
      alsoFound={found}
      viewTools={(view, changeView) => (
        <SavedViews table="jobs" view={view} changeView={changeView} />
      )}
      caption={`Jobs, ${jobs.length}`}
      rows={jobs}
      columns={columns}
      rowKey={jobKey}
      order={{ column: 'number', isDescending: true }}
      filterLabel="Name, street, phone or note"
      tools={
        mayStart ? (
          <>
            <LinkButton look="line" href={paths.importJobs()}>
              From a list
            </LinkButton>
            <LinkButton look="line" href={apiPaths.exportJobs()} prefetch={false} download>
              As CSV
            </LinkButton>
            <LinkButton href={paths.newJob()}>
              New job <KeyHint keys="N" isOnFill />
            </LinkButton>
          </>
        ) : null
      }
      empty={
        <EmptyState
          title="No jobs yet"
          action={
            mayStart ? <LinkButton href={paths.newJob()}>Start the first job</LinkButton> : null
          }
        >
          A job begins with a call: who it is, where, and what they want made.
        </EmptyState>
      }
    />
  );
}
