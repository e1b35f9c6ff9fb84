import { RequestProblem } from '@/components/shell/ask-server';
import type { ImportedList, ListPreview } from '@/lib/contracts/job-lists';
import type { JobColumn } from '@/lib/import/job-columns';
import { apiPaths } from '@/lib/paths';
import { readProblemDetails } from '@/lib/problem-details';

export type Columns = readonly (JobColumn | null)[];

const said = (columns: Columns) => columns.map((column) => column ?? '').join(',');

export const previewList = (file: File, columns: Columns | null) =>
  sendFile<ListPreview>(apiPaths.previewList(columns ? { columns: said(columns) } : {}), file);

export const importList = (
  file: File,
  choice: { idempotencyKey: string; columns: Columns; leavesOut: boolean; takesDoubles: boolean },
) =>
  sendFile<ImportedList>(
    apiPaths.importList({
      idempotencyKey: choice.idempotencyKey,
      columns: said(choice.columns),
      leaveOutProblems: choice.leavesOut ? 'yes' : 'no',
      takeDoubles: choice.takesDoubles ? 'yes' : 'no',
    }),
    file,
  );

/** The file itself is the body; a refusal comes as it does for every other request. */
async function sendFile<Answer>(path: string, file: File): Promise<Answer> {
  const response = await fetch(path, {
    method: 'POST',
    headers: { 'content-type': 'text/csv' },
    body: file,
  }).catch(() => {
    throw new RequestProblem({
      type: 'no-connection',
      title: 'No connection, or the file was changed or moved',
      status: 0,
      detail: 'Nothing was imported. Choose the file once more.',
    });
  });
  const body: unknown = await response.json().catch(() => null);
  if (response.ok) return body as Answer;
  throw new RequestProblem(
    readProblemDetails(body) ?? {
      type: 'about:blank',
      title: 'Something went wrong',
      status: response.status,
      detail: 'Nothing was imported. Try again in a minute.',
    },
  );
}
