import { eq } from 'drizzle-orm';
import { shops } from '@/db/schema';
import type { ChangeClosedDaysInput, CrewChange } from '@/lib/contracts/crews';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { holidaysOf } from '@/server/shops/booking-days';
import { keepOrTry } from './keep-or-try';
import { newlyOutside, visitsOutside } from './visits-outside';

/** On which days the shop is closed: its own, and the public holidays that it keeps. */
export async function changeClosedDays(
  ctx: PersonContext,
  input: ChangeClosedDaysInput,
): Promise<CrewChange> {
  mustBeAllowed(ctx, 'crews:change');
  const { isTrial, closedDays, holidays } = input;
  const year = ctx.now.getUTCFullYear();
  if (holidays && holidaysOf(holidays, year).length === 0) throw noHolidays();
  return keepOrTry(ctx, isTrial, async (tx) => {
    const isThisShop = eq(shops.id, ctx.shop.id);
    const [kept] = await tx
      .select({ rules: shops.rules })
      .from(shops)
      .where(isThisShop)
      .for('update');
    if (!kept) throw new Error('the shop is gone');
    const { booking } = kept.rules;
    const rules = {
      ...kept.rules,
      booking: {
        ...booking,
        closedDays: closedDays ? [...new Set(closedDays)].sort() : booking.closedDays,
        holidays: holidays === undefined ? (booking.holidays ?? null) : holidays,
      },
    };
    const before = await visitsOutside(tx, withRules(ctx, kept.rules));
    await tx.update(shops).set({ rules }).where(isThisShop);
    await writeAudit(tx, ctx, {
      verb: 'change-closed-days',
      subjectKind: 'person',
      subjectId: ctx.actor.personId,
      summary: 'Closed days changed',
      detail: {
        before: { closedDays: booking.closedDays, holidays: booking.holidays },
        given: input,
      },
    });
    const after = await visitsOutside(tx, withRules(ctx, rules));
    return { isKept: !isTrial, newlyOutside: newlyOutside(before, after) };
  });
}

function withRules(ctx: PersonContext, rules: PersonContext['shop']['rules']): PersonContext {
  return { ...ctx, shop: { ...ctx.shop, rules } };
}

function noHolidays(): Refusal {
  return new Refusal({
    status: 422,
    code: 'no-holidays-known',
    message: 'No public holidays are known of that place. Pick another from the list.',
    errors: { holidays: 'Pick a place from the list.' },
  });
}
