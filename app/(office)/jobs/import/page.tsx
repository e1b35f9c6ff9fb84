import type { Metadata } from 'next';
import { ImportScreen } from '@/components/jobs/import-screen';
import { TitleBlock } from '@/components/ui/title-block';
import { pageContext } from '@/server/base/page-context';

export const metadata: Metadata = { title: 'Import jobs' };

export default async function ImportJobsPage() {
  await pageContext('jobs:change');
  return (
    <>
      <TitleBlock level={1} title="Import jobs" meta="all of a list, or nothing" className="mb-4" />
      <ImportScreen />
    </>
  );
}
