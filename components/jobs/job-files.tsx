'use client';

import { useRouter } from 'next/navigation';
import { type ChangeEvent, useState } from 'react';
import { buttonLook } from '@/components/ui/button-look';
import { EmptyState } from '@/components/ui/empty-state';
import { FormError } from '@/components/ui/form-error';
import { type JobFileRow, MOST_PAPER_BYTES } from '@/lib/contracts/papers';
import { apiPaths } from '@/lib/paths';
import { type ProblemDetails, readProblemDetails } from '@/lib/problem-details';

type JobFilesProps = { jobId: string; files: JobFileRow[]; mayAdd: boolean };

/** Plans and letters kept with the job, and photos of it that belong to no room. */
export function JobFiles({ jobId, files, mayAdd }: JobFilesProps) {
  const router = useRouter();
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);

  const add = async (event: ChangeEvent<HTMLInputElement>) => {
    const input = event.currentTarget;
    setProblem(null);
    setIsBusy(true);
    for (const file of input.files ?? []) {
      const refused = await send(jobId, file);
      if (refused) {
        setProblem(refused);
        break;
      }
    }
    input.value = '';
    setIsBusy(false);
    router.refresh();
  };

  return (
    <>
      {files.length === 0 ? (
        <EmptyState title="No papers yet">
          Plans, letters and the makers’ papers as PDF, for all who work on this job.
        </EmptyState>
      ) : (
        <ul>
          {files.map((file) => (
            <li
              key={file.id}
              className="flex flex-wrap items-baseline justify-between gap-x-6 border-b border-rule py-1.5"
            >
              <a className="link" href={apiPaths.file(file.id)} target="_blank" rel="noreferrer">
                {file.isPicture ? file.caption || 'Photo' : file.name}
              </a>
              <span className="text-note text-graphite">
                {file.kilobytes} kB, {file.addedBy}, {file.addedAtWords}
              </span>
            </li>
          ))}
        </ul>
      )}
      <FormError problem={problem} shownFields={[]} />
      {mayAdd ? (
        <label className={buttonLook('line', 'desk', 'mt-3 cursor-pointer focus-within:outline-2')}>
          {isBusy ? 'Adding…' : 'Add a PDF'}
          <input
            type="file"
            accept="application/pdf"
            multiple
            disabled={isBusy}
            onChange={add}
            className="sr-only"
          />
        </label>
      ) : null}
    </>
  );
}

/** One file to the office; what stood against it, or null when it is kept. */
async function send(jobId: string, file: File): Promise<ProblemDetails | null> {
  const plain = (title: string): ProblemDetails => ({
    type: 'urn:setwell:problem:not-sent',
    title,
    status: 413,
  });
  if (file.size > MOST_PAPER_BYTES) {
    return plain(`${file.name} is over 20 MB. Nothing was kept; make it smaller.`);
  }
  const query = new URLSearchParams({ fileId: crypto.randomUUID(), name: file.name });
  try {
    const answer = await fetch(`${apiPaths.papers(jobId)}?${query}`, {
      method: 'POST',
      body: file,
    });
    if (answer.ok) return null;
    return readProblemDetails(await answer.json().catch(() => null)) ?? plain('It was not kept.');
  } catch {
    return plain('The office did not answer. Nothing was kept; try again.');
  }
}
