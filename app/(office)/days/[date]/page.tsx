import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DayScreen } from '@/components/days/day-screen';
import { may } from '@/lib/permissions';
import { isLocalDate } from '@/lib/time/civil';
import { formatLocalDay } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import { pageContext } from '@/server/base/page-context';
import { getMapGround } from '@/server/days/get-map-ground';

export const metadata: Metadata = { title: 'Days' };

export default async function DayPage({ params }: { params: Promise<{ date: string }> }) {
  const ctx = await pageContext('visits:read');
  const { date } = await params;
  if (!isLocalDate(date)) notFound();
  const { zone, region } = ctx.shop;
  return (
    <DayScreen
      key={date}
      date={date}
      today={localDate(ctx.now, zone)}
      title={formatLocalDay(date, { language: 'en', region })}
      ground={getMapGround(ctx)}
      mayBook={may(ctx.actor.role, 'visits:book')}
    />
  );
}
