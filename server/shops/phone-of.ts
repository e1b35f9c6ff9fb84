import { parsePhoneNumberFromString } from 'libphonenumber-js';
import type { Shop } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';

/** The country whose way of writing numbers a shop's people use; in the EU they write +49 … */
const countryOf = { US: 'US', UK: 'GB', AU: 'AU', EU: undefined } as const;

/** A phone as typed, as E.164; empty stays empty, and what is no number is refused at its field. */
export function phoneOf(shop: Shop, typed: string, field: string): string {
  if (typed === '') return '';
  const phone = parsePhoneNumberFromString(typed, { defaultCountry: countryOf[shop.region] });
  if (phone?.isPossible()) return phone.number;
  throw new Refusal({
    status: 422,
    code: 'no-such-phone',
    message: 'The phone number is not one that can be called. Nothing was saved.',
    errors: { [field]: 'Not a phone number that can be called. Give the area code as well.' },
  });
}
