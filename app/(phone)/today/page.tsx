import type { Metadata } from 'next';
import { TodayScreen } from '@/components/day/today-screen';
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
  return <TodayScreen view={view} />;
}
