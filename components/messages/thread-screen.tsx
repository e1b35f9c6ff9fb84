import Link from 'next/link';
import { TitleBlock } from '@/components/ui/title-block';
import type { ThreadView } from '@/lib/contracts/messages';
import { paths } from '@/lib/paths';
import { ConsentPanel } from './consent-panel';
import { LanguageChoice } from './language-choice';
import { SchedulerList } from './scheduler-list';
import { ThreadMessages } from './thread-messages';
import { WriteForm } from './write-form';

/** One customer: what was said both ways on the left; who they are, and what they allow, on the right. */
export function ThreadScreen({ thread, mayWrite }: { thread: ThreadView; mayWrite: boolean }) {
  const { customerId, name, phone, email, jobs, channels, leftOut, language } = thread;
  return (
    <>
      <TitleBlock level={1} title={name} meta="messages" className="mb-4" />
      {thread.items.length > 0 ? <SchedulerList items={thread.items} maySettle={mayWrite} /> : null}
      <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <section>
          <TitleBlock title="What was said" meta={thread.messages.length} />
          <ThreadMessages messages={thread.messages} />
          {mayWrite ? (
            <WriteForm
              customerId={customerId}
              jobId={jobs[0]?.id ?? null}
              channels={channels}
              leftOut={leftOut}
            />
          ) : null}
        </section>
        <div className="flex flex-col gap-8">
          <section>
            <TitleBlock title="Who" />
            <dl className="grid grid-cols-[auto_1fr] gap-x-5 gap-y-1.5 py-3">
              <dt className="text-graphite">Phone</dt>
              <dd>
                {phone ? (
                  <a className="underline" href={`tel:${phone}`}>
                    {phone}
                  </a>
                ) : (
                  'none'
                )}
              </dd>
              <dt className="text-graphite">E-mail</dt>
              <dd className="break-words">{email || 'none'}</dd>
              <dt className="text-graphite">Jobs</dt>
              <dd>
                {jobs.map((job) => (
                  <Link key={job.id} href={paths.job(job.id)} className="link block">
                    {job.number} · {job.title}
                  </Link>
                ))}
              </dd>
            </dl>
            {mayWrite ? (
              <LanguageChoice
                key={language}
                customerId={customerId}
                name={name}
                language={language}
              />
            ) : null}
          </section>
          <ConsentPanel thread={thread} mayMark={mayWrite} />
        </div>
      </div>
    </>
  );
}
