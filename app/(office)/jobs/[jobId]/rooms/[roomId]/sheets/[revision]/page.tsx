import '@/components/sheet/shop-sheet.css';
import type { Metadata } from 'next';
import { ShopSheet } from '@/components/sheet/shop-sheet';
import { may } from '@/lib/permissions';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { getSheet } from '@/server/sheets/get-sheet';

export const metadata: Metadata = { title: 'Shop sheet' };

type SheetPageProps = { params: Promise<{ roomId: string; revision: string }> };

export default async function SheetPage({ params }: SheetPageProps) {
  const ctx = await pageContext('sheets:read');
  const { roomId, revision } = await params;
  const sheet = await found(getSheet(ctx, { roomId, revision }));
  return <ShopSheet sheet={sheet} mayTakeUp={may(ctx.actor.role, 'sheets:take-up')} />;
}
