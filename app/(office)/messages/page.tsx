import type { Metadata } from 'next';
import { MessagesTable } from '@/components/messages/messages-table';
import { TitleBlock } from '@/components/ui/title-block';
import { pageContext } from '@/server/base/page-context';
import { listMessages } from '@/server/messages/list-messages';

export const metadata: Metadata = { title: 'Messages' };

export default async function MessagesPage() {
  const ctx = await pageContext('messages:read');
  return (
    <>
      <TitleBlock level={1} title="Messages" className="mb-4" />
      <MessagesTable messages={await listMessages(ctx, {})} />
    </>
  );
}
