'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import type { JobRow } from '@/lib/contracts/jobs';
import { paths } from '@/lib/paths';
import { LateJobs } from './late-jobs';
import { SlipPreview } from './slip-preview';
import { useSlipPreview } from './slip-query';

/** The shop is late: choose the jobs, see all that it moves, agree once. */
export function SlipScreen({ jobs }: { jobs: JobRow[] }) {
  const router = useRouter();
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set());
  const ask = useSlipPreview();
  return (
    <div className="max-w-page">
      <TitleBlock
        level={1}
        title="The shop is late"
        meta={
          <LinkButton look="plain" href={paths.diary()}>
            Back to the diary
          </LinkButton>
        }
        className="mb-4"
      />
      {ask.data ? (
        <SlipPreview
          preview={ask.data}
          onBack={() => ask.reset()}
          onAccepted={() => router.push(paths.diary())}
        />
      ) : (
        <LateJobs
          {...{ jobs, chosen }}
          onChoose={setChosen}
          onAsk={(input) => ask.mutate(input)}
          isAsking={ask.isPending}
          problem={ask.error ? problemOf(ask.error) : null}
        />
      )}
    </div>
  );
}
