import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** The shop as its context carries it, read anew with every request. */
export async function getShopRules(ctx: PersonContext): Promise<ShopSettings> {
  mustBeAllowed(ctx, 'shop:read');
  const { name, phone, email, region, zone, rules } = ctx.shop;
  return { name, phone, email, region, zone, ...rules };
}
