import type { Metadata } from 'next';
import { SlipScreen } from '@/components/slip/slip-screen';
import { pageContext } from '@/server/base/page-context';
import { listLateJobs } from '@/server/days/list-late-jobs';

export const metadata: Metadata = { title: 'The shop is late' };

export default async function LatePage() {
  const ctx = await pageContext('visits:book');
  return <SlipScreen jobs={await listLateJobs(ctx)} />;
}
