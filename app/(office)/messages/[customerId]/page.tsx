import type { Metadata } from 'next';
import { ThreadScreen } from '@/components/messages/thread-screen';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { may } from '@/lib/permissions';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { getThread } from '@/server/messages/get-thread';

export const metadata: Metadata = { title: 'Messages with one customer' };

type Props = { params: Promise<{ customerId: string }> };

export default async function ThreadPage({ params }: Props) {
  const ctx = await pageContext('messages:read');
  const thread = await found(getThread(ctx, await params));
  return (
    <>
      <LiveRefresh topics={['messages']} />
      <ThreadScreen thread={thread} mayWrite={may(ctx.actor.role, 'messages:send')} />
    </>
  );
}
