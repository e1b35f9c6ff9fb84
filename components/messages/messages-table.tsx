'use client';

import Link from 'next/link';
import { type Column, DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { Verdict } from '@/components/ui/verdict';
import type { MessageView } from '@/lib/contracts/messages';
import { paths } from '@/lib/paths';
import { messageStates, occasionOf, reasonOf } from './message-state';

const columns: Column<MessageView>[] = [
  {
    key: 'customer',
    header: 'Customer',
    cell: (message) => (
      <Link href={paths.thread(message.customerId)} className="font-bold hover:underline">
        {message.customerName}
      </Link>
    ),
    sortValue: (message) => message.customerName,
    text: (message) => message.customerName,
  },
  {
    key: 'occasion',
    header: 'Occasion',
    cell: occasionOf,
    choice: occasionOf,
  },
  {
    key: 'channel',
    header: 'By',
    isForDesk: true,
    cell: (message) => (
      <span className="whitespace-nowrap">{message.channel === 'sms' ? 'text' : 'e-mail'}</span>
    ),
    choice: (message) => (message.channel === 'sms' ? 'text' : 'e-mail'),
  },
  {
    key: 'due',
    header: 'When',
    cell: (message) => <span className="sm:whitespace-nowrap">{message.dueAtWords}</span>,
  },
  {
    key: 'state',
    header: 'Stands',
    cell: (message) => {
      const { words, kind } = messageStates[message.state];
      return (
        <>
          <Verdict kind={kind}>{words}</Verdict>
          {message.reason ? (
            <span className="block text-note text-graphite">{reasonOf(message)}</span>
          ) : null}
        </>
      );
    },
    choice: (message) => messageStates[message.state].words,
  },
  {
    key: 'body',
    header: 'Text',
    isForDesk: true,
    cell: (message) => <span className="line-clamp-2 max-w-prose text-note">{message.body}</span>,
    text: (message) => message.body,
  },
];

export function MessagesTable({ messages }: { messages: MessageView[] }) {
  return (
    <DataTable
      name="messages"
      caption={`Messages, ${messages.length}`}
      rows={messages}
      columns={columns}
      rowKey={(message) => message.id}
      filterLabel="Customer or words of the text"
      empty={
        <EmptyState title="Nothing told yet">
          Book a visit in the diary: the customer is told by text and e-mail, and it shows here.
        </EmptyState>
      }
    />
  );
}
