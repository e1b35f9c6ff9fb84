import { toE164 } from '@/lib/messages/phone-number';
import type { Shop } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';

/** A phone as typed, as E.164; empty stays empty, and what is no number is refused at its field. */
export function phoneOf(shop: Shop, typed: string, field: string): string {
  if (typed === '') return '';
  const { value, problems } = toE164(typed, shop.region);
  if (value) return value.e164;
  throw new Refusal({
    status: 422,
    code: 'no-such-phone',
    message: 'The phone number is not one that can be called. Nothing was saved.',
    errors: { [field]: problems[0]?.message ?? 'This is not a phone number.' },
  });
}
