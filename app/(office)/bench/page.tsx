import type { Metadata } from 'next';
import { BenchTable } from '@/components/sheet/bench-table';
import { TitleBlock } from '@/components/ui/title-block';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listBench } from '@/server/sheets/list-bench';

export const metadata: Metadata = { title: 'Bench' };

export default async function BenchPage() {
  const ctx = await pageContext('sheets:read');
  return (
    <>
      <TitleBlock level={1} title="Bench" meta="newest sheets, first install first" />
      <BenchTable
        rows={await listBench(ctx)}
        mayTakeUp={may(ctx.actor.role, 'sheets:take-up')}
        maySayReady={may(ctx.actor.role, 'sheets:say-ready')}
      />
    </>
  );
}
