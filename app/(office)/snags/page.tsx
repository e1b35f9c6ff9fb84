import type { Metadata } from 'next';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { SnagsTable } from '@/components/snags/snags-table';
import { TitleBlock } from '@/components/ui/title-block';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listSnags } from '@/server/snags/list-snags';

export const metadata: Metadata = { title: 'Snags' };

export default async function SnagsPage() {
  const ctx = await pageContext('jobs:read');
  const snags = await listSnags(ctx, {});
  return (
    <>
      <LiveRefresh topics={['site']} />
      <TitleBlock level={1} title="Snags" meta="open, the most pressing first" />
      <SnagsTable snags={snags} mayChange={may(ctx.actor.role, 'snags:change')} />
    </>
  );
}
