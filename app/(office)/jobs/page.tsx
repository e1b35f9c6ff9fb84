import type { Metadata } from 'next';
import { JobsTable } from '@/components/jobs/jobs-table';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { TitleBlock } from '@/components/ui/title-block';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listJobs } from '@/server/jobs/list-jobs';

export const metadata: Metadata = { title: 'Jobs' };

export default async function JobsPage() {
  const ctx = await pageContext('jobs:read');
  const jobs = await listJobs(ctx, { search: '' });
  return (
    <>
      <TitleBlock level={1} title="Jobs" className="mb-4" />
      <LiveRefresh topics={['jobs', 'visits']} />
      <JobsTable jobs={jobs} mayStart={may(ctx.actor.role, 'jobs:change')} />
    </>
  );
}
