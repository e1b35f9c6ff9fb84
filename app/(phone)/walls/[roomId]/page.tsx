import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { RoomScreen } from '@/components/walls/room-screen';
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
  return <RoomScreen view={view} />;
}
