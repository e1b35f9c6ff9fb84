import { eq } from 'drizzle-orm';
import { shops } from '@/db/schema';
import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { isZone } from '@/lib/time/zones';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { phoneOf } from './phone-of';

/** What the shop decides. Released sheets keep the rules that they were made by. */
export async function changeShopRules(
  ctx: PersonContext,
  input: ChangeShopRulesInput,
): Promise<ShopSettings> {
  mustBeAllowed(ctx, 'shop:change');
  if (input.zone !== undefined && !isZone(input.zone)) throw noSuchZone();
  const phone = input.phone === undefined ? undefined : phoneOf(ctx.shop, input.phone, 'phone');
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
    const { fit, booking, checklists, keeping } = input;
    const rules = {
      fit: fit ?? before.rules.fit,
      booking: booking ?? before.rules.booking,
      checklists: checklists ?? before.rules.checklists,
      keeping: keeping ?? before.rules.keeping,
    };
    const [after] = await tx
      .update(shops)
      .set({ name: input.name, phone, email: input.email, zone: input.zone, rules })
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
        given: { ...input, phone },
      },
    });
    const { rules: kept, ...shop } = after;
    return { ...shop, ...kept };
  });
}

function noSuchZone(): Refusal {
  return new Refusal({
    status: 422,
    code: 'no-such-zone',
    message: 'That time zone is not known.',
    errors: { zone: 'Pick a zone from the list.' },
  });
}
