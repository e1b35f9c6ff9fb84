import type { Metadata } from 'next';
import { NewJobForm } from '@/components/jobs/new-job-form';
import { TitleBlock } from '@/components/ui/title-block';
import { pageContext } from '@/server/base/page-context';
import { getMapGround } from '@/server/days/get-map-ground';

export const metadata: Metadata = { title: 'New job' };

export default async function NewJobPage() {
  const ctx = await pageContext('jobs:change');
  return (
    <>
      <TitleBlock level={1} title="New job" meta="customer, site and job in one go" />
      <NewJobForm ground={getMapGround(ctx)} />
    </>
  );
}
