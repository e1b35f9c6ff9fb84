import { redirect } from 'next/navigation';
import { paths } from '@/lib/paths';
import { localDate } from '@/lib/time/local-moment';
import { pageContext } from '@/server/base/page-context';

export default async function DaysPage() {
  const ctx = await pageContext('visits:read');
  redirect(paths.day(localDate(ctx.now, ctx.shop.zone)));
}
