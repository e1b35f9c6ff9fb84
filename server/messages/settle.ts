import { and, eq, gte, isNotNull } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { messages } from '@/db/schema';
import { logBug } from '@/server/base/log';
import { type Claimed, claimUnsettled } from './claim-due';
import type { Sending } from './send-due';
import {
  giveUpWhileHeld,
  mostAttempts,
  writeRefusal,
  writeSent,
  writeWhileHeld,
} from './write-outcome';

/** The provider's clock may be a little behind ours. */
const clockSlackMs = 120_000;

/**
 * Finds out what became of messages that a crash or a lost answer left `sending`. A text is looked for at
 * the provider and goes again only when it is not there. An e-mail cannot be looked up: it goes again under
 * the Message-ID of its first try, by which mail programs know it for the same.
 */
export async function settle(sending: Omit<Sending, 'compose'>): Promise<number> {
  const unsettled = await claimUnsettled(sending.db, sending.now());
  // One after the other: two of the same words to one number must not both find the same text.
  for (const message of unsettled) await settleOne(sending, message);
  return unsettled.length;
}

async function settleOne(sending: Omit<Sending, 'compose'>, message: Claimed): Promise<void> {
  const { db, ports, now } = sending;
  try {
    // Nothing was written down yet, so nothing was sent.
    if (message.channel === 'email' || message.body === '' || !message.firstTriedAt) {
      await tryAgain(sending, message);
      return;
    }
    const since = new Date(message.firstTriedAt.getTime() - clockSlackMs);
    const { toAddress: to, body } = message;
    const except = await sidsOfOthers(db, message, since);
    const lookup = await ports.sms.findSent({ to, body, since, except });
    if (!lookup.ok) {
      await writeRefusal(db, message, { ...lookup.refusal, retry: 'ask-first' }, now());
      return;
    }
    const { found } = lookup;
    if (!found) await tryAgain(sending, message);
    else if (found.state === 'not-delivered') {
      const why = {
        message: found.refusal?.message ?? 'The text did not arrive.',
        code: found.refusal?.code ?? null,
        providerId: found.providerId,
      };
      await giveUpWhileHeld(db, message, why, now());
    } else {
      await writeSent(db, message, { ...found, at: now() });
    }
  } catch (error) {
    logBug('messages/settle', error);
  }
}

async function tryAgain({ db, now }: Omit<Sending, 'compose'>, message: Claimed): Promise<void> {
  if (message.attempts < mostAttempts) {
    await writeWhileHeld(db, message, { state: 'waiting', dueAt: now() });
  } else {
    const why = { message: 'It was tried many times.', code: null };
    await giveUpWhileHeld(db, message, why, now());
  }
}

/** Texts to this number that are known to be other messages of ours. */
async function sidsOfOthers(db: Database, message: Claimed, since: Date): Promise<Set<string>> {
  const others = await db
    .select({ providerId: messages.providerId })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, message.shopId),
        eq(messages.toAddress, message.toAddress),
        isNotNull(messages.providerId),
        gte(messages.sentAt, since),
      ),
    );
  return new Set(others.flatMap(({ providerId }) => providerId ?? []));
}
