'use client';

import { useRouter } from 'next/navigation';
import { useFormRequest } from '@/components/door/use-form-request';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextareaField } from '@/components/ui/textarea-field';
import { Verdict } from '@/components/ui/verdict';
import { paths } from '@/lib/paths';
import { InFractions } from './in-fractions';
import { sendRelease } from './release-query';

type ReleasePanelProps = {
  jobId: string;
  roomId: string;
  seenReadingIds: string[];
  seenRunsMark: string;
  nextRevision: string;
  /** What speaks against it; with any, a reason is asked for. */
  openPoints: string[];
  /** What no reason lifts; with any, there is no button. */
  stops: string[];
  /** What it would change against the newest revision; null before the first. */
  changes: string[] | null;
};

/** The step from a fit to the bench: what is open, what changes, and the button. */
export function ReleasePanel(props: ReleasePanelProps) {
  const { jobId, roomId, seenReadingIds, seenRunsMark, nextRevision, openPoints, stops, changes } =
    props;
  const router = useRouter();
  let released = nextRevision;
  const form = useFormRequest(
    async ({ overrideReason = '' }) => {
      const answer = await sendRelease({ roomId, seenReadingIds, seenRunsMark, overrideReason });
      released = answer.revision;
    },
    () => {
      router.push(paths.sheet(jobId, roomId, released));
      router.refresh();
    },
  );
  if (changes?.length === 0) {
    return (
      <p className="py-2">
        <Verdict kind="confirmed">nothing changed since the newest revision</Verdict>
      </p>
    );
  }
  if (stops.length > 0) {
    return (
      <section className="py-2">
        <h3>
          <Verdict kind="over" className="font-bold">
            cannot be released yet
          </Verdict>
        </h3>
        <Lines lines={stops} />
      </section>
    );
  }
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-3 py-2">
      {changes ? (
        <section>
          <h3 className="font-bold">What revision {nextRevision} changes</h3>
          <Lines lines={changes} />
        </section>
      ) : null}
      {openPoints.length > 0 ? (
        <section>
          <h3>
            <Verdict kind="over" className="font-bold">
              {openPoints.length === 1
                ? 'one point is open'
                : `${openPoints.length} points are open`}
            </Verdict>
          </h3>
          <Lines lines={openPoints} />
          <TextareaField
            label="Why it goes out all the same"
            name="overrideReason"
            hint="Stands on the sheet and in the job’s story."
            maxLength={400}
            required
            rows={2}
            error={form.errorOf('overrideReason')}
          />
        </section>
      ) : null}
      <FormError problem={form.problem} shownFields={['overrideReason']} />
      <div>
        <Button type="submit" busyText={form.isBusy ? 'Releasing…' : undefined}>
          Release revision {nextRevision} to the bench
        </Button>
      </div>
    </form>
  );
}

function Lines({ lines }: { lines: string[] }) {
  return (
    <ul className="list-disc pl-5">
      {lines.map((line) => (
        <li key={line}>
          <InFractions words={line} />
        </li>
      ))}
    </ul>
  );
}
