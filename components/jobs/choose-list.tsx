'use client';

import { type DragEvent, useId, useState } from 'react';
import { controlLook } from '@/components/ui/field-frame';
import { mostListRows } from '@/lib/contracts/job-lists';
import { jobColumnWords } from '@/lib/import/job-columns';

/** The file, chosen or dropped. */
export function ChooseList({ onChoose }: { onChoose: (file: File) => void }) {
  const id = useId();
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const [file] = event.dataTransfer.files;
    if (file) onChoose(file);
  };
  return (
    <label
      htmlFor={id}
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={drop}
      className={`flex max-w-prose flex-col gap-3 border border-dashed px-5 py-6 ${isOver ? 'border-pine bg-tint' : 'border-graphite'}`}
    >
      <span className="text-lead font-bold">A list of customers and jobs, as CSV</span>
      <input
        id={id}
        type="file"
        accept=".csv,.txt,.tsv,text/csv,text/plain"
        className={controlLook}
        onChange={(event) => {
          const [file] = event.target.files ?? [];
          if (file) onChoose(file);
          event.target.value = '';
        }}
      />
      <span className="text-graphite">
        The first row names the columns: {jobColumnWords.customer}, {jobColumnWords.street} and what
        else you have. Commas, semicolons or tabs; up to {mostListRows} rows at a time. Nothing is
        written before you have seen it.
      </span>
    </label>
  );
}
