import type { Metadata } from 'next';
import { FitScreen } from '@/components/fit/fit-screen';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { may } from '@/lib/permissions';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { getFit } from '@/server/sheets/get-fit';

export const metadata: Metadata = { title: 'Fit' };

type FitPageProps = {
  params: Promise<{ roomId: string }>;
  searchParams: Promise<{ wall?: string; lay?: string }>;
};

export default async function FitPage({ params, searchParams }: FitPageProps) {
  const ctx = await pageContext('sheets:read');
  const { roomId } = await params;
  const { wall, lay } = await searchParams;
  const mayLayOut = may(ctx.actor.role, 'runs:change');
  return (
    <>
      <LiveRefresh topics={['readings', 'releases']} />
      <FitScreen
        view={await found(getFit(ctx, { roomId }))}
        choice={{ wall, lay: mayLayOut ? lay : undefined }}
        mayLayOut={mayLayOut}
        mayRelease={may(ctx.actor.role, 'sheets:release')}
      />
    </>
  );
}
