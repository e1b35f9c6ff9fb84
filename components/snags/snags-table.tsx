'use client';

import Link from 'next/link';
import { type Column, DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { Verdict } from '@/components/ui/verdict';
import type { SnagView } from '@/lib/contracts/snags';
import { paths } from '@/lib/paths';
import { crewEn } from '@/lib/words/crew-en';
import { CloseSnag, DueField, MenderField } from './snag-controls';
import { SnagFacts } from './snag-facts';

type SnagsTableProps = { snags: SnagView[]; mayChange: boolean };

/** Every open snag of the shop: what, where, who mends it, by when. */
export function SnagsTable({ snags, mayChange }: SnagsTableProps) {
  const columns: Column<SnagView>[] = [
    {
      key: 'job',
      header: 'Job',
      cell: ({ jobId, jobNumber, customerName }) => (
        <Link href={paths.job(jobId)} className="font-bold hover:underline">
          {customerName}
          <span className="block text-note font-normal text-graphite">{jobNumber}</span>
        </Link>
      ),
      sortValue: ({ customerName }) => customerName,
      text: ({ customerName, jobNumber }) => `${customerName} ${jobNumber}`,
    },
    {
      key: 'what',
      header: 'What',
      cell: (snag) => <SnagFacts snag={snag} />,
      sortValue: ({ words }) => words,
      text: ({ words, place, roomName }) => `${words} ${place} ${roomName ?? ''}`,
      choice: ({ kind }) => crewEn.snagKinds[kind],
    },
    {
      key: 'mender',
      header: 'Who mends it',
      cell: (snag) => (mayChange ? <MenderField snag={snag} /> : crewEn.menders[snag.mender]),
      sortValue: ({ mender }) => mender,
      choice: ({ mender }) => crewEn.menders[mender],
    },
    {
      key: 'due',
      header: 'By when',
      cell: (snag) => (
        <>
          {mayChange ? <DueField snag={snag} /> : snag.dueWords}
          {snag.isLate ? <Verdict kind="late" /> : null}
        </>
      ),
      sortValue: ({ dueOn }) => dueOn,
    },
    ...(mayChange
      ? [{ key: 'close', header: '', cell: (snag: SnagView) => <CloseSnag snag={snag} /> }]
      : []),
  ];
  return (
    <DataTable
      name="snags"
      caption={`Open snags, ${snags.length}`}
      rows={snags}
      columns={columns}
      rowKey={({ id }) => id}
      filterLabel="Customer, room or words"
      empty={
        <EmptyState title="No snag is open">
          What a crew finds on site stands here, with its photos, until it is mended.
        </EmptyState>
      }
    />
  );
}
