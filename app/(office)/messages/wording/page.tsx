import type { Metadata } from 'next';
import { WordingScreen } from '@/components/messages/wording-screen';
import { phoneWords } from '@/lib/messages/phone-number';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listWordings } from '@/server/messages/list-wordings';

export const metadata: Metadata = { title: 'Wording' };

export default async function WordingPage() {
  const ctx = await pageContext('messages:read');
  const { name, phone, email, region } = ctx.shop;
  return (
    <WordingScreen
      {...(await listWordings(ctx))}
      shop={{ name, phone: phoneWords(phone, region), email }}
      mayChange={may(ctx.actor.role, 'shop:change')}
    />
  );
}
