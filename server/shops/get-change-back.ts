import { and, eq } from 'drizzle-orm';
import { audit } from '@/db/schema';
import type { RuleChangeInput } from '@/lib/contracts/rule-changes';
import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { changeBack } from '@/lib/rules/change-back';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** What would have to be changed to take one change of the rules back. Nothing is changed by asking. */
export async function getChangeBack(
  ctx: PersonContext,
  { changeId }: RuleChangeInput,
): Promise<ChangeShopRulesInput> {
  mustBeAllowed(ctx, 'shop:change');
  const [line] = await ctx.db
    .select({ detail: audit.detail })
    .from(audit)
    .where(
      and(
        eq(audit.shopId, ctx.shop.id),
        eq(audit.verb, 'change-shop-rules'),
        eq(audit.id, changeId),
      ),
    );
  if (!line) throw notFound('change');
  const { rules, name, phone, email, zone } = ctx.shop;
  const detail = line.detail as { before: ShopSettings; given: ChangeShopRulesInput };
  return changeBack({ name, phone, email, zone, ...rules }, detail);
}
