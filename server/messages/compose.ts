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
};

export type Composed =
  | { is: 'sms'; body: string }
  | { is: 'email'; email: Omit<OutgoingEmail, 'to' | 'idempotencyKey'> }
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
