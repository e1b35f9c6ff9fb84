import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { QueueStatus } from '@/components/phone/queue-status';
import { PhoneShell } from '@/components/shell/phone-shell';
import { RoomWhere } from '@/components/walls/room-where';
import { WallBookScreen } from '@/components/walls/wall-book-screen';
import { openWallBookInput } from '@/lib/contracts/rooms';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { openWallBook } from '@/server/walls/open-wall-book';

export const metadata: Metadata = { title: 'Wall book' };

export default async function WallsPage({
  params,
  searchParams,
}: {
  params: Promise<{ roomId: string }>;
  searchParams: Promise<{ job?: string }>;
}) {
  const ctx = await pageContext('walls:measure');
  const { roomId } = await params;
  const { job } = await searchParams;
  const asked = openWallBookInput.safeParse({ roomId, jobId: job });
  if (!asked.success) notFound();
  const view = await found(openWallBook(ctx, asked.data));
  return (
    <PhoneShell where={<RoomWhere view={view} />} status={<QueueStatus />}>
      <WallBookScreen view={view} />
    </PhoneShell>
  );
}
