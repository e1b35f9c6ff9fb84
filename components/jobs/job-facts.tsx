import Link from 'next/link';
import { Verdict } from '@/components/ui/verdict';
import type { JobView } from '@/lib/contracts/jobs';
import { phoneWords } from '@/lib/messages/phone-number';
import { paths } from '@/lib/paths';
import type { Region } from '@/lib/time/text-locale';

/** Who and where, as one reads it out on the phone. */
export function JobFacts({
  job,
  region,
  mayRead,
}: {
  job: JobView;
  region: Region;
  /** What was said with the customer is one step away. */
  mayRead: boolean;
}) {
  const place = [job.street, job.town, job.postcode].filter(Boolean).join(', ');
  const told = [job.mayText ? 'text' : null, job.mayEmail ? 'e-mail' : null].filter(Boolean);
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-5 gap-y-1.5 py-3">
      <dt className="text-graphite">Customer</dt>
      <dd>{job.customerName}</dd>
      {job.phone ? (
        <>
          <dt className="text-graphite">Phone</dt>
          <dd>
            <a className="underline" href={`tel:${job.phone}`}>
              {phoneWords(job.phone, region)}
            </a>
          </dd>
        </>
      ) : null}
      {job.email ? (
        <>
          <dt className="text-graphite">E-mail</dt>
          <dd>{job.email}</dd>
        </>
      ) : null}
      <dt className="text-graphite">Told by</dt>
      <dd>
        {told.length > 0 ? told.join(' and ') : <Verdict kind="waiting">call them</Verdict>}
        {job.language === 'es' ? ', in Spanish' : ''}
        {mayRead ? (
          <>
            {' · '}
            <Link href={paths.thread(job.customerId)} className="link">
              messages
            </Link>
          </>
        ) : null}
      </dd>
      <dt className="text-graphite">Site</dt>
      <dd>{place}</dd>
      {job.floorsUp !== 0 ? (
        <>
          <dt className="text-graphite">Floor</dt>
          <dd>
            {job.floorsUp} up, {job.hasLift ? 'with a lift' : 'no lift'}
          </dd>
        </>
      ) : null}
      {job.yearBuilt ? (
        <>
          <dt className="text-graphite">Built</dt>
          <dd>
            {job.yearBuilt}
            {job.yearBuilt < 1978 ? (
              <Verdict kind="problem">
                old paint: follow the local law before anything is cut, sanded or scraped
              </Verdict>
            ) : null}
          </dd>
        </>
      ) : null}
      <dt className="text-graphite">Next visit</dt>
      <dd>{job.nextVisit ?? 'none booked'}</dd>
    </dl>
  );
}
