import { and, desc, eq } from 'drizzle-orm';
import { audit } from '@/db/schema';
import type { RuleHistoryLine } from '@/lib/contracts/rule-changes';
import type { ChangeShopRulesInput, ShopRules } from '@/lib/contracts/shop-rules';
import { ruleChanges } from '@/lib/rules/rule-changes';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

const mostLines = 50;

/** Who changed which rule from what to what, newest first. */
export async function listRuleChanges(ctx: PersonContext): Promise<RuleHistoryLine[]> {
  mustBeAllowed(ctx, 'shop:read');
  const rows = await ctx.db
    .select({ id: audit.id, who: audit.actorName, at: audit.at, detail: audit.detail })
    .from(audit)
    .where(and(eq(audit.shopId, ctx.shop.id), eq(audit.verb, 'change-shop-rules')))
    .orderBy(desc(audit.sequence))
    .limit(mostLines);
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return rows
    .map(({ id, who, at, detail }) => {
      const { before, given } = detail as { before: ShopRules; given: ChangeShopRulesInput };
      return {
        id,
        who,
        atWords: `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`,
        changes: ruleChanges(before, given),
      };
    })
    .filter(({ changes }) => changes.length > 0);
}
