import type { SmsRefusal, SmsRefusalCode } from './sms-port';

type Meaning = { code: SmsRefusalCode; retry: SmsRefusal['retry']; message: string };

const meaning = (code: SmsRefusalCode, retry: SmsRefusal['retry'], message: string): Meaning => ({
  code,
  retry,
  message,
});

const badNumber = meaning('bad-number', 'never', 'This is not a number that can be texted.');
const cannotReceive = meaning(
  'cannot-receive',
  'never',
  'This number takes no texts: a landline, or its carrier refuses them.',
);
const accountFault = meaning(
  'misconfigured',
  'never',
  "The shop's texting account refused this. Check its settings with the provider.",
);

/** The provider's error codes, from the API and from delivery reports, by what they mean to us. */
const meanings: Record<number, Meaning> = {
  20003: accountFault,
  20404: meaning('misconfigured', 'never', 'The provider does not know this message or account.'),
  20429: meaning('busy', 'later', 'The provider asks to slow down.'),
  21211: badNumber,
  21217: badNumber,
  21408: meaning('misconfigured', 'never', "The shop's account may not text this country."),
  21606: accountFault,
  21608: accountFault,
  21610: meaning('opted-out', 'never', 'This number said STOP and gets no texts.'),
  21612: cannotReceive,
  21614: cannotReceive,
  21617: meaning('blocked', 'never', 'The text is too long to be sent.'),
  30001: meaning('busy', 'later', 'The queue of the provider is full.'),
  30003: meaning('unreachable', 'later', 'The phone is off or out of reach.'),
  30004: meaning('blocked', 'never', 'The carrier or the owner of this number blocks our texts.'),
  30005: badNumber,
  30006: cannotReceive,
  30007: meaning('blocked', 'never', 'The carrier filtered this text out.'),
  30008: meaning('unreachable', 'later', 'The text did not arrive; no reason was given.'),
  30034: accountFault,
};

/**
 * What a provider's code means; an unknown one is taken by its HTTP status: 5xx may pass, 4xx will not.
 * Example: 21610 is 'opted-out', never to be tried again.
 */
export function refusalOf(providerCode: number | null, httpStatus = 400, detail = ''): SmsRefusal {
  return { ...meaningOf(providerCode, httpStatus), providerCode, detail };
}

function meaningOf(providerCode: number | null, httpStatus: number): Meaning {
  const known = providerCode === null ? undefined : meanings[providerCode];
  if (known) return known;
  if (httpStatus === 429) return meanings[20429] as Meaning;
  if (httpStatus === 401 || httpStatus === 403) return accountFault;
  if (httpStatus >= 500) {
    return meaning('no-answer', 'ask-first', 'The provider has a fault of its own.');
  }
  const named = providerCode === null ? '' : ` (${providerCode})`;
  return meaning('blocked', 'never', `The provider refused this text${named}.`);
}
