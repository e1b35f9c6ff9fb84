import { logBug } from '@/server/base/log';
import { type Claimed, claimUnsettled } from './claim-due';
import type { Sending } from './send-due';
import { callThem, mostAttempts, writeRefusal, writeSent, writeWhileHeld } from './write-outcome';

/** The provider's clock may be a little behind ours. */
const clockSlackMs = 120_000;

/**
 * Finds out what became of messages that a crash or a lost answer left `sending`. A text is looked for at
 * the provider and goes again only when it is not there. An e-mail cannot be looked up: it goes again under
 * the Message-ID of its first try, by which mail programs know it for the same.
 */
export async function settle(sending: Omit<Sending, 'compose'>): Promise<number> {
  const unsettled = await claimUnsettled(sending.db, sending.now());
  await Promise.all(unsettled.map((message) => settleOne(sending, message)));
  return unsettled.length;
}

async function settleOne(
  { db, ports, now }: Omit<Sending, 'compose'>,
  message: Claimed,
): Promise<void> {
  try {
    const again = () =>
      writeWhileHeld(
        db,
        message,
        message.attempts < mostAttempts
          ? { state: 'waiting', dueAt: now() }
          : { state: 'refused', reason: callThem('It was tried many times.') },
      );
    // Nothing was written down yet, so nothing was sent.
    if (message.channel === 'email' || message.body === '' || !message.firstTriedAt) {
      await again();
      return;
    }
    const lookup = await ports.sms.findSent({
      to: message.toAddress,
      body: message.body,
      since: new Date(message.firstTriedAt.getTime() - clockSlackMs),
    });
    if (!lookup.ok) {
      await writeRefusal(db, message, { ...lookup.refusal, retry: 'ask-first' }, now());
      return;
    }
    const { found } = lookup;
    if (!found) await again();
    else if (found.state === 'not-delivered') {
      const reason = callThem(found.refusal?.message ?? 'The text did not arrive.');
      await writeWhileHeld(db, message, { state: 'refused', providerId: found.providerId, reason });
    } else {
      await writeSent(db, message, { ...found, at: now() });
    }
  } catch (error) {
    logBug('messages/settle', error);
  }
}
