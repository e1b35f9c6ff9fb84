import type { Metadata } from 'next';
import Link from 'next/link';
import { ChecklistsForm } from '@/components/checklists/checklists-form';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { getShopRules } from '@/server/shops/get-shop-rules';

export const metadata: Metadata = { title: 'Checklists' };

export default async function ChecklistsPage() {
  const ctx = await pageContext('shop:read');
  const { checklists = {} } = await getShopRules(ctx);
  return (
    <>
      <TitleBlock
        level={1}
        title="Checklists"
        meta={
          <Link href={paths.rules()} className="link">
            Shop rules
          </Link>
        }
      />
      <ChecklistsForm own={checklists} mayChange={may(ctx.actor.role, 'shop:change')} />
    </>
  );
}
