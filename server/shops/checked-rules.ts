import type { ChangeShopRulesInput } from '@/lib/contracts/shop-rules';
import { isZone } from '@/lib/time/zones';
import type { PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { phoneOf } from './phone-of';

/** A change of the rules as it would be kept: a zone that there is, and the phone as E.164. */
export function checkedRules(
  ctx: PersonContext,
  input: ChangeShopRulesInput,
): ChangeShopRulesInput {
  if (input.zone !== undefined && !isZone(input.zone)) {
    throw new Refusal({
      status: 422,
      code: 'no-such-zone',
      message: 'That time zone is not known.',
      errors: { zone: 'Pick a zone from the list.' },
    });
  }
  return input.phone === undefined
    ? input
    : { ...input, phone: phoneOf(ctx.shop, input.phone, 'phone') };
}
