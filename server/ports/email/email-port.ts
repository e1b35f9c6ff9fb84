/** E-mailing a customer or a person of the shop: what the business asks of whoever carries it. */

export type Attachment = { filename: string; contentType: string; content: Uint8Array };

export type OutgoingEmail = {
  to: string;
  subject: string;
  text: string;
  html?: string;
  /** A calendar object, with the METHOD that it carries (RFC 5546). */
  ics?: { content: string; method: 'REQUEST' | 'CANCEL' | 'PUBLISH' };
  attachments?: Attachment[];
  replyTo?: string;
  /** Makes the Message-ID, so that the same message sent twice is one to the reader's program. */
  idempotencyKey?: string;
};

export type EmailRefusalCode =
  /** The mailbox does not exist, or its server will not take it. */
  | 'bad-address'
  /** Not now: greylisted, full or busy. */
  | 'deferred'
  /** Nothing was sent: nobody there. */
  | 'unreachable'
  /** It may have been sent: the answer was lost. */
  | 'no-answer'
  | 'misconfigured';

export type EmailRefusal = {
  code: EmailRefusalCode;
  /** A second copy of an e-mail has the same Message-ID and is tried again even after a lost answer. */
  retry: 'later' | 'never';
  /** SMTP reply code. */
  providerCode: number | null;
  /** In words for the scheduler. */
  message: string;
  /** What the server said, word for word, for who sets the program up. */
  detail: string;
};

export type EmailSendResult =
  | { ok: true; providerId: string }
  | { ok: false; refusal: EmailRefusal };

export type EmailPort = {
  send(email: OutgoingEmail): Promise<EmailSendResult>;
};
