'use client';

import type { SnagView } from '@/lib/contracts/snags';
import { NewSnag } from './new-snag';
import { CloseSnag, DueField, MenderField } from './snag-controls';
import { SnagFacts } from './snag-facts';

type JobSnagsProps = {
  jobId: string;
  snags: SnagView[];
  rooms: { id: string; name: string }[];
  mayChange: boolean;
};

/** The snags of a job, open ones first, and a new one from a call. */
export function JobSnags({ jobId, snags, rooms, mayChange }: JobSnagsProps) {
  return (
    <>
      {snags.length === 0 ? <p className="py-2 text-graphite">None.</p> : null}
      <ul className="divide-y divide-rule">
        {snags.map((snag) => (
          <li key={snag.id} className="flex flex-wrap items-start justify-between gap-3 py-3">
            <SnagFacts snag={snag} />
            {mayChange && snag.closedAt === null ? (
              <div className="flex flex-wrap gap-2">
                <MenderField snag={snag} />
                <DueField snag={snag} />
                <CloseSnag snag={snag} />
              </div>
            ) : null}
          </li>
        ))}
      </ul>
      {mayChange ? <NewSnag jobId={jobId} rooms={rooms} /> : null}
    </>
  );
}
