/** Who may be told, and by which way. */

export const channels = ['sms', 'email'] as const;
export type Channel = (typeof channels)[number];

/** One thing that was said about a channel; rows are added, never changed. */
export type ConsentRecord = {
  channel: Channel;
  given: boolean;
  at: Date;
  /** Tells two records of one instant apart; the higher came later. */
  sequence: number;
};

export type ConsentState = 'given' | 'withdrawn' | 'never-asked';

/**
 * What holds for a channel: the newest record. Example: given in May, withdrawn in June: 'withdrawn'.
 */
export function consentNow(records: readonly ConsentRecord[], channel: Channel): ConsentState {
  const newest = records
    .filter((record) => record.channel === channel)
    .toSorted((a, b) => a.at.getTime() - b.at.getTime() || a.sequence - b.sequence)
    .at(-1);
  if (!newest) return 'never-asked';
  return newest.given ? 'given' : 'withdrawn';
}

export type Reachability = {
  consents: readonly ConsentRecord[];
  /** E.164, or empty. */
  phone: string;
  /** False for a landline, or once the provider said that the number takes no texts. */
  phoneTakesTexts: boolean;
  email: string;
};

export type ChannelDecision = {
  /** Where to send, one or both. */
  channels: Channel[];
  /** Why each other channel is left out, in words for the scheduler. */
  leftOut: { channel: Channel; because: string }[];
  /** No channel is left: somebody must ring. */
  callThem: boolean;
};

/**
 * The channels on which a customer may be told about a visit. A text needs consent; an e-mail about
 * one's own visit needs only that it was not refused.
 * Example: consent to texts withdrawn, an address known: e-mail alone, "said no to texts".
 */
export function channelsFor(person: Reachability): ChannelDecision {
  const because: Record<Channel, string | null> = {
    sms: whyNotSms(person),
    email: whyNotEmail(person),
  };
  const open = channels.filter((channel) => because[channel] === null);
  return {
    channels: open,
    leftOut: channels.flatMap((channel) => {
      const reason = because[channel];
      return reason === null ? [] : [{ channel, because: reason }];
    }),
    callThem: open.length === 0,
  };
}

function whyNotSms({ consents, phone, phoneTakesTexts }: Reachability): string | null {
  if (phone === '') return 'no phone number';
  const state = consentNow(consents, 'sms');
  if (state === 'withdrawn') return 'said no to texts';
  if (state === 'never-asked') return 'not asked about texts';
  return phoneTakesTexts ? null : 'this number takes no texts';
}

function whyNotEmail({ consents, email }: Reachability): string | null {
  if (email === '') return 'no e-mail address';
  return consentNow(consents, 'email') === 'withdrawn' ? 'said no to e-mail' : null;
}
