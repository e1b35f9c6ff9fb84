import type { Metadata } from 'next';
import { KeptList } from '@/components/phone/kept-list';
import { QueueStatus } from '@/components/phone/queue-status';
import { TodayList } from '@/components/phone/today-list';
import { PhoneShell } from '@/components/shell/phone-shell';
import { isLocalDate } from '@/lib/time/civil';
import { pageContext } from '@/server/base/page-context';
import { getToday } from '@/server/days/get-today';

export const metadata: Metadata = { title: 'Today' };

export default async function TodayPage({
  searchParams,
}: {
  searchParams: Promise<{ on?: string }>;
}) {
  const ctx = await pageContext('visits:read');
  const { on } = await searchParams;
  const view = await getToday(ctx, on && isLocalDate(on) ? { date: on } : {});
  return (
    <PhoneShell where={<b>{ctx.shop.name}</b>} status={<QueueStatus />}>
      <TodayList view={view} personName={ctx.actor.name} />
      <KeptList />
    </PhoneShell>
  );
}
