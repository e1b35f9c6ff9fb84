import { and, eq, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';
import type { EmailRefusal } from '@/server/ports/email/email-port';
import type { SmsRefusal, SmsState } from '@/server/ports/sms/sms-port';
import type { Claimed } from './claim-due';
import { giveUp, type WhyGivenUp } from './give-up';
import { nextAskAt } from './next-ask-at';

type Change = Partial<typeof messages.$inferInsert>;

/** Changes a message that this worker still holds, and what is told with it; false when a report or another worker was faster. */
export async function writeWhileHeld(
  db: Database,
  message: Claimed,
  change: Change,
): Promise<boolean> {
  const changed = await db
    .update(messages)
    .set(change)
    .where(and(eq(messages.shopId, message.shopId), stillHeld(message)))
    .returning({ id: messages.id });
  return changed.length > 0;
}

export function giveUpWhileHeld(
  db: Database,
  message: Claimed,
  why: WhyGivenUp,
  now: Date,
): Promise<void> {
  return giveUp(db, stillHeld(message), why, now);
}

function stillHeld(message: Claimed) {
  return and(
    inArray(messages.id, [message.id, ...message.others.map(({ id }) => id)]),
    eq(messages.state, 'sending'),
    message.claimedAt ? eq(messages.claimedAt, message.claimedAt) : undefined,
  );
}

export async function writeSent(
  db: Database,
  message: Claimed,
  sent: { providerId: string; state: SmsState; at: Date },
): Promise<void> {
  const isDelivered = sent.state === 'delivered';
  const awaitsReport = message.channel === 'sms' && !isDelivered;
  await writeWhileHeld(db, message, {
    state: isDelivered ? 'delivered' : 'sent',
    providerId: sent.providerId,
    sentAt: sent.at,
    deliveredAt: isDelivered ? sent.at : null,
    askAt: awaitsReport ? nextAskAt(sent.at, sent.at) : null,
    reason: '',
  });
}

export const mostAttempts = 8;
const firstPauseMs = 30_000;
const longestPauseMs = 3_600_000;
/** A lost answer is looked up after the provider has had time to write its books. */
const askAfterMs = 15_000;

export async function writeRefusal(
  db: Database,
  message: Claimed,
  refusal: SmsRefusal | EmailRefusal,
  now: Date,
): Promise<void> {
  const after = (ms: number) => new Date(now.getTime() + ms);
  if (refusal.retry === 'ask-first') {
    await writeWhileHeld(db, message, { dueAt: after(askAfterMs), reason: refusal.message });
    return;
  }
  if (refusal.retry === 'later' && message.attempts < mostAttempts) {
    const pauseMs = Math.min(firstPauseMs * 2 ** (message.attempts - 1), longestPauseMs);
    const again = { dueAt: after(pauseMs), reason: refusal.message };
    await writeWhileHeld(db, message, { state: 'waiting', ...again });
    return;
  }
  await giveUpWhileHeld(db, message, refusal, now);
}
