'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { Skeleton } from '@/components/ui/skeleton';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import type { ListPreview } from '@/lib/contracts/job-lists';
import { apiPaths, paths } from '@/lib/paths';
import { ChooseList } from './choose-list';
import { ListColumns } from './list-columns';
import { ListRows } from './list-rows';
import { useImport } from './use-import';

/** A list comes in: chosen, looked at row by row, then all of it or nothing. */
export function ImportScreen() {
  const router = useRouter();
  const [leavesOut, setLeavesOut] = useState(false);
  const [takesDoubles, setTakesDoubles] = useState(false);
  const list = useImport(({ jobs, leftOut }) => {
    const rest = leftOut > 0 ? ` Left out: ${rowsWords(leftOut)}.` : '';
    showToast({
      text: `${jobs} ${jobs === 1 ? 'job' : 'jobs'} imported.${rest} Their addresses are being put on the map; those not found stay under “no pin”.`,
    });
    router.push(paths.jobs());
  });
  const { preview } = list;
  return (
    <div className="flex flex-col gap-8">
      <ChooseList onChoose={list.choose} />
      {preview ? null : (
        <p>
          Not sure about the columns?{' '}
          <Link href={apiPaths.exportJobs()} prefetch={false} className="text-blueprint underline">
            Take your own jobs away as CSV
          </Link>
          : what goes out in these columns comes in by them.
        </p>
      )}
      <FormError problem={list.problem} />
      {list.isBusy && !preview ? <Skeleton className="h-60 w-full" /> : null}
      {preview ? (
        <>
          <section className="flex flex-col gap-3">
            <TitleBlock title="Columns" meta={`${list.file?.name ?? ''}, ${fileWords(preview)}`} />
            <ListColumns preview={preview} onChange={list.setColumn} />
          </section>
          <section className="flex flex-col gap-3">
            <TitleBlock title="Rows" meta={countWords(preview)} />
            {preview.counts.problems > 0 ? (
              <CheckField
                label={`Leave out ${rowsWords(preview.counts.problems)} with something wrong`}
                hint="Without this nothing comes in until the list is mended."
                checked={leavesOut}
                onChange={(event) => setLeavesOut(event.target.checked)}
              />
            ) : null}
            {preview.counts.doubles > 0 ? (
              <CheckField
                label={`Bring in ${rowsWords(preview.counts.doubles)} of people or places that are known already`}
                hint="Each begins one more job; the same phone or e-mail is the same customer."
                checked={takesDoubles}
                onChange={(event) => setTakesDoubles(event.target.checked)}
              />
            ) : null}
            <div className="flex flex-wrap items-center gap-3">
              <Button
                disabled={jobsIn(preview, { leavesOut, takesDoubles }) === 0}
                busyText={list.isBusy ? 'Working…' : undefined}
                onClick={() => list.bringIn({ leavesOut, takesDoubles })}
              >
                {buttonWords(jobsIn(preview, { leavesOut, takesDoubles }))}
              </Button>
              <p className="text-note text-graphite">
                Nobody is texted or e-mailed, and nobody is taken to have agreed to it.
              </p>
            </div>
            <ListRows rows={preview.rows} />
          </section>
        </>
      ) : null}
    </div>
  );
}

const separatorWords: Record<string, string> = { ',': 'commas', ';': 'semicolons', '\t': 'tabs' };

const fileWords = ({ encoding, separator }: ListPreview) =>
  `${encoding}, divided by ${separatorWords[separator] ?? separator}`;

const countWords = ({ counts }: ListPreview) =>
  `${counts.ready} ready · ${counts.doubles} known already · ${counts.problems} with something wrong`;

const rowsWords = (rows: number) => (rows === 1 ? 'one row' : `${rows} rows`);

/** How many jobs a press of the button would begin. */
function jobsIn(
  { counts }: ListPreview,
  choice: { leavesOut: boolean; takesDoubles: boolean },
): number {
  if (counts.problems > 0 && !choice.leavesOut) return 0;
  return counts.ready + (choice.takesDoubles ? counts.doubles : 0);
}

function buttonWords(jobs: number): string {
  if (jobs === 0) return 'Nothing to import';
  return jobs === 1 ? 'Import 1 job' : `Import ${jobs} jobs`;
}
