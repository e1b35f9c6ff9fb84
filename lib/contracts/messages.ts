import { z } from 'zod';

const id = z.uuid();

/** What a message must say that its visit no longer tells. Instants as ISO text. */
export type MessageCause = {
  /** Moved or called off: the arrival that the customer was told last. */
  toldFrom?: string;
  toldUntil?: string;
  /** Called off: why. Not ready: what is missing. */
  reason?: string;
  /** Which visit: those that were asked about, in the order of their numbers, and what was answered. */
  choices?: string[];
  answered?: 'confirm' | 'another-time';
  /** Written by hand: the words themselves, and the subject of an e-mail. */
  text?: string;
  subject?: string;
};

export const messageStates = [
  'waiting',
  'sending',
  'sent',
  'delivered',
  'refused',
  'withdrawn',
  'received',
] as const;
export const messageState = z.enum(messageStates);

export const messageView = z.object({
  id,
  jobId: id.nullable(),
  customerName: z.string(),
  occasion: z.string(),
  channel: z.enum(['sms', 'email']),
  state: messageState,
  dueAtWords: z.string(),
  reason: z.string(),
  body: z.string(),
  customerId: id,
  /** What a text cost, in messages of the carrier; 0 for an e-mail and what was not sent. */
  segments: z.number().int(),
});
export type MessageView = z.infer<typeof messageView>;

export const schedulerItemKinds = [
  'unclear-reply',
  'asks-other-time',
  'call-me',
  'not-ready',
  'time-taken',
  'no-answer',
  'not-delivered',
  'said-stop',
  'running-late',
  'nobody-home',
  'cabinets-late',
] as const;
export const schedulerItemKind = z.enum(schedulerItemKinds);
export type SchedulerItemKind = z.infer<typeof schedulerItemKind>;

/** One thing for the office to look at. */
export const schedulerItemView = z.object({
  id,
  kind: schedulerItemKind,
  words: z.string(),
  atWords: z.string(),
  customerId: id,
  customerName: z.string(),
  phone: z.string(),
  jobId: id.nullable(),
});
export type SchedulerItemView = z.infer<typeof schedulerItemView>;

/** How many lines of the scheduler's list are open. */
export type ToAnswerView = { toAnswer: number };

export const tickOffInput = z.object({ itemId: id });
export type TickOffInput = z.infer<typeof tickOffInput>;

export const listMessagesInput = z.object({ jobId: id.optional() });
export type ListMessagesInput = z.infer<typeof listMessagesInput>;

export const writeByHandInput = z.object({
  /** Made in the browser: sent twice, it goes out once. */
  idempotencyKey: z.uuid(),
  customerId: id,
  jobId: id.nullable().default(null),
  channel: z.enum(['sms', 'email']),
  /** Of an e-mail; a text has none. */
  subject: z
    .string()
    .trim()
    .max(120)
    .regex(/^\P{Cc}*$/u, 'Write it in one line.')
    .default(''),
  text: z.string().trim().min(1, 'Write something.').max(1_500),
});
export type WriteByHandInput = z.infer<typeof writeByHandInput>;
/** When it goes out, in words: "at once", or "Wed, Dec 2, 8:00 AM: it is night at the site". */
export type WrittenByHand = { id: string; goesOut: string };

export const consentWays = ['on the phone', 'in person', 'in writing', 'by e-mail'] as const;

/** Said to somebody of the shop, by any means; with what was said. */
export const markConsentInput = z
  .object({
    customerId: id,
    channel: z.enum(['sms', 'email']),
    given: z.boolean(),
    way: z.enum(consentWays),
    /** Their words, or where it is written down. */
    proof: z.string().trim().max(400).default(''),
  })
  .refine(({ given, proof }) => !given || proof !== '', {
    path: ['proof'],
    message: 'Write what they said, or where it is written down: it is the proof.',
  });
export type MarkConsentInput = z.infer<typeof markConsentInput>;

export const setLanguageInput = z.object({ customerId: id, language: z.enum(['en', 'es']) });
export type SetLanguageInput = z.infer<typeof setLanguageInput>;

export const customerIdInput = z.object({ customerId: id });

/** Everything that was told to one customer and heard from them, beside who they are and what they allow. */
export const threadView = z.object({
  customerId: id,
  name: z.string(),
  phone: z.string(),
  email: z.string(),
  language: z.enum(['en', 'es']),
  /** Where they can be told now, and why not elsewhere. */
  channels: z.array(z.enum(['sms', 'email'])),
  leftOut: z.array(z.object({ channel: z.enum(['sms', 'email']), because: z.string() })),
  consents: z.array(
    z.object({
      id,
      channel: z.enum(['sms', 'email']),
      given: z.boolean(),
      how: z.string(),
      proof: z.string(),
      by: z.string(),
      atWords: z.string(),
    }),
  ),
  jobs: z.array(z.object({ id, number: z.number().int(), title: z.string() })),
  /** Oldest first, as on a phone. */
  messages: z.array(messageView.extend({ writtenBy: z.string() })),
  items: z.array(schedulerItemView),
});
export type ThreadView = z.infer<typeof threadView>;

/** To the owner's own phone or inbox; says what happened. */
export const sendTestInput = z.discriminatedUnion('channel', [
  z.object({
    channel: z.literal('sms'),
    to: z.string().trim().min(1, 'Write the number.').max(40),
  }),
  z.object({ channel: z.literal('email'), to: z.email('That is no e-mail address.').max(200) }),
]);
export type SendTestInput = z.infer<typeof sendTestInput>;
export const testAnswer = z.object({
  arrived: z.enum(['yes', 'sent', 'no']),
  /** What happened, for the owner. */
  message: z.string(),
  /** What to do about it. */
  advice: z.string(),
  /** The service's own words and code, for who sets it up. */
  detail: z.string(),
});
export type TestAnswer = z.infer<typeof testAnswer>;
