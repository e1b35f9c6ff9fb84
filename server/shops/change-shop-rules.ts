import { eq } from 'drizzle-orm';
import { shops } from '@/db/schema';
import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { checkedRules } from './checked-rules';

/** What the shop decides. Released sheets keep the rules that they were made by. */
export async function changeShopRules(
  ctx: PersonContext,
  asked: ChangeShopRulesInput,
): Promise<ShopSettings> {
  mustBeAllowed(ctx, 'shop:change');
  const given = checkedRules(ctx, asked);
  return ctx.db.transaction(async (tx) => {
    const isThisShop = eq(shops.id, ctx.shop.id);
    const [before] = await tx
      .select({
        name: shops.name,
        phone: shops.phone,
        email: shops.email,
        zone: shops.zone,
        rules: shops.rules,
      })
      .from(shops)
      .where(isThisShop)
      .for('update');
    if (!before) throw new Error('the shop is gone');
    const { name, phone, email, zone, fit, booking, checklists, keeping } = given;
    const rules = {
      fit: fit ?? before.rules.fit,
      booking: booking ?? before.rules.booking,
      checklists: checklists ?? before.rules.checklists,
      keeping: keeping ?? before.rules.keeping,
    };
    const [after] = await tx
      .update(shops)
      .set({ name, phone, email, zone, rules })
      .where(isThisShop)
      .returning({
        name: shops.name,
        phone: shops.phone,
        email: shops.email,
        region: shops.region,
        zone: shops.zone,
        rules: shops.rules,
      });
    if (!after) throw new Error('the shop is gone');
    await writeAudit(tx, ctx, {
      verb: 'change-shop-rules',
      subjectKind: 'person',
      subjectId: ctx.actor.personId,
      summary: 'Shop rules changed',
      detail: {
        before: { ...before, ...before.rules, rules: undefined },
        given,
      },
    });
    const { rules: kept, ...shop } = after;
    return { ...shop, ...kept };
  });
}
