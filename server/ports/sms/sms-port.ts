/** Texting a customer: what the business asks of whoever carries it. */

export type OutgoingSms = {
  /** E.164. */
  to: string;
  body: string;
  /** Where delivery is reported; the idempotency key is added to it as `key`. */
  statusCallback?: string;
  /** The message's own key, so that a report finds its row even when the answer to `send` was lost. */
  idempotencyKey?: string;
};

export type SmsRefusalCode =
  /** Said STOP. Never again, until START. */
  | 'opted-out'
  /** Not a number that exists. */
  | 'bad-number'
  /** A landline, or a carrier that takes no texts. */
  | 'cannot-receive'
  /** Too many at once. */
  | 'busy'
  /** Nothing was sent: nobody there. */
  | 'unreachable'
  /** It may have been sent: the answer was lost. */
  | 'no-answer'
  /** The provider or a carrier will not carry this text. */
  | 'blocked'
  /** Our account, number or registration. */
  | 'misconfigured';

export type SmsRefusal = {
  code: SmsRefusalCode;
  /** later: try again; ask-first: look with `findSent` before trying again; never: fall to e-mail or a call. */
  retry: 'later' | 'ask-first' | 'never';
  providerCode: number | null;
  /** In words for the scheduler. */
  message: string;
  /** What the provider said, word for word, for who sets the program up. */
  detail: string;
};

export type SmsState = 'waiting' | 'sent' | 'delivered' | 'not-delivered';

/** Where a message stands, by the provider. `refusal` says why when it was not delivered. */
export type SmsReport = {
  providerId: string;
  state: SmsState;
  /** Delivered and not-delivered are final; reports may come late, twice and out of order. */
  isFinal: boolean;
  refusal: SmsRefusal | null;
};

export type SmsSendResult =
  | { ok: true; providerId: string; state: SmsState }
  | { ok: false; refusal: SmsRefusal };

export type SmsLookup<T> = { ok: true; found: T | null } | { ok: false; refusal: SmsRefusal };

export type SmsPort = {
  send(sms: OutgoingSms): Promise<SmsSendResult>;
  find(providerId: string): Promise<SmsLookup<SmsReport>>;
  /**
   * Settles a message whose answer was lost: the same text to the same number since then, that is not
   * known for another message.
   */
  findSent(sms: {
    to: string;
    body: string;
    since: Date;
    except?: ReadonlySet<string>;
  }): Promise<SmsLookup<SmsReport>>;
  /** Whether a webhook came from the provider. `url` is the public one, with its query. */
  isGenuine(webhook: { url: string; params: Record<string, string>; signature: string }): boolean;
};
