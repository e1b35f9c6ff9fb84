import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { connection } from 'next/server';
import { ChainGuide } from '@/components/demo/chain-guide';
import { Wordmark } from '@/components/shell/wordmark';
import { TitleBlock } from '@/components/ui/title-block';
import { listDemoPeople } from '@/server/people/list-demo-people';

export const metadata: Metadata = { title: 'The whole chain in three minutes' };

export default async function DemoPage() {
  await connection();
  const people = await listDemoPeople();
  if (people.length === 0) notFound();
  return (
    <main className="px-6 py-5">
      <Wordmark />
      <TitleBlock
        level={1}
        title="The whole chain in three minutes"
        meta="an invented shop on an invented island; nothing leaves this machine"
        className="mt-4 mb-5"
      />
      <ChainGuide people={people} />
    </main>
  );
}
