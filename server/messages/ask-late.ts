import { and, eq } from 'drizzle-orm';
import { messages } from '@/db/schema';
import { logBug } from '@/server/base/log';
import { claimUnreported, type Unreported } from './claim-unreported';
import { hearReport } from './hear-report';
import { nextAskAt } from './next-ask-at';
import type { Sending } from './send-due';

type Asking = Pick<Sending, 'db' | 'ports' | 'now'>;

/**
 * Asks the provider for reports that have not come. After a day without one the message stays sent, and
 * says that nobody knows whether it arrived.
 */
export async function askLate(asking: Asking): Promise<number> {
  const unreported = await claimUnreported(asking.db, asking.now());
  await Promise.all(unreported.map((message) => askOne(asking, message)));
  return unreported.length;
}

async function askOne({ db, ports, now }: Asking, message: Unreported): Promise<void> {
  try {
    const lookup = await ports.sms.find(message.providerId);
    if (lookup.ok && lookup.found?.isFinal) {
      await hearReport(db, lookup.found, { messageId: message.id, now: now() });
      return;
    }
    const askAt = nextAskAt(message.sentAt, now());
    await db
      .update(messages)
      .set({ askAt, ...(askAt ? {} : { reason: 'The provider never said whether it arrived.' }) })
      .where(
        and(
          eq(messages.shopId, message.shopId),
          eq(messages.id, message.id),
          eq(messages.state, 'sent'),
        ),
      );
  } catch (error) {
    logBug('messages/ask-late', error);
  }
}
