/** What is sent, made by the room that knows what the message is about: handed in, because the outbox does not. */
import type { MessageCause } from '@/lib/contracts/messages';
import type { Channel } from '@/lib/messages/consent';
import type { Context, SystemActor } from '@/server/base/context';
import type { OutgoingEmail } from '@/server/ports/email/email-port';
import type { Recipient } from './recipient';

export type DueMessage = {
  id: string;
  visitId: string;
  occasion: string;
  channel: Channel;
  cause: MessageCause;
  /** Other visits of the same customer that it tells of as well. */
  others: { id: string; visitId: string; cause: MessageCause }[];
};

/** Of the others that go with a message, one that it says nothing of after all, with why. */
export type LeftOut = { id: string; reason: string };

export type Composed =
  | { is: 'sms'; body: string; leftOut?: LeftOut[] }
  | { is: 'email'; email: Omit<OutgoingEmail, 'to' | 'idempotencyKey'>; leftOut?: LeftOut[] }
  /** Not sent after all, with why. */
  | { is: 'withdrawn'; reason: string }
  /** It cannot be written, with why. */
  | { is: 'refused'; reason: string };

/** Renders from the visit as it is NOW. */
export type Compose = (
  ctx: Context<SystemActor>,
  message: DueMessage,
  recipient: Recipient,
) => Promise<Composed>;
