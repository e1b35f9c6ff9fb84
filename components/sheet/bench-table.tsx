'use client';

import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { type Column, DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { FormError } from '@/components/ui/form-error';
import { Verdict } from '@/components/ui/verdict';
import type { BenchRow } from '@/lib/contracts/rooms';
import { paths } from '@/lib/paths';
import { ReadyField } from './ready-field';
import { useTakeUp } from './use-take-up';

type BenchTableProps = { rows: BenchRow[]; mayTakeUp: boolean; maySayReady: boolean };

/** What the bench has to build, first install first; superseded sheets say so in red. */
export function BenchTable({ rows, mayTakeUp, maySayReady }: BenchTableProps) {
  const { takeUp, problem } = useTakeUp();
  const numbered = rows.map((row, index) => ({ ...row, order: index }));
  type Row = (typeof numbered)[number];
  const columns: Column<Row>[] = [
    {
      key: 'install',
      header: 'Install',
      isForDesk: true,
      cell: ({ installWords }) => installWords ?? <span className="text-graphite">not booked</span>,
      sortValue: ({ order }) => order,
    },
    {
      key: 'job',
      header: 'Job',
      cell: ({ jobId, jobNumber, customerName, jobTitle }) => (
        <>
          <Link href={paths.job(jobId)} className="font-bold hover:underline">
            {customerName}
          </Link>
          <span className="block text-note text-graphite">
            {jobNumber} · {jobTitle}
          </span>
        </>
      ),
      sortValue: ({ customerName }) => customerName,
      text: ({ customerName, jobTitle, jobNumber }) => `${customerName} ${jobTitle} ${jobNumber}`,
    },
    {
      key: 'sheet',
      header: 'Sheet',
      cell: ({ jobId, roomId, roomName, revision, isSuperseded }) => (
        <>
          <Link href={paths.sheet(jobId, roomId, revision)} className="link">
            {roomName}, revision {revision}
          </Link>
          {isSuperseded ? (
            <Verdict kind="over" className="ml-3">
              superseded
            </Verdict>
          ) : null}
        </>
      ),
      sortValue: ({ roomName }) => roomName,
      text: ({ roomName }) => roomName,
    },
    {
      key: 'released',
      header: 'Released',
      isForDesk: true,
      cell: ({ releasedAtWords }) => releasedAtWords,
    },
    {
      key: 'bench',
      header: 'Bench',
      cell: ({ releaseId, takenUpWords }) =>
        takenUpWords ? (
          <Verdict kind="confirmed">{takenUpWords}</Verdict>
        ) : mayTakeUp ? (
          <Button look="line" onClick={() => void takeUp(releaseId)}>
            Take it up
          </Button>
        ) : (
          <Verdict kind="waiting">not taken up</Verdict>
        ),
      choice: ({ takenUpWords }) => (takenUpWords ? 'in build' : 'to take up'),
    },
    {
      key: 'ready',
      header: 'Cabinets ready',
      cell: ({ jobId, readyOn, readyWords }) =>
        maySayReady ? <ReadyField jobId={jobId} readyOn={readyOn} /> : (readyWords ?? ''),
      sortValue: ({ readyOn }) => readyOn,
    },
  ];
  return (
    <>
      <FormError problem={problem} />
      <DataTable
        name="bench"
        caption={`Sheets to build, ${rows.length}`}
        rows={numbered}
        columns={columns}
        rowKey={({ releaseId }) => releaseId}
        filterLabel="Job or room"
        empty={
          <EmptyState title="Nothing to build yet">
            A sheet appears here when a room’s fit is released. It starts with a site measure.
          </EmptyState>
        }
      />
    </>
  );
}
