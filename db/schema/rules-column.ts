import { customType } from 'drizzle-orm/pg-core';
import { type ShopRules, shopRules } from '@/lib/contracts/shop-rules';

/** A rule that came after a shop's were written has its start value when they are read. */
export const rulesColumn = customType<{ data: ShopRules; driverData: string }>({
  dataType: () => 'jsonb',
  toDriver: (rules) => JSON.stringify(rules),
  fromDriver: (stored) => withNewerRules(typeof stored === 'string' ? JSON.parse(stored) : stored),
});

/** What an older program allowed and this one does not must not lock a shop out: it stays as it is. */
function withNewerRules(stored: unknown): ShopRules {
  const { data } = shopRules.safeParse(stored);
  return data ?? (stored as ShopRules);
}
