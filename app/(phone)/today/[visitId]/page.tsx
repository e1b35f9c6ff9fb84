import type { Metadata } from 'next';
import Link from 'next/link';
import { QueueStatus } from '@/components/phone/queue-status';
import { VisitScreen } from '@/components/phone/visit-screen';
import { PhoneShell } from '@/components/shell/phone-shell';
import { paths } from '@/lib/paths';
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
    <PhoneShell where={<Link href={paths.today()}>‹ Today</Link>} status={<QueueStatus />}>
      <VisitScreen
        visit={visit}
        mayReport={may(role, 'visits:report')}
        mayMeasure={may(role, 'walls:measure')}
      />
    </PhoneShell>
  );
}
