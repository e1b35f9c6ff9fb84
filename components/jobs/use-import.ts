'use client';

import { useRef, useState } from 'react';
import { newId } from '@/components/phone/new-id';
import { problemOf } from '@/components/shell/ask-server';
import type { ImportedList, ListPreview } from '@/lib/contracts/job-lists';
import type { JobColumn } from '@/lib/import/job-columns';
import type { ProblemDetails } from '@/lib/problem-details';
import { importList, previewList } from './import-query';

/** A list on its way in: chosen, looked at with its columns, and brought in under one key. */
export function useImport(onDone: (imported: ImportedList) => void) {
  const [file, setFile] = useState<File | null>(null);
  const [preview, setPreview] = useState<ListPreview | null>(null);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [isBusy, setIsBusy] = useState(false);
  const key = useRef('');

  async function run(work: () => Promise<void>) {
    setIsBusy(true);
    setProblem(null);
    try {
      await work();
    } catch (caught) {
      setProblem(problemOf(caught));
    } finally {
      setIsBusy(false);
    }
  }

  return {
    file,
    preview,
    problem,
    isBusy,
    choose: (chosen: File) =>
      run(async () => {
        setFile(chosen);
        setPreview(null);
        key.current = newId();
        setPreview(await previewList(chosen, null));
      }),
    setColumn: (index: number, column: JobColumn | null) =>
      run(async () => {
        if (!file || !preview) return;
        // A thing that is named for a second column leaves the first.
        const columns = preview.columns.map((old, at) =>
          at === index ? column : old === column ? null : old,
        );
        key.current = newId();
        setPreview({ ...preview, columns });
        setPreview(await previewList(file, columns));
      }),
    bringIn: (choice: { leavesOut: boolean; takesDoubles: boolean }) =>
      run(async () => {
        if (!file || !preview) return;
        const { columns } = preview;
        onDone(await importList(file, { idempotencyKey: key.current, columns, ...choice }));
      }),
  };
}
