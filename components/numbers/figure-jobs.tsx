'use client';

import Link from 'next/link';
import { type Column, DataTable } from '@/components/ui/data-table';
import type { FigureKey, FigureLine } from '@/lib/contracts/numbers';
import { paths } from '@/lib/paths';

type Line = FigureLine & { place: number; valueWords: string };

const columns: Column<Line>[] = [
  {
    key: 'job',
    header: 'Job',
    cell: ({ jobId, jobNumber }) => (
      <Link className="link" href={paths.job(jobId)}>
        {jobNumber}
      </Link>
    ),
    sortValue: ({ jobNumber }) => jobNumber,
    text: ({ jobNumber }) => String(jobNumber),
  },
  { key: 'on', header: 'Day', cell: ({ on }) => on, sortValue: ({ on }) => on },
  {
    key: 'words',
    header: 'What',
    cell: ({ words }) => words,
    sortValue: ({ words }) => words,
    text: ({ words }) => words,
  },
  {
    key: 'value',
    header: 'Value',
    isNumber: true,
    cell: ({ valueWords }) => valueWords,
    sortValue: ({ value }) => value ?? 0,
  },
];

/** Of what counts as a yes or a no there is nothing to add up. */
const withoutValue = columns.filter(({ key }) => key !== 'value');

export function FigureJobs({ figure, lines }: { figure: FigureKey; lines: Line[] }) {
  return (
    <DataTable
      name={`numbers-${figure}`}
      caption={`Jobs behind the figure, ${lines.length}`}
      rows={lines}
      columns={lines.some(({ value }) => value !== null) ? columns : withoutValue}
      rowKey={({ place }) => String(place)}
      filterLabel="Find a job or a word"
    />
  );
}
