import type { Metadata } from 'next';
import Link from 'next/link';
import { MessagesTable } from '@/components/messages/messages-table';
import { SchedulerList } from '@/components/messages/scheduler-list';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listItems } from '@/server/messages/list-items';
import { listMessages } from '@/server/messages/list-messages';

export const metadata: Metadata = { title: 'Messages' };

export default async function MessagesPage() {
  const ctx = await pageContext('messages:read');
  const items = await listItems(ctx);
  const wording = (
    <Link href={paths.wordings()} className="link">
      Wording, prices and a test
    </Link>
  );
  return (
    <>
      <TitleBlock level={1} title="Messages" meta={wording} className="mb-4" />
      <LiveRefresh topics={['messages']} />
      <SchedulerList items={items} maySettle={may(ctx.actor.role, 'messages:send')} />
      <MessagesTable messages={await listMessages(ctx, {})} />
    </>
  );
}
