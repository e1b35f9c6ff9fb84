'use client';

import Link from 'next/link';
import { minutesWords } from '@/components/diary/visit-words';
import { useFormRequest } from '@/components/door/use-form-request';
import { useRuleChange } from '@/components/rules/use-rule-change';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TitleBlock } from '@/components/ui/title-block';
import type {
  DurationCorrection,
  DurationCorrectionsView,
} from '@/lib/contracts/duration-corrections';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { paths } from '@/lib/paths';

type OwnTimesProps = { times: DurationCorrectionsView; settings: ShopSettings };

/** What the year's visits say of the minutes in the rules, what taking them up would do, and the way back. */
export function OwnTimes({ times, settings }: OwnTimesProps) {
  return (
    <section className="pb-6">
      <TitleBlock
        level={3}
        title="The shop’s own times"
        meta={
          <Link className="link" href={paths.rules()}>
            the rules, and what they were before
          </Link>
        }
      />
      {times.corrections.map((correction) => (
        <Offer key={correction.rule} correction={correction} settings={settings} />
      ))}
      {times.tooFew.map((words) => (
        <p key={words} className="border-b border-rule py-2 text-graphite">
          {words}
        </p>
      ))}
    </section>
  );
}

type OfferProps = { correction: DurationCorrection; settings: ShopSettings };

function Offer({ correction, settings }: OfferProps) {
  const { rule, words, nowMinutes, offeredMinutes, waiting } = correction;
  const { look, dialog } = useRuleChange(settings);
  const form = useFormRequest(
    () => look({ booking: { ...settings.booking, [rule]: offeredMinutes } }),
    () => form.rest(),
  );
  return (
    <div className="flex flex-wrap items-start justify-between gap-x-8 gap-y-2 border-b border-rule py-3">
      <div className="max-w-prose">
        <p className="font-medium">{words}</p>
        <p className="text-note text-graphite">{spreadWords(correction)}</p>
        {offeredMinutes === nowMinutes ? null : <p className="pt-1">{effectWords(waiting)}</p>}
        {waiting.length > 0 ? (
          <ul className="text-note">
            {waiting.slice(0, shownJobs).map((job) => (
              <li key={job.jobId}>
                <Link className="link" href={paths.job(job.jobId)}>
                  {job.jobNumber} {job.customerName}
                </Link>
                : {minutesWords(job.fromMinutes)} → {minutesWords(job.toMinutes)}
              </li>
            ))}
            {waiting.length > shownJobs ? <li>and {waiting.length - shownJobs} more</li> : null}
          </ul>
        ) : null}
      </div>
      {offeredMinutes === nowMinutes ? null : (
        <Button
          look="line"
          onClick={() => void form.run({})}
          busyText={form.isBusy ? 'Looking…' : undefined}
        >
          Use {offeredMinutes} minutes
        </Button>
      )}
      <FormError problem={form.problem} shownFields={[]} />
      {dialog}
    </div>
  );
}

const shownJobs = 5;

function spreadWords(correction: DurationCorrection): string {
  const { lowQuartileMinutes: low, highQuartileMinutes: high, setAsideCount } = correction;
  const half = `The middle half took ${low} to ${high}.`;
  if (setAsideCount === 0) return half;
  const aside = setAsideCount === 1 ? '1 is' : `${setAsideCount} are`;
  return `${half} ${aside} set aside: a tap was forgotten, and the time is absurd.`;
}

function effectWords(waiting: DurationCorrection['waiting']): string {
  if (waiting.length === 0) return 'Nothing that waits would be booked otherwise.';
  const visits = waiting.length === 1 ? '1 visit that waits' : `${waiting.length} visits that wait`;
  return `Would change ${visits}; what is booked stays as it is.`;
}
