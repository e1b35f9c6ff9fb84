import type { Metadata } from 'next';
import { StopScreen } from '@/components/day/stop-screen';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { getStop } from '@/server/days/get-stop';
import { getTodayVisit } from '@/server/days/get-today-visit';

export const metadata: Metadata = { title: 'Visit' };

export default async function TodayVisitPage({ params }: { params: Promise<{ visitId: string }> }) {
  const ctx = await pageContext('visits:read');
  const { visitId } = await params;
  const visit = await found(getTodayVisit(ctx, { visitId }));
  const stop = await getStop(ctx, { visitId });
  return <StopScreen visit={visit} stop={stop} />;
}
