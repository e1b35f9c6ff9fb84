import type { Metadata } from 'next';
import Link from 'next/link';
import { ToolsScreen } from '@/components/tools/tools-screen';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listTools } from '@/server/shops/list-tools';

export const metadata: Metadata = { title: 'Measuring tools' };

export default async function ToolsPage() {
  const ctx = await pageContext('shop:read');
  return (
    <>
      <TitleBlock
        level={1}
        title="Measuring tools"
        meta={
          <Link href={paths.rules()} className="link">
            Shop rules
          </Link>
        }
      />
      <ToolsScreen
        tools={await listTools(ctx)}
        unit={ctx.shop.rules.fit.unit}
        mayChange={may(ctx.actor.role, 'shop:change')}
      />
    </>
  );
}
