/** Phone numbers as people write them, and as they are kept: E.164. */
import { type CountryCode, parsePhoneNumberFromString } from 'libphonenumber-js/max';
import type { Outcome, Problem } from '@/lib/problem';
import type { Region } from '@/lib/time/text-locale';

export type PhoneNumber = {
  /** "+12025550123" */
  e164: string;
  /** "(202) 555-0123", for people of the same country. */
  national: string;
  /** "+1 202 555 0123", for everybody. */
  international: string;
  /** no: its range is for landlines and the like. unknown: try, and see what the provider says. */
  takesTexts: 'yes' | 'no' | 'unknown';
};

/** A number without a country code is read as of this country; in the EU it needs its own. */
const countryOf: Record<Region, CountryCode | undefined> = {
  US: 'US',
  UK: 'GB',
  AU: 'AU',
  EU: undefined,
};

const mobile = new Set(['MOBILE', 'FIXED_LINE_OR_MOBILE', 'PERSONAL_NUMBER']);

/**
 * Reads a phone number in any usual spelling. Spaces, brackets, dots and dashes do not matter; letters or an
 * extension do: neither can be texted. A possible number that no country has given out (those kept for
 * drama among them) is taken, with a warning.
 * Example: "(202) 555-0123" in the US is +12025550123; "07700 900123" in the UK is +447700900123, with a warning.
 * Problems: phone-not-readable, phone-with-extension (errors); phone-not-in-use (warning).
 */
export function toE164(text: string, region: Region): Outcome<PhoneNumber> {
  const parsed = parsePhoneNumberFromString(text, {
    ...(countryOf[region] ? { defaultCountry: countryOf[region] } : {}),
    extract: false,
  });
  if (!parsed?.isPossible() || /[a-z]/i.test(text.replace(/ext?\.?|x/gi, ''))) {
    return { value: null, problems: [notReadable(region)] };
  }
  if (parsed.ext) return { value: null, problems: [withExtension] };
  const type = parsed.getType();
  return {
    value: {
      e164: parsed.number,
      national: parsed.formatNational(),
      international: parsed.formatInternational(),
      takesTexts: type === undefined ? 'unknown' : mobile.has(type) ? 'yes' : 'no',
    },
    problems: parsed.isValid() ? [] : [notInUse],
  };
}

/**
 * A kept number as people of the shop's country write it; as it is kept where it cannot be read.
 * Example: "+12025550123" in the US is "(202) 555-0123"; in the UK it is "+1 202 555 0123".
 */
export function phoneWords(e164: string, region: Region): string {
  const { value } = toE164(e164, region);
  if (!value) return e164;
  const home = toE164(value.national, region).value?.e164;
  return home === value.e164 ? value.national : value.international;
}

function notReadable(region: Region): Problem {
  const country = region === 'EU' ? ' Write it with its country code, +34 or +353 and so on.' : '';
  const message = `This is not a phone number.${country}`;
  return { code: 'phone-not-readable', message, about: [], severity: 'error' };
}

const withExtension: Problem = {
  code: 'phone-with-extension',
  message: 'A number with an extension cannot be texted. Keep the extension in the notes.',
  about: [],
  severity: 'error',
};

const notInUse: Problem = {
  code: 'phone-not-in-use',
  message: 'No country has given out a number like this. Check it with the customer.',
  about: [],
  severity: 'warning',
};
