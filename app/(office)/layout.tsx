import type { ReactNode } from 'react';
import { Providers } from '@/app/providers';
import { OfficeShell } from '@/components/shell/office-shell';
import { pageContext } from '@/server/base/page-context';
import { isStarting } from '@/server/numbers/is-starting';
import { listMyShops } from '@/server/people/switch-shop';
import { carriersMissing } from '@/server/ports/carriers-missing';

export default async function OfficeLayout({ children }: { children: ReactNode }) {
  const ctx = await pageContext('shop:read');
  const { shop, actor } = ctx;
  return (
    <Providers>
      <OfficeShell
        shop={{ id: shop.id, name: shop.name }}
        shops={await listMyShops(ctx)}
        person={{ name: actor.name, role: actor.role }}
        carriersMissing={carriersMissing()}
        isStarting={await isStarting(ctx)}
      >
        {children}
      </OfficeShell>
    </Providers>
  );
}
