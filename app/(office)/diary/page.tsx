import type { Metadata } from 'next';
import { DiaryScreen } from '@/components/diary/diary-screen';
import { may } from '@/lib/permissions';
import { isLocalDate } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import { pageContext } from '@/server/base/page-context';
import { bookingDays } from '@/server/shops/booking-days';
import { listCrews } from '@/server/shops/list-crews';

export const metadata: Metadata = { title: 'Diary' };

export default async function DiaryPage({
  searchParams,
}: {
  searchParams: Promise<{ on?: string }>;
}) {
  const ctx = await pageContext('visits:read');
  const { on } = await searchParams;
  const { zone, region } = ctx.shop;
  const { dayStart, dayEnd, workdays, closedDays } = bookingDays(ctx);
  const today = localDate(ctx.now, zone);
  return (
    <DiaryScreen
      zone={zone}
      region={region}
      today={today}
      startOn={on && isLocalDate(on) ? on : today}
      pattern={{ dayStart, dayEnd, workdays, closedDays }}
      crews={await listCrews(ctx)}
      mayBook={may(ctx.actor.role, 'visits:book')}
    />
  );
}
