'use client';

import { useId } from 'react';
import { controlLook } from '@/components/ui/field-frame';
import type { ListPreview } from '@/lib/contracts/job-lists';
import { type JobColumn, jobColumns, jobColumnWords } from '@/lib/import/job-columns';

type ListColumnsProps = {
  preview: ListPreview;
  onChange: (index: number, column: JobColumn | null) => void;
};

/** What each column of the list is: guessed from its heading, and changed by hand. */
export function ListColumns({ preview, onChange }: ListColumnsProps) {
  const id = useId();
  const named = preview.headings.map((heading, index) => ({
    index,
    heading: heading || `column ${index + 1}`,
    sample: preview.samples[index] ?? '',
    column: preview.columns[index] ?? null,
  }));
  return (
    <ul className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-4">
      {named.map(({ index, heading, sample, column }) => (
        <li key={index} className="flex min-w-0 flex-col gap-1">
          <label htmlFor={`${id}-${index}`} className="truncate font-medium">
            {heading}
          </label>
          <select
            id={`${id}-${index}`}
            className={controlLook}
            value={column ?? ''}
            aria-describedby={`${id}-${index}-sample`}
            onChange={(event) => onChange(index, (event.target.value || null) as JobColumn | null)}
          >
            <option value="">leave it out</option>
            {jobColumns.map((one) => (
              <option key={one} value={one}>
                {jobColumnWords[one]}
              </option>
            ))}
          </select>
          <p id={`${id}-${index}-sample`} className="truncate text-note text-graphite">
            {sample || 'empty'}
          </p>
        </li>
      ))}
    </ul>
  );
}
