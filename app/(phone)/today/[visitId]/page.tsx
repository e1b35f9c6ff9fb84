import type { Metadata } from 'next';
import { StopScreen } from '@/components/phone/stop-screen';
import { may } from '@/lib/permissions';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { getTodayVisit } from '@/server/days/get-today-visit';

export const metadata: Metadata = { title: 'Visit' };

export default async function TodayVisitPage({ params }: { params: Promise<{ visitId: string }> }) {
  const ctx = await pageContext('visits:read');
  const { visitId } = await params;
  const visit = await found(getTodayVisit(ctx, { visitId }));
  const { role } = ctx.actor;
  return (
    <StopScreen
      visit={visit}
      holder={{ mayReport: may(role, 'visits:report'), mayMeasure: may(role, 'walls:measure') }}
    />
  );
}
