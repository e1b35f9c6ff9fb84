import type { Metadata } from 'next';
import { connection } from 'next/server';
import { CustomerPhone } from '@/components/demo/customer-phone';
import { TitleBlock } from '@/components/ui/title-block';
import { found } from '@/server/base/found';
import { readPhone } from '@/server/demo/read-phone';

export const metadata: Metadata = { title: 'The customer’s phone' };

type Props = { searchParams: Promise<{ number?: string; address?: string }> };

export default async function DemoPhonePage({ searchParams }: Props) {
  await connection();
  const phone = await found(readPhone(await searchParams));
  return (
    <main className="in-sun mx-auto min-h-dvh max-w-phone bg-sheet px-4 py-4">
      <TitleBlock
        level={1}
        title="The customer’s phone"
        meta="a fake: nothing leaves this machine"
        className="mb-4"
      />
      <CustomerPhone phone={phone} />
    </main>
  );
}
