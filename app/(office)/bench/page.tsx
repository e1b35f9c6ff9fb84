import type { Metadata } from 'next';
import { BenchScreen } from '@/components/bench/bench-screen';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { TitleBlock } from '@/components/ui/title-block';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listBench } from '@/server/sheets/list-bench';
import { listSnags } from '@/server/snags/list-snags';

export const metadata: Metadata = { title: 'Bench' };

export default async function BenchPage() {
  const ctx = await pageContext('sheets:read');
  const snags = await listSnags(ctx, {});
  const { role } = ctx.actor;
  return (
    <>
      <TitleBlock level={1} title="Bench" meta="newest sheets, first need first" className="mb-4" />
      <LiveRefresh topics={['releases', 'jobs']} />
      <BenchScreen
        sheets={await listBench(ctx)}
        notes={snags.filter(({ mender }) => mender === 'bench')}
        mayTakeUp={may(role, 'sheets:take-up')}
        maySayReady={may(role, 'sheets:say-ready')}
        mayBook={may(role, 'visits:book')}
      />
    </>
  );
}
